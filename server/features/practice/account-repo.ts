import { eq, getTableColumns } from 'drizzle-orm';
import type { Db } from '../../db/client.ts';
import { ability, answer, dayCount, drill, problem, slipCount, topicLevel } from '../../db/schema/practice.ts';

const tables = [answer, problem, drill, ability, topicLevel, slipCount, dayCount] as const;

/** What becomes of a person's practice when they ask for their data, or leave. */
export function practiceAccountRepo(db: Db) {
  return {
    /** Everything a person answered and what was made of it, without seeds: an open problem's answer is not given away. */
    async exportOf(userId: string): Promise<Record<string, unknown>> {
      const { userId: _owner, seed: _seed, ...problemColumns } = getTableColumns(problem);
      const [drills, problems, answers, levels, slips, days] = await Promise.all([
        db.select().from(drill).where(eq(drill.userId, userId)).orderBy(drill.id),
        db.select(problemColumns).from(problem).where(eq(problem.userId, userId)).orderBy(problem.id),
        db.select().from(answer).where(eq(answer.userId, userId)).orderBy(answer.id),
        db.select().from(topicLevel).where(eq(topicLevel.userId, userId)),
        db.select().from(slipCount).where(eq(slipCount.userId, userId)),
        db.select().from(dayCount).where(eq(dayCount.userId, userId)).orderBy(dayCount.day),
      ]);
      const own = <Row extends { userId: string }>(rows: Row[]) => rows.map(({ userId: _id, ...row }) => row);
      return {
        drills: own(drills),
        problems,
        answers: own(answers),
        levels: own(levels),
        slips: own(slips),
        days: own(days),
      };
    },

    /** Hands the rows to an id that leads to nobody: the statistics stay true, the person is gone from them. */
    async anonymize(writer: Pick<Db, 'update'>, owner: { userId: string; anonymousId: string }): Promise<void> {
      for (const table of tables) {
        await writer.update(table).set({ userId: owner.anonymousId }).where(eq(table.userId, owner.userId));
      }
    },
  };
}
