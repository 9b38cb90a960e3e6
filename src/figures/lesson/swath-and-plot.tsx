import { useState } from 'react';
import { DrawingFrame } from '../frame.tsx';
import { useHatching } from '../grounds.tsx';
import { Slider } from './slider.tsx';

/** The trade's round figure for 1/128 of an acre, sq ft (43,560 / 128 = 340.3). */
const plotSqFt = 340;
/** Units of the drawing for a foot: the longest strip, 2 ft wide and 170 ft long, just fits. */
const unitsPerFoot = 1.86;
/** A strip is thin: its width is drawn larger than its length, and the drawing says so. */
const widthTimes = 5;

/** The strip from above, walked once from left to right. */
function Strip({ swathFt, lengthFt }: { swathFt: number; lengthFt: number }) {
  const hatching = useHatching();
  const long = lengthFt * unitsPerFoot;
  const wide = swathFt * unitsPerFoot * widthTimes;
  const left = 16;
  const top = 34;
  const right = left + long;
  const below = top + wide + 18;
  const middle = top + wide / 2;
  const box = { x: left, y: top, width: long, height: wide };
  return (
    <DrawingFrame
      height={140}
      alt={`A strip ${swathFt} feet wide and ${lengthFt} feet long, sprayed in one pass: one 128th of an acre.`}
    >
      {hatching.defs}
      <text x={left} y={top - 10}>
        {swathFt} ft wide
      </text>
      <rect {...box} className="fill-turf-wash" />
      <rect {...box} width={long * 0.62} className="fill-dye-wash" />
      <rect {...box} width={long * 0.62} fill={hatching.url('swath')} />
      <rect {...box} fill="none" className="stroke-ink" strokeWidth="1.6" />
      <path
        d={`M${left + long * 0.62} ${middle}l-13 -7v14z`}
        className="fill-dye stroke-sheet"
        strokeWidth="1"
        paintOrder="stroke"
      />
      <path d={`M7 ${top}V${top + wide}M3 ${top}h8M3 ${top + wide}h8`} className="stroke-ink" />
      <path d={`M${left} ${below}H${right}M${left} ${below - 5}v10M${right} ${below - 5}v10`} className="stroke-ink" />
      <rect x={(left + right) / 2 - 29} y={below - 10} width="58" height="20" className="fill-sheet" />
      <text x={(left + right) / 2} y={below + 5} textAnchor="middle" fontWeight="600">
        {lengthFt} ft
      </text>
      <text x={left} y={134} fontSize="15" className="fill-ink-soft">
        width drawn {widthTimes} times as large
      </text>
    </DrawingFrame>
  );
}

/** Change the swath and see how long a strip of 1/128 acre must be. */
export function SwathAndPlot() {
  const [swathFt, setSwathFt] = useState(4);
  const lengthFt = Math.round(plotSqFt / swathFt);
  return (
    <div className="grid items-center gap-x-6 gap-y-3 sm:grid-cols-[14rem_1fr]">
      <div>
        <Slider
          label="Swath width"
          value={swathFt}
          min={2}
          max={6}
          step={0.5}
          text={`${swathFt} ft`}
          onChange={setSwathFt}
        />
        <output className="block">
          340 sq ft ÷ {swathFt} ft {lengthFt * swathFt === plotSqFt ? '=' : '≈'} <b>{lengthFt} ft</b> long
        </output>
      </div>
      <Strip swathFt={swathFt} lengthFt={lengthFt} />
    </div>
  );
}
