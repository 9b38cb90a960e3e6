import { and, desc, eq, isNotNull, sql } from 'drizzle-orm';
import type { NodePgDatabase } from 'drizzle-orm/node-postgres';
import type { Pool } from 'pg';
import { AppError } from '../../../shared/errors.ts';
import type { Context, Tier, Topic } from '../../../shared/vocabulary.ts';
import { problem } from '../../db/schema/practice.ts';
import type { LoggedAnswer } from './replay.ts';
import { loadSql, recordForm } from './statements.ts';

export type ProblemRow = typeof problem.$inferSelect;
export type NewProblem = typeof problem.$inferInsert;

export interface BeliefRow {
  mean: number;
  variance: number;
}
export interface TopicRow extends BeliefRow {
  topic: Topic;
  answers: number;
  right: number;
  days: number;
  lastDay: string;
  lastAt: string;
  reachedAt: string | null;
}

/** Everything that grading one answer needs, read in one statement. */
export interface Loaded {
  problem: {
    id: string;
    family: string;
    version: number;
    seed: string;
    tier: Tier;
    context: Context;
    hints: number;
    drillId: string | null;
    position: number | null;
    drillLength: number | null;
    closedAt: string | null;
  };
  answers: (LoggedAnswer & { id: string })[];
  /** Null until the person's first answer. `sequence` tells whether somebody else wrote in between. */
  ability: (BeliefRow & { sequence: number }) | null;
  topics: TopicRow[];
}

export interface AnswerWrite {
  id: string;
  part: string;
  topic: string;
  response: unknown;
  read: string;
  value: string | null;
  verdict: string;
  slip: string | null;
  attempt: number;
  is_first: boolean;
  hints: number;
  choices: number;
  seconds: number;
  key: string;
}
export interface RecordWrite {
  userId: string;
  sequence: number;
  ability: BeliefRow;
  problem: { id: string; family: string; version: number; tier: Tier; context: Context };
  answers: AnswerWrite[];
  topics: (Omit<TopicRow, 'lastDay' | 'lastAt' | 'reachedAt'> & { last_day: string; reached_at: string | null })[];
  slips: { topic: string; family: string; slip: string }[];
  day: { day: string; answered: number; right: number; seconds: number };
  closed: boolean;
  at: Date;
}

/** The values of the recording statement, in the order of its placeholders. */
function recordValues(write: RecordWrite): unknown[] {
  const { userId, sequence, ability, problem: own, at, answers, topics, slips, day, closed } = write;
  const values: unknown[] = [userId, sequence, ability.mean, ability.variance];
  values.push(own.id, own.family, own.version, own.tier, own.context, at);
  for (const list of [answers, topics, slips]) values.push(JSON.stringify(list));
  values.push(day.day, day.answered, day.right, day.seconds, closed);
  return values;
}

/** Reads and writes of problems put before people and of the answer log. */
export function practiceRepo(db: NodePgDatabase, pool: Pool) {
  return {
    /** `topics` are those the problem exercises, where the caller knows them already; null reads all levels. */
    async load(userId: string, problemId: string, topics: readonly Topic[] | null): Promise<Loaded | null> {
      const { rows } = await pool.query<Loaded>({
        name: 'practice-load',
        text: loadSql,
        values: [userId, problemId, topics],
      });
      const found = rows[0];
      // Identifiers are time-ordered. Sorting a handful here keeps the statement on the index by problem.
      found?.answers.sort((a, b) => (a.id < b.id ? -1 : 1));
      return found ?? null;
    },

    /** Makes the row that an answer's write will change; does nothing when it is there. */
    async ensureAbility(userId: string, belief: BeliefRow): Promise<void> {
      await db.execute(
        sql`insert into ability (user_id, mean, variance) values (${userId}, ${belief.mean}, ${belief.variance}) on conflict do nothing`,
      );
    },

    /**
     * Records answers and what follows from them, all or nothing; false when the person's sequence has moved on.
     * @throws AppError `key-reused` when the key already stands beside an answer to another problem
     */
    async record(write: RecordWrite): Promise<boolean> {
      try {
        const slips = write.slips.length > 0;
        const { name, text } = recordForm({ slips, closes: write.closed });
        const { rows } = await pool.query<{ recorded: number }>({ name, text, values: recordValues(write) });
        return (rows[0]?.recorded ?? 0) > 0;
      } catch (error) {
        if (error instanceof Error && 'constraint' in error && error.constraint === 'answer_once') {
          throw new AppError('key-reused', { cause: error });
        }
        throw error;
      }
    },

    async create(row: NewProblem): Promise<void> {
      await db.insert(problem).values(row);
    },

    /** Shows hint `number`: grows to it, never shrinks, and only while the problem is open. */
    async showHints(userId: string, problemId: string, number: number): Promise<void> {
      await db
        .update(problem)
        .set({ hints: sql`greatest(${problem.hints}, ${number})` })
        .where(and(eq(problem.userId, userId), eq(problem.id, problemId), sql`${problem.closedAt} is null`));
    },

    async find(userId: string, problemId: string): Promise<ProblemRow | null> {
      const rows = await db
        .select()
        .from(problem)
        .where(and(eq(problem.userId, userId), eq(problem.id, problemId)));
      return rows[0] ?? null;
    },

    async latestCheckpoint(userId: string, lesson: string, checkpoint: string): Promise<ProblemRow | null> {
      const rows = await db
        .select()
        .from(problem)
        .where(and(eq(problem.userId, userId), eq(problem.lesson, lesson), eq(problem.checkpoint, checkpoint)))
        .orderBy(desc(problem.shownAt), desc(problem.id))
        .limit(1);
      return rows[0] ?? null;
    },

    /** The checkpoints of a lesson that the person has worked to the end. */
    async closedCheckpoints(userId: string, lesson: string): Promise<string[]> {
      const rows = await db
        .selectDistinct({ checkpoint: problem.checkpoint })
        .from(problem)
        .where(and(eq(problem.userId, userId), eq(problem.lesson, lesson), isNotNull(problem.closedAt)));
      return rows.flatMap((row) => (row.checkpoint === null ? [] : [row.checkpoint]));
    },
  };
}
export type PracticeRepo = ReturnType<typeof practiceRepo>;
