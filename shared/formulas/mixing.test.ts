import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { add, compare, quantity, scale, type Quantity } from '../quantity/quantity.ts';
import { rational } from '../quantity/rational.ts';
import type { UnitKey } from '../quantity/units.ts';
import { activeInDry } from './active-in-dry.ts';
import { activeInLiquid } from './active-in-liquid.ts';
import { areaPerTank } from './area-per-tank.ts';
import { dryForActive } from './dry-for-active.ts';
import { fieldRateFromBand } from './field-rate-from-band.ts';
import { lastLoad } from './last-load.ts';
import { liquidForActive } from './liquid-for-active.ts';
import { mixForArea } from './mix-for-area.ts';
import { mixFromWaterTrial } from './mix-from-water-trial.ts';
import { partsPerMillion } from './parts-per-million.ts';
import { powderForPercentWeight } from './powder-for-percent-weight.ts';
import { productForMix } from './product-for-mix.ts';
import { productForPercentVolume } from './product-for-percent-volume.ts';
import { productForRatio } from './product-for-ratio.ts';
import { productPerGallon } from './product-per-gallon.ts';
import { stockForDilution } from './stock-for-dilution.ts';
import { tankLoads } from './tank-loads.ts';

const q = (value: number | string, unit: UnitKey) => quantity(value, unit);
/** Value and unit, to compare exactly. */
const written = (one: Quantity) => `${one.value.toFraction()} ${one.unit}`;
const some = fc.integer({ min: 1, max: 2000 });

describe('product in a mix', () => {
  it('1.5 Tbsp a gallon is 4.5 Tbsp in 3 gal', () => {
    const use = { amount: q('1.5', 'tbsp'), perMix: q(1, 'gal'), mix: q(3, 'gal') };
    expect(written(productForMix(use))).toBe(written(q('4.5', 'tbsp')));
  });

  it('1 qt an acre at 40 gal an acre is 0.8 fl oz a gallon', () => {
    expect(written(productPerGallon({ perAcre: q(32, 'fl-oz'), rate: q(40, 'gal/acre') }))).toBe(
      written(q('0.8', 'fl-oz')),
    );
  });

  it('2 gal on 8 shrubs is 7 gal on 28', () => {
    const trial = { used: q(2, 'gal'), tried: q(8, 'count'), all: q(28, 'count') };
    expect(written(mixFromWaterTrial(trial))).toBe(written(q(7, 'gal')));
  });

  it('2% of 3 gal is 7.68 fl oz', () => {
    const product = productForPercentVolume({ percent: q(2, 'percent'), mix: q(3, 'gal') });
    expect(compare(product, q('7.68', 'fl-oz'))).toBe(0);
  });

  it('a ratio made up to takes less than one added to', () => {
    const gallon = { volume: q(128, 'fl-oz'), waterParts: rational(15) };
    expect(written(productForRatio({ ...gallon, convention: 'made-up-to' }))).toBe(written(q(8, 'fl-oz')));
    expect(compare(productForRatio({ ...gallon, convention: 'added-to' }), q(8, 'fl-oz'))).toBe(1);
  });

  it('thinning: 10% from 40% takes a quarter', () => {
    const use = { amount: q(8, 'gal'), wanted: q(10, 'percent'), stock: q(40, 'percent') };
    expect(written(stockForDilution(use))).toBe(written(q(2, 'gal')));
  });
});

describe('active ingredient', () => {
  it('liquid: there and back changes nothing', () => {
    fc.assert(
      fc.property(some, some, (pounds, perGallon) => {
        const strength = q(perGallon, 'lb/gal');
        const product = liquidForActive({ active: q(pounds, 'lb'), strength });
        expect(written(activeInLiquid({ product, strength }))).toBe(written(q(pounds, 'lb')));
      }),
    );
  });

  it('dry: there and back changes nothing', () => {
    fc.assert(
      fc.property(some, fc.integer({ min: 1, max: 100 }), (pounds, percent) => {
        const share = q(percent, 'percent');
        const product = dryForActive({ active: q(pounds, 'lb'), percent: share });
        expect(written(activeInDry({ product, percent: share }))).toBe(written(q(pounds, 'lb')));
      }),
    );
  });

  it('10 gal of 1% from a 50% powder takes 1.668 lb', () => {
    const use = { mix: q(10, 'gal'), wanted: q(1, 'percent'), product: q(50, 'percent') };
    expect(written(powderForPercentWeight(use))).toBe(written(q('1.668', 'lb')));
  });

  it('1 lb in 100 gal of water at 8 lb a gallon is 1,250 ppm', () => {
    const mix = { dissolved: q(1, 'lb'), water: q(100, 'gal'), density: q(8, 'lb/gal') };
    expect(written(partsPerMillion(mix))).toBe(written(q(1250, 'ppm')));
  });
});

describe('tanks', () => {
  it('loads and the last one always make up the mix', () => {
    fc.assert(
      fc.property(some, some, (mixGal, tankGal) => {
        const job = { mix: q(mixGal, 'gal'), tank: q(tankGal, 'gal') };
        const last = lastLoad(job);
        const full = scale(job.tank, tankLoads(job).value.sub(1));
        expect(written(add(full, last))).toBe(written(job.mix));
        expect(compare(last, q(0, 'gal'))).toBe(1);
        expect(compare(last, job.tank)).toBeLessThanOrEqual(0);
      }),
    );
  });

  it('12 gal in a 4 gal tank are three full loads', () => {
    const job = { mix: q(12, 'gal'), tank: q(4, 'gal') };
    expect(written(tankLoads(job))).toBe(written(q(3, 'count')));
    expect(written(lastLoad(job))).toBe(written(q(4, 'gal')));
  });

  it('what a tank covers takes a tank of mix', () => {
    fc.assert(
      fc.property(some, some, (tankGal, perAcre) => {
        const sprayer = { tank: q(tankGal, 'gal'), rate: q(perAcre, 'gal/acre') };
        expect(written(mixForArea({ rate: sprayer.rate, area: areaPerTank(sprayer) }))).toBe(written(sprayer.tank));
      }),
    );
  });

  it('a 10 in band on 40 in rows takes a quarter of the rate', () => {
    const spray = { rate: q(20, 'gal/acre'), band: q(10, 'in'), row: q(40, 'in') };
    expect(written(fieldRateFromBand(spray))).toBe(written(q(5, 'gal/acre')));
  });
});

describe('what has no meaning is refused', () => {
  const gal = q(1, 'gal');
  it.each([
    ['no mix', () => productForMix({ amount: q(1, 'tbsp'), perMix: gal, mix: q(0, 'gal') })],
    ['no sprayer rate', () => productPerGallon({ perAcre: q(1, 'qt'), rate: q(0, 'gal/acre') })],
    ['no plants tried', () => mixFromWaterTrial({ used: gal, tried: q(0, 'count'), all: q(5, 'count') })],
    ['no percent', () => productForPercentVolume({ percent: q(0, 'percent'), mix: gal })],
    ['a volume for a percent', () => productForPercentVolume({ percent: gal, mix: gal })],
    ['no parts', () => productForRatio({ volume: gal, waterParts: rational(0), convention: 'added-to' })],
    [
      'a mix stronger than its stock',
      () => stockForDilution({ amount: gal, wanted: q(5, 'percent'), stock: q(4, 'percent') }),
    ],
    ['no strength', () => liquidForActive({ active: q(1, 'lb'), strength: q(0, 'lb/gal') })],
    ['no product', () => activeInLiquid({ product: q(0, 'gal'), strength: q(1, 'lb/gal') })],
    ['no active', () => dryForActive({ active: q(0, 'lb'), percent: q(5, 'percent') })],
    ['a negative percent', () => activeInDry({ product: q(1, 'lb'), percent: q(-5, 'percent') })],
    [
      'no powder strength',
      () => powderForPercentWeight({ mix: gal, wanted: q(1, 'percent'), product: q(0, 'percent') }),
    ],
    ['no water', () => partsPerMillion({ dissolved: q(1, 'oz'), water: q(0, 'gal') })],
    ['no tank', () => tankLoads({ mix: gal, tank: q(0, 'gal') })],
    ['a negative tank', () => lastLoad({ mix: gal, tank: q(-1, 'gal') })],
    ['no area', () => mixForArea({ rate: q(20, 'gal/acre'), area: q(0, 'acre') })],
    ['no rate', () => areaPerTank({ tank: gal, rate: q(0, 'gal/acre') })],
    [
      'a band wider than its row',
      () => fieldRateFromBand({ rate: q(20, 'gal/acre'), band: q(50, 'in'), row: q(40, 'in') }),
    ],
  ])('%s', (_, call) => {
    expect(call).toThrow(RangeError);
  });
});
