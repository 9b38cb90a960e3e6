import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { useCallback, useMemo, useState, type ReactNode } from 'react';
import 'katex/dist/katex.min.css';
import type { LessonSummary } from '../../../shared/contracts/lessons.ts';
import { useLocale } from '../../i18n/i18n.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { Button } from '../../ui/button.tsx';
import { Loading } from '../../ui/loading.tsx';
import { Notice } from '../../ui/notice.tsx';
import { lessonParts } from './components/lesson-parts.tsx';
import { LessonProvider, type CheckpointPlace } from './lesson-context.ts';
import { LessonEnd, LessonSources } from './lesson-foot.tsx';
import { lessonTextQuery, type FoundLesson } from './lesson-text.ts';
import { useReadingPlace } from './reading-place.ts';
import { useSaveProgress } from './queries.ts';

const begun = 0.15;

/** Says where one stopped last time, and leads there. */
function GoOn({ position, textOf }: { position: number; textOf: () => HTMLElement | null }) {
  const t = useStore(lessonMessages);
  const go = () => {
    const text = textOf();
    if (!text) return;
    const box = text.getBoundingClientRect();
    const top = window.scrollY + box.top + box.height * position - window.innerHeight;
    window.scrollTo({ top, behavior: 'smooth' });
  };
  return (
    <Notice tone="plain" className="no-print mb-6 max-w-[40rem]">
      <p className="flex flex-wrap items-center gap-x-4">
        <Button look="plain" onClick={go}>
          {t.backToPlace}
        </Button>
      </p>
    </Notice>
  );
}

interface LessonSheetProps {
  lesson: LessonSummary;
  found: FoundLesson;
  renderCheckpoint: (place: CheckpointPlace, onDone: (checkpoint: string) => void) => ReactNode;
}

/** A lesson's text, how far one is in it, and its foot. */
export function LessonSheet({ lesson, found, renderCheckpoint }: LessonSheetProps) {
  const t = useStore(lessonMessages);
  const locale = useLocale();
  const { slug, checkpoints } = lesson;
  const { data: read, error } = useQuery(lessonTextQuery(found, slug));
  const [done, setDone] = useState<readonly string[]>([]);
  const [came] = useState(lesson.progress);
  const save = useSaveProgress(slug).mutate;
  const text = useReadingPlace((position) => save({ position, state: 'reading' }));
  const markDone = useCallback(
    (checkpoint: string) => setDone((known) => (known.includes(checkpoint) ? known : [...known, checkpoint])),
    [],
  );
  const context = useMemo(
    () => ({ slug, checkpoints, renderCheckpoint: (place: CheckpointPlace) => renderCheckpoint(place, markDone) }),
    [slug, checkpoints, renderCheckpoint, markDone],
  );
  if (error) throw error;
  if (!read) return <Loading />;
  return (
    <>
      {came?.state === 'reading' && came.position > begun && (
        <GoOn position={came.position} textOf={() => text.current} />
      )}
      {found.locale !== locale && (
        <Notice tone="plain" className="mb-6 max-w-[40rem]">
          {t.englishOnly}
        </Notice>
      )}
      <LessonProvider value={context}>
        <article ref={text} lang={found.locale} className="lesson">
          {read.default({ components: lessonParts })}
        </article>
      </LessonProvider>
      <LessonEnd lesson={lesson} done={done.length} />
      <LessonSources front={read.frontmatter} />
    </>
  );
}
