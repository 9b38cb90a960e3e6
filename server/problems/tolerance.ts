import type { Quantity } from '../../shared/quantity/quantity.ts';
import { inUnit } from '../../shared/quantity/quantity.ts';
import { rational, type Rational } from '../../shared/quantity/rational.ts';
import type { CountPart, NumberPart, Part } from './family.ts';

const half = rational(1, 2);
const onePercent = rational(1, 100);
const none = rational(0);

/** The larger of two values. */
export function larger(a: Rational, b: Rational): Rational {
  return a.compare(b) >= 0 ? a : b;
}

/**
 * How far from `value` an entry may lie and still count as that value: half of the stated step or 1 %, whichever is
 * wider. Whole things allow nothing. `value` in the answer's unit; the result too.
 */
export function toleranceAround(part: NumberPart | CountPart, value: Rational): Rational {
  if (part.kind === 'count') return none;
  return larger(part.step.mul(half), value.abs().mul(onePercent));
}

/** Whether an entry counts as `target`; both are brought to the part's own unit. */
export function counts(part: NumberPart | CountPart, entry: Rational, target: Rational): boolean {
  return entry.sub(target).abs().compare(toleranceAround(part, target)) <= 0;
}

/**
 * The gap two values of one part must exceed to be told apart: twice the tolerance of the right answer, and the two
 * values' own tolerances together.
 */
export function apart(part: NumberPart | CountPart, a: Rational, b: Rational): boolean {
  const right = part.answer.value;
  const twice = toleranceAround(part, right).mul(2);
  const own = toleranceAround(part, a).add(toleranceAround(part, b));
  return a.sub(b).abs().compare(larger(twice, own)) > 0;
}

/** A value of the part's kind as a number in the part's own unit. */
export function inPartUnit(part: NumberPart | CountPart, value: Quantity): Rational {
  return inUnit(value, part.answer.unit);
}

/** Whether a part asks for a number: a measure or a count. */
export function isNumeric(part: Part): part is NumberPart | CountPart {
  return part.kind === 'number' || part.kind === 'count';
}
