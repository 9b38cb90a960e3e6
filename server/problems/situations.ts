import type { Text } from '../../shared/vocabulary.ts';
import type { Rng } from './rng.ts';

/** First names of mixed origins for the people in problems. No one real is meant. */
export const people = [
  'Wanjiru',
  'Matthias',
  'Aroha',
  'Bao',
  'Celestino',
  'Dariela',
  'Emeka',
  'Farida',
  'Goran',
  'Hina',
  'Ikaika',
  'Jorunn',
  'Kwame',
  'Leilani',
  'Marisol',
  'Nikhil',
  'Oyelaran',
  'Paloma',
  'Quentin',
  'Ravindra',
  'Soledad',
  'Tariq',
  'Ulani',
  'Valentina',
  'Wendeline',
  'Ximena',
  'Yusuf',
  'Zofia',
  'Anneke',
  'Tomasz',
  'Lupe',
  'Eamon',
] as const;

/** A kind of place where a crew works, with the prepositions each language needs. */
export interface Place {
  readonly key: string;
  /** "the library" / "la biblioteca" */
  readonly the: Text;
  /** "of the library" / "de la biblioteca"; Spanish also after "detrás", "al lado", "enfrente". */
  readonly of: Text;
  /** "to the library" / "a la biblioteca"; Spanish also after "junto". */
  readonly to: Text;
  /** "at the library" / "en la biblioteca" */
  readonly at: Text;
}

function place(key: string, en: string, article: 'el' | 'la', es: string): Place {
  return {
    key,
    the: { en: `the ${en}`, es: `${article} ${es}` },
    of: { en: `of the ${en}`, es: article === 'el' ? `del ${es}` : `de la ${es}` },
    to: { en: `to the ${en}`, es: article === 'el' ? `al ${es}` : `a la ${es}` },
    at: { en: `at the ${en}`, es: `en ${article} ${es}` },
  };
}

/** Kinds of places; none is a real one. */
export const places: readonly Place[] = [
  place('library', 'town library', 'la', 'biblioteca municipal'),
  place('clinic', 'clinic', 'la', 'clínica'),
  place('school', 'school', 'la', 'escuela'),
  place('park-lodge', 'park lodge', 'el', 'albergue del parque'),
  place('church', 'church', 'la', 'iglesia'),
  place('apartment-block', 'apartment building', 'el', 'edificio de apartamentos'),
  place('office-park', 'office park', 'el', 'parque de oficinas'),
  place('community-center', 'community center', 'el', 'centro comunitario'),
  place('museum', 'museum', 'el', 'museo'),
  place('fire-station', 'fire station', 'la', 'estación de bomberos'),
  place('community-garden', 'community garden', 'el', 'jardín comunitario'),
  place('town-hall', 'town hall', 'el', 'ayuntamiento'),
  place('care-home', 'care home', 'el', 'hogar de ancianos'),
  place('hotel', 'hotel', 'el', 'hotel'),
];

/** Parts of a working year, as a crew says them; they fit in the middle of a sentence. */
export const seasons: readonly Text[] = [
  { en: 'in early spring', es: 'a principios de la primavera' },
  { en: 'in late spring', es: 'a finales de la primavera' },
  { en: 'in early summer', es: 'a principios del verano' },
  { en: 'in late summer', es: 'a finales del verano' },
  { en: 'in the fall', es: 'en el otoño' },
  { en: 'before the growing season', es: 'antes de la temporada de crecimiento' },
];

/** The same text with its first letter large, to open a sentence. */
export function capital(text: Text): Text {
  const large = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);
  return { en: large(text.en), es: large(text.es) };
}

/** Who does the work, where and when, and which of a family's ways of telling it is used. */
export interface Scene {
  readonly situation: number;
  readonly person: string;
  readonly place: Place;
  readonly season: Text;
}

/** Draws a scene for a family that tells its problem in `situations` ways. */
export function drawScene(rng: Rng, situations: number): Scene {
  return {
    situation: rng.int(0, situations - 1),
    person: rng.pick(people),
    place: rng.pick(places),
    season: rng.pick(seasons),
  };
}

/** One way of telling a problem of some kind. */
export interface Situation<G> {
  readonly heading: Text;
  readonly statement: (given: G) => Text;
}

/** The situation a scene was drawn for. @throws RangeError when there is none of this number. */
export function situationOf<G extends Scene>(situations: readonly Situation<G>[], given: G): Situation<G> {
  const found = situations[given.situation];
  if (!found) throw new RangeError(`no situation ${given.situation}`);
  return found;
}
