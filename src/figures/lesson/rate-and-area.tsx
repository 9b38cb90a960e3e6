import { useState } from 'react';
import { DrawingFrame } from '../frame.tsx';
import { Slider } from './slider.tsx';

const rateFlOz = 1.5;
const mostThousands = 8;
const columns = 4;
const figures = new Intl.NumberFormat('en-US', { maximumFractionDigits: 3 });

/** The lawn as squares of 1,000 sq ft, the last one perhaps begun only; each says what product it takes. */
function Thousands({ thousands }: { thousands: number }) {
  return (
    <DrawingFrame
      height={166}
      alt={`${figures.format(thousands)} squares of 1,000 square feet. A full one takes 1.5 fluid ounces.`}
    >
      {Array.from({ length: mostThousands }, (_, index) => {
        const share = Math.min(Math.max(thousands - index, 0), 1);
        const x = 4 + (index % columns) * 87;
        const y = 4 + Math.floor(index / columns) * 83;
        return (
          <g key={index} transform={`translate(${x} ${y})`}>
            <rect width="80" height="76" fill="none" className="stroke-rule" strokeDasharray="4 4" />
            {share > 0 && (
              <>
                <rect width={80 * share} height="76" className="fill-turf-wash stroke-turf" strokeWidth="1.6" />
                <text x={share < 0.7 ? 80 * share + 5 : 40} y="34" textAnchor={share < 0.7 ? 'start' : 'middle'}>
                  <tspan fontWeight="600">{figures.format(share * rateFlOz)}</tspan>
                </text>
                <text x={share < 0.7 ? 80 * share + 5 : 40} y="52" textAnchor={share < 0.7 ? 'start' : 'middle'}>
                  fl oz
                </text>
              </>
            )}
          </g>
        );
      })}
    </DrawingFrame>
  );
}

/** Change the area and count the thousands: each takes the label's amount of product and of water once. */
export function RateAndArea() {
  const [areaSqFt, setAreaSqFt] = useState(4500);
  const thousands = areaSqFt / 1000;
  const count = figures.format(thousands);
  return (
    <div className="grid items-center gap-x-6 gap-y-3 sm:grid-cols-[14rem_1fr]">
      <div>
        <Slider
          label="Area of the lawn"
          value={areaSqFt}
          min={500}
          max={mostThousands * 1000}
          step={500}
          text={`${figures.format(areaSqFt)} sq ft`}
          onChange={setAreaSqFt}
        />
        <output className="block">
          {figures.format(areaSqFt)} ÷ 1,000 = {count} thousands.
          <br />
          {count} × 1.5 fl oz = <b>{figures.format(thousands * rateFlOz)} fl oz</b> of product.
          <br />
          {count} × 1 gal = <b>{count} gal</b> of water.
        </output>
      </div>
      <Thousands thousands={thousands} />
    </div>
  );
}
