import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense, useCallback, useMemo } from 'react';
import { useParams } from 'react-router';
import type { CheckpointPlace } from '../../features/lessons/lesson-context.ts';
import { LessonSheet } from '../../features/lessons/lesson-sheet.tsx';
import { findLesson } from '../../features/lessons/lesson-text.ts';
import { placeOf } from '../../features/lessons/modules.ts';
import { lessonsQuery } from '../../features/lessons/queries.ts';
import { useLocale } from '../../i18n/i18n.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { shellMessages } from '../../i18n/shell.ts';
import { topicMessages } from '../../i18n/words.ts';
import { paths } from '../../paths.ts';
import { Button, ButtonLink } from '../../ui/button.tsx';
import { Loading } from '../../ui/loading.tsx';
import { Notice } from '../../ui/notice.tsx';
import { PageHeading } from '../../ui/page.tsx';
import { NotFound } from '../not-found.tsx';

const CheckpointWork = lazy(async () => ({
  default: (await import('../../features/practice/checkpoint-work.tsx')).CheckpointWork,
}));

/** A lesson at its own address. */
export default function Lesson() {
  const t = useStore(lessonMessages);
  const shell = useStore(shellMessages);
  const names = useStore(topicMessages);
  const locale = useLocale();
  const { topic: topicKey = '', slug = '' } = useParams();
  const { data: lessons, error } = useQuery(lessonsQuery);
  const place = lessons ? placeOf(lessons, topicKey, slug) : null;
  const found = useMemo(() => findLesson(locale, topicKey, slug), [locale, topicKey, slug]);
  const renderCheckpoint = useCallback(
    ({ id, family, tier }: CheckpointPlace, onDone: (checkpoint: string) => void) => (
      <Suspense fallback={<Loading />}>
        <CheckpointWork lesson={slug} checkpoint={id} family={family} tier={tier} onDone={onDone} />
      </Suspense>
    ),
    [slug],
  );
  if (error) throw error;
  if (!lessons) return <Loading />;
  if (!place || !found) return <NotFound />;
  const { lesson, module, number, previous, next } = place;
  const above = t.place({
    module: module.number,
    topic: names[module.topic],
    number,
    count: String(module.lessons.length),
    minutes: lesson.minutes,
  });
  return (
    <div key={slug} className="max-w-[44rem]">
      <PageHeading title={lesson.title} above={above} />
      <LessonSheet lesson={lesson} found={found} renderCheckpoint={renderCheckpoint} />
      <Notice tone="caution" className="mt-6 text-sm">
        {shell.caution}
      </Notice>
      <nav aria-label={t.around} className="no-print mt-6 flex flex-wrap items-center gap-x-5 gap-y-3">
        {next && <ButtonLink to={paths.lesson(next.topic, next.slug)}>{t.next({ title: next.title })}</ButtonLink>}
        <ButtonLink look="quiet" to={paths.drillsOn(lesson.topic)}>
          {t.drillThis}
        </ButtonLink>
        {previous && (
          <ButtonLink look="plain" to={paths.lesson(previous.topic, previous.slug)}>
            {t.previous({ title: previous.title })}
          </ButtonLink>
        )}
        <ButtonLink look="plain" to={paths.course}>
          {t.toCourse}
        </ButtonLink>
        <Button look="plain" onClick={() => window.print()}>
          {t.print}
        </Button>
      </nav>
    </div>
  );
}
