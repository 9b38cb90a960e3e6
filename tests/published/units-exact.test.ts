import { describe, expect, it } from 'vitest';
import { inUnit, quantity } from '../../shared/quantity/quantity.ts';
import { rational } from '../../shared/quantity/rational.ts';
import type { UnitKey } from '../../shared/quantity/units.ts';

// Figures that these publications give as exact, and what follows from them by whole numbers.
// Handbook 44, Appendix C: General Tables of Units of Measurement, National Institute of Standards and Technology, 2012.
// Special Publication 811, Guide for the Use of the International System of Units, same institute, 2008, Appendix B.8.
const exact: readonly (readonly [value: string, from: UnitKey, figure: string, to: UnitKey])[] = [
  // Length: 1 in = 25.4 mm (SP 811), 1 ft = 0.304 8 m, 1 mile = 5,280 ft (Handbook 44).
  ['1', 'in', '25.4', 'mm'],
  ['1', 'ft', '0.3048', 'm'],
  ['1', 'ft', '12', 'in'],
  ['1', 'yd', '3', 'ft'],
  ['1', 'mi', '5280', 'ft'],
  ['1', 'mi', '1609.344', 'm'],
  // Area (Handbook 44, international foot).
  ['1', 'sq-ft', '144', 'sq-in'],
  ['1', 'sq-yd', '9', 'sq-ft'],
  ['1', 'acre', '43560', 'sq-ft'],
  ['1', 'acre', '4046.8564224', 'sq-m'],
  ['1', 'sq-mi', '640', 'acre'],
  ['1', 'ha', '10000', 'sq-m'],
  // Liquid volume (Handbook 44): 1 gal = 231 cu in = 4 qt = 8 pt = 16 cups = 128 fl oz.
  ['1', 'gal', '231', 'cu-in'],
  ['1', 'gal', '3.785411784', 'l'],
  ['1', 'gal', '4', 'qt'],
  ['1', 'gal', '8', 'pt'],
  ['1', 'gal', '16', 'cup'],
  ['1', 'gal', '128', 'fl-oz'],
  ['1', 'cup', '8', 'fl-oz'],
  ['1', 'cup', '1/2', 'pt'],
  ['1', 'cup', '236.5882365', 'ml'],
  ['1', 'pt', '473.176473', 'ml'],
  ['1', 'qt', '946.352946', 'ml'],
  ['1', 'fl-oz', '29.5735295625', 'ml'],
  ['1', 'fl-oz', '2', 'tbsp'],
  ['1', 'tbsp', '3', 'tsp'],
  ['1', 'tbsp', '14.78676478125', 'ml'],
  ['1', 'tsp', '4.92892159375', 'ml'],
  ['1', 'cu-ft', '1728', 'cu-in'],
  // Weight (Handbook 44, avoirdupois).
  ['1', 'lb', '453.59237', 'g'],
  ['1', 'lb', '16', 'oz'],
  ['1', 'oz', '28.349523125', 'g'],
  ['1', 'ton', '2000', 'lb'],
  // Speed, from the mile and the foot.
  ['1', 'mph', '88', 'ft/min'],
  ['1', 'mph', '22/15', 'ft/s'],
  ['1', 'mph', '1.609344', 'km/h'],
  // Pressure, from the pound, standard gravity and the inch (SP 811).
  ['1', 'bar', '100', 'kpa'],
  ['0.00064516', 'psi', '0.004448221615260500', 'kpa'],
  // Temperature (SP 811).
  ['32', 'f', '0', 'c'],
  ['98.6', 'f', '37', 'c'],
  // An acre has 43.56 thousand sq ft.
  ['43.56', 'lb/acre', '1', 'lb/1000-sq-ft'],
  ['43.56', 'gal/acre', '1', 'gal/1000-sq-ft'],
  ['43.56', 'usd/acre', '1', 'usd/1000-sq-ft'],
];

describe('figures published as exact', () => {
  it.each(exact)('%s %s is %s %s', (value, from, figure, to) => {
    const [top, bottom] = figure.split('/') as [string, string | undefined];
    expect(inUnit(quantity(value, from), to).toFraction()).toBe(
      rational(top)
        .div(bottom ?? '1')
        .toFraction(),
    );
  });
});

describe('figures that the trade reckons with', () => {
  it('1/128 acre is 340.3125 sq ft, which the trade calls 340', () => {
    expect(inUnit(quantity(rational(1, 128), 'acre'), 'sq-ft').equals('340.3125')).toBe(true);
  });
  it('5,940 in "gal/acre = 5,940 x gal/min / (mph x inches)" is 43,560 x 12 / 88', () => {
    const squareFeet = inUnit(quantity(1, 'acre'), 'sq-ft');
    const inches = inUnit(quantity(1, 'ft'), 'in');
    const feetAMinute = inUnit(quantity(1, 'mph'), 'ft/min');
    expect(squareFeet.mul(inches).div(feetAMinute).toFraction()).toBe('5940');
  });
});
