import type { MeasuresFigure } from '../../shared/contracts/figure.ts';
import { DrawingFrame, drawingWidth } from './frame.tsx';

type Tool = MeasuresFigure['tools'][number]['tool'];

const floor = 128;

function Shape({ tool }: { tool: Tool }) {
  const ink = { className: 'fill-sheet stroke-ink', strokeWidth: 1.6 };
  switch (tool) {
    case 'teaspoon':
      return <path d="M-34 118q9 14 26 0h42v-5h-42q-17 -5 -26 5z" {...ink} />;
    case 'tablespoon':
      return <path d="M-38 114q12 22 36 0h40v-6h-40q-24 -6 -36 6z" {...ink} />;
    case 'cylinder':
      return (
        <g>
          <path d="M-14 30h28v92h10v6h-48v-6h10z" {...ink} />
          {[46, 60, 74, 88, 102].map((y) => (
            <path key={y} d={`M14 ${y}h-11`} className="stroke-ink" strokeWidth="1.2" />
          ))}
        </g>
      );
    case 'cup':
      return <path d="M-22 84h44l-5 44h-34zM22 92q16 8 -3 22" {...ink} />;
    case 'pint':
      return <path d="M-26 70h52l-6 58h-40zM26 80q18 10 -3 28" {...ink} />;
    case 'quart':
      return <path d="M-30 50h60l-6 78h-48zM30 62q20 14 -3 38M-30 50l-7 -5" {...ink} />;
    case 'gallon':
      return <path d="M-10 18h20v14q28 8 28 34v62h-76v-62q0 -26 28 -34z" {...ink} />;
  }
}

/** The measures on the shelf, side by side. */
export function MeasuresDrawing({ figure }: { figure: MeasuresFigure }) {
  const columns = Math.min(4, figure.tools.length);
  const width = drawingWidth / Math.max(1, columns);
  const rows = Math.ceil(figure.tools.length / Math.max(1, columns));
  return (
    <DrawingFrame height={rows * 160} alt={figure.alt}>
      {figure.tools.map(({ tool, name }, index) => (
        <g
          key={name}
          transform={`translate(${width * ((index % columns) + 0.5)} ${160 * Math.floor(index / columns)})`}
        >
          <path d={`M${-width / 2 + 8} ${floor}H${width / 2 - 8}`} className="stroke-rule-strong" />
          <Shape tool={tool} />
          <text y="149" textAnchor="middle">
            {name}
          </text>
        </g>
      ))}
    </DrawingFrame>
  );
}
