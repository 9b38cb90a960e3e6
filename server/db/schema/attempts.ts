import { bigint, integer, pgTable, varchar } from 'drizzle-orm/pg-core';

/** Tries at one account, counted under a hash of its address; the columns are those rate-limiter-flexible asks for. */
export const attempts = pgTable('attempts', {
  key: varchar('key', { length: 255 }).primaryKey(),
  points: integer('points').notNull().default(0),
  expire: bigint('expire', { mode: 'number' }),
});
