import { useStore } from '@nanostores/react';
import { useEffect, useRef, useState } from 'react';
import type { LessonSummary } from '../../../shared/contracts/lessons.ts';
import { useFormat } from '../../i18n/i18n.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { ApiError } from '../../lib/api.ts';
import { Chip } from '../../ui/chip.tsx';
import { useSaveProgress } from './queries.ts';
import type { LessonModule } from './lesson-text.ts';

/** Marks the lesson as read: honestly, once its end was seen and every checkpoint is done. */
export function LessonEnd({ lesson, done }: { lesson: LessonSummary; done: number }) {
  const t = useStore(lessonMessages);
  const end = useRef<HTMLDivElement>(null);
  const [seen, setSeen] = useState(false);
  const { mutate, error } = useSaveProgress(lesson.slug);
  const isRead = lesson.progress?.state === 'read';
  const unfinished = error instanceof ApiError && error.code === 'lesson-unfinished';
  const left = Math.max(1, lesson.checkpoints.length - done);
  useEffect(() => {
    if (!end.current) return undefined;
    const watch = new IntersectionObserver((entries) => entries.some((entry) => entry.isIntersecting) && setSeen(true));
    watch.observe(end.current);
    return () => watch.disconnect();
  }, []);
  // Asked again at every checkpoint that is done: the server knows which are missing.
  useEffect(() => {
    if (seen && !isRead) mutate({ position: 1, state: 'read' });
    // oxlint-disable-next-line react/exhaustive-effect-dependencies
  }, [seen, done, isRead, mutate]);
  return (
    <div ref={end} className="mt-8 border-t-2 border-ink pt-4">
      <output className="block">
        {isRead ? (
          <>
            <Chip tone="mark">{t.read}</Chip> {t.isRead}
          </>
        ) : (
          <span className="text-ink-soft">{unfinished ? t.missing(left) : t.endReach}</span>
        )}
      </output>
    </div>
  );
}

/** Where a lesson's facts come from, and when it was last gone over. */
export function LessonSources({ front }: { front: LessonModule['frontmatter'] }) {
  const t = useStore(lessonMessages);
  const { time } = useFormat();
  const { sources = [], revised } = front;
  return (
    <section aria-label={t.sources} className="mt-6 text-sm text-ink-soft">
      <h2 className="font-sans text-sm font-semibold">{t.sources}</h2>
      {sources.length === 0 && <p>{t.noSources}</p>}
      <ul className="mt-1 list-disc pl-5">
        {sources.map(({ title, publisher, year, ref }) => (
          <li key={title}>{[title, publisher, year, ref].filter(Boolean).join(', ')}</li>
        ))}
      </ul>
      {revised !== undefined && (
        <p className="mt-2">{t.revised({ date: time(new Date(revised), { dateStyle: 'long', timeZone: 'UTC' }) })}</p>
      )}
    </section>
  );
}
