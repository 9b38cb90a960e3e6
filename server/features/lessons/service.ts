import type { LessonProgressBody, LessonProgressView, LessonSummary } from '../../../shared/contracts/lessons.ts';
import { AppError } from '../../../shared/errors.ts';
import type { Locale } from '../../../shared/vocabulary.ts';
import type { LessonCatalogue } from './catalogue.ts';
import type { LessonProgressRow, LessonRepo } from './repo.ts';

export interface LessonDeps {
  repo: LessonRepo;
  catalogue: () => Promise<LessonCatalogue>;
  /** Names of the lesson's checkpoints that the person has worked to the end. */
  checkpointsDone: (userId: string, slug: string) => Promise<readonly string[]>;
  now: () => Date;
}

function progressView(row: LessonProgressRow | undefined): LessonProgressView {
  if (!row) return { state: 'not-started', position: 0, startedAt: null, readAt: null };
  return {
    state: row.readAt ? 'read' : 'reading',
    position: row.position,
    startedAt: row.startedAt.toISOString(),
    readAt: row.readAt?.toISOString() ?? null,
  };
}

export function lessonService({ repo, catalogue, checkpointsDone, now }: LessonDeps) {
  return {
    /** Every lesson in the order of the course, with the person's own progress. */
    async list(userId: string | null, language: Locale): Promise<LessonSummary[]> {
      const [lessons, rows] = await Promise.all([catalogue(), userId === null ? [] : repo.ofPerson(userId)]);
      const bySlug = new Map(rows.map((row) => [row.lessonSlug, row]));
      return lessons[language].map((lesson) => ({
        ...lesson,
        progress: userId === null ? null : progressView(bySlug.get(lesson.slug)),
      }));
    },

    /** Records where a reader is. A lesson counts as read once its checkpoints are answered; the client sees to the scrolling. */
    async save(userId: string, slug: string, body: LessonProgressBody): Promise<LessonProgressView> {
      const lesson = (await catalogue()).en.find((one) => one.slug === slug);
      if (!lesson) throw new AppError('not-found');
      const read = body.state === 'read';
      if (read && lesson.checkpoints.length > 0) {
        const done = new Set(await checkpointsDone(userId, slug));
        if (lesson.checkpoints.some((name) => !done.has(name))) throw new AppError('lesson-unfinished');
      }
      return progressView(await repo.save({ userId, slug, position: body.position, read, at: now() }));
    },
  };
}
export type LessonService = ReturnType<typeof lessonService>;
