import { sql } from 'drizzle-orm';
import { check, pgTable, primaryKey, real, text, timestamp, uuid } from 'drizzle-orm/pg-core';

const moment = (name: string) => timestamp(name, { withTimezone: true, precision: 3 });

/** How far a person is in a lesson. `readAt`, once set, stays. */
export const lessonProgress = pgTable(
  'lesson_progress',
  {
    userId: uuid('user_id').notNull(),
    lessonSlug: text('lesson_slug').notNull(),
    /** Share of the lesson that has been in view, 0 to 1. */
    position: real('position').notNull().default(0),
    startedAt: moment('started_at').notNull().defaultNow(),
    readAt: moment('read_at'),
    updatedAt: moment('updated_at').notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.userId, table.lessonSlug] }),
    check('lesson_progress_position', sql`${table.position} between 0 and 1`),
  ],
);
