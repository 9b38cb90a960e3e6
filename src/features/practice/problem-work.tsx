import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense, useEffect, useRef, useState, type ReactNode } from 'react';
import type { ProblemView } from '../../../shared/contracts/practice.ts';
import { ProblemFigure } from '../../figures/problem-figure.tsx';
import { practiceMessages } from '../../i18n/practice.ts';
import { shellMessages } from '../../i18n/shell.ts';
import { LabelPanel } from '../../ui/label-panel.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Loading } from '../../ui/loading.tsx';
import { Notice } from '../../ui/notice.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { GiveUp } from './give-up.tsx';
import { Hints } from './hints.tsx';
import { LabelOnPhone } from './label-beside.tsx';
import { PartBlock } from './part-block.tsx';
import { problemQuery } from './queries.ts';

// Formulas need their own style sheet and fonts: fetched only once a solution is shown.
const WorkingLines = lazy(async () => ({ default: (await import('../../ui/working-lines.tsx')).WorkingLines }));

/** The worked solution; it takes the focus where it was just asked for. */
function Solution({ lines, asked }: { lines: NonNullable<ProblemView['working']>; asked: boolean }) {
  const t = useStore(practiceMessages);
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    if (asked) heading.current?.focus();
  }, [asked]);
  return (
    <section className="border-t border-rule pt-4">
      <h2 ref={heading} tabIndex={-1} data-quiet-focus="" className="mb-2">
        {t.solution}
      </h2>
      <Suspense fallback={<Loading />}>
        <WorkingLines lines={lines} />
      </Suspense>
    </section>
  );
}

function Worksheet({ problem, compact, after }: { problem: ProblemView; compact: boolean; after?: ReactNode }) {
  const t = useStore(practiceMessages);
  const current = problem.parts.find((part) => part.state === 'open');
  const [begun] = useState(problem.state);
  const gaveUp = problem.parts.some((part) => part.attempts.at(-1)?.verdict === 'blank');
  return (
    <Sheet graduated>
      <p className="mb-2 max-w-[38rem] font-serif text-[1.1rem] leading-normal">{problem.statement}</p>
      {problem.figure && <ProblemFigure figure={problem.figure} describe={t.describe} />}
      {problem.label && !compact && <LabelOnPhone label={problem.label} floating={problem.state === 'open'} />}
      {problem.label && compact && (
        <div className="mb-4 max-w-md">
          <LabelPanel label={problem.label} />
        </div>
      )}
      {problem.parts.map((part, index) => (
        <PartBlock
          key={part.key}
          problemId={problem.id}
          part={part}
          lettered={problem.parts.length > 1}
          after={problem.parts.slice(0, index).find((before) => before.attempts.length === 0)?.key ?? null}
        />
      ))}
      {current && (
        <div className="flex flex-wrap items-center gap-x-6 gap-y-1 border-t border-rule pt-2">
          <Hints problemId={problem.id} part={current} />
          <GiveUp problemId={problem.id} />
        </div>
      )}
      {problem.working && <Solution lines={problem.working} asked={begun === 'open' && gaveUp} />}
      {problem.state === 'done' && after}
    </Sheet>
  );
}

/**
 * A problem being worked: statement, drawing, parts, label and the standing caution.
 * `compact` is for a checkpoint inside a lesson; `after` stands at the foot once all parts are closed.
 */
export function ProblemWork({
  problemId,
  compact = false,
  after,
}: {
  problemId: string;
  compact?: boolean;
  after?: ReactNode;
}) {
  const shell = useStore(shellMessages);
  const { data: problem, error } = useQuery(problemQuery(problemId));
  if (error) return <Failure error={error} />;
  if (!problem) return <Loading />;
  const beside = !compact && problem.label !== null;
  return (
    <div className={beside ? 'grid items-start gap-6 wide:grid-cols-[minmax(0,1fr)_20rem]' : 'max-w-[44rem]'}>
      {/* Another problem in the same place begins with empty fields. */}
      <Worksheet key={problem.id} problem={problem} compact={compact} after={after} />
      {!compact && (
        <aside className={beside ? '' : 'mt-4'}>
          {problem.label && (
            <div className="mb-4 hidden wide:sticky wide:top-6 wide:block">
              <LabelPanel label={problem.label} />
              <Notice tone="caution" className="mt-4 text-sm">
                {shell.caution}
              </Notice>
            </div>
          )}
          <div className={problem.label ? 'wide:hidden' : ''}>
            <Notice tone="caution" className="text-sm">
              {shell.caution}
            </Notice>
          </div>
        </aside>
      )}
    </div>
  );
}
