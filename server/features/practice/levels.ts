import type { Tier, Topic } from '../../../shared/vocabulary.ts';
import { authorsDifficulty, newAbility, newTopic, update, type Belief } from '../../learning/estimate.ts';
import { chanceAtMark } from '../../learning/level.ts';
import type { BeliefRow, TopicRow } from './repo.ts';

/** The chance at the mark from which a topic counts as having reached it. */
const sureEnough = 0.9;
const msPerDay = 86_400_000;

/** What one counted answer says, and when it was given. */
export interface CountedAnswer {
  topic: Topic;
  tier: Tier;
  right: boolean;
  hints: number;
  /** Options to choose from, 0 when entered. */
  choices: number;
  at: Date;
  /** The day of `at` in the installation's zone, yyyy-mm-dd. */
  day: string;
}

export interface PersonLevels {
  ability: BeliefRow;
  topics: Map<Topic, TopicRow>;
}

/** The person's levels after one counted answer; a new structure, the old one is left as it was. */
export function withAnswer(before: PersonLevels, answer: CountedAnswer): PersonLevels {
  const old = before.topics.get(answer.topic);
  const topicBelief: Belief = old ?? newTopic;
  const daysSince = old ? Math.max(0, answer.at.getTime() - Date.parse(old.lastAt)) / msPerDay : null;
  const after = update(
    { ability: before.ability, topic: topicBelief },
    {
      right: answer.right,
      hints: answer.hints,
      guess: answer.choices > 0 ? 1 / answer.choices : 0,
      daysSince,
      difficulty: authorsDifficulty(answer.tier),
    },
  );
  const answers = (old?.answers ?? 0) + 1;
  const days = old ? old.days + (old.lastDay === answer.day ? 0 : 1) : 1;
  const at = answer.at.toISOString();
  const state = { belief: after.topic, answers, days, daysSince: 0, reached: false };
  const reached = old?.reachedAt ?? (days >= 2 && chanceAtMark(after.ability, state) >= sureEnough ? at : null);
  const row: TopicRow = {
    topic: answer.topic,
    ...after.topic,
    answers,
    right: (old?.right ?? 0) + (answer.right ? 1 : 0),
    days,
    lastDay: answer.day,
    lastAt: at,
    reachedAt: reached,
  };
  return { ability: after.ability, topics: new Map(before.topics).set(answer.topic, row) };
}

/** The levels of somebody who has not answered yet. */
export function noLevels(): PersonLevels {
  return { ability: { ...newAbility }, topics: new Map() };
}

const formatters = new Map<string, Intl.DateTimeFormat>();

/** The day of a moment in a zone, yyyy-mm-dd. */
export function dayIn(zone: string, at: Date): string {
  let formatter = formatters.get(zone);
  if (!formatter) {
    formatter = new Intl.DateTimeFormat('en-CA', { timeZone: zone, year: 'numeric', month: '2-digit', day: '2-digit' });
    formatters.set(zone, formatter);
  }
  return formatter.format(at);
}
