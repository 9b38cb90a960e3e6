import { and, asc, desc, eq, inArray, sql } from 'drizzle-orm';
import type { NodePgDatabase } from 'drizzle-orm/node-postgres';
import { answer, drill, problem } from '../../db/schema/practice.ts';

export type DrillRow = typeof drill.$inferSelect;
export type NewDrill = typeof drill.$inferInsert;

/** One problem of a drill with what became of its parts. */
export interface DrillProblem {
  drillId: string;
  id: string;
  position: number;
  family: string;
  closed: boolean;
  /** First answers given, and how many of them earned the mark. */
  answered: number;
  right: number;
}

/** Reads and writes of drills; the owner stands in every WHERE. */
export function drillRepo(db: NodePgDatabase) {
  return {
    async create(row: NewDrill): Promise<void> {
      await db.insert(drill).values(row);
    },

    async find(userId: string, id: string): Promise<DrillRow | null> {
      const rows = await db
        .select()
        .from(drill)
        .where(and(eq(drill.userId, userId), eq(drill.id, id)));
      return rows[0] ?? null;
    },

    async recent(userId: string, count: number): Promise<DrillRow[]> {
      return db.select().from(drill).where(eq(drill.userId, userId)).orderBy(desc(drill.createdAt)).limit(count);
    },

    async problems(userId: string, drillIds: readonly string[]): Promise<DrillProblem[]> {
      if (drillIds.length === 0) return [];
      const rows = await db
        .select({
          drillId: problem.drillId,
          id: problem.id,
          position: problem.position,
          family: problem.family,
          closed: sql<boolean>`${problem.closedAt} is not null`,
          answered: sql<number>`count(${answer.id})::int`,
          right: sql<number>`count(*) filter (where ${answer.verdict} in ('right', 'carried'))::int`,
        })
        .from(problem)
        .leftJoin(
          answer,
          and(eq(answer.userId, problem.userId), eq(answer.problemId, problem.id), eq(answer.isFirst, true)),
        )
        .where(and(eq(problem.userId, userId), inArray(problem.drillId, [...drillIds])))
        .groupBy(problem.userId, problem.id)
        .orderBy(asc(problem.position));
      return rows.flatMap((row) =>
        row.drillId === null || row.position === null ? [] : [{ ...row, drillId: row.drillId, position: row.position }],
      );
    },
  };
}
export type DrillRepo = ReturnType<typeof drillRepo>;
