import { describe, expect, it } from 'vitest';
import { productForArea } from '../../shared/formulas/product-for-area.ts';
import { rectangleArea } from '../../shared/formulas/rectangle-area.ts';
import { testPlotLength } from '../../shared/formulas/test-plot-length.ts';
import { quantity } from '../../shared/quantity/quantity.ts';
import { asPrinted, printedText } from './as-printed.ts';
import type { Disagreement, Example } from './example.ts';

// Sources, named as they name themselves.
const onslow = 'Calibrating Your Spreader, N.C. Cooperative Extension, Onslow County, 2017';
const manual = 'Sprayer / spreader operator manual, calibration worksheets (equipment manual)';
const dropSheet = 'Drop Spreader Calibration (Louisiana Home Lawn Series), LSU AgCenter';
const rotarySheet = 'Broadcast Spreader Calibration (Louisiana Home Lawn Series), LSU AgCenter';
const florida =
  'Dry chemical applicator calibration, alternative procedure (Table 2), Florida Cooperative Extension Service';

const ft = (value: number) => quantity(value, 'ft');
const sqFt = (value: number) => quantity(value, 'sq-ft');
const course = (swathFt: number) => testPlotLength({ area: sqFt(1000), width: ft(swathFt) });
const strip = (widthFt: number, lengthFt: number) => rectangleArea({ length: ft(lengthFt), width: ft(widthFt) });

const examples: readonly Example[] = [
  {
    what: 'course for 1,000 sq ft at a swath of 8 ft',
    source: onslow,
    computed: () => course(8),
    printed: { value: '125', unit: 'ft' },
  },
  {
    what: 'course for 1,000 sq ft at a swath of 6 ft',
    source: manual,
    computed: () => course(6),
    printed: { value: '167', unit: 'ft', step: '1' },
  },
  {
    what: '1 lb on a tarp of 10 by 10 ft, for 1,000 sq ft',
    source: onslow,
    computed: () => productForArea({ amount: quantity(1, 'lb'), labelArea: strip(10, 10), area: sqFt(1000) }),
    printed: { value: '10', unit: 'lb' },
  },
  {
    what: 'a 3 ft drop spreader over 100 ft',
    source: dropSheet,
    computed: () => strip(3, 100),
    printed: { value: '300', unit: 'sq-ft' },
  },
  {
    what: '5 lb per 1,000 sq ft over 10 by 100 ft',
    source: rotarySheet,
    computed: () => productForArea({ amount: quantity(5, 'lb'), labelArea: sqFt(1000), area: strip(10, 100) }),
    printed: { value: '5', unit: 'lb' },
  },
];

// Where a publication and the exact relation differ, the exact relation is followed.
const disagreements: readonly Disagreement[] = [
  {
    what: '20 lb in 43 turns of a 9 ft wheel, 8 ft wide, for an acre',
    source: florida,
    computed: () =>
      productForArea({ amount: quantity(20, 'lb'), labelArea: strip(8, 43 * 9), area: quantity(1, 'acre') }),
    printed: { value: '277', unit: 'lb', step: '1' },
    ours: { value: '281', unit: 'lb', step: '1' },
    why: 'The field formula takes 43.56 turns for 43.',
  },
];

describe('published spreader calibrations', () => {
  it.each(examples)('$what ($source)', ({ computed, printed }) => {
    expect(asPrinted(computed(), printed)).toBe(printedText(printed));
  });

  it.each(disagreements)('$what: printed $printed.value, we follow $ours.value. $why ($source)', (one) => {
    expect(asPrinted(one.computed(), one.ours)).toBe(printedText(one.ours));
    expect(asPrinted(one.computed(), one.printed)).not.toBe(printedText(one.printed));
  });
});
