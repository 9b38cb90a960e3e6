import type { LevelView, ProgressView, SlipView } from '../../../shared/contracts/practice.ts';
import { topics, type Locale, type Topic } from '../../../shared/vocabulary.ts';
import { familyByKey } from '../../problems/registry.ts';
import { slipName } from '../../problems/slip-name.ts';
import { levelView } from './level-view.ts';
import type { PersonLevels } from '../practice/levels.ts';
import type { ProgressRepo } from './repo.ts';

export function progressService(repo: ProgressRepo, now: () => Date) {
  async function levels(userId: string): Promise<LevelView[]> {
    const stored = await repo.levels(userId);
    const byTopic = new Map(stored.topics.map((row) => [row.topic, row]));
    return topics.map((topic) => levelView({ topic, ability: stored.ability, stored: byTopic.get(topic), at: now() }));
  }

  return {
    levels,
    /** One topic's level straight from what an answer left behind. */
    levelAfter: (after: PersonLevels, topic: Topic): LevelView =>
      levelView({ topic, ability: after.ability, stored: after.topics.get(topic), at: now() }),

    async progress(userId: string, locale: Locale): Promise<ProgressView> {
      const [levelList, slips, days, totals] = await Promise.all([
        levels(userId),
        repo.slips(userId),
        repo.days(userId),
        repo.totals(userId),
      ]);
      return {
        levels: levelList,
        ...totals,
        slips: slips.map((row): SlipView => {
          const family = familyByKey(row.family);
          return {
            topic: row.topic,
            family: row.family,
            familyTitle: family?.title[locale] ?? row.family,
            slip: row.slip,
            headline: slipName(row.family, row.slip)[locale],
            times: row.times,
            lastAt: row.lastAt.toISOString(),
          };
        }),
        days: days.map(({ day, answered, right }) => ({ date: day, answered, right })),
      };
    },
  };
}
export type ProgressService = ReturnType<typeof progressService>;
