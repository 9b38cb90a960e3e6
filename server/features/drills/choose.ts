import type { Tier, Topic } from '../../../shared/vocabulary.ts';
import { families } from '../../problems/registry.ts';
import type { Family } from '../../problems/family.ts';
import { makeRng } from '../../problems/rng.ts';

/** How hard a drill is: one tier throughout, or rising from one step to several. */
export type DrillTier = Tier | 'rising';

/** The tier wanted at a place of a drill: rising takes the first third in tier 1, the next in tier 2, the rest in tier 3. */
export function tierAt(tier: DrillTier, position: number, length: number): Tier {
  if (tier !== 'rising') return tier;
  const share = (position - 1) / length;
  if (share < 1 / 3) return 1;
  return share < 2 / 3 ? 2 : 3;
}

/** Of a family's tiers the wanted one, else the nearest, the easier of two. */
export function nearestTier(family: Family<unknown>, wanted: Tier): Tier {
  return [...family.tiers].sort((a, b) => Math.abs(a - wanted) - Math.abs(b - wanted) || a - b)[0] ?? 1;
}

/** Topics in turn, in an order drawn once for the drill, so that neighbours differ wherever there is a choice. */
function topicAt(topics: readonly Topic[], position: number, drillId: string): Topic {
  const order = makeRng(`drill/${drillId}`).shuffle(topics);
  return order[(position - 1) % order.length] as Topic;
}

/**
 * The family and tier of the problem at a place of a drill. Families of the topic take turns: one not yet seen in this
 * drill comes before one seen, the wanted tier before another, and never the same family twice running where there is
 * another.
 */
export function chooseProblem(options: {
  drillId: string;
  topics: readonly Topic[];
  tier: DrillTier;
  length: number;
  position: number;
  /** Families of the problems before, in order. */
  before: readonly string[];
}): { family: string; tier: Tier } | null {
  const { drillId, topics, position, length, before } = options;
  const drillable = topics.filter((topic) => families.some((family) => family.topic === topic));
  if (drillable.length === 0) return null;
  const topic = topicAt(drillable, position, drillId);
  const wanted = tierAt(options.tier, position, length);
  const rng = makeRng(`drill/${drillId}/${position}`);
  const candidates = rng.shuffle(families.filter((family) => family.topic === topic));
  const rank = (family: Family<unknown>): number => {
    const seen = before.filter((key) => key === family.key).length;
    const lastOne = before.at(-1) === family.key ? 100 : 0;
    return lastOne + 10 * Math.abs(nearestTier(family, wanted) - wanted) + 3 * seen;
  };
  const best = candidates.sort((a, b) => rank(a) - rank(b))[0];
  return best ? { family: best.key, tier: nearestTier(best, wanted) } : null;
}
