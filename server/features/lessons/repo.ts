import { eq, sql } from 'drizzle-orm';
import type { Db } from '../../db/client.ts';
import { lessonProgress } from '../../db/schema/lesson.ts';

export type LessonProgressRow = typeof lessonProgress.$inferSelect;

/** Reads and writes of how far a person is in each lesson. */
export function lessonRepo(db: Db) {
  return {
    ofPerson: (userId: string): Promise<LessonProgressRow[]> =>
      db.select().from(lessonProgress).where(eq(lessonProgress.userId, userId)),

    /** Keeps the newest position; a lesson once read stays read. */
    async save(write: {
      userId: string;
      slug: string;
      position: number;
      read: boolean;
      at: Date;
    }): Promise<LessonProgressRow> {
      const { userId, slug, position, read, at } = write;
      const readAt = read ? at : null;
      const rows = await db
        .insert(lessonProgress)
        .values({ userId, lessonSlug: slug, position, startedAt: at, readAt, updatedAt: at })
        .onConflictDoUpdate({
          target: [lessonProgress.userId, lessonProgress.lessonSlug],
          set: {
            position,
            updatedAt: at,
            readAt: sql`coalesce(${lessonProgress.readAt}, excluded.read_at)`,
          },
        })
        .returning();
      return rows[0] as LessonProgressRow;
    },

    async exportOf(userId: string): Promise<Record<string, unknown>> {
      const { lessonSlug, position, startedAt, readAt } = lessonProgress;
      const lessons = await db
        .select({ lesson: lessonSlug, position, startedAt, readAt })
        .from(lessonProgress)
        .where(eq(lessonProgress.userId, userId));
      return { lessons };
    },

    /** What a person read says nothing once they have left. */
    async forget(writer: Pick<Db, 'delete'>, userId: string): Promise<void> {
      await writer.delete(lessonProgress).where(eq(lessonProgress.userId, userId));
    },
  };
}
export type LessonRepo = ReturnType<typeof lessonRepo>;
