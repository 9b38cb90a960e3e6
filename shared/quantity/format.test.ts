import { describe, expect, it } from 'vitest';
import { formatMeasure, formatNumber, formatQuantity, unitSymbol, unitWord } from './format.ts';
import { quantity } from './quantity.ts';
import { rational } from './rational.ts';
import { units, type UnitKey } from './units.ts';

const keys = Object.keys(units) as UnitKey[];

describe('formatNumber', () => {
  it.each([
    ['1600', {}, '1,600'],
    ['1234567.891', {}, '1,234,567.891'],
    ['999', {}, '999'],
    ['2.5', { places: 2 }, '2.50'],
    ['2.5', { places: 0 }, '3'],
    ['-2.5', { places: 0 }, '−3'],
    ['1.005', { places: 2 }, '1.01'],
    ['0.99996', {}, '1'],
    ['-0.00001', {}, '0'],
    ['0.125', { maxPlaces: 2 }, '0.13'],
    ['12', { maxPlaces: 2 }, '12'],
    ['1250.5', { locale: 'es' }, '1,250.5'],
  ] as const)('%s with %o is %s', (value, options, expected) => {
    expect(formatNumber(rational(value), options)).toBe(expected);
  });
  it('rounds what no decimal holds', () => {
    expect(formatNumber(rational(2, 3))).toBe('0.6667');
    expect(formatNumber(rational(1, 3), { places: 1 })).toBe('0.3');
  });
});

describe('formatMeasure', () => {
  it.each([
    [5, 2, '2 1/2'],
    [3, 4, '3/4'],
    [1, 3, '1/3'],
    [11, 3, '3 2/3'],
    [9, 8, '1 1/8'],
    [5, 16, '5/16'],
    [6, 1, '6'],
    [2501, 2, '1,250 1/2'],
    [-5, 4, '−1 1/4'],
    [-3, 4, '−3/4'],
    [1, 5, '0.2'],
    [1, 7, '0.1429'],
    [0, 1, '0'],
  ])('%i over %i is %s', (top, bottom, expected) => {
    expect(formatMeasure(rational(top, bottom))).toBe(expected);
  });
  it('keeps to the marks a tool has', () => {
    expect(formatMeasure(rational(3, 8), { maxDenominator: 4 })).toBe('0.375');
    expect(formatMeasure(rational(3, 4), { maxDenominator: 4 })).toBe('3/4');
  });
});

describe('formatQuantity', () => {
  it.each([
    ['2.4', 'fl-oz', {}, '2.4 fl oz'],
    ['2.5', 'tbsp', { style: 'fraction' }, '2 1/2 Tbsp'],
    ['1600', 'sq-ft', {}, '1,600 sq ft'],
    ['2', 'percent', {}, '2%'],
    ['70', 'f', {}, '70 °F'],
    ['90', 'deg', {}, '90°'],
    ['13.4', 'usd', {}, '$13.40'],
    ['12', 'usd', {}, '$12'],
    ['-12.5', 'usd', {}, '−$12.50'],
    ['1250.5', 'usd/acre', {}, '$1,250.50 per acre'],
    ['12', 'usd', { places: 2 }, '$12.00'],
    ['1', 'acre', {}, '1 acre'],
    ['0.5', 'acre', {}, '0.5 acre'],
    ['0', 'acre', {}, '0 acres'],
    ['3', 'acre', {}, '3 acres'],
    ['1.00001', 'acre', {}, '1 acre'],
    ['1.5', 'acre', { style: 'fraction' }, '1 1/2 acres'],
    ['0.2', 'tbsp', { style: 'fraction', places: 2 }, '0.20 Tbsp'],
    ['40', 'gal/acre', {}, '40 gal per acre'],
    ['1.5', 'fl-oz/1000-sq-ft', {}, '1.5 fl oz per 1,000 sq ft'],
    ['3', 'count', {}, '3'],
    ['3', 'sq-ft', { locale: 'es' }, '3 pies²'],
    ['1', 'sq-ft', { locale: 'es' }, '1 pie²'],
    ['2', 'fl-oz', { locale: 'es' }, '2 oz líq'],
    ['2', 'tbsp', { locale: 'es' }, '2 cdas'],
    ['3', 'mph', { locale: 'es' }, '3 mi/h'],
    ['40', 'gal/acre', { locale: 'es' }, '40 gal por acre'],
  ] as const)('%s %s with %o is "%s"', (value, unit, options, expected) => {
    expect(formatQuantity(quantity(value, unit), options)).toBe(expected);
  });
});

describe('names of units', () => {
  it('has a symbol and a word for every unit but plain counts, in both languages', () => {
    for (const locale of ['en', 'es'] as const) {
      for (const unit of keys.filter((key) => key !== 'count')) {
        expect(unitSymbol(unit, { locale })).not.toBe('');
        expect(unitWord(unit, { locale })).toMatch(/^[\p{L}0-9, ]+$/u);
        expect(unitSymbol(unit, { locale })).not.toMatch(/undefined|-/);
      }
      expect(unitSymbol('count', { locale })).toBe('');
    }
  });
  it('writes units out, one and many', () => {
    expect(unitWord('fl-oz', { locale: 'en' })).toBe('fluid ounces');
    expect(unitWord('tbsp', { locale: 'en', value: rational(1) })).toBe('tablespoon');
    expect(unitWord('sq-ft', { locale: 'en', value: rational(2) })).toBe('square feet');
    expect(unitWord('fl-oz', { locale: 'es' })).toBe('onzas líquidas');
    expect(unitWord('oz', { locale: 'en' })).toBe('ounces by weight');
    expect(unitWord('gal/1000-sq-ft', { locale: 'en' })).toBe('gallons per 1,000 square feet');
  });
  it('never writes two units of a language alike', () => {
    for (const locale of ['en', 'es'] as const) {
      expect(new Set(keys.map((unit) => unitSymbol(unit, { locale }))).size).toBe(keys.length);
      expect(new Set(keys.map((unit) => unitWord(unit, { locale }))).size).toBe(keys.length);
    }
  });
});
