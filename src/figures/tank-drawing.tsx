import { useId } from 'react';
import type { TankFigure } from '../../shared/contracts/figure.ts';
import { DrawingFrame } from './frame.tsx';

const top = 34;
const bottom = 190;
const left = 80;
const right = 260;

/** A tank from the side with its graduations; the liquid stands at `level`. */
export function TankDrawing({ figure }: { figure: TankFigure }) {
  const clip = useId();
  const level = Math.min(Math.max(figure.level, 0), 1);
  const y = bottom - (bottom - top) * level;
  return (
    <DrawingFrame height={bottom + 34} alt={figure.alt}>
      <rect x={left + 60} y={top - 18} width="60" height="18" className="fill-sheet stroke-ink" strokeWidth="1.6" />
      <rect
        x={left}
        y={top}
        width={right - left}
        height={bottom - top}
        rx="10"
        className="fill-sheet stroke-ink"
        strokeWidth="1.8"
      />
      {level > 0 && (
        <>
          <clipPath id={clip}>
            <rect x={left + 1} y={top + 1} width={right - left - 2} height={bottom - top - 2} rx="9" />
          </clipPath>
          <path
            d={`M${left} ${y}q${(right - left) / 2} 7 ${right - left} 0V${bottom}H${left}z`}
            clipPath={`url(#${clip})`}
            className="fill-dye"
            opacity=".75"
          />
        </>
      )}
      {Array.from({ length: 9 }, (_, index) => {
        const mark = bottom - ((bottom - top) * (index + 1)) / 10;
        return (
          <path
            key={mark}
            d={`M${right} ${mark}h${index % 5 === 4 ? -22 : -12}`}
            className="stroke-ink"
            strokeWidth="1.3"
          />
        );
      })}
      <text x={(left + right) / 2} y={bottom + 22} textAnchor="middle" fontWeight="600">
        {figure.capacity}
      </text>
      {figure.levelText !== undefined && (
        <text x={right + 10} y={Math.min(Math.max(y + 5, top + 10), bottom)}>
          {figure.levelText}
        </text>
      )}
    </DrawingFrame>
  );
}
