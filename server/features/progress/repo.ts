import { desc, eq, sql } from 'drizzle-orm';
import type { NodePgDatabase } from 'drizzle-orm/node-postgres';
import { ability, dayCount, slipCount, topicLevel } from '../../db/schema/practice.ts';

const mostSlips = 30;
const mostDays = 60;

/** Reads of one person's levels, slips and days. */
export function progressRepo(db: NodePgDatabase) {
  return {
    async levels(userId: string) {
      const [own, topics] = await Promise.all([
        db.select().from(ability).where(eq(ability.userId, userId)),
        db.select().from(topicLevel).where(eq(topicLevel.userId, userId)),
      ]);
      return { ability: own[0] ?? null, topics };
    },
    slips: (userId: string) =>
      db
        .select()
        .from(slipCount)
        .where(eq(slipCount.userId, userId))
        .orderBy(desc(slipCount.times), desc(slipCount.lastAt))
        .limit(mostSlips),
    async days(userId: string) {
      const rows = await db
        .select()
        .from(dayCount)
        .where(eq(dayCount.userId, userId))
        .orderBy(desc(dayCount.day))
        .limit(mostDays);
      return rows.reverse();
    },
    async totals(userId: string) {
      const rows = await db
        .select({
          answered: sql<number>`coalesce(sum(${dayCount.answered}), 0)::int`,
          right: sql<number>`coalesce(sum(${dayCount.right}), 0)::int`,
          seconds: sql<number>`coalesce(sum(${dayCount.seconds}), 0)::int`,
        })
        .from(dayCount)
        .where(eq(dayCount.userId, userId));
      return rows[0] ?? { answered: 0, right: 0, seconds: 0 };
    },
  };
}
export type ProgressRepo = ReturnType<typeof progressRepo>;
