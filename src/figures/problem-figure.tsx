import { lazy, Suspense, type ReactNode } from 'react';
import type { Figure } from '../../shared/contracts/figure.ts';
import { PlanDrawing } from './plan-drawing.tsx';

// Plans stand in most lessons and problems; the other drawings are fetched with the problems that have them.
const BoomDrawing = lazy(async () => ({ default: (await import('./boom-drawing.tsx')).BoomDrawing }));
const MeasuresDrawing = lazy(async () => ({ default: (await import('./measures-drawing.tsx')).MeasuresDrawing }));
const NozzleDrawing = lazy(async () => ({ default: (await import('./nozzle-drawing.tsx')).NozzleDrawing }));
const TankDrawing = lazy(async () => ({ default: (await import('./tank-drawing.tsx')).TankDrawing }));

function Drawing({ figure }: { figure: Figure }) {
  switch (figure.kind) {
    case 'plan':
      return <PlanDrawing figure={figure} />;
    case 'boom':
      return <BoomDrawing figure={figure} />;
    case 'tank':
      return <TankDrawing figure={figure} />;
    case 'nozzle-patterns':
      return <NozzleDrawing figure={figure} />;
    case 'measures':
      return <MeasuresDrawing figure={figure} />;
  }
}

/** A problem's or lesson's drawing, with its text equivalent one press away for everyone. */
export function ProblemFigure(props: { figure: Figure; describe: string; caption?: ReactNode }) {
  const { figure, describe, caption } = props;
  return (
    <figure className="my-4">
      <Suspense fallback={<div aria-hidden="true" className="h-48" />}>
        <Drawing figure={figure} />
      </Suspense>
      {caption}
      <details className="no-print mt-1 text-sm text-ink-soft">
        <summary className="inline-flex min-h-6 items-center underline underline-offset-4">{describe}</summary>
        <p className="mt-1 max-w-prose">{figure.alt}</p>
      </details>
    </figure>
  );
}
