import { useStore } from '@nanostores/react';
import { Link } from 'react-router';
import type { LessonSummary } from '../../../shared/contracts/lessons.ts';
import { topics, type Topic } from '../../../shared/vocabulary.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { topicMessages } from '../../i18n/words.ts';
import { Chip, type ChipTone } from '../../ui/chip.tsx';
import { Sheet } from '../../ui/sheet.tsx';

type State = NonNullable<LessonSummary['progress']>['state'];
const tones: Record<State, ChipTone> = { 'not-started': 'none', reading: 'filling', read: 'mark' };

function LessonRow({ lesson, to }: { lesson: LessonSummary; to: string }) {
  const t = useStore(lessonMessages);
  const state = lesson.progress?.state ?? 'not-started';
  const words: Record<State, string> = { 'not-started': t.notStarted, reading: t.reading, read: t.read };
  return (
    <li className="flex flex-wrap items-baseline gap-x-4 gap-y-0.5 border-t border-rule py-2.5">
      <Link to={to} className="mr-auto inline-flex min-h-6 items-center font-semibold">
        {lesson.title}
      </Link>
      <span className="text-sm text-ink-soft">{t.minutes(lesson.minutes)}</span>
      <Chip tone={tones[state]}>{words[state]}</Chip>
    </li>
  );
}

interface CourseListProps {
  lessons: readonly LessonSummary[];
  /** Topics that problems exist for, so that a module without lessons still has something to do. */
  drillable: readonly Topic[];
  lessonAt: (lesson: LessonSummary) => string;
  drillAt: (topic: Topic) => string;
}

/** The modules in their order, each with its lessons and how far one is in them. */
export function CourseList({ lessons, drillable, lessonAt, drillAt }: CourseListProps) {
  const t = useStore(lessonMessages);
  const names = useStore(topicMessages);
  return (
    <ol className="grid gap-4">
      {topics.map((topic, index) => {
        const own = lessons.filter((lesson) => lesson.topic === topic);
        const read = own.filter((lesson) => lesson.progress?.state === 'read').length;
        const drill = drillable.includes(topic) && (
          <Link to={drillAt(topic)} className="inline-flex min-h-6 items-center text-sm">
            {t.drillIt({ topic: names[topic] })}
          </Link>
        );
        const head = (
          <div className="flex flex-wrap items-baseline gap-x-4">
            <h2 className="mr-auto text-[1.15rem]">
              <span className="block font-sans text-sm font-normal tracking-normal text-ink-soft">
                {t.module({ number: index + 1 })}
              </span>
              {names[topic]}
            </h2>
            {own.length > 0 && <p className="text-sm text-ink-soft">{t.readCount({ read, all: own.length })}</p>}
          </div>
        );
        return (
          <li key={topic}>
            {own.length > 0 ? (
              <Sheet>
                {head}
                <ul className="mt-3">
                  {own.map((lesson) => (
                    <LessonRow key={lesson.slug} lesson={lesson} to={lessonAt(lesson)} />
                  ))}
                </ul>
                {drill}
              </Sheet>
            ) : (
              <div className="border border-dashed border-rule-strong px-4 py-3 wide:px-6">
                {head}
                <p className="flex flex-wrap gap-x-4 text-sm text-ink-soft">
                  {t.toCome} {drill}
                </p>
              </div>
            )}
          </li>
        );
      })}
    </ol>
  );
}
