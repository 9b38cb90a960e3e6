import { DrawingFrame } from '../frame.tsx';

const top = 22;
const floor = 226;
const left = 128;
const right = 188;
const level = 112;

const alt =
  'A measuring cylinder on a level shelf, marked every 10 milliliters from 10 to 100. The liquid curves up at the glass; the bottom of the curve stands at 60. An eye level with it reads 60. An eye above looks down through the front of the glass and reads 70.';

function Eye({ x, y, turn }: { x: number; y: number; turn: number }) {
  return (
    <g transform={`translate(${x} ${y}) rotate(${turn})`}>
      <path d="M-15 0Q0 -12 15 0Q0 12 -15 0z" className="fill-sheet stroke-ink" strokeWidth="1.6" />
      <circle cx="-5" r="4.5" className="fill-ink" />
    </g>
  );
}

/** Where to hold the eye when reading a cylinder, and what a higher eye reads. */
export function ReadingACylinder() {
  const marks = Array.from({ length: 10 }, (_, index) => ({ ml: (index + 1) * 10, y: 214 - (index + 1) * 17 }));
  return (
    <DrawingFrame height={244} alt={alt}>
      <path
        d={`M${left} ${level - 7}q30 15 ${right - left} 0V${floor - 8}H${left}z`}
        className="fill-dye"
        opacity=".35"
      />
      <path d={`M${left} ${level - 7}q30 15 ${right - left} 0`} className="stroke-dye" strokeWidth="2" fill="none" />
      <path
        d={`M${left - 5} ${top}q5 3 5 9V${floor - 8}h-16v8h92v-8h-16V${top + 9}q0 -6 5 -9`}
        className="stroke-ink"
        strokeWidth="1.8"
        fill="none"
      />
      <path d={`M20 ${floor + 1}H330`} className="stroke-rule-strong" strokeWidth="2" />
      {marks.map(({ ml, y }) => (
        <g key={ml}>
          <path d={`M${right} ${y}h-${ml % 20 === 0 ? 18 : 11}`} className="stroke-ink" strokeWidth="1.3" />
          {ml % 20 === 0 && (
            <text x={left - 10} y={y + 5} textAnchor="end" fontSize="14">
              {ml}
            </text>
          )}
        </g>
      ))}
      <path d={`M158 ${level}H262`} className="stroke-turf" strokeWidth="2" />
      <Eye x={278} y={level} turn={0} />
      <text x="300" y={level + 5} fontWeight="600">
        60
      </text>
      <path d={`M158 ${level}L262 53`} className="stroke-clay" strokeWidth="2" strokeDasharray="5 4" />
      <Eye x={275} y={45} turn={-30} />
      <text x="297" y="43" fontWeight="600">
        70
      </text>
      <text x={left - 10} y={top + 4} textAnchor="end" fontSize="14">
        mL
      </text>
    </DrawingFrame>
  );
}
