import type { LevelView } from '../../../shared/contracts/practice.ts';
import { tiers, type Tier, type Topic } from '../../../shared/vocabulary.ts';
import { newAbility, newTopic, type Belief } from '../../learning/estimate.ts';
import { levelOf } from '../../learning/level.ts';
import { families } from '../../problems/registry.ts';

const msPerDay = 86_400_000;

/** What is stored of a topic; null parts mean nothing was answered yet. */
export interface StoredTopic extends Belief {
  answers: number;
  days: number;
  lastAt: Date | string;
  reachedAt: Date | string | null;
}

function tiersOf(topic: Topic): Tier[] {
  return tiers.filter((tier) => families.some((family) => family.topic === topic && family.tiers.includes(tier)));
}

/** A topic's level as it stands at a moment. */
export function levelView(options: {
  topic: Topic;
  ability: Belief | null;
  stored: StoredTopic | undefined;
  at: Date;
}): LevelView {
  const { topic, stored, at } = options;
  const daysSince = stored ? Math.max(0, at.getTime() - new Date(stored.lastAt).getTime()) / msPerDay : null;
  const level = levelOf(options.ability ?? newAbility, {
    belief: stored ?? newTopic,
    answers: stored?.answers ?? 0,
    days: stored?.days ?? 0,
    daysSince,
    reached: stored ? stored.reachedAt !== null : false,
  });
  return { topic, ...level, answers: stored?.answers ?? 0, tiers: tiersOf(topic) };
}
