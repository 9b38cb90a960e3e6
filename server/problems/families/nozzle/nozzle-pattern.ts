import type { NozzlePatternFigure } from '../../../../shared/contracts/figure.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type ChoicePart, type Slip } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { capital, drawScene, type Scene } from '../../situations.ts';
import type { WorkingLine } from '../../working.ts';
import { both } from '../both.ts';
import { patternJobs } from './pattern-jobs.ts';
import { patternMarks, patternNames, patternOrder, type NamedPattern } from './pattern-names.ts';
import type { PatternRule } from './pattern-rule.ts';
import { patternSigns } from './pattern-signs.ts';

interface Given extends Scene {
  readonly asks: 'fit' | 'fitted';
  readonly rule: string;
  readonly told: number;
  /** The three wrong patterns offered. */
  readonly offered: readonly NamedPattern[];
}

const rules = { fit: patternJobs, fitted: patternSigns } as const;

function ruleOf(g: Given): PatternRule {
  const found = rules[g.asks].find(({ key }) => key === g.rule);
  if (!found) throw new RangeError(`no rule ${g.rule}`);
  return found;
}

const openings = 3;

function draw(rng: Rng, tier: Tier): Given {
  const asks = tier === 1 ? 'fit' : 'fitted';
  const rule = rng.pick(rules[asks]);
  return {
    ...drawScene(rng, openings),
    asks,
    rule: rule.key,
    told: rng.int(0, rule.told.length - 1),
    offered: rng.sample(rule.wrong, 3).map(({ pattern }) => pattern),
  };
}

function openingsFor(g: Given): readonly Text[] {
  if (g.asks === 'fit') {
    return [
      both(
        en`${g.person} gets the sprayer ready for work at ${g.place.the}.`,
        es`${g.person} prepara el rociador para el trabajo ${g.place.at}.`,
      ),
      both(
        en`${g.person} and the crew leader look at a job ${g.place.at}.`,
        es`${g.person} y el jefe de cuadrilla miran un trabajo ${g.place.at}.`,
      ),
      both(en`The crew works ${g.place.at} ${g.season}.`, es`La cuadrilla trabaja ${g.place.at} ${g.season}.`),
    ];
  }
  return [
    both(en`${g.person} checks a job ${g.place.at}.`, es`${g.person} revisa un trabajo ${g.place.at}.`),
    both(
      en`${g.person} and the crew leader look at a sprayer ${g.place.at}.`,
      es`${g.person} y el jefe de cuadrilla miran un rociador ${g.place.at}.`,
    ),
    both(
      en`${capital(g.season)} a sprayer gives trouble ${g.place.at}.`,
      es`${capital(g.season)} un rociador da problemas ${g.place.at}.`,
    ),
  ];
}

function statement(g: Given): Text {
  const told = ruleOf(g).told[g.told] ?? both('', '');
  const opening = openingsFor(g)[g.situation];
  return both(en`${opening ?? ''} ${told}`, es`${opening ?? ''} ${told}`);
}

function part(g: Given): ChoicePart {
  const rule = ruleOf(g);
  const wrong = rule.wrong.filter(({ pattern }) => g.offered.includes(pattern));
  return {
    kind: 'choice',
    key: 'a',
    topic: 'nozzle',
    ask:
      g.asks === 'fit'
        ? both('Which nozzle pattern fits this job best?', '¿Qué patrón de boquilla sirve mejor para este trabajo?')
        : both('Which nozzle pattern was fitted?', '¿Qué patrón de boquilla estaba puesto?'),
    options: [
      { key: rule.right, text: patternNames[rule.right], right: true, reason: rule.why },
      ...wrong.map(({ pattern, slip, reason }) => ({
        key: pattern,
        text: patternNames[pattern],
        right: false,
        slip,
        reason,
      })),
    ],
  };
}

function offeredPatterns(g: Given): NamedPattern[] {
  const all = new Set<string>([ruleOf(g).right, ...g.offered]);
  return patternOrder.filter((one): one is NamedPattern => all.has(one));
}

function figure(g: Given): NozzlePatternFigure<Text> {
  const shown = offeredPatterns(g);
  const marks = (locale: 'en' | 'es') => shown.map((one) => patternMarks[one][locale]).join('; ');
  return {
    kind: 'nozzle-patterns',
    patterns: shown.map((pattern) => ({ pattern, name: patternNames[pattern] })),
    alt: both(`Marks that nozzles leave. ${marks('en')}.`, `Marcas que dejan las boquillas. ${marks('es')}.`),
  };
}

function working(g: Given): readonly WorkingLine[] {
  const { options } = part(g);
  const lines = options.map(({ text, reason, right }) => ({ name: text, reason, answers: right }));
  return [...lines.filter(({ answers }) => !answers), ...lines.filter(({ answers }) => answers)];
}

const slipKeys = [...new Set([...patternJobs, ...patternSigns].flatMap(({ wrong }) => wrong.map(({ slip }) => slip)))];
const slips: readonly Slip<Given>[] = slipKeys.map((key) => ({
  key,
  part: 'a',
  message: (g) => part(g).options.find((option) => option.slip === key)?.reason ?? both('', ''),
}));

export const nozzlePatternFamily = defineFamily<Given>({
  key: 'nozzle-pattern',
  version: 1,
  topic: 'nozzle',
  tiers: [1, 2],
  title: both('Nozzle pattern for a job', 'Patrón de boquilla para un trabajo'),
  sources: [
    { title: 'MF3178 (spray nozzle types)', publisher: 'Kansas State University Extension', year: null },
    {
      title: 'Sprayer Nozzles: Selection and Calibration',
      publisher: 'University of Kentucky Cooperative Extension',
      year: 1996,
      ref: 'PAT-3',
    },
  ],
  draw,
  heading: (g) =>
    g.asks === 'fit'
      ? both('A nozzle for the job', 'Una boquilla para el trabajo')
      : both('What the spray left behind', 'Lo que dejó el rociado'),
  statement,
  parts: (g) => [part(g)],
  figure,
  hints: (g) =>
    g.asks === 'fit'
      ? [
          both(
            'You are asked for a pattern. Look at what the spray has to do: cover, keep to a band, get in, reach, or lie on the soil.',
            'Se pide un patrón. Mire qué tiene que hacer el rociado: cubrir, quedar en una banda, entrar, llegar lejos o quedar en el suelo.',
          ),
          both(
            'Ask two things: does the spray overlap, and are leaves, air or ground in its way?',
            'Pregúntese dos cosas: ¿se traslapa el rociado?, y ¿qué tiene enfrente: hojas, aire o suelo?',
          ),
          both(
            'Lay the mark of each pattern over the job in your mind. Where would it leave too much or too little?',
            'Ponga con la mente la marca de cada patrón sobre el trabajo. ¿Dónde dejaría de más o de menos?',
          ),
        ]
      : [
          both(
            'You are asked which nozzle leaves such a sign. Say where there is too much spray and where too little.',
            'Se pregunta qué boquilla deja esa señal. Diga dónde hay rociado de más y dónde de menos.',
          ),
          both(
            'Each pattern leaves its own mark: look at the middle, the edges and the size of the drops.',
            'Cada patrón deja su marca: mire el centro, los bordes y el tamaño de las gotas.',
          ),
          both(
            'Go through the marks in the drawing and cross out those that cannot leave this sign.',
            'Recorra las marcas del dibujo y descarte las que no pueden dejar esta señal.',
          ),
        ],
  working,
  slips,
});
