import { describe, expect, it } from 'vitest';
import { quantity } from '../../../shared/quantity/quantity.ts';
import { labelFaults } from './check-label.ts';
import { korrin2l } from './korrin-2l.ts';
import { labels } from './labels.ts';
import { labelsWithRate, oneFigure } from './pick.ts';
import { formulations, type PracticeLabel } from './practice-label.ts';
import { percentMix, perAcre, perGallon, perSqFt, readyToUse } from './rate-lines.ts';

const head = { key: 'x', site: 'lawn', heading: { en: 'Lawns', es: 'Césped' } } as const;
const withRate = (rate: PracticeLabel['rates'][number]): PracticeLabel => ({ ...korrin2l, rates: [rate] });

describe('practice labels', () => {
  it('all stay inside the ranges', () => {
    expect(labels.flatMap(labelFaults)).toEqual([]);
  });

  it('have keys and numbers of their own and cover every formulation', () => {
    expect(new Set(labels.map((label) => label.key)).size).toBe(labels.length);
    expect(new Set(labels.map((label) => label.number)).size).toBe(labels.length);
    expect(new Set(labels.map((label) => label.formulation))).toEqual(new Set(formulations));
  });

  it('give each kind of family five labels or more', () => {
    const different = (pairs: readonly (readonly [PracticeLabel, unknown])[]) =>
      new Set(pairs.map(([label]) => label)).size;
    const sqFtLiquid = labelsWithRate(
      'area',
      (rate) => rate.area.unit === 'sq-ft' && rate.water !== undefined && rate.product.least.unit === 'fl-oz',
    );
    const acreLiquid = labelsWithRate(
      'area',
      (rate) =>
        rate.area.unit === 'acre' && ['pt', 'qt'].includes(rate.product.least.unit) && !!oneFigure(rate.product),
    );
    const granules = labelsWithRate('area', (rate, label) => label.formulation === 'G' && !!oneFigure(rate.product));
    for (const pairs of [sqFtLiquid, acreLiquid, granules, labelsWithRate('mix'), labelsWithRate('percent')]) {
      expect(different(pairs)).toBeGreaterThanOrEqual(5);
    }
  });
});

describe('a label outside the ranges is refused', () => {
  it.each([
    ['too much liquid for 1,000 sq ft', perSqFt({ ...head, product: '6.5', unit: 'fl-oz', waterGal: '1' })],
    ['too much for 1,000 sq ft, printed for 500', perSqFt({ ...head, product: '3.5', unit: 'fl-oz', sqFt: '500' })],
    ['too little water', perSqFt({ ...head, product: '1', unit: 'fl-oz', waterGal: '0.25' })],
    ['dry product as heavy as granules', perSqFt({ ...head, product: '3', unit: 'lb' })],
    ['too much for an acre', perAcre({ ...head, product: '5', unit: 'qt' })],
    ['too much water for an acre', perAcre({ ...head, product: '1', unit: 'qt', waterGal: '120' })],
    ['too strong a spot mix', perGallon({ ...head, product: '7', unit: 'tbsp' })],
    ['too high a percent', percentMix({ ...head, percent: '6' })],
    ['a range upside down', percentMix({ ...head, percent: ['2', '1'] })],
    ['a concentrate used as it comes', readyToUse(head)],
  ])('%s', (_, rate) => {
    expect(labelFaults(withRate(rate))).toHaveLength(1);
  });

  it('names label, line and range', () => {
    expect(labelFaults(withRate(percentMix({ ...head, percent: '6' })))).toEqual([
      'korrin-2l: x: percent by volume: outside 0.25 to 5 percent',
    ]);
  });

  it('also for a number that is not of the invented series, no rate, or one key twice', () => {
    expect(labelFaults({ ...korrin2l, number: '524-1' })).toHaveLength(1);
    expect(labelFaults({ ...korrin2l, rates: [] })).toHaveLength(1);
    expect(labelFaults({ ...korrin2l, rates: [...korrin2l.rates, ...korrin2l.rates] })).toHaveLength(1);
    expect(labelFaults({ ...korrin2l, strength: quantity('2', 'lb/gal') })).toEqual([]);
  });
});
