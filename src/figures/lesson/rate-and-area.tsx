import { useState } from 'react';
import { DrawingFrame } from '../frame.tsx';
import { Slider } from './slider.tsx';

const rate = 1.5;
const inWords = new Intl.NumberFormat('en-US', { maximumFractionDigits: 2 });

/** Change the area and count the thousands: each takes the label's amount once. */
export function RateAndArea() {
  const [area, setArea] = useState(4500);
  const thousands = area / 1000;
  const product = inWords.format(thousands * rate);
  const alt = `${inWords.format(thousands)} squares of 1,000 square feet, each with 1.5 fluid ounces.`;
  return (
    <div>
      <Slider
        label="Area of the lawn"
        value={area}
        min={500}
        max={8000}
        step={250}
        text={`${inWords.format(area)} sq ft`}
        onChange={setArea}
      />
      <DrawingFrame height={92} alt={alt}>
        {Array.from({ length: 8 }, (_, index) => {
          const share = Math.min(Math.max(thousands - index, 0), 1);
          return (
            <g key={index} transform={`translate(${6 + index * 42} 8)`}>
              <rect width="36" height="36" className="fill-sheet stroke-rule-strong" />
              <rect
                width={36 * share}
                height="36"
                className="fill-turf-wash stroke-turf"
                strokeWidth={share > 0 ? 1.4 : 0}
              />
              {share > 0 && (
                <text x="18" y="62" textAnchor="middle" fontSize="13">
                  {inWords.format(share * rate)}
                </text>
              )}
            </g>
          );
        })}
        <text x="6" y="86" fontSize="13">
          fl oz for each square of 1,000 sq ft
        </text>
      </DrawingFrame>
      <p role="status" className="mt-2">
        {inWords.format(area)} ÷ 1,000 = {inWords.format(thousands)}. {inWords.format(thousands)} × 1.5 fl oz ={' '}
        <b>{product} fl oz</b>
      </p>
    </div>
  );
}
