import type { NozzlePatternFigure } from '../../shared/contracts/figure.ts';
import { DrawingFrame, drawingWidth } from './frame.tsx';

type Pattern = NozzlePatternFigure['patterns'][number]['pattern'];

const rowHeight = 150;

/** The spray from the side, from a nozzle at 0,0 down to 70. */
const sprays: Record<Pattern, string> = {
  'flat-fan': 'M0 0L-46 70H46z',
  'even-fan': 'M0 0L-38 70H38z',
  'hollow-cone': 'M0 0L-34 70M0 0L34 70M0 0L-24 70M0 0L24 70',
  'full-cone': 'M0 0L-34 70H34z',
  stream: 'M-2.500 0H2.500V70H-2.500z',
  flood: 'M0 0Q-50 6 -60 70H60Q50 6 0 0z',
};

/** The mark it leaves on the ground, seen from above, round 0,0. */
function Footprint({ pattern }: { pattern: Pattern }) {
  const ink = { className: 'fill-dye', opacity: 0.6 };
  switch (pattern) {
    case 'flat-fan':
      return <path d="M-46 0Q0 -14 46 0Q0 14 -46 0z" {...ink} />;
    case 'even-fan':
      return <rect x="-38" y="-6" width="76" height="12" {...ink} />;
    case 'hollow-cone':
      return <ellipse rx="32" ry="12" fill="none" className="stroke-dye" strokeWidth="6" opacity=".6" />;
    case 'full-cone':
      return <ellipse rx="34" ry="13" {...ink} />;
    case 'stream':
      return <circle r="5" {...ink} />;
    case 'flood':
      return <path d="M-60 0Q0 -20 60 0Q0 8 -60 0z" {...ink} />;
  }
}

/** Spray patterns side by side: from the side above, the mark on the ground below. */
export function NozzleDrawing({ figure }: { figure: NozzlePatternFigure }) {
  const columns = figure.patterns.length > 2 ? 2 : Math.max(1, figure.patterns.length);
  const width = drawingWidth / columns;
  const rows = Math.ceil(figure.patterns.length / columns);
  return (
    <DrawingFrame height={rows * rowHeight + 4} alt={figure.alt}>
      {figure.patterns.map(({ pattern, name }, index) => {
        const x = width * ((index % columns) + 0.5);
        const y = 22 + rowHeight * Math.floor(index / columns);
        const lines = pattern === 'hollow-cone';
        return (
          <g key={name} transform={`translate(${x} ${y})`}>
            <path d="M-8 -16h16v10l-4 6h-8l-4-6z" className="fill-sheet stroke-ink" strokeWidth="1.5" />
            <path
              d={sprays[pattern]}
              className={lines ? 'stroke-dye' : 'fill-dye'}
              fill={lines ? 'none' : undefined}
              strokeWidth="2.5"
              opacity=".35"
            />
            <g transform="translate(0 86)">
              <Footprint pattern={pattern} />
            </g>
            <text y="120" textAnchor="middle" fontWeight="600">
              {name}
            </text>
          </g>
        );
      })}
    </DrawingFrame>
  );
}
