import { describe, expect, it } from 'vitest';
import { mixFromWaterTrial } from '../../shared/formulas/mix-from-water-trial.ts';
import { productForMix } from '../../shared/formulas/product-for-mix.ts';
import { productPerGallon } from '../../shared/formulas/product-per-gallon.ts';
import { quantity } from '../../shared/quantity/quantity.ts';
import type { UnitKey } from '../../shared/quantity/units.ts';
import { asPrinted, printedText } from './as-printed.ts';
import type { Disagreement, Example } from './example.ts';

// Sources, named as they name themselves.
const handbook =
  'Agrochemical and Pesticide Safety (handbook; mixing chapter), Example 1, M. F. Waxman, CRC/Lewis, 1998 (author, publisher and year from memory)';
const wiki = 'Calculations for Mixing Pesticides, pesticidesafety.org wiki (publisher not shown in the copy read)';
const kentucky =
  'Pesticides Calculations for Homeowners, University of Kentucky Research and Education Center, Princeton';
const newEngland = 'New England Vegetable Management Guide: pesticide dilution tables, New England Extension systems';
const slides = '1/128 Method of Calibration: hand sprayers and high pressure hand guns, extension slide set';
const northCarolina = 'Backpack Sprayer Calibration Worksheet, NC State Extension, Christmas Trees';
const albany = 'Calibrating Your Sprayer, Albany County (Wyoming) Weed and Pest Control District';
const card = 'Guidelines for Spot Spraying (calibration and mixing card), herbicide manufacturer guidance';
const county =
  'Mixing herbicides using per-acre rates; sprayer calibration instructions, county weed program worksheet (county not shown in the copy read)';
const growth = 'PGR Dilution Guide, Michigan State University, in Greenhouse Product News';
const stewardship =
  'How do I calibrate a hose-end sprayer?, Pesticide Environmental Stewardship (land-grant university consortium)';

const gal = (value: number) => quantity(value, 'gal');
/** Product for a mix at an amount for 100 gal. */
const per100 = (amount: number, unit: UnitKey, mixGal: number) =>
  productForMix({ amount: quantity(amount, unit), perMix: gal(100), mix: gal(mixGal) });
/** Product for a mix at an amount for 1 gal. */
const perGallon = (amount: string, unit: UnitKey, mixGal: number) =>
  productForMix({ amount: quantity(amount, unit), perMix: gal(1), mix: gal(mixGal) });
/** Product for each gallon at fluid ounces an acre and gallons an acre. */
const ofAcre = (flOz: number, gpa: number | string) =>
  productPerGallon({ perAcre: quantity(flOz, 'fl-oz'), rate: quantity(gpa, 'gal/acre') });

const examples: readonly Example[] = [
  {
    what: '2 lb per 100 gal in 500 gal',
    source: handbook,
    computed: () => per100(2, 'lb', 500),
    printed: { value: '10', unit: 'lb' },
  },
  {
    what: '2 pt per 100 gal in 20 gal, in fl oz',
    source: wiki,
    computed: () => per100(2, 'pt', 20),
    printed: { value: '6.4', unit: 'fl-oz' },
  },
  {
    what: '1 lb per 100 gal in 1 gal, in grams',
    source: kentucky,
    computed: () => per100(1, 'lb', 1),
    printed: { value: '4.5', unit: 'g', step: '0.1' },
  },
  {
    what: '1 pt per 100 gal in 1 gal, in teaspoons',
    source: newEngland,
    computed: () => per100(1, 'pt', 1),
    printed: { value: '1', unit: 'tsp', step: '1' },
  },
  {
    what: '1 qt an acre at 40 gal an acre, for each gallon',
    source: slides,
    computed: () => ofAcre(32, 40),
    printed: { value: '0.8', unit: 'fl-oz' },
  },
  {
    what: '8 fl oz an acre at 7.5 gal an acre, for each gallon',
    source: northCarolina,
    computed: () => ofAcre(8, '7.5'),
    printed: { value: '1.06', unit: 'fl-oz', step: '0.01', cut: true },
  },
  {
    what: '32 fl oz an acre at 20 gal an acre, in 20 gal',
    source: albany,
    computed: () => productForMix({ amount: ofAcre(32, 20), perMix: gal(1), mix: gal(20) }),
    printed: { value: '32', unit: 'fl-oz' },
  },
  {
    what: '7 fl oz an acre at 100 gal an acre, in a load of 50 gal',
    source: county,
    computed: () => productForMix({ amount: ofAcre(7, 100), perMix: gal(1), mix: gal(50) }),
    printed: { value: '3.5', unit: 'fl-oz' },
  },
  {
    what: '3.8 mL a gallon in 3 gal',
    source: card,
    computed: () => perGallon('3.8', 'ml', 3),
    printed: { value: '11.4', unit: 'ml' },
  },
  {
    what: '38 mL a gallon in 50 gal',
    source: growth,
    computed: () => perGallon('38', 'ml', 50),
    printed: { value: '1900', unit: 'ml' },
  },
  {
    what: '2 qt wet one tree: six trees, in gallons',
    source: stewardship,
    computed: () =>
      mixFromWaterTrial({ used: quantity(2, 'qt'), tried: quantity(1, 'count'), all: quantity(6, 'count') }),
    printed: { value: '3', unit: 'gal' },
  },
];

// Where a publication and the exact relation differ, the exact relation is followed.
const disagreements: readonly Disagreement[] = [
  {
    what: '3.2 fl oz in milliliters',
    source: northCarolina,
    computed: () => perGallon('3.2', 'fl-oz', 1),
    printed: { value: '96', unit: 'ml', step: '1' },
    ours: { value: '94.6', unit: 'ml', step: '0.1' },
    why: 'The worksheet takes 30 mL for a fluid ounce; grading takes that as right, too.',
  },
];

describe('published amounts per gallon', () => {
  it.each(examples)('$what ($source)', ({ computed, printed }) => {
    expect(asPrinted(computed(), printed)).toBe(printedText(printed));
  });

  it.each(disagreements)('$what: printed $printed.value, we follow $ours.value. $why ($source)', (one) => {
    expect(asPrinted(one.computed(), one.ours)).toBe(printedText(one.ours));
    expect(asPrinted(one.computed(), one.printed)).not.toBe(printedText(one.printed));
  });
});
