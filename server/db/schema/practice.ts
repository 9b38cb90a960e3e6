import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  date,
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  smallint,
  text,
  timestamp,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import type { Context, PartKey, Tier, Topic, Verdict } from '../../../shared/vocabulary.ts';

// Hot tables carry user_id in every key and refer to no other hot table by foreign key, so that they can be
// partitioned by month or distributed by user. A problem is stored as (family, version, seed, tier) only: its text is
// rendered at reading time in the reader's language.

const moment = (name: string) => timestamp(name, { withTimezone: true, precision: 3 });

/** An untimed run of problems on chosen topics. */
export const drill = pgTable(
  'drill',
  {
    userId: uuid('user_id').notNull(),
    id: uuid('id').notNull(),
    topics: text('topics').array().$type<Topic[]>().notNull(),
    tier: text('tier').$type<'1' | '2' | '3' | 'rising'>().notNull(),
    length: smallint('length').notNull(),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.userId, table.id] }),
    index('drill_recent').on(table.userId, table.createdAt.desc()),
    check('drill_length', sql`${table.length} between 1 and 100`),
  ],
);

/** One problem put before one person. */
export const problem = pgTable(
  'problem',
  {
    userId: uuid('user_id').notNull(),
    id: uuid('id').notNull(),
    family: text('family').notNull(),
    version: integer('version').notNull(),
    seed: text('seed').notNull(),
    tier: smallint('tier').$type<Tier>().notNull(),
    context: text('context').$type<Context>().notNull(),
    drillId: uuid('drill_id'),
    position: smallint('position'),
    lesson: text('lesson'),
    checkpoint: text('checkpoint'),
    /** Hints shown so far, 0 to 3. */
    hints: smallint('hints').notNull().default(0),
    shownAt: moment('shown_at').notNull().defaultNow(),
    closedAt: moment('closed_at'),
  },
  (table) => [
    primaryKey({ columns: [table.userId, table.id] }),
    uniqueIndex('problem_place')
      .on(table.userId, table.drillId, table.position)
      .where(sql`${table.drillId} is not null`),
    index('problem_checkpoint')
      .on(table.userId, table.lesson, table.checkpoint, table.shownAt)
      .where(sql`${table.lesson} is not null`),
  ],
);

/** The log of answers, one row a part and attempt. Nothing in it is ever updated. */
export const answer = pgTable(
  'answer',
  {
    userId: uuid('user_id').notNull(),
    id: uuid('id').notNull(),
    problemId: uuid('problem_id').notNull(),
    family: text('family').notNull(),
    version: integer('version').notNull(),
    tier: smallint('tier').$type<Tier>().notNull(),
    part: text('part').$type<PartKey>().notNull(),
    topic: text('topic').$type<Topic>().notNull(),
    context: text('context').$type<Context>().notNull(),
    /** What was sent, as it was sent; null for a part left open. */
    response: jsonb('response'),
    /** How the entry was read, in English. */
    read: text('read').notNull(),
    /** The entry in the part's unit, exact, as text; null when it is not a number. */
    value: text('value'),
    verdict: text('verdict').$type<Verdict>().notNull(),
    slip: text('slip'),
    attempt: smallint('attempt').notNull(),
    /** Whether it is the first answer to the part, the one that counts for the level. */
    isFirst: boolean('is_first').notNull(),
    hints: smallint('hints').notNull(),
    /** Options to choose from; 0 when the answer was entered. */
    choices: smallint('choices').notNull(),
    seconds: integer('seconds').notNull(),
    key: uuid('key').notNull(),
    at: moment('at').notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.userId, table.problemId, table.part, table.attempt] }),
    unique('answer_once').on(table.userId, table.key),
  ],
);

/** What is estimated of one person over all topics; `sequence` grows by one with every answer recorded. */
export const ability = pgTable('ability', {
  userId: uuid('user_id').primaryKey(),
  mean: doublePrecision('mean').notNull(),
  variance: doublePrecision('variance').notNull(),
  sequence: integer('sequence').notNull().default(0),
});

/** What is estimated of one person and topic. */
export const topicLevel = pgTable(
  'topic_level',
  {
    userId: uuid('user_id').notNull(),
    topic: text('topic').$type<Topic>().notNull(),
    mean: doublePrecision('mean').notNull(),
    variance: doublePrecision('variance').notNull(),
    answers: integer('answers').notNull(),
    right: integer('right').notNull(),
    days: integer('days').notNull(),
    lastDay: date('last_day', { mode: 'string' }).notNull(),
    lastAt: moment('last_at').notNull(),
    /** When the topic was first at the mark. */
    reachedAt: moment('reached_at'),
  },
  (table) => [primaryKey({ columns: [table.userId, table.topic] })],
);

/** How often a person made a slip, first answers only. */
export const slipCount = pgTable(
  'slip_count',
  {
    userId: uuid('user_id').notNull(),
    topic: text('topic').$type<Topic>().notNull(),
    family: text('family').notNull(),
    slip: text('slip').notNull(),
    times: integer('times').notNull(),
    lastAt: moment('last_at').notNull(),
  },
  (table) => [primaryKey({ columns: [table.userId, table.family, table.slip, table.topic] })],
);

/** First answers of a person, day by day. */
export const dayCount = pgTable(
  'day_count',
  {
    userId: uuid('user_id').notNull(),
    day: date('day', { mode: 'string' }).notNull(),
    answered: integer('answered').notNull(),
    right: integer('right').notNull(),
    seconds: integer('seconds').notNull(),
  },
  (table) => [primaryKey({ columns: [table.userId, table.day] })],
);
