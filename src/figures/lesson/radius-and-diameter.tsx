import { useState } from 'react';
import { DrawingFrame, drawingWidth } from '../frame.tsx';
import { useHatching } from '../grounds.tsx';
import { Slider } from './slider.tsx';

const pi = 3.14;
const mostAcrossFt = 24;
const height = 290;
/** The circle that the slip stands for is twice as wide as the bed, and the widest one just fits. */
const unitsPerFoot = (height - 8) / (mostAcrossFt * 2);
const centerX = drawingWidth / 2;
const centerY = height / 2;
const whole = new Intl.NumberFormat('en-US', { maximumFractionDigits: 0 });

/** The bed with its radius, and round it the circle one gets by taking the distance across for the radius. */
function Circles({ acrossFt }: { acrossFt: number }) {
  const hatching = useHatching();
  const radius = (acrossFt / 2) * unitsPerFoot;
  const bed = { cx: centerX, cy: centerY, r: radius };
  return (
    <DrawingFrame
      height={height}
      alt={`A round bed ${acrossFt} feet across, so ${acrossFt / 2} feet from the center to the edge. A dashed circle round it has ${acrossFt} feet as its radius: it is twice as wide and holds four times the ground.`}
    >
      {hatching.defs}
      <circle {...bed} r={radius * 2} fill="none" className="stroke-clay" strokeWidth="1.8" strokeDasharray="7 5" />
      <circle {...bed} className="fill-brass-wash" />
      <circle {...bed} className="stroke-ink" strokeWidth="1.6" fill={hatching.url('bed')} />
      <path
        d={`M${centerX} ${centerY}H${centerX + radius}M${centerX + radius} ${centerY - 5}v10`}
        className="stroke-ink"
        strokeWidth="1.8"
      />
      <circle cx={centerX} cy={centerY} r="3" className="fill-ink" />
      <text x={centerX} y={centerY - radius - 7} textAnchor="middle" fontWeight="600">
        radius {acrossFt / 2} ft
      </text>
    </DrawingFrame>
  );
}

/** Change the distance across a bed; see the area, and what the diameter taken for the radius would give. */
export function RadiusAndDiameter() {
  const [acrossFt, setAcrossFt] = useState(16);
  const radiusFt = acrossFt / 2;
  const right = whole.format(pi * radiusFt * radiusFt);
  const wrong = whole.format(pi * acrossFt * acrossFt);
  return (
    <div className="grid items-center gap-x-6 gap-y-3 sm:grid-cols-[14rem_1fr]">
      <div>
        <Slider
          label="Distance across"
          value={acrossFt}
          min={8}
          max={mostAcrossFt}
          step={2}
          text={`${acrossFt} ft`}
          onChange={setAcrossFt}
        />
        <output className="block">
          Radius {radiusFt} ft. 3.14 × {radiusFt} ft × {radiusFt} ft = <b>{right} sq ft</b>.
        </output>
        <p className="mt-2 text-[0.95rem] text-clay">
          Dashed: {acrossFt} ft taken for the radius gives {wrong} sq ft, four times as much.
        </p>
      </div>
      <Circles acrossFt={acrossFt} />
    </div>
  );
}
