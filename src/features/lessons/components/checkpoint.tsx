import { useStore } from '@nanostores/react';
import { lessonMessages } from '../../../i18n/lessons.ts';
import { useLesson, type CheckpointPlace } from '../lesson-context.ts';

/** A problem inside a lesson, drawn from a family and graded by the server like any other. */
export function Checkpoint(place: CheckpointPlace) {
  const t = useStore(lessonMessages);
  const { renderCheckpoint } = useLesson();
  const heading = `checkpoint-${place.id}`;
  return (
    <section aria-labelledby={heading} className="not-prose my-8 font-sans" data-checkpoint={place.id}>
      <h2 id={heading} className="mb-2 text-[1.05rem]">
        {t.checkpoint}
      </h2>
      {renderCheckpoint(place)}
    </section>
  );
}
