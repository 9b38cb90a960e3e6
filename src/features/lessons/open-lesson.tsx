import { useStore } from '@nanostores/react';
import type { LessonSummary } from '../../../shared/contracts/lessons.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { ButtonLink } from '../../ui/button.tsx';

/** The lesson left half read most recently, with the way back into it. */
export function OpenLesson(props: { lessons: readonly LessonSummary[]; linkTo: (lesson: LessonSummary) => string }) {
  const t = useStore(lessonMessages);
  const open = props.lessons
    .filter((lesson) => lesson.progress?.state === 'reading')
    .sort((a, b) => (b.progress?.startedAt ?? '').localeCompare(a.progress?.startedAt ?? ''))[0];
  if (!open) return null;
  return (
    <div className="mb-6 border-b border-rule pb-5">
      <h2>{t.openTitle}</h2>
      <p className="mt-2 mb-3 font-serif">{`${open.title} · ${t.minutes(open.minutes)}`}</p>
      <ButtonLink look="quiet" to={props.linkTo(open)}>
        {t.openGoOn}
      </ButtonLink>
    </div>
  );
}
