import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { useCallback, useMemo } from 'react';
import { useParams } from 'react-router';
import { topics } from '../../../shared/vocabulary.ts';
import type { CheckpointPlace } from '../../features/lessons/lesson-context.ts';
import { LessonSheet } from '../../features/lessons/lesson-sheet.tsx';
import { findLesson } from '../../features/lessons/lesson-text.ts';
import { lessonsQuery } from '../../features/lessons/queries.ts';
import { CheckpointWork } from '../../features/practice/checkpoint-work.tsx';
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

/** A lesson at its own address. */
export default function Lesson() {
  const t = useStore(lessonMessages);
  const shell = useStore(shellMessages);
  const names = useStore(topicMessages);
  const locale = useLocale();
  const { topic: topicKey, slug = '' } = useParams();
  const { data: lessons, error } = useQuery(lessonsQuery);
  const lesson = lessons?.find((one) => one.slug === slug && one.topic === topicKey);
  const topic = lesson?.topic;
  const found = useMemo(() => (topic ? findLesson(locale, topic, slug) : null), [locale, topic, slug]);
  const renderCheckpoint = useCallback(
    ({ id, family, tier }: CheckpointPlace, onDone: (checkpoint: string) => void) => (
      <CheckpointWork lesson={slug} checkpoint={id} family={family} tier={tier} onDone={onDone} />
    ),
    [slug],
  );
  if (error) throw error;
  if (!lessons) return <Loading />;
  if (!lesson || !found) return <NotFound />;
  const siblings = lessons.filter((one) => one.topic === lesson.topic);
  const next = lessons[lessons.indexOf(lesson) + 1];
  const place = {
    module: topics.indexOf(lesson.topic) + 1,
    topic: names[lesson.topic],
    number: siblings.indexOf(lesson) + 1,
    count: siblings.length,
  };
  return (
    <div key={slug} className="max-w-[44rem]">
      <PageHeading title={lesson.title} above={`${t.place(place)} · ${t.minutes(lesson.minutes)}`} />
      <LessonSheet lesson={lesson} found={found} renderCheckpoint={renderCheckpoint} />
      <Notice tone="caution" className="mt-6 text-sm">
        {shell.caution}
      </Notice>
      <div className="no-print mt-6 flex flex-wrap items-center gap-x-5 gap-y-3">
        {next && <ButtonLink to={paths.lesson(next.topic, next.slug)}>{t.next({ title: next.title })}</ButtonLink>}
        <ButtonLink look="quiet" to={paths.drillsOn(lesson.topic)}>
          {t.drillNow({ topic: names[lesson.topic] })}
        </ButtonLink>
        <Button look="plain" onClick={() => window.print()}>
          {t.print}
        </Button>
        <ButtonLink look="plain" to={paths.course}>
          {t.backToCourse}
        </ButtonLink>
      </div>
    </div>
  );
}
