import { useStore } from '@nanostores/react';
import { Link } from 'react-router';
import type { LessonState, LessonSummary } from '../../../shared/contracts/lessons.ts';
import type { Topic } from '../../../shared/vocabulary.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { topicMessages } from '../../i18n/words.ts';
import { Chip, type ChipTone } from '../../ui/chip.tsx';
import { modulesOf, type Module } from './modules.ts';

const tones: Record<LessonState, ChipTone> = { 'not-started': 'none', reading: 'filling', read: 'mark' };

interface Ways {
  lessonAt: (lesson: LessonSummary) => string;
  drillAt: (topic: Topic) => string;
}

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

function ModuleSection({ module, canDrill, lessonAt, drillAt }: { module: Module; canDrill: boolean } & Ways) {
  const t = useStore(lessonMessages);
  const names = useStore(topicMessages);
  const { lessons, number, topic } = module;
  const read = lessons.filter((lesson) => lesson.progress?.state === 'read').length;
  const empty = lessons.length === 0;
  return (
    <section aria-labelledby={`module-${topic}`} className={`border border-rule ${empty ? '' : 'bg-sheet'}`}>
      <div className="flex flex-wrap items-baseline gap-x-4 gap-y-0.5 px-4 py-2.5 wide:px-6">
        <h2 id={`module-${topic}`} className="mr-auto text-[1.15rem]">
          <span className="mr-2 block font-sans text-sm font-semibold tracking-normal text-ink-soft wide:inline">
            {t.module({ number })}
          </span>
          <span className="inline-block">{names[topic]}</span>
        </h2>
        <p className="text-sm text-ink-soft">
          {empty ? t.noLessons : t.readOf({ read, count: String(lessons.length) })}
        </p>
        {empty && canDrill && (
          <Link to={drillAt(topic)} className="inline-flex min-h-6 items-center text-sm">
            {t.toProblems}
          </Link>
        )}
      </div>
      {!empty && (
        <ol>
          {lessons.map((lesson) => (
            <LessonRow key={lesson.slug} lesson={lesson} to={lessonAt(lesson)} />
          ))}
        </ol>
      )}
    </section>
  );
}

interface CourseListProps extends Ways {
  lessons: readonly LessonSummary[];
  /** Topics that problems exist for, so that a module without lessons still has something to do. */
  drillable: readonly Topic[];
}

/** The modules in their order, each with its lessons and how far one is in them. */
export function CourseList({ lessons, drillable, ...ways }: CourseListProps) {
  return (
    <div className="grid gap-3">
      {modulesOf(lessons).map((module) => (
        <ModuleSection key={module.topic} module={module} canDrill={drillable.includes(module.topic)} {...ways} />
      ))}
    </div>
  );
}
