import type { ReactNode } from 'react';
import type { Figure } from '../../shared/contracts/figure.ts';
import { BoomDrawing } from './boom-drawing.tsx';
import { MeasuresDrawing } from './measures-drawing.tsx';
import { NozzleDrawing } from './nozzle-drawing.tsx';
import { PlanDrawing } from './plan-drawing.tsx';
import { TankDrawing } from './tank-drawing.tsx';

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
      <Drawing figure={figure} />
      {caption}
      <details className="no-print mt-1 text-sm text-ink-soft">
        <summary className="inline-flex min-h-6 items-center underline underline-offset-4">{describe}</summary>
        <p className="mt-1 max-w-prose">{figure.alt}</p>
      </details>
    </figure>
  );
}
