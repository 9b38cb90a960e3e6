import { describe, expect, it } from 'vitest';
import { parseQuantity } from './parse.ts';
import type { UnitKey } from './units.ts';

/** "1 1/4 fl-oz" for what was read, with "*" when the unit was not typed; the problem in brackets when unreadable. */
function reading(text: string, defaultUnit: UnitKey = 'fl-oz', locale: 'en' | 'es' = 'en'): string {
  const result = parseQuantity(text, { locale, defaultUnit });
  if (!result.ok) return `[${result.problem}]`;
  const { value, unit } = result.quantity;
  return `${value.toFraction(true)} ${unit}${result.unitGiven ? '' : '*'}`;
}

describe('numbers as people type them', () => {
  it.each([
    ['1,250', '1250'],
    ['1,250,000', '1250000'],
    ['1,250.5', '1250 1/2'],
    ['1.250,5', '1250 1/2'],
    ['1.250.000', '1250000'],
    ['1.250', '1 1/4'],
    ['2.5', '2 1/2'],
    ['2,5', '2 1/2'],
    ['0,125', '1/8'],
    ['1,2345', '1 469/2000'],
    ['.5', '1/2'],
    [',5', '1/2'],
    ['5.', '5'],
    ['5,', '5'],
    ['007', '7'],
    ['1 1/4', '1 1/4'],
    ['1  1/4', '1 1/4'],
    ['1-1/4', '1 1/4'],
    ['1 and 1/4', '1 1/4'],
    ['1 y 1/4', '1 1/4'],
    ['1¼', '1 1/4'],
    ['1 ¼', '1 1/4'],
    ['⅞', '7/8'],
    ['10 1⁄2', '10 1/2'],
    ['5/4', '1 1/4'],
    ['5 / 4', '1 1/4'],
    ['1,250 1/2', '1250 1/2'],
    ['2\u00a0½', '2 1/2'],
    ['１２', '12'],
    ['-5', '-5'],
    ['−5', '-5'],
    ['–5', '-5'],
    ['- 1 1/4', '-1 1/4'],
    ['+5', '5'],
    ['~5', '5'],
    ['= 5', '5'],
    ['≈5', '5'],
    ['about 5', '5'],
    ['aprox. 5', '5'],
    ['0', '0'],
  ])('%s is %s', (text, value) => {
    expect(reading(text)).toBe(`${value} fl-oz*`);
    expect(reading(text, 'fl-oz', 'es')).toBe(`${value} fl-oz*`);
  });
});

describe('one quantity with its unit', () => {
  it.each([
    ['1.25 fl oz', '1 1/4 fl-oz'],
    ['1 1/4 fl. oz.', '1 1/4 fl-oz'],
    ['1.25floz', '1 1/4 fl-oz'],
    ['37 mL', '37 ml'],
    ['1.25 oz', '1 1/4 oz'],
    ['5 oz.', '5 oz'],
    ['2 Tbsp', '2 tbsp'],
    ['2 TABLESPOONS', '2 tbsp'],
    ['2 tbs.', '2 tbsp'],
    ['2 T', '2 tbsp'],
    ['2T', '2 tbsp'],
    ['2 t', '2 tsp'],
    ['2 1/2t.', '2 1/2 tsp'],
    ['2 Teaspoons', '2 tsp'],
    ['100 sq. ft.', '100 sq-ft'],
    ['100 sq.ft.', '100 sq-ft'],
    ['100sqft', '100 sq-ft'],
    ['100 ft2', '100 sq-ft'],
    ['100 ft²', '100 sq-ft'],
    ['100 ft^2', '100 sq-ft'],
    ['100 square feet', '100 sq-ft'],
    ['3 acres', '3 acre'],
    ['0.5 ac.', '1/2 acre'],
    ['2%', '2 percent'],
    ['2 percent', '2 percent'],
    ['$13.40', '13 2/5 usd'],
    ['-$5', '-5 usd'],
    ['$12 per acre', '12 usd/acre'],
    ['40 gpa', '40 gal/acre'],
    ['40 gal/ac', '40 gal/acre'],
    ['40 gallons per acre', '40 gal/acre'],
    ['2 gal per 1,000 sq ft', '2 gal/1000-sq-ft'],
    ['2 gal/1000 sq. ft.', '2 gal/1000-sq-ft'],
    ['2 gal / 1000ft²', '2 gal/1000-sq-ft'],
    ['3 lb per 1,000', '3 lb/1000-sq-ft'],
    ['3 oz/1000 sq ft', '3 oz/1000-sq-ft'],
    ['2 fl oz per gal', '2 fl-oz/gal'],
    ['2 T/gal', '2 tbsp/gal'],
    ['2 fl oz per 1 gal', '2 fl-oz/gal'],
    ['2 pt per 100 gallons', '2 pt/100-gal'],
    ['0.4 gpm', '2/5 gal/min'],
    ['3 mph', '3 mph'],
    ['3 mi/h', '3 mph'],
    ['40 p.s.i.', '40 psi'],
    ['40 lb per sq in', '40 psi'],
    ['30 sec.', '30 s'],
    ['5 minutes', '5 min'],
    ['70 °F', '70 f'],
    ['70 ºF', '70 f'],
    ['3/4 of a gallon', '3/4 gal'],
    ['6 loads', '6 count'],
    ['2 onzas líquidas', '2 fl-oz'],
    ['2 oz líq', '2 fl-oz'],
    ['2 oz. líq.', '2 fl-oz'],
    ['2 onzas', '2 oz'],
    ['2,5 cdas', '2 1/2 tbsp'],
    ['2 cucharadas', '2 tbsp'],
    ['3 cdtas.', '3 tsp'],
    ['3/4 de galón', '3/4 gal'],
    ['2 galones por acre', '2 gal/acre'],
    ['100 pies²', '100 sq-ft'],
    ['100 pies cuadrados', '100 sq-ft'],
    ['20 pies', '20 ft'],
    ['2 galones por 1.000 pies cuadrados', '2 gal/1000-sq-ft'],
    ['3 libras', '3 lb'],
  ])('%s is %s', (text, expected) => {
    expect(reading(text, 'count')).toBe(expected);
    expect(reading(text, 'count', 'es')).toBe(expected);
  });

  it('reads a letter by what is asked', () => {
    expect(reading('20 c', 'fl-oz')).toBe('20 cup');
    expect(reading('20 c', 'f')).toBe('20 c');
    expect(reading('70°', 'f')).toBe('70 f');
    expect(reading('70 degrees', 'deg')).toBe('70 deg');
    expect(reading('5 m', 'ft')).toBe('5 m');
    expect(reading('5 m', 's')).toBe('5 min');
    expect(reading('40 pounds', 'psi')).toBe('40 psi');
    expect(reading('40 pounds per square inch', 'psi')).toBe('40 psi');
    expect(reading('40 pounds', 'oz')).toBe('40 lb');
  });
  it('never takes an ounce for a fluid ounce, whatever is asked', () => {
    for (const asked of ['fl-oz', 'gal', 'oz', 'ml'] as const) expect(reading('1.25 oz', asked)).toBe('1 1/4 oz');
  });
});

describe('quantities in steps of units', () => {
  it.each([
    ['1 qt 6 fl oz', '1 3/16 qt'],
    ['1 qt, 6 fl oz', '1 3/16 qt'],
    ['1 qt and 6 fl oz', '1 3/16 qt'],
    ['1 qt + 6 fl oz', '1 3/16 qt'],
    ['1qt6floz', '1 3/16 qt'],
    ['3 pintas y 4 oz líq', '3 1/4 pt'],
    ['3 gal 2 qt 1 pt', '3 5/8 gal'],
    ['1 1/2 cups and 1 Tbsp', '1 9/16 cup'],
    ['2 lb 3 oz', '2 3/16 lb'],
    ['5\' 6"', '5 1/2 ft'],
    ['5’ 6”', '5 1/2 ft'],
    ['5′6″', '5 1/2 ft'],
    ["5'6''", '5 1/2 ft'],
    ['5\'-6 1/2"', '5 13/24 ft'],
    ['-5 ft 6 in', '-5 1/2 ft'],
    ['1 T 1 t', '1 1/3 tbsp'],
    ['1 min 30 s', '1 1/2 min'],
  ])('%s is %s', (text, expected) => {
    expect(reading(text)).toBe(expected);
  });
  it.each([
    ['1.25 fl oz 37 mL', 'two-numbers'],
    ['1 fl oz 30 mL', 'two-numbers'],
    ['2.5 Tbsp 1.25 fl oz', 'two-numbers'],
    ['1.25 fl oz 2.5 Tbsp', 'two-numbers'],
    ['20 °C 68 °F', 'two-numbers'],
    ['3 gal -2 qt', 'two-numbers'],
    ['1 gal 2', 'two-numbers'],
    ['2 qt 3 oz', 'mixed-kinds'],
    ['5 gal 3 lb', 'mixed-kinds'],
    ['$5 gal', 'mixed-kinds'],
  ])('%s is refused: %s', (text, problem) => {
    expect(reading(text)).toBe(`[${problem}]`);
  });
});

describe('what cannot be read', () => {
  it.each([
    ['', 'empty'],
    [' \t\n', 'empty'],
    ['abc', 'no-number'],
    ['fl oz', 'no-number'],
    ['-', 'no-number'],
    ['...', 'no-number'],
    ['NaN', 'no-number'],
    ['1 2 3', 'two-numbers'],
    ['2-3', 'two-numbers'],
    ['1 - 1/4', 'two-numbers'],
    ['1.5 1/2', 'two-numbers'],
    ['5 zorks', 'unknown-unit'],
    ['5 gallop', 'unknown-unit'],
    ['5 gal maybe', 'unknown-unit'],
    ['1/0', 'zero-denominator'],
    ['1 1/00', 'zero-denominator'],
    ['1,2,3', 'ambiguous-comma'],
    ['1,234,56', 'ambiguous-comma'],
    ['1.2.3', 'not-a-number'],
    ['1/2/3', 'not-a-number'],
    ['2 x 3', 'unknown-unit'],
    ['2*3', 'not-a-number'],
    ['>5', 'not-a-number'],
    ['--5', 'not-a-number'],
    ['1e3', 'not-a-number'],
    ['1e999999999', 'not-a-number'],
    ['1:30', 'not-a-number'],
    ['9'.repeat(31), 'too-long'],
    [`1/${'9'.repeat(31)}`, 'too-long'],
    [`0.${'0'.repeat(40)}1`, 'too-long'],
    [`5 ${'z'.repeat(300)}`, 'too-long'],
  ])('%s: %s', (text, problem) => {
    expect(reading(text)).toBe(`[${problem}]`);
  });

  it('says what it stumbled over', () => {
    const result = parseQuantity('5 zorks', { locale: 'en', defaultUnit: 'gal' });
    expect(result).toEqual({ ok: false, problem: 'unknown-unit', detail: 'zorks' });
  });
});
