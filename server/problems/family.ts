import type { Figure } from '../../shared/contracts/figure.ts';
import type { Quantity } from '../../shared/quantity/quantity.ts';
import type { Rational } from '../../shared/quantity/rational.ts';
import type { UnitKey } from '../../shared/quantity/units.ts';
import type { PartKey, Text, Tier, Topic } from '../../shared/vocabulary.ts';
import type { PracticeLabel } from './labels/practice-label.ts';
import type { Rng } from './rng.ts';
import type { WorkingLine } from './working.ts';

/**
 * The contract of a problem family: a generator of problems of one kind, with its relation, worked solution and slips.
 * A problem is determined by (key, version, seed, tier) for ever; a change that alters a drawn number, what a statement
 * means or an answer is a new version.
 */

/** The trainee's own readable answers to the earlier numeric parts; what is missing is computed from the given. */
export type Earlier = Readonly<Partial<Record<PartKey, Quantity>>>;

interface PartBase {
  readonly key: PartKey;
  /** The topic this part exercises; its level is what an answer moves. */
  readonly topic: Topic;
  /** The question of this part, with the rounding stated: "How much product, to the nearest 0.1 fl oz?" */
  readonly ask: Text;
}

/** One number with a unit. */
export interface NumberPart extends PartBase {
  readonly kind: 'number';
  /** The exact answer, in the unit asked for. */
  readonly answer: Quantity;
  /** The step the statement says to round to, in the answer's unit. */
  readonly step: Rational;
  /** Units offered in the field, the asked one first. Any unit of the same kind is accepted when typed. */
  readonly units: readonly UnitKey[];
  /** Answers that the trade's rounded constants give (340 for 340.3 sq ft, 43.5 for 43.56 ...), equally right. */
  readonly alsoRight?: readonly Quantity[];
}

/** Whole things (loads, stations, passes): only the whole number is right. `thing` is what is counted, in the plural. */
export interface CountPart extends PartBase {
  readonly kind: 'count';
  readonly answer: Quantity;
  readonly thing: Text;
}

/** Choice of one. The engine shuffles the options by the seed. */
export interface ChoicePart extends PartBase {
  readonly kind: 'choice';
  readonly options: readonly ChoiceOption[];
}
/** One option of a choice. */
export interface ChoiceOption {
  readonly key: string;
  readonly text: Text;
  readonly right: boolean;
  /** Why it is right, or why it is not; shown after grading. */
  readonly reason: Text;
  /** Key of the slip that leads to this option, when it has one. */
  readonly slip?: string;
}

/** Putting steps in order. `steps` stand in the right order; the engine shuffles them by the seed. */
export interface OrderPart extends PartBase {
  readonly kind: 'order';
  readonly steps: readonly { readonly key: string; readonly text: Text }[];
  /** Pairs [before, after] that must hold for an order to be right; without it only the given order is right. */
  readonly mustPrecede?: readonly (readonly [before: string, after: string])[];
}

export type Part = NumberPart | CountPart | ChoicePart | OrderPart;

/** A named, recognisable mistake. */
export interface Slip<G> {
  /** kebab-case, permanent once released. */
  readonly key: string;
  readonly part: PartKey;
  /** What the slip gives for these numbers (number and count parts); null when it cannot happen with them. */
  readonly answer?: (given: G, earlier: Earlier) => Quantity | null;
  /** Order parts: whether an order shows the slip. */
  readonly inOrder?: (given: G, order: readonly string[]) => boolean;
  /** What the trainee reads, with these numbers; never contains the right answer. First sentence names the slip. */
  readonly message: (given: G, earlier: Earlier) => Text;
}

/** A published source of the family's relation. */
export interface Source {
  readonly title: string;
  readonly publisher: string;
  readonly year: number | null;
  readonly ref?: string;
}

/** The practice label a problem shows. */
export interface LabelUse {
  readonly label: PracticeLabel;
  /** Key of the rate line that this problem needs. */
  readonly rate: string;
}

/** A problem family; `G` is what its draw gives. */
export interface Family<G = unknown> {
  readonly key: string;
  readonly version: number;
  readonly topic: Topic;
  readonly tiers: readonly Tier[];
  /** Short name of the kind of problem, as staff and instructors see it: "Lawn less obstacles". */
  readonly title: Text;
  readonly sources: readonly Source[];
  /** Draws the numbers and the situation; null rejects the draw (the engine draws again, at most 200 times). */
  readonly draw: (rng: Rng, tier: Tier) => G | null;
  /** Heading of this problem: "Weed control on a back lawn". */
  readonly heading: (given: G) => Text;
  /** At most 60 words, present tense. */
  readonly statement: (given: G) => Text;
  /** The parts, with answers computed from `earlier` where the trainee's own earlier answers are given (carried credit). */
  readonly parts: (given: G, earlier: Earlier) => readonly Part[];
  readonly figure?: (given: G) => Figure<Text>;
  readonly label?: (given: G) => LabelUse;
  /** (1) what is asked and given, (2) the relation in words and symbols, (3) the first line with numbers. None gives the answer. */
  readonly hints: (given: G) => readonly [Text, Text, Text];
  /** The lines that lead from what is given to the answers; the last line is the last answer as one would measure it out. */
  readonly working: (given: G) => readonly WorkingLine[];
  readonly slips: readonly Slip<G>[];
}

/**
 * Checks a family against its own type of `given` and then forgets that type: the engine hands a family only the given
 * that the same family drew.
 */
export function defineFamily<G>(family: Family<G>): Family<unknown> {
  return family as unknown as Family<unknown>;
}
