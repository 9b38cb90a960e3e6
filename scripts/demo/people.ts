import type { Locale, Role, Topic } from '../../shared/vocabulary.ts';

/** The one password of the demonstration's people; it opens nothing but the demonstration. */
export const demoPassword = 'mark-the-tank';

export interface DemoPerson {
  name: string;
  email: string;
  roles: readonly Role[];
  language: Locale;
  /** What the account is good for trying. */
  note: string;
  /** How the person's twelve weeks went; none for those who did not practice. */
  history?: { strength: number; weak: readonly Topic[]; strong: readonly Topic[]; days: number };
}

// Invented people of an invented training outfit and its customers. Any likeness to a person is chance.
const school = 'Alder Row Grounds School';
const pennant = 'Pennant Hill Grounds Care';
const copperbeech = 'Copperbeech Landscapes';

function trainee(name: string, note: string, rest: Pick<DemoPerson, 'history'> & { language?: Locale }): DemoPerson {
  const { language = 'en', history } = rest;
  return { name, email: emailOf(name), roles: ['trainee'], language, note, history };
}

function emailOf(name: string): string {
  return `${name.toLowerCase().replaceAll(' ', '.')}@example.test`;
}

function helper(name: string, roles: readonly Role[], note: string): DemoPerson {
  return { name, email: emailOf(name), roles, language: 'en', note };
}

export const demoPeople: readonly DemoPerson[] = [
  trainee('Imre Tollund', `${pennant}, halfway through`, {
    history: { strength: -0.2, weak: ['rate', 'boom'], strong: ['area'], days: 26 },
  }),
  helper('Odalys Brennick', ['trainee', 'instructor'], `instructor at ${school}`),
  helper('Sunniva Caldbeck', ['trainee', 'staff'], `office of ${school}`),
  helper('Ruben Ostermark', ['trainee', 'manager'], `manager at ${pennant}`),
  helper('Pilar Wexcombe', ['trainee', 'manager'], `manager at ${copperbeech}`),
  trainee('Noor Haverley', 'a candidate who studies alone, near the examination', {
    history: { strength: 1, weak: ['spreader'], strong: ['rate', 'units'], days: 34 },
  }),
  trainee('Yadira Salcombe', `${copperbeech}, studies in Spanish`, {
    language: 'es',
    history: { strength: 0.4, weak: ['strength'], strong: ['handheld'], days: 22 },
  }),
  trainee('Wanjiru Ashgrove', `${pennant}, strong`, {
    history: { strength: 0.9, weak: [], strong: ['area', 'tank'], days: 24 },
  }),
  trainee('Matthias Dornleigh', `${copperbeech}, struggles`, {
    history: { strength: -0.9, weak: ['units', 'strength', 'boom'], strong: [], days: 14 },
  }),
  trainee('Tove Lindqvale', `${pennant}, new: nothing practiced yet`, {}),
];
