import { useStore } from '@nanostores/react';
import { useEffect, useRef, useState } from 'react';
import { lessonMessages } from '../../../i18n/lessons.ts';
import { Loading } from '../../../ui/loading.tsx';
import { useLesson, type CheckpointPlace } from '../lesson-context.ts';

/**
 * A problem inside a lesson, drawn from a family and graded by the server like any other. It and the code that shows it are
 * fetched when the reader comes near.
 */
export function Checkpoint(place: CheckpointPlace) {
  const t = useStore(lessonMessages);
  const { checkpoints, renderCheckpoint } = useLesson();
  const heading = `checkpoint-${place.id}`;
  const section = useRef<HTMLElement>(null);
  const [isNear, setNear] = useState(false);
  useEffect(() => {
    if (!section.current) return undefined;
    const watch = new IntersectionObserver(
      (entries) => entries.some((entry) => entry.isIntersecting) && setNear(true),
      {
        rootMargin: '800px',
      },
    );
    watch.observe(section.current);
    return () => watch.disconnect();
  }, []);
  return (
    <section ref={section} aria-labelledby={heading} className="not-prose my-8 font-sans" data-checkpoint={place.id}>
      <h2 id={heading} className="mb-2 text-[1.05rem]">
        {t.checkpointOf({ number: checkpoints.indexOf(place.id) + 1, count: String(checkpoints.length) })}
      </h2>
      {isNear ? renderCheckpoint(place) : <Loading />}
    </section>
  );
}
