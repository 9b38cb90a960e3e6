import type { LevelState } from '../../shared/vocabulary.ts';
import { c0, expectedRight, forgettingGap, sigmoid, type Belief } from './estimate.ts';

/** The mark: the share right on average tier-2 problems of a topic that a person at the mark is expected to reach. */
export const mark = 0.8;
const markLogit = Math.log(mark / (1 - mark));
/** How sure one must be that the mark is reached. */
const sureEnough = 0.9;
/** Fewer answers than this show no level at all. */
export const fewestAnswers = 3;
/** Standard normal quantile of .9: the ends of an 80 % range. */
const z80 = 1.2815515655446004;

/** What is stored of one person and topic, beside the person's ability. */
export interface TopicState {
  readonly belief: Belief;
  /** First answers counted. */
  readonly answers: number;
  /** Different days with a counted answer. */
  readonly days: number;
  /** Days since the last counted answer. */
  readonly daysSince: number | null;
  /** True once the topic has been at the mark. */
  readonly reached: boolean;
}

/** A level as it is shown. */
export interface Level {
  readonly state: LevelState;
  /** Predicted share right on an average tier-2 problem, 0 to 1; null while not started. */
  readonly fill: number | null;
  /** The 80 % range of that share. */
  readonly range: { readonly low: number; readonly high: number } | null;
}

/** The standard normal distribution function; Abramowitz & Stegun 7.1.26, error below 1.5e-7. */
export function normalCdf(x: number): number {
  const z = Math.abs(x) / Math.SQRT2;
  const t = 1 / (1 + 0.3275911 * z);
  const poly = t * (0.254829592 + t * (-0.284496736 + t * (1.421413741 + t * (-1.453152027 + t * 1.061405429))));
  const erf = 1 - poly * Math.exp(-z * z);
  return x >= 0 ? (1 + erf) / 2 : (1 - erf) / 2;
}

/** Mean and variance of the logit on the average tier-2 problem of the topic (difficulty 0), forgetting included. */
function logit(ability: Belief, topic: TopicState): Belief {
  return {
    mean: c0 + ability.mean + topic.belief.mean - forgettingGap(topic.daysSince),
    variance: ability.variance + topic.belief.variance,
  };
}

/** The chance that the person is right at least as often as the mark asks. */
export function chanceAtMark(ability: Belief, topic: TopicState): number {
  const { mean, variance } = logit(ability, topic);
  return normalCdf((mean - markLogit) / Math.sqrt(variance));
}

/** The level as it is shown: state, fill and range. */
export function levelOf(ability: Belief, topic: TopicState): Level {
  if (topic.answers < fewestAnswers) return { state: 'not-started', fill: null, range: null };
  const { mean, variance } = logit(ability, topic);
  const fill = expectedRight(mean, variance);
  const half = z80 * Math.sqrt(variance);
  const range = { low: sigmoid(mean - half), high: sigmoid(mean + half) };
  if (topic.reached && fill <= mark) return { state: 'top-up', fill, range };
  const atMark = topic.days >= 2 && (topic.reached || chanceAtMark(ability, topic) >= sureEnough);
  return { state: atMark ? 'at-the-mark' : 'filling', fill, range };
}
