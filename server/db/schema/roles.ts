import { sql } from 'drizzle-orm';
import { check, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import type { Role } from '../../../shared/vocabulary.ts';
import { user } from './auth.ts';

/** What a person may be here; one person can hold several. */
export const userRole = pgTable(
  'user_role',
  {
    userId: uuid('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    role: text('role').$type<Role>().notNull(),
    grantedAt: timestamp('granted_at', { withTimezone: true, precision: 3 }).notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.userId, table.role] }),
    check('user_role_known', sql`${table.role} in ('trainee', 'instructor', 'manager', 'staff')`),
  ],
);
