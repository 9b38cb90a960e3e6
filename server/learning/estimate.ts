import type { Tier } from '../../shared/vocabulary.ts';

/**
 * The estimate of what a person can do: a Gaussian rating (Elo whose step follows from tracked variances) on the logit
 * scale. Everything here is pure; the state of a person is an ability `g` and, for each topic, a deviation `s`.
 * The rule and its constants were chosen by measurement on open data (Statics 2011, ASSISTments 2009).
 */

/** A mean and a variance, logit scale. */
export interface Belief {
  readonly mean: number;
  readonly variance: number;
}

/** What is known of a problem's difficulty: its family's `b` and the variant's `d`, as one mean and variance each. */
export interface Difficulty {
  readonly family: Belief;
  readonly variant: Belief;
}

/** The evidence of one first answer. */
export interface Evidence {
  /** Right, or right given the person's own earlier answer. */
  readonly right: boolean;
  /** Hints seen before it, 0 to 3; the worked solution counts as 3. */
  readonly hints: number;
  /** Chance of guessing it: 1 over the number of options for a choice, 0 for an entered answer. */
  readonly guess: number;
  /** Days since the person's last counted answer on the topic; null when there is none. */
  readonly daysSince: number | null;
  readonly difficulty: Difficulty;
}

/** Constant of the scale: a new person is right on a tier-2 problem a little more often than two times in three. */
export const c0 = 0.8;
/** Forgetting: logits lost are phi times the log of 1 + days. */
export const phi = 0.3;
/** What nothing is known of yet. */
export const newAbility: Belief = { mean: 0, variance: 0.9 ** 2 };
/** The same for one topic: how far it lies from the person's ability. */
export const newTopic: Belief = { mean: 0, variance: 0.7 ** 2 };
const abilityDrift = 0.1 ** 2;
const topicDrift = 0.15 ** 2;
const learntFromFeedback = 0.06;
const tierMeans: Readonly<Record<Tier, number>> = { 1: -0.7, 2: 0, 3: 0.9 };

/** The author's own view of a family's difficulty, used until there is evidence. */
export function authorsDifficulty(tier: Tier): Difficulty {
  return { family: { mean: tierMeans[tier], variance: 1 }, variant: { mean: 0, variance: 0.16 } };
}

/** Weight of a first answer as evidence: hints make a right answer weaker, a wrong one always counts whole. */
export function evidenceWeight(evidence: Pick<Evidence, 'right' | 'hints'>): number {
  if (!evidence.right) return 1;
  return [1, 0.6, 0.35][evidence.hints] ?? 0;
}

/** The logistic function. */
export function sigmoid(x: number): number {
  return 1 / (1 + Math.exp(-x));
}

/** Logits lost by forgetting after `days`; 0 when the topic was never answered. */
export function forgettingGap(days: number | null): number {
  return days === null ? 0 : phi * Math.log1p(Math.max(0, days));
}

/** Expected share right when the logit is Gaussian: the usual probit-style shrinkage of the mean. */
export function expectedRight(mean: number, variance: number): number {
  return sigmoid(mean / Math.sqrt(1 + (Math.PI * variance) / 8));
}

/**
 * The beliefs after one first answer.
 * @param before ability `g` and topic deviation `s` before the answer
 * @returns both after it; constant time
 */
export function update(
  before: { ability: Belief; topic: Belief },
  evidence: Evidence,
): { ability: Belief; topic: Belief } {
  const { ability, topic } = before;
  const { family, variant } = evidence.difficulty;
  const mean = c0 + ability.mean + topic.mean - forgettingGap(evidence.daysSince) - family.mean - variant.mean;
  const variance = ability.variance + topic.variance + family.variance + variant.variance;
  const q = expectedRight(mean, variance);
  const c = evidence.guess;
  const p = c + (1 - c) * q;
  const spread = p * (1 - p);
  const r = ((1 - c) * q * (1 - q)) / spread;
  const w = ((1 - c) ** 2 * q ** 2 * (1 - q) ** 2) / spread;
  const k = evidenceWeight(evidence);
  const d = 1 + k * w * variance;
  const step = (k * ((evidence.right ? 1 : 0) - p) * r) / d;
  const after = (belief: Belief): Belief => ({
    mean: belief.mean + belief.variance * step,
    variance: belief.variance - (belief.variance ** 2 * k * w) / d,
  });
  const nextAbility = after(ability);
  const nextTopic = after(topic);
  return {
    ability: { mean: nextAbility.mean, variance: nextAbility.variance + abilityDrift },
    topic: {
      mean: nextTopic.mean + (evidence.right ? 0 : learntFromFeedback),
      variance: nextTopic.variance + topicDrift,
    },
  };
}
