import { useStore } from '@nanostores/react';
import { Link } from 'react-router';
import type { LessonState, LessonSummary } from '../../../shared/contracts/lessons.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { topicMessages } from '../../i18n/words.ts';
import { Chip, type ChipTone } from '../../ui/chip.tsx';
import type { Module } from './modules.ts';

const tones: Record<LessonState, ChipTone> = { 'not-started': 'none', reading: 'filling', read: 'mark' };

function LessonRow({ lesson, to }: { lesson: LessonSummary; to: string }) {
  const t = useStore(lessonMessages);
  const state = lesson.progress?.state ?? 'not-started';
  return (
    <li className="border-t border-rule">
      <Link
        to={to}
        className="flex min-h-11 flex-wrap items-center gap-x-4 gap-y-0.5 px-4 py-2 text-ink no-underline hover:bg-dye-wash wide:px-6"
      >
        <span className="mr-auto font-serif text-[1.05rem] underline decoration-rule-strong underline-offset-4">
          {lesson.title}
        </span>
        <span className="text-sm text-ink-soft">{t.minutes(lesson.minutes)}</span>
        <Chip tone={tones[state]}>{t[state]}</Chip>
      </Link>
    </li>
  );
}

/** A module with its lessons, or the plain word that they are still being written. */
export function ModuleBlock({ module, linkTo }: { module: Module; linkTo: (lesson: LessonSummary) => string }) {
  const t = useStore(lessonMessages);
  const topics = useStore(topicMessages);
  const { lessons, number, topic } = module;
  const read = lessons.filter((lesson) => lesson.progress?.state === 'read').length;
  const empty = lessons.length === 0;
  return (
    <section aria-labelledby={`module-${topic}`} className={`border border-rule ${empty ? '' : 'bg-sheet'}`}>
      <div className="flex flex-wrap items-baseline gap-x-4 gap-y-0.5 px-4 py-2.5 wide:px-6">
        <h2 id={`module-${topic}`} className="mr-auto text-[1.15rem]">
          <span className="mr-2 font-sans text-sm font-semibold text-ink-soft">{t.module({ number })}</span>
          <span className="inline-block">{topics[topic]}</span>
        </h2>
        <p className="text-sm text-ink-soft">
          {empty ? t.noLessons : t.readOf({ read: String(read), count: String(lessons.length) })}
        </p>
      </div>
      {!empty && (
        <ol>
          {lessons.map((lesson) => (
            <LessonRow key={lesson.slug} lesson={lesson} to={linkTo(lesson)} />
          ))}
        </ol>
      )}
    </section>
  );
}
