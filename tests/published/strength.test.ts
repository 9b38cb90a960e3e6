import { describe, expect, it } from 'vitest';
import { activeInDry } from '../../shared/formulas/active-in-dry.ts';
import { dryForActive } from '../../shared/formulas/dry-for-active.ts';
import { liquidForActive } from '../../shared/formulas/liquid-for-active.ts';
import { partsPerMillion } from '../../shared/formulas/parts-per-million.ts';
import { perAcreToPerThousand } from '../../shared/formulas/per-acre-to-per-thousand.ts';
import { powderForPercentWeight } from '../../shared/formulas/powder-for-percent-weight.ts';
import { productForMix } from '../../shared/formulas/product-for-mix.ts';
import { productForPercentVolume } from '../../shared/formulas/product-for-percent-volume.ts';
import { productForRatio } from '../../shared/formulas/product-for-ratio.ts';
import { stockForDilution } from '../../shared/formulas/stock-for-dilution.ts';
import { quantity } from '../../shared/quantity/quantity.ts';
import { rational } from '../../shared/quantity/rational.ts';
import { asPrinted, printedText } from './as-printed.ts';
import type { Disagreement, Example } from './example.ts';

// Sources, named as they name themselves.
const illinois = 'How Much Product to Add in Handheld Sprayers?, University of Illinois Extension, 2006';
const georgia = 'Calibrate sprayer, University of Georgia Cooperative Extension';
const army = 'Pesticides in the Military, Subcourse MD0173, U.S. Army Medical Department Center and School, 2006';
const missouri = 'Pesticide dilution table (G7510), University of Missouri Extension';
const virginia = 'Formulas for Determining Application Rates, Virginia Department of Wildlife Resources';
const pacific =
  'Weights and measures; pints of commercial material needed per acre, Pacific Northwest Pest Management Handbooks';
const newEngland = 'New England Vegetable Management Guide: pesticide dilution tables, New England Extension systems';
const handbook =
  'Agrochemical and Pesticide Safety (handbook; mixing chapter), Example 5, M. F. Waxman, CRC/Lewis, 1998 (author, publisher and year from memory)';
const florida =
  'Dry chemical applicator calibration, alternative procedure (Table 2), Florida Cooperative Extension Service';
const chartA = 'Dilution charts and conversion tables, janitorial chemical supplier (chart A)';
const chartB = 'Dilution table mixing chart, janitorial chemical supplier (chart B)';
const chartC = 'Dilution charts, janitorial chemical supplier (chart C)';
const texas = 'Nutrition and fertility: ppm calculations, Texas A&M AgriLife Extension, greenhouse IPM guide';

const lb = (value: number | string) => quantity(value, 'lb');
const gal = (value: number | string) => quantity(value, 'gal');
const percent = (value: number | string) => quantity(value, 'percent');
const volumePercent = (share: string, mixGal: number) =>
  productForPercentVolume({ percent: percent(share), mix: gal(mixGal) });
const liquid = (active: string, perGallon: string) =>
  liquidForActive({ active: lb(active), strength: quantity(perGallon, 'lb/gal') });
const dry = (active: number, share: string) => dryForActive({ active: lb(active), percent: percent(share) });
/** Active ingredient in a mix of so many percent by weight. */
const activeInMix = (share: string, mixGal: number) =>
  powderForPercentWeight({ mix: gal(mixGal), wanted: percent(share), product: percent(100) });
const ratio = (waterParts: number, convention: 'added-to' | 'made-up-to') =>
  productForRatio({ volume: gal(1), waterParts: rational(waterParts), convention });
/** Parts per million of an ounce of product of so many percent in 100 gal. */
const ounceIn100 = (share: number) =>
  partsPerMillion({
    dissolved: activeInDry({ product: quantity(1, 'oz'), percent: percent(share) }),
    water: gal(100),
  });

const examples: readonly Example[] = [
  {
    what: '0.5% by volume in 2 gal',
    source: illinois,
    computed: () => volumePercent('0.5', 2),
    printed: { value: '1.28', unit: 'fl-oz' },
  },
  {
    what: '2% by volume in 2 gal',
    source: georgia,
    computed: () => volumePercent('2', 2),
    printed: { value: '5.1', unit: 'fl-oz', step: '0.1' },
  },
  {
    what: '55 gal of 1% from a 48% concentrate',
    source: army,
    computed: () => stockForDilution({ amount: gal(55), wanted: percent(1), stock: percent(48) }),
    printed: { value: '1.146', unit: 'gal', step: '0.001' },
  },
  {
    what: '10 lb of 5% dust from an 80% powder',
    source: army,
    computed: () => stockForDilution({ amount: lb(10), wanted: percent(5), stock: percent(80) }),
    printed: { value: '0.625', unit: 'lb' },
  },
  {
    what: '5 gal of a 2% suspension from an 80% powder',
    source: army,
    computed: () => powderForPercentWeight({ mix: gal(5), wanted: percent(2), product: percent(80) }),
    printed: { value: '1.04', unit: 'lb', step: '0.01' },
  },
  {
    what: '100 gal of 0.25% from 2 lb/gal',
    source: missouri,
    computed: () => liquidForActive({ active: activeInMix('0.25', 100), strength: quantity(2, 'lb/gal') }),
    printed: { value: '1', unit: 'gal', step: '1' },
  },
  {
    what: '100 gal of 1% from 3 lb/gal',
    source: missouri,
    computed: () => liquidForActive({ active: activeInMix('1', 100), strength: quantity(3, 'lb/gal') }),
    printed: { value: '3', unit: 'gal', step: '1' },
  },
  {
    what: '2 lb active from 4 lb/gal, in pints',
    source: pacific,
    computed: () => liquid('2', '4'),
    printed: { value: '4', unit: 'pt' },
  },
  {
    what: '1.5 lb active from 5 lb/gal, in pints',
    source: pacific,
    computed: () => liquid('1.5', '5'),
    printed: { value: '2.4', unit: 'pt' },
  },
  {
    what: '0.25 lb active from 3 lb/gal, in pints',
    source: pacific,
    computed: () => liquid('0.25', '3'),
    printed: { value: '0.7', unit: 'pt', step: '0.1' },
  },
  {
    what: '1 lb active from 1.5 lb/gal, in quarts',
    source: newEngland,
    computed: () => liquid('1', '1.5'),
    printed: { value: '2.6667', unit: 'qt', step: '0.0001' },
  },
  {
    what: '5 lb active from 1.5 lb/gal, in gallons',
    source: newEngland,
    computed: () => liquid('5', '1.5'),
    printed: { value: '3.3333', unit: 'gal', step: '0.0001' },
  },
  {
    what: '1 lb active an acre from 4 lb/gal, in mL for 1,000 sq ft',
    source: pacific,
    computed: () => perAcreToPerThousand({ perAcre: liquid('1', '4') }),
    printed: { value: '22', unit: 'ml', step: '1' },
  },
  {
    what: '0.3 lb active as a 6% spray, in gallons',
    source: army,
    computed: () =>
      liquidForActive({ active: lb('0.3'), strength: quantity(rational('8.34').mul(6).div(100), 'lb/gal') }),
    printed: { value: '0.6', unit: 'gal', step: '0.1' },
  },
  {
    what: '2 lb active from an 80% powder',
    source: handbook,
    computed: () => dry(2, '80'),
    printed: { value: '2.5', unit: 'lb' },
  },
  {
    what: '1 lb active from a 15% powder',
    source: newEngland,
    computed: () => dry(1, '15'),
    printed: { value: '6.6667', unit: 'lb', step: '0.0001' },
  },
  {
    what: '5 lb active from 1.5% granules',
    source: newEngland,
    computed: () => dry(5, '1.5'),
    printed: { value: '333', unit: 'lb', step: '1' },
  },
  {
    what: 'active in 277 lb of a 20% product',
    source: florida,
    computed: () => activeInDry({ product: lb(277), percent: percent(20) }),
    printed: { value: '55.4', unit: 'lb' },
  },
  {
    what: '1 lb active an acre from a 75% product, in grams for 1,000 sq ft',
    source: pacific,
    computed: () => perAcreToPerThousand({ perAcre: dry(1, '75') }),
    printed: { value: '14', unit: 'g', step: '1' },
  },
  {
    what: '1 to 64, added to a gallon',
    source: chartA,
    computed: () => ratio(64, 'added-to'),
    printed: { value: '2', unit: 'fl-oz' },
  },
  {
    what: '1 to 85, added to a gallon',
    source: chartB,
    computed: () => ratio(85, 'added-to'),
    printed: { value: '1.5', unit: 'fl-oz', step: '0.1' },
  },
  {
    what: '1 to 10, made up to a gallon',
    source: chartC,
    computed: () => ratio(10, 'made-up-to'),
    printed: { value: '11.5', unit: 'fl-oz', step: '0.5' },
  },
  {
    what: '0.0038 g in a gallon, in ppm',
    source: virginia,
    computed: () => partsPerMillion({ dissolved: quantity('0.0038', 'g'), water: gal(1) }),
    printed: { value: '1', unit: 'ppm', step: '0.01' },
  },
  {
    what: '7 oz in 100 gal through a 1 to 100 proportioner, for 100 gal of stock',
    source: texas,
    computed: () => productForMix({ amount: quantity(7, 'oz'), perMix: gal(100), mix: gal(100 * 100) }),
    printed: { value: '700', unit: 'oz' },
  },
];

// Where a publication and the exact relation differ, the exact relation is followed.
const disagreements: readonly Disagreement[] = [
  {
    what: '1% by weight in a gallon',
    source: virginia,
    computed: () => activeInMix('1', 1),
    printed: { value: '1.34', unit: 'oz', step: '0.01' },
    ours: { value: '1.33', unit: 'oz', step: '0.01' },
    why: '0.01 × 8.34 × 16 is 1.3344.',
  },
  {
    what: '0.75 lb active from 7 lb/gal, in pints',
    source: pacific,
    computed: () => liquid('0.75', '7'),
    printed: { value: '0.87', unit: 'pt', step: '0.01' },
    ours: { value: '0.86', unit: 'pt', step: '0.01' },
    why: '6 ÷ 7 is 0.857.',
  },
  {
    what: '1 oz of a 15% product in 100 gal',
    source: texas,
    computed: () => ounceIn100(15),
    printed: { value: '11.25', unit: 'ppm', step: '0.01' },
    ours: { value: '11.24', unit: 'ppm', step: '0.01' },
    why: 'The guide takes 75 ppm for an ounce in 100 gal.',
  },
  {
    what: '1 oz of a 33% product in 100 gal',
    source: texas,
    computed: () => ounceIn100(33),
    printed: { value: '29.75', unit: 'ppm', step: '0.01' },
    ours: { value: '24.73', unit: 'ppm', step: '0.01' },
    why: 'A slip in the guide: 0.33 × 75 is 24.75.',
  },
];

describe('published concentrations', () => {
  it.each(examples)('$what ($source)', ({ computed, printed }) => {
    expect(asPrinted(computed(), printed)).toBe(printedText(printed));
  });

  it.each(disagreements)('$what: printed $printed.value, we follow $ours.value. $why ($source)', (one) => {
    expect(asPrinted(one.computed(), one.ours)).toBe(printedText(one.ours));
    expect(asPrinted(one.computed(), one.printed)).not.toBe(printedText(one.printed));
  });
});
