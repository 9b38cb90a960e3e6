import type { LessonSummary } from '../../../shared/contracts/lessons.ts';
import { topics, type Topic } from '../../../shared/vocabulary.ts';

export interface Module {
  number: number;
  topic: Topic;
  lessons: LessonSummary[];
}

/** The eighteen modules in order, each with its lessons. */
export function modulesOf(lessons: readonly LessonSummary[]): Module[] {
  return topics.map((topic, index) => ({
    number: index + 1,
    topic,
    lessons: lessons.filter((lesson) => lesson.topic === topic).sort((a, b) => a.number - b.number),
  }));
}

/** The lesson to read next: the one begun last in the order of the course, or the first not read. */
export function nextLesson(lessons: readonly LessonSummary[]): LessonSummary | null {
  const ordered = modulesOf(lessons).flatMap((module) => module.lessons);
  const begun = ordered
    .filter((lesson) => lesson.progress?.state === 'reading')
    .sort((a, b) => (b.progress?.startedAt ?? '').localeCompare(a.progress?.startedAt ?? ''))[0];
  return begun ?? ordered.find((lesson) => lesson.progress?.state !== 'read') ?? null;
}

/** A lesson's place in the course, with its neighbors across modules. */
export function placeOf(lessons: readonly LessonSummary[], topic: string, slug: string) {
  const modules = modulesOf(lessons);
  const ordered = modules.flatMap((module) => module.lessons);
  const index = ordered.findIndex((lesson) => lesson.topic === topic && lesson.slug === slug);
  const lesson = ordered[index];
  const module = modules.find((one) => one.topic === topic);
  if (!lesson || !module) return null;
  return {
    lesson,
    module,
    number: module.lessons.indexOf(lesson) + 1,
    previous: ordered[index - 1] ?? null,
    next: ordered[index + 1] ?? null,
  };
}
