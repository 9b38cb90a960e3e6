import { quantity, type Quantity } from '../../shared/quantity/quantity.ts';
import { rational, type Rational } from '../../shared/quantity/rational.ts';
import { roundToStep } from '../../shared/quantity/round.ts';
import { kindOf, unitsOfKind } from '../../shared/quantity/units.ts';
import { inUnit } from '../../shared/quantity/quantity.ts';
import type { PartKey } from '../../shared/vocabulary.ts';
import { partsGivenEarlier, type Problem } from './engine.ts';
import type { CountPart, NumberPart } from './family.ts';
import { makeRng } from './rng.ts';
import { apart, inPartUnit, isNumeric } from './tolerance.ts';

/** One option of a numeric part in its multiple-choice form. */
export interface NumberOption {
  readonly value: Quantity;
  readonly right: boolean;
  /** The slip that leads here: of this part, or `carried:<slip>` for one of an earlier part; null when none does. */
  readonly slip: string | null;
}

interface Candidate {
  readonly value: Rational;
  readonly slip: string | null;
}

/** The least share by which two options of one question differ. */
const closest = rational(8, 100);

function farEnough(value: Rational, others: readonly Rational[]): boolean {
  return others.every((other) => {
    const big = value.compare(other) > 0 ? value : other;
    return value.sub(other).abs().compare(big.mul(closest)) >= 0;
  });
}

/** What an earlier part's slips lead to here, by a right method: honest traps, since somebody makes them. */
function carriedCandidates(problem: Problem, part: NumberPart | CountPart): Candidate[] {
  const found: Candidate[] = [];
  for (const live of problem.slips) {
    if (live.part >= part.key) continue;
    const earlierPart = problem.parts.find((one) => one.key === live.part);
    if (!earlierPart || !isNumeric(earlierPart)) continue;
    const earlier = { [live.part]: quantity(live.value, earlierPart.answer.unit) } as Partial<
      Record<PartKey, Quantity>
    >;
    const own = partsGivenEarlier(problem, earlier).find((one) => one.key === part.key);
    if (own && isNumeric(own)) found.push({ value: inPartUnit(part, own.answer), slip: `carried:${live.key}` });
  }
  return found;
}

function generalCandidates(part: NumberPart | CountPart): Candidate[] {
  const exact = part.answer.value;
  const asked = part.answer.unit;
  const otherUnits = part.kind === 'count' ? [] : unitsOfKind(kindOf(asked)).filter((unit) => unit !== asked);
  return [
    { value: exact.mul(10), slip: 'decimal-place' },
    { value: exact.div(10), slip: 'decimal-place' },
    ...otherUnits.map((unit) => ({ value: inUnit(part.answer, unit), slip: 'unit-name' })),
    { value: exact.mul(2), slip: null },
    { value: exact.div(2), slip: null },
    { value: exact.mul(rational(3, 2)), slip: null },
    { value: exact.add(1), slip: null },
    { value: exact.add(2), slip: null },
    { value: exact.mul(100), slip: 'decimal-place' },
  ];
}

/**
 * The timed-set form of a numeric part: the answer and three slips (topped up with decimal-place and unit-name
 * variants), all rounded alike, ordered by value, no two closer than 8 %.
 * @throws RangeError when four options that far apart cannot be found
 */
export function choiceForm(problem: Problem, part: NumberPart | CountPart): readonly NumberOption[] {
  const rng = makeRng(
    `options/${problem.key.family}/${problem.key.version}/${problem.key.tier}/${problem.key.seed}/${part.key}`,
  );
  const step = part.kind === 'count' ? rational(1) : part.step;
  const round = (value: Rational) => roundToStep(value, step);
  const right = round(part.answer.value);
  const own = problem.slips
    .filter((live) => live.part === part.key)
    .map((live) => ({ value: live.value, slip: live.key }));
  const candidates: Candidate[] = [
    ...rng.shuffle(own),
    ...rng.shuffle(carriedCandidates(problem, part)),
    ...generalCandidates(part),
  ];
  const taken: Rational[] = [right];
  const options: NumberOption[] = [{ value: quantity(right, part.answer.unit), right: true, slip: null }];
  for (const candidate of candidates) {
    if (options.length === 4) break;
    const value = round(candidate.value);
    if (value.compare(0) <= 0 || !farEnough(value, taken) || !apart(part, value, part.answer.value)) continue;
    taken.push(value);
    options.push({ value: quantity(value, part.answer.unit), right: false, slip: candidate.slip });
  }
  if (options.length < 4) throw new RangeError(`${problem.key.family}: no four options for part ${part.key}`);
  return options.sort((a, b) => a.value.value.compare(b.value.value));
}
