import { pgTable, text, timestamp } from 'drizzle-orm/pg-core';

/** What the seed has done already, so that running it again changes nothing. */
export const seeded = pgTable('seeded', {
  part: text('part').primaryKey(),
  at: timestamp('at', { withTimezone: true, precision: 3 }).notNull().defaultNow(),
});
