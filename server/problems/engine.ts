import type { Rational } from '../../shared/quantity/rational.ts';
import type { PartKey, Tier } from '../../shared/vocabulary.ts';
import type { Earlier, Family, Part, Slip } from './family.ts';
import { makeRng } from './rng.ts';
import { apart, inPartUnit, isNumeric } from './tolerance.ts';

/** What determines a problem, for ever and on every machine. */
export interface ProblemKey {
  readonly family: string;
  readonly version: number;
  readonly seed: string;
  readonly tier: Tier;
}

/** A slip that can be told apart on this draw, with what it gives in the part's unit. */
export interface LiveSlip {
  readonly key: string;
  readonly part: PartKey;
  readonly value: Rational;
  readonly slip: Slip<unknown>;
}

/** One generated instance. Holds the answers: it never leaves the server as it is. */
export interface Problem {
  readonly key: ProblemKey;
  readonly family: Family<unknown>;
  readonly given: unknown;
  readonly parts: readonly Part[];
  readonly slips: readonly LiveSlip[];
}

/** Most draws tried before a family is said to be unable to give a problem. */
export const mostDraws = 200;

/** A family gave no acceptable draw within the limit; names family, seed and tier. */
export class NoDrawError extends Error {
  constructor(key: ProblemKey) {
    super(`family ${key.family} v${key.version} gives no acceptable draw for seed "${key.seed}", tier ${key.tier}`);
    this.name = 'NoDrawError';
  }
}

const noEarlier: Earlier = {};

/**
 * The slips that differ from the right answer, from the answers that rounded constants give and from each other by more
 * than twice the tolerance. Of two that collide the one listed first stays.
 */
function liveSlips(family: Family<unknown>, given: unknown, parts: readonly Part[]): LiveSlip[] {
  const live: LiveSlip[] = [];
  for (const part of parts) {
    if (!isNumeric(part)) continue;
    const taken: Rational[] = [part.answer.value];
    if (part.kind === 'number') for (const also of part.alsoRight ?? []) taken.push(inPartUnit(part, also));
    for (const slip of family.slips) {
      if (slip.part !== part.key || !slip.answer) continue;
      const answer = slip.answer(given, noEarlier);
      if (!answer) continue;
      const value = inPartUnit(part, answer);
      if (value.compare(0) <= 0 || !taken.every((other) => apart(part, value, other))) continue;
      taken.push(value);
      live.push({ key: slip.key, part: part.key, value, slip });
    }
  }
  return live;
}

/** Slips a problem must keep: two in tier 1, three above, or all the family defines for these parts when it has fewer. */
function slipsNeeded(family: Family<unknown>, parts: readonly Part[], tier: Tier): number {
  const numeric = new Set<string>(parts.filter(isNumeric).map((part) => part.key));
  let defined = 0;
  for (const slip of family.slips) if (slip.answer && numeric.has(slip.part)) defined += 1;
  return Math.min(tier === 1 ? 2 : 3, defined);
}

/**
 * Generates the problem that (family, version, seed, tier) determines.
 * @throws RangeError when the family has no such tier; NoDrawError when 200 draws give nothing acceptable.
 */
export function generate(family: Family<unknown>, options: { seed: string; tier: Tier }): Problem {
  const { seed, tier } = options;
  const key: ProblemKey = { family: family.key, version: family.version, seed, tier };
  if (!family.tiers.includes(tier)) throw new RangeError(`family ${family.key} has no tier ${tier}`);
  const rng = makeRng(`${family.key}/${family.version}/${tier}/${seed}`);
  for (let drawn = 0; drawn < mostDraws; drawn += 1) {
    const given = family.draw(rng, tier);
    if (given === null) continue;
    const parts = family.parts(given, noEarlier);
    const slips = liveSlips(family, given, parts);
    if (slips.length < slipsNeeded(family, parts, tier)) continue;
    return { key, family, given, parts, slips };
  }
  throw new NoDrawError(key);
}

/** The part with this key, or undefined when the problem has none. */
export function partOf(problem: Problem, key: PartKey): Part | undefined {
  return problem.parts.find((part) => part.key === key);
}

/** The problem's parts with their answers computed from the trainee's own earlier answers. */
export function partsGivenEarlier(problem: Problem, earlier: Earlier): readonly Part[] {
  return problem.family.parts(problem.given, earlier);
}
