/** Closed word lists of the product: the words the interface, the code and the database share. */

/** A text in both languages of the product. */
export interface Text {
  readonly en: string;
  readonly es: string;
}

export const locales = ['en', 'es'] as const;
export type Locale = (typeof locales)[number];

/** The eighteen topics, in the order of the modules of the course. */
export const topics = [
  'label',
  'pests',
  'equipment',
  'nozzle',
  'area',
  'units',
  'rate',
  'spot',
  'strength',
  'handheld',
  'boom',
  'spreader',
  'tank',
  'mixing',
  'cleanup',
  'ppe',
  'drift',
  'law',
] as const;
export type Topic = (typeof topics)[number];

/** How much a problem asks: one step; two steps or a unit change; several steps or a judgement. */
export const tiers = [1, 2, 3] as const;
export type Tier = (typeof tiers)[number];

export const roles = ['trainee', 'instructor', 'manager', 'staff'] as const;
export type Role = (typeof roles)[number];

/** A topic's state for one person, drawn as a sight tube. */
export const levelStates = ['not-started', 'filling', 'at-the-mark', 'top-up'] as const;
export type LevelState = (typeof levelStates)[number];

/** What grading can say of one answer. `slip` names a family's own slip; the four after it are slips any family shares. */
export const verdicts = [
  'right',
  'carried',
  'slip',
  'unit-kind',
  'unit-name',
  'decimal-place',
  'rounding',
  'unrecognised',
  'blank',
] as const;
export type Verdict = (typeof verdicts)[number];

/** Where an answer was given. */
export const contexts = ['drill', 'top-up', 'checkpoint', 'timed-set', 'worksheet', 'single'] as const;
export type Context = (typeof contexts)[number];

/** Keys of the parts of a problem, in order. */
export const partKeys = ['a', 'b', 'c', 'd', 'e', 'f'] as const;
export type PartKey = (typeof partKeys)[number];
