import { useState } from 'react';
import { DrawingFrame } from '../frame.tsx';
import { useHatching } from '../grounds.tsx';
import { Slider } from './slider.tsx';

const lineFt = 80;
/** The edge of the lawn as a sum of waves along the base line: height in feet, number of half waves. */
const waves = [
  [24, 1],
  [6, 2],
  [6, 3],
  [5, 7],
] as const;
/** Steps that divide the line evenly. */
const stepsFt = [20, 16, 10, 8, 5] as const;
const unitsPerFoot = 4;
const left = 14;
const base = 138;
const whole = new Intl.NumberFormat('en-US', { maximumFractionDigits: 0 });

const widthAt = (alongFt: number) =>
  waves.reduce((sum, [height, halves]) => sum + height * Math.sin((halves * Math.PI * alongFt) / lineFt), 0);
const x = (alongFt: number) => left + alongFt * unitsPerFoot;
const y = (widthFt: number) => base - widthFt * unitsPerFoot;

/** The area under the waves: a half wave of height h over a length l covers 2hl/π, and whole waves cover nothing. */
const trueSqFt = waves.reduce(
  (sum, [height, halves]) => sum + (halves % 2 === 1 ? (2 * height * lineFt) / (halves * Math.PI) : 0),
  0,
);
const edge = Array.from({ length: lineFt + 1 }, (_, alongFt) => `${x(alongFt)},${y(widthAt(alongFt)).toFixed(1)}`);

interface Offset {
  alongFt: number;
  widthFt: number;
}

function offsetsEvery(stepFt: number): Offset[] {
  return Array.from({ length: lineFt / stepFt - 1 }, (_, index) => {
    const alongFt = (index + 1) * stepFt;
    return { alongFt, widthFt: Math.round(widthAt(alongFt)) };
  });
}

function Slices({ offsets, stepFt }: { offsets: readonly Offset[]; stepFt: number }) {
  const hatching = useHatching();
  return (
    <DrawingFrame
      height={172}
      alt={`A lawn with a straight side of 80 feet and a wavy edge. Every ${stepFt} feet an offset runs square across, and a slice ${stepFt} feet thick stands round it.`}
    >
      {hatching.defs}
      <polygon points={edge.join(' ')} className="fill-turf-wash" />
      <polygon points={edge.join(' ')} fill={hatching.url('turf')} className="stroke-ink" strokeWidth="1.8" />
      {offsets.map(({ alongFt, widthFt }) => (
        <g key={alongFt}>
          <rect
            x={x(alongFt - stepFt / 2)}
            y={y(widthFt)}
            width={stepFt * unitsPerFoot}
            height={widthFt * unitsPerFoot}
            className="fill-dye stroke-dye"
            fillOpacity=".14"
            strokeWidth="1.2"
          />
          <path
            d={`M${x(alongFt)} ${base}V${y(widthFt)}`}
            className="stroke-ink"
            strokeWidth="1.3"
            strokeDasharray="5 4"
          />
        </g>
      ))}
      <path d={`M${x(0)} 152H${x(lineFt)}M${x(0)} 147v10M${x(lineFt)} 147v10`} className="stroke-ink" />
      <rect x={x(lineFt / 2) - 27} y="142" width="54" height="20" className="fill-sheet" />
      <text x={x(lineFt / 2)} y="157" textAnchor="middle">
        80 ft
      </text>
    </DrawingFrame>
  );
}

/** Change the step between offsets; see the slices follow the edge more closely, and the estimate with them. */
export function OffsetSteps() {
  const [choice, setChoice] = useState(0);
  const stepFt = stepsFt[choice] ?? stepsFt[0];
  const offsets = offsetsEvery(stepFt);
  const sumFt = offsets.reduce((sum, { widthFt }) => sum + widthFt, 0);
  return (
    <div className="grid items-center gap-x-6 gap-y-3 sm:grid-cols-[14rem_1fr]">
      <div>
        <Slider
          label="Step"
          value={choice}
          min={0}
          max={stepsFt.length - 1}
          step={1}
          text={`${stepFt} ft`}
          onChange={setChoice}
        />
        <output className="block">
          {offsets.length} offsets add up to {sumFt} ft. {sumFt} ft × {stepFt} ft ={' '}
          <b>{whole.format(sumFt * stepFt)} sq ft</b>
        </output>
        <p className="mt-2 text-[0.95rem] text-ink-soft">This lawn holds {whole.format(trueSqFt)} sq ft.</p>
      </div>
      <Slices offsets={offsets} stepFt={stepFt} />
    </div>
  );
}
