import { useState } from 'react';
import { PlanDrawing } from '../plan-drawing.tsx';
import { Slider } from './slider.tsx';

/** The trade's round figure for 1/128 of an acre, sq ft (43,560 / 128 = 340.3). */
const plot = 340;

/** Change the swath and see how long a strip of 1/128 acre must be. */
export function SwathAndPlot() {
  const [swath, setSwath] = useState(4);
  const length = Math.round(plot / swath);
  const alt = `A strip ${swath} feet wide and ${length} feet long: one 128th of an acre.`;
  return (
    <div className="grid gap-4 sm:grid-cols-[14rem_1fr]">
      <div>
        <Slider label="Swath width" value={swath} min={2} max={6} step={0.5} text={`${swath} ft`} onChange={setSwath} />
        <p role="status">
          340 sq ft ÷ {swath} ft = <b>{length} ft</b> long
        </p>
      </div>
      <PlanDrawing
        figure={{
          kind: 'plan',
          width: 170,
          height: 6,
          shapes: [{ form: 'rect', x: 0, y: (6 - swath) / 2, width: length, height: swath, ground: 'swath' }],
          dimensions: [
            {
              from: [0, (6 + swath) / 2],
              to: [length, (6 + swath) / 2],
              text: `${length} ft`,
              place: 'outside',
              side: 'right',
            },
          ],
          alt,
        }}
      />
    </div>
  );
}
