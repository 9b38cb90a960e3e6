import { useState } from 'react';
import { PlanDrawing } from '../plan-drawing.tsx';
import { Slider } from './slider.tsx';

const pi = 3.14;
const inWords = new Intl.NumberFormat('en-US', { maximumFractionDigits: 0 });

/** Change the distance across a bed; see the area, and what the diameter taken for the radius would give. */
export function RadiusAndDiameter() {
  const [across, setAcross] = useState(16);
  const radius = across / 2;
  const right = inWords.format(pi * radius * radius);
  const wrong = inWords.format(pi * across * across);
  return (
    <div className="grid gap-4 sm:grid-cols-[14rem_1fr]">
      <div>
        <Slider
          label="Distance across"
          value={across}
          min={8}
          max={40}
          step={2}
          text={`${across} ft`}
          onChange={setAcross}
        />
        <p role="status">
          Radius {radius} ft. 3.14 × {radius} ft × {radius} ft = <b>{right} sq ft</b>.
        </p>
        <p className="mt-2 text-sm text-ink-soft">
          With {across} ft in place of the radius it would be {wrong} sq ft: four times as much.
        </p>
      </div>
      <PlanDrawing
        figure={{
          kind: 'plan',
          width: 40,
          height: 40,
          shapes: [{ form: 'circle', x: 20, y: 20, radius, ground: 'bed' }],
          dimensions: [
            { from: [20 - radius, 20], to: [20 + radius, 20], text: `${across} ft`, place: 'inside', side: 'left' },
          ],
          alt: `A round bed ${across} feet across.`,
        }}
      />
    </div>
  );
}
