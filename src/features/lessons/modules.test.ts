import { expect, test } from 'vitest';
import type { LessonProgressView, LessonSummary } from '../../../shared/contracts/lessons.ts';
import { modulesOf, nextLesson, placeOf } from './modules.ts';

type Short = Pick<LessonSummary, 'slug' | 'topic' | 'number'> & { progress?: LessonProgressView };

function lessons(...given: Short[]): LessonSummary[] {
  const rest = { minutes: 6, objectives: [], families: [], checkpoints: [] };
  return given.map((one) => ({ ...rest, title: one.slug, progress: null, ...one }));
}
const reading = (startedAt: string): LessonProgressView => ({
  state: 'reading',
  position: 0.4,
  startedAt,
  readAt: null,
});
const read: LessonProgressView = {
  state: 'read',
  position: 1,
  startedAt: '2026-11-01T08:00:00Z',
  readAt: '2026-11-01T08:09:00Z',
};

test('there are eighteen modules in the order of the topics, lessons or none', () => {
  const modules = modulesOf(
    lessons({ slug: 'second', topic: 'area', number: 2 }, { slug: 'first', topic: 'area', number: 1 }),
  );
  expect(modules.map((module) => module.number)).toEqual(Array.from({ length: 18 }, (_, index) => index + 1));
  expect(modules[0]).toEqual({ number: 1, topic: 'label', lessons: [] });
  expect(modules[4]?.lessons.map((lesson) => lesson.slug)).toEqual(['first', 'second']);
});

test('one goes on with the lesson begun last, else with the first not read', () => {
  const rate = { slug: 'rate', topic: 'rate', number: 1 } as const;
  const area = { slug: 'area', topic: 'area', number: 1 } as const;
  expect(nextLesson(lessons(rate, area))?.slug).toBe('area');
  expect(nextLesson(lessons(rate, { ...area, progress: read }))?.slug).toBe('rate');
  const begun = lessons(
    { ...area, progress: reading('2026-11-03T08:00:00Z') },
    { ...rate, progress: reading('2026-11-04T08:00:00Z') },
  );
  expect(nextLesson(begun)?.slug).toBe('rate');
  expect(nextLesson(lessons({ ...area, progress: read }))).toBeNull();
});

test('the lessons before and after are found across modules', () => {
  const all = lessons(
    { slug: 'acres', topic: 'area', number: 2 },
    { slug: 'rectangles', topic: 'area', number: 1 },
    { slug: 'per-acre', topic: 'rate', number: 1 },
  );
  const place = placeOf(all, 'area', 'acres');
  expect(place?.number).toBe(2);
  expect(place?.module.number).toBe(5);
  expect(place?.previous?.slug).toBe('rectangles');
  expect(place?.next?.slug).toBe('per-acre');
  expect(placeOf(all, 'area', 'rectangles')?.previous).toBeNull();
  expect(placeOf(all, 'rate', 'acres')).toBeNull();
});
