import { describe, expect, it } from 'vitest';
import {
  gallonsPerAcreFrom128th,
  oneOf128Acre,
  tradeTestPlot,
} from '../../shared/formulas/gallons-per-acre-from-128th.ts';
import { rateFromTestPlot } from '../../shared/formulas/rate-from-test-plot.ts';
import { testPlotLength } from '../../shared/formulas/test-plot-length.ts';
import { quantity, type Quantity } from '../../shared/quantity/quantity.ts';
import { asPrinted, printedText } from './as-printed.ts';
import type { Disagreement, Example } from './example.ts';

// Sources, named as they name themselves.
const lsu = 'Ounces Equal Gallons: Sprayer Calibration, LSU AgCenter';
const ohio =
  'Calibrating Turfgrass Chemical Application Equipment (Bulletin 817-00, section 7), Ohio State University Extension, 2000';
const slides = '1/128 Method of Calibration: hand sprayers and high pressure hand guns, extension slide set';
const northCarolina = 'Backpack Sprayer Calibration Worksheet, NC State Extension, Christmas Trees';
const sportsTurf = 'Backpack and hand-held sprayer calibration, 128th-acre method, SportsTurf magazine, April 2014';
const boomless = 'Calibrating a cluster nozzle/boomless sprayer, LSU AgCenter';
const turfResource = 'Turf resource: boom and backpack sprayer calibration, herbicide manufacturer guidance';
const florida = 'Sprayer calibration table for band-spraying of herbicides, Florida Cooperative Extension Service';
const county =
  'Mixing herbicides using per-acre rates; sprayer calibration instructions, county weed program worksheet (county not shown in the copy read)';

const shortcut = (flOz: string) => gallonsPerAcreFrom128th({ caught: quantity(flOz, 'fl-oz') });
const perAcre = (flOz: string, area: Quantity) =>
  rateFromTestPlot({ used: quantity(flOz, 'fl-oz'), area, unit: 'gal/acre' });
/** All tables divide 340 sq ft, not 340.3125, by the width. */
const plotLength = (widthIn: number) => testPlotLength({ area: tradeTestPlot, width: quantity(widthIn, 'in') });

const examples: readonly Example[] = [
  {
    what: '40 fl oz on 1/128 acre',
    source: slides,
    computed: () => shortcut('40'),
    printed: { value: '40', unit: 'gal/acre' },
  },
  {
    what: '40 fl oz on 340 sq ft, by the area',
    source: slides,
    computed: () => perAcre('40', tradeTestPlot),
    printed: { value: '40', unit: 'gal/acre', step: '0.1' },
  },
  {
    what: '7.5 fl oz on 1/128 acre',
    source: northCarolina,
    computed: () => shortcut('7.5'),
    printed: { value: '7.5', unit: 'gal/acre' },
  },
  {
    what: '80 fl oz on 1/128 acre',
    source: ohio,
    computed: () => perAcre('80', oneOf128Acre),
    printed: { value: '80', unit: 'gal/acre' },
  },
  {
    what: '44 fl oz on 1/128 acre',
    source: sportsTurf,
    computed: () => perAcre('44', oneOf128Acre),
    printed: { value: '44', unit: 'gal/acre' },
  },
  {
    what: '140 fl oz on 3,400 sq ft',
    source: boomless,
    computed: () => perAcre('140', quantity(3400, 'sq-ft')),
    printed: { value: '14', unit: 'gal/acre', step: '1' },
  },
  {
    what: '2 gal on 1,000 sq ft',
    source: turfResource,
    computed: () =>
      rateFromTestPlot({ used: quantity(2, 'gal'), area: quantity(1000, 'sq-ft'), unit: 'gal/1000-sq-ft' }),
    printed: { value: '2', unit: 'gal/1000-sq-ft' },
  },
  {
    what: '26 fl oz over 300 ft in a 12 in band',
    source: florida,
    computed: () => perAcre('26', quantity(300, 'sq-ft')),
    printed: { value: '29.5', unit: 'gal/acre', step: '0.1' },
  },
  {
    what: 'plot length for 30 in',
    source: lsu,
    computed: () => plotLength(30),
    printed: { value: '136', unit: 'ft', step: '1' },
  },
  {
    what: 'plot length for 26 in',
    source: lsu,
    computed: () => plotLength(26),
    printed: { value: '157', unit: 'ft', step: '1' },
  },
  {
    what: 'plot length for 22 in',
    source: lsu,
    computed: () => plotLength(22),
    printed: { value: '185', unit: 'ft', step: '1' },
  },
  {
    what: 'plot length for 20 in',
    source: lsu,
    computed: () => plotLength(20),
    printed: { value: '204', unit: 'ft', step: '1' },
  },
  {
    what: 'plot length for 16 in',
    source: lsu,
    computed: () => plotLength(16),
    printed: { value: '255', unit: 'ft', step: '1' },
  },
  {
    what: 'plot length for 12 in',
    source: lsu,
    computed: () => plotLength(12),
    printed: { value: '340', unit: 'ft', step: '1' },
  },
  {
    what: 'plot length for 10 in',
    source: lsu,
    computed: () => plotLength(10),
    printed: { value: '408', unit: 'ft', step: '1' },
  },
  {
    what: 'plot length for 34 in',
    source: ohio,
    computed: () => plotLength(34),
    printed: { value: '120', unit: 'ft', step: '1' },
  },
  {
    what: 'plot length for 38 in',
    source: ohio,
    computed: () => plotLength(38),
    printed: { value: '107', unit: 'ft', step: '1' },
  },
  {
    what: 'plot length for 40 in',
    source: ohio,
    computed: () => plotLength(40),
    printed: { value: '102', unit: 'ft', step: '1' },
  },
];

// Where a publication and the exact relation differ, the exact relation is followed.
const disagreements: readonly Disagreement[] = [
  {
    what: '100 fl oz on a square of 18.5 ft',
    source: county,
    computed: () => perAcre('100', quantity('342.25', 'sq-ft')),
    printed: { value: '100', unit: 'gal/acre', step: '0.1' },
    ours: { value: '99.4', unit: 'gal/acre', step: '0.1' },
    why: 'The square is 342.25 sq ft; the shortcut wants 340.3.',
  },
];

describe('published calibrations of hand sprayers', () => {
  it.each(examples)('$what ($source)', ({ computed, printed }) => {
    expect(asPrinted(computed(), printed)).toBe(printedText(printed));
  });

  it.each(disagreements)('$what: printed $printed.value, we follow $ours.value. $why ($source)', (one) => {
    expect(asPrinted(one.computed(), one.ours)).toBe(printedText(one.ours));
    expect(asPrinted(one.computed(), one.printed)).not.toBe(printedText(one.printed));
  });
});
