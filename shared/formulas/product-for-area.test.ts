import { describe, expect, it } from 'vitest';
import { compare, quantity } from '../quantity/quantity.ts';
import { perAcreToPerThousand } from './per-acre-to-per-thousand.ts';
import { productForArea } from './product-for-area.ts';

const sqFt = (value: number) => quantity(value, 'sq-ft');

describe('product for an area', () => {
  it('1.5 fl oz for 1,000 sq ft is 2.4 fl oz for 1,600 sq ft', () => {
    const needed = productForArea({ amount: quantity('1.5', 'fl-oz'), labelArea: sqFt(1000), area: sqFt(1600) });
    expect(needed).toMatchObject({ unit: 'fl-oz' });
    expect(compare(needed, quantity('2.4', 'fl-oz'))).toBe(0);
  });

  it('a rate per acre serves an area in square feet, exactly', () => {
    const needed = productForArea({ amount: quantity(2, 'qt'), labelArea: quantity(1, 'acre'), area: sqFt(10890) });
    expect(compare(needed, quantity('0.5', 'qt'))).toBe(0);
  });

  it('weights stay weights', () => {
    const needed = productForArea({ amount: quantity(3, 'lb'), labelArea: sqFt(1000), area: sqFt(2500) });
    expect(compare(needed, quantity('7.5', 'lb'))).toBe(0);
  });

  it('an amount per acre divided by 43.56 is the amount per 1,000 sq ft', () => {
    const perThousand = perAcreToPerThousand({ perAcre: quantity('43.56', 'fl-oz') });
    expect(compare(perThousand, quantity(1, 'fl-oz'))).toBe(0);
  });

  it.each([
    ['no amount', { amount: quantity(0, 'fl-oz'), labelArea: sqFt(1000), area: sqFt(10) }],
    ['no label area', { amount: quantity(1, 'fl-oz'), labelArea: sqFt(0), area: sqFt(10) }],
    ['a negative area', { amount: quantity(1, 'fl-oz'), labelArea: sqFt(1000), area: sqFt(-10) }],
    ['a length for an area', { amount: quantity(1, 'fl-oz'), labelArea: sqFt(1000), area: quantity(10, 'ft') }],
  ])('%s is refused with a RangeError', (_, use) => {
    expect(() => productForArea(use)).toThrow(RangeError);
  });
});
