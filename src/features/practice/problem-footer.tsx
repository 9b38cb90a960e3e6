import { useStore } from '@nanostores/react';
import type { LevelView, ProblemView } from '../../../shared/contracts/practice.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { useAnother, useNextProblem } from './queries.ts';
import { TopicTube } from './topic-tubes.tsx';

/** After a problem: where its topics now stand, and where to go. */
export function ProblemFooter(props: {
  problem: ProblemView;
  levels: readonly LevelView[];
  onShow: (problem: ProblemView) => void;
  onEnd: () => void;
}) {
  const t = useStore(practiceMessages);
  const { problem, levels, onShow, onEnd } = props;
  const { drill } = problem;
  const next = useNextProblem(drill?.id ?? '');
  const another = useAnother(problem.id);
  const worked = new Set(problem.parts.map((part) => part.topic));
  const last = drill !== null && drill.position === drill.length;
  return (
    <section className="border-t border-rule pt-4">
      <h2 className="sr-only">{t.levelMoved}</h2>
      <div className="mb-4 flex flex-wrap gap-x-8 gap-y-3" aria-live="polite">
        {levels
          .filter((level) => worked.has(level.topic))
          .map((level) => (
            <TopicTube key={level.topic} level={level} />
          ))}
      </div>
      <Failure error={next.error ?? another.error} />
      <div className="flex flex-wrap gap-3">
        {drill && !last && (
          <Button disabled={next.isPending} onClick={() => next.mutate(undefined, { onSuccess: onShow })}>
            {t.next}
          </Button>
        )}
        {drill && last && <Button onClick={onEnd}>{t.finish}</Button>}
        <Button
          look={drill ? 'quiet' : 'main'}
          disabled={another.isPending}
          onClick={() => another.mutate(undefined, { onSuccess: onShow })}
        >
          {t.another}
        </Button>
      </div>
    </section>
  );
}
