import { DrawingFrame } from '../frame.tsx';

const columns = 8;
const side = 41;
const step = 43;
/** 43,560 sq ft in an acre: 43 whole thousands and 0.56 of another. */
const thousands = 43.56;

/** An acre counted out in squares of 1,000 sq ft: 43 whole ones and a bit more than half of another. */
export function AcreInThousands({ alt }: { alt: string }) {
  const squares = Array.from({ length: Math.ceil(thousands) }, (_, index) => ({
    number: index + 1,
    share: Math.min(1, thousands - index),
    x: 4 + (index % columns) * step,
    y: 4 + Math.floor(index / columns) * step,
  }));
  return (
    <DrawingFrame height={4 + Math.ceil(squares.length / columns) * step} alt={alt}>
      {squares.map(({ number, share, x, y }) => (
        <g key={number}>
          {share < 1 && (
            <rect
              x={x}
              y={y}
              width={side}
              height={side}
              fill="none"
              className="stroke-rule-strong"
              strokeDasharray="3 3"
            />
          )}
          <rect
            x={x}
            y={y}
            width={side * share}
            height={side}
            className="fill-turf-wash stroke-turf"
            strokeWidth="1.2"
          />
          {(number % columns === 0 || number === squares.length - 1) && (
            <text x={x + side / 2} y={y + side / 2 + 5} textAnchor="middle">
              {number}
            </text>
          )}
          {share < 1 && (
            <text x={x + side + 8} y={y + side / 2 + 5} fontWeight="600">
              and 0.56
            </text>
          )}
        </g>
      ))}
    </DrawingFrame>
  );
}
