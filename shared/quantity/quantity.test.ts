import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { add, compare, convert, inUnit, quantity, ratio, sameKind, scale, subtract } from './quantity.ts';
import { rational } from './rational.ts';
import { kindOf, units, unitsOfKind, type UnitKey } from './units.ts';

const keys = Object.keys(units) as UnitKey[];
const anyValue = fc
  .tuple(fc.bigInt({ min: -(10n ** 12n), max: 10n ** 12n }), fc.bigInt({ min: 1n, max: 10n ** 6n }))
  .map(([top, bottom]) => rational(top, bottom));
const anyPair = fc
  .constantFrom(...keys)
  .chain((from) => fc.tuple(fc.constant(from), fc.constantFrom(...unitsOfKind(kindOf(from)))));

describe('convert', () => {
  it.each([
    ['1', 'gal', 'fl-oz', '128'],
    ['1', 'fl-oz', 'tbsp', '2'],
    ['1', 'tbsp', 'tsp', '3'],
    ['2.5', 'qt', 'cup', '10'],
    ['1', 'acre', 'sq-ft', '43560'],
    ['1', 'acre', '1000-sq-ft', '43.56'],
    ['1', 'lb', 'oz', '16'],
    ['1', 'mph', 'ft/min', '88'],
    ['43.56', 'fl-oz/acre', 'fl-oz/1000-sq-ft', '1'],
    ['1', 'gal/min', 'fl-oz/s', '32/15'],
    ['1', 'pt/100-gal', 'fl-oz/gal', '0.16'],
    ['212', 'f', 'c', '100'],
    ['-40', 'c', 'f', '-40'],
    ['0', 'c', 'f', '32'],
  ] as const)('%s %s in %s is %s', (value, from, to, expected) => {
    const [top, bottom] = expected.split('/') as [string, string | undefined];
    expect(inUnit(quantity(value, from), to).toFraction()).toBe(
      rational(top)
        .div(bottom ?? '1')
        .toFraction(),
    );
  });

  it('goes there and back exactly, for every pair of units of a kind', () => {
    fc.assert(
      fc.property(anyPair, anyValue, ([from, to], value) => {
        const back = convert(convert(quantity(value, from), to), from);
        expect(back.unit).toBe(from);
        expect(back.value.equals(value)).toBe(true);
      }),
      { numRuns: 500 },
    );
  });

  it('names both kinds when they differ', () => {
    expect(() => convert(quantity(1, 'oz'), 'fl-oz')).toThrow(RangeError);
    expect(() => convert(quantity(1, 'oz'), 'fl-oz')).toThrow(/weight.*volume/);
  });
});

describe('reckoning', () => {
  it('adds and takes away in the unit of the first', () => {
    const sum = add(quantity(1, 'qt'), quantity(6, 'fl-oz'));
    expect([sum.value.toFraction(), sum.unit]).toEqual(['19/16', 'qt']);
    const left = subtract(quantity(1, 'acre'), quantity(560, 'sq-ft'));
    expect([inUnit(left, 'sq-ft').toFraction(), left.unit]).toEqual(['43000', 'acre']);
  });
  it('scales and compares', () => {
    expect(scale(quantity('0.1', 'gal'), '3').value.toFraction()).toBe('3/10');
    expect(scale(quantity(3, 'gal'), rational(1, 3)).value.toFraction()).toBe('1');
    expect(ratio(quantity(1, 'acre'), quantity(1000, 'sq-ft')).toFraction()).toBe('1089/25');
    expect(compare(quantity(1, 'pt'), quantity(16, 'fl-oz'))).toBe(0);
    expect(compare(quantity(1, 'pt'), quantity(17, 'fl-oz'))).toBe(-1);
    expect(compare(quantity(1, 'lb'), quantity('453.59', 'g'))).toBe(1);
  });
  it('tells kinds apart', () => {
    expect(sameKind(quantity(1, 'oz'), quantity(1, 'lb'))).toBe(true);
    expect(sameKind(quantity(1, 'oz'), quantity(1, 'fl-oz'))).toBe(false);
    expect(() => add(quantity(1, 'oz'), quantity(1, 'fl-oz'))).toThrow(RangeError);
    expect(() => subtract(quantity(1, 'oz'), quantity(1, 'fl-oz'))).toThrow(RangeError);
    expect(() => ratio(quantity(1, 'oz'), quantity(1, 'fl-oz'))).toThrow(RangeError);
    expect(() => compare(quantity(1, 'oz'), quantity(1, 'fl-oz'))).toThrow(RangeError);
  });
  it('refuses a ratio to nothing', () => {
    expect(() => ratio(quantity(1, 'oz'), quantity(0, 'lb'))).toThrow(/zero/i);
  });

  it('takes away what it added, whatever the units', () => {
    fc.assert(
      fc.property(anyPair, anyValue, anyValue, ([one, other], a, b) => {
        const first = quantity(a, one);
        const second = quantity(b, other);
        fc.pre(!units[other].offset && !units[one].offset);
        expect(compare(subtract(add(first, second), second), first)).toBe(0);
        expect(compare(add(first, second), add(second, first))).toBe(0);
      }),
    );
  });
});
