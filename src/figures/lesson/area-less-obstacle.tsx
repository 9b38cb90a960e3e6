import { useState } from 'react';
import { PlanDrawing } from '../plan-drawing.tsx';
import { Slider } from './slider.tsx';

const lawn = { length: 60, width: 30 };
const deep = 10;
const inWords = new Intl.NumberFormat('en-US');

/** Change the patio and see what it takes off the lawn. */
export function AreaLessObstacle() {
  const [long, setLong] = useState(20);
  const whole = lawn.length * lawn.width;
  const off = long * deep;
  const text = { whole: inWords.format(whole), off: inWords.format(off), left: inWords.format(whole - off) };
  return (
    <div className="grid gap-4 sm:grid-cols-[14rem_1fr]">
      <div>
        <Slider
          label="Length of the patio"
          value={long}
          min={8}
          max={36}
          step={2}
          text={`${long} ft`}
          onChange={setLong}
        />
        <output className="block">
          {text.whole} sq ft − {text.off} sq ft = <b>{text.left} sq ft</b> of grass
        </output>
      </div>
      <PlanDrawing
        figure={{
          kind: 'plan',
          width: lawn.length,
          height: lawn.width,
          shapes: [
            { form: 'rect', x: 0, y: 0, width: lawn.length, height: lawn.width, ground: 'turf', name: 'lawn' },
            {
              form: 'rect',
              x: lawn.length - long,
              y: lawn.width - deep,
              width: long,
              height: deep,
              ground: 'hard',
              name: 'patio',
            },
          ],
          dimensions: [
            { from: [0, 0], to: [lawn.length, 0], text: '60 ft', place: 'outside', side: 'left' },
            { from: [0, lawn.width], to: [0, 0], text: '30 ft', place: 'outside', side: 'left' },
          ],
          alt: `A lawn 60 feet by 30 feet with a patio ${long} feet by 10 feet in one corner.`,
        }}
      />
    </div>
  );
}
