import { describe, expect, it } from 'vitest';
import { areaPerTank } from '../../shared/formulas/area-per-tank.ts';
import { lastLoad } from '../../shared/formulas/last-load.ts';
import { mixForArea } from '../../shared/formulas/mix-for-area.ts';
import { tankLoads } from '../../shared/formulas/tank-loads.ts';
import { quantity } from '../../shared/quantity/quantity.ts';
import { asPrinted, printedText } from './as-printed.ts';
import type { Example } from './example.ts';

// Sources, named as they name themselves.
const turfResource = 'Turf resource: boom and backpack sprayer calibration, herbicide manufacturer guidance';
const mesa = 'Sprayer Calibration Methods: how to calibrate a handgun, Mesa County, Colorado, Noxious Weed program';
const handbook =
  'Agrochemical and Pesticide Safety (handbook; mixing chapter), Example 4, M. F. Waxman, CRC/Lewis, 1998 (author, publisher and year from memory)';
const ours = 'the rule as published by university extension; numbers made for coverage, not a published figure';

const gal = (value: number) => quantity(value, 'gal');
const gpa = (value: number | string) => quantity(value, 'gal/acre');
const field = { mix: mixForArea({ rate: gpa(40), area: quantity('3.5', 'acre') }), tank: gal(50) };
const lawn = {
  mix: mixForArea({ rate: quantity(1, 'gal/1000-sq-ft'), area: quantity(12000, 'sq-ft') }),
  tank: gal(4),
};

const examples: readonly Example[] = [
  {
    what: 'acres from 200 gal at 20 gal an acre',
    source: turfResource,
    computed: () => areaPerTank({ tank: gal(200), rate: gpa(20) }),
    printed: { value: '10', unit: 'acre' },
  },
  {
    what: 'acres from 25 gal at 150 gal an acre',
    source: mesa,
    computed: () => areaPerTank({ tank: gal(25), rate: gpa(150) }),
    printed: { value: '0.1667', unit: 'acre', step: '0.0001' },
  },
  {
    what: 'mix for 3.5 acres at 15 gal an acre',
    source: handbook,
    computed: () => mixForArea({ rate: gpa(15), area: quantity('3.5', 'acre') }),
    printed: { value: '52.5', unit: 'gal' },
  },
  {
    what: 'loads of 50 gal for 3.5 acres at 40 gal an acre',
    source: ours,
    computed: () => tankLoads(field),
    printed: { value: '3', unit: 'count' },
  },
  {
    what: 'the last of those loads',
    source: ours,
    computed: () => lastLoad(field),
    printed: { value: '40', unit: 'gal' },
  },
  {
    what: 'loads of 4 gal for 12,000 sq ft at 1 gal per 1,000',
    source: ours,
    computed: () => tankLoads(lawn),
    printed: { value: '3', unit: 'count' },
  },
  {
    what: 'the last of those loads is full',
    source: ours,
    computed: () => lastLoad(lawn),
    printed: { value: '4', unit: 'gal' },
  },
];

describe('published tank loads', () => {
  it.each(examples)('$what ($source)', ({ computed, printed }) => {
    expect(asPrinted(computed(), printed)).toBe(printedText(printed));
  });
});
