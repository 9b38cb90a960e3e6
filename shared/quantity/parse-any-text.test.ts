import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatQuantity, unitWord } from './format.ts';
import { parseQuantity, type ParseProblem } from './parse.ts';
import { quantity } from './quantity.ts';
import { rational } from './rational.ts';
import { spellings } from './unit-aliases.ts';
import { units, type UnitKey } from './units.ts';

const keys = Object.keys(units) as UnitKey[];
const locales = ['en', 'es'] as const;
const problems: readonly ParseProblem[] = [
  'empty',
  'no-number',
  'two-numbers',
  'unknown-unit',
  'zero-denominator',
  'too-long',
  'mixed-kinds',
  'ambiguous-comma',
  'not-a-number',
];

/** What reading a text comes to: a unit or a problem. */
function outcome(text: string, locale: 'en' | 'es', defaultUnit: UnitKey = 'fl-oz'): UnitKey | ParseProblem {
  const result = parseQuantity(text, { locale, defaultUnit });
  return result.ok ? result.quantity.unit : result.problem;
}
const promised = new Set<string>([...keys, ...problems]);
const anyLocale = fc.constantFrom(...locales);

// Text made of the pieces of quantities gets far deeper than arbitrary characters do.
const words =
  '0|1|2|3|5|9|1/2|1 1/4|½|2.5|2,5|1,250|0/0| |  |-|–|+|/|.|,|$|%|°|T|t|fl oz|oz|gal|qt|ft|\'|"|²|per|por|1,000 sq ft|and|y|of a|de|e|~|\u00a0|\u200b|\ud800|ﷺ|İ';
const pieces = fc.constantFrom(...words.split('|'));

describe('any text', () => {
  it('never throws on arbitrary characters', () => {
    fc.assert(
      fc.property(
        fc.string({ unit: 'binary', maxLength: 300 }),
        anyLocale,
        fc.constantFrom(...keys),
        (text, locale, unit) => {
          expect(promised).toContain(outcome(text, locale, unit));
        },
      ),
      { numRuns: 2000 },
    );
  });
  it('never throws on what looks like quantities', () => {
    fc.assert(
      fc.property(fc.array(pieces, { maxLength: 30 }), anyLocale, fc.constantFrom(...keys), (parts, locale, unit) => {
        expect(promised).toContain(outcome(parts.join(''), locale, unit));
      }),
      { numRuns: 3000 },
    );
  });
  it('refuses 10,000 characters of anything unread', () => {
    const long = fc.string({ unit: 'binary', minLength: 10_000, maxLength: 10_100, size: 'max' });
    fc.assert(
      fc.property(long, (text) => {
        expect(outcome(text, 'en')).toBe('too-long');
      }),
      { numRuns: 20 },
    );
  });

  // The longest entries that are read at all, each made to lead one pattern as far astray as it can go.
  it.each(['1', '1 ', '1,', '1.', '/', '1/', '1/1 ', '-', '$', 'T', 'a.', '.', '½', 'ﷺ', '…', ' ', '1y', '1 gal per '])(
    'reads or refuses 200 and refuses 10,000 characters of "%s"',
    (piece) => {
      const of = (length: number) => piece.repeat(Math.ceil(length / piece.length)).slice(0, length);
      expect(problems).toContain(outcome(of(200), 'en'));
      expect(outcome(of(10_000), 'en')).toBe('too-long');
    },
  );
});

describe('what is written can be read', () => {
  const value = fc
    .tuple(fc.bigInt({ min: -(10n ** 9n), max: 10n ** 9n }), fc.constantFrom(1n, 2n, 4n, 8n, 10n, 16n, 100n, 1000n))
    .map(([top, bottom]) => rational(top, bottom));

  it('as decimals, in both languages', () => {
    fc.assert(
      fc.property(value, fc.constantFrom(...keys), anyLocale, (exact, unit, locale) => {
        const shown = formatQuantity(quantity(exact, unit), { locale, maxPlaces: 6 });
        const read = parseQuantity(shown, { locale, defaultUnit: unit });
        expect(read.ok && read.quantity.unit, shown).toBe(unit);
        expect(read.ok && read.quantity.value.equals(exact), shown).toBe(true);
      }),
      { numRuns: 1000 },
    );
  });
  it('as fractions', () => {
    const measure = fc
      .tuple(fc.nat(100_000), fc.constantFrom(1, 2, 3, 4, 8, 16))
      .map(([top, bottom]) => rational(top, bottom));
    const unmoney = keys.filter((key) => !key.startsWith('usd'));
    fc.assert(
      fc.property(measure, fc.constantFrom(...unmoney), anyLocale, (exact, unit, locale) => {
        const shown = formatQuantity(quantity(exact, unit), { locale, style: 'fraction' });
        const read = parseQuantity(shown, { locale, defaultUnit: unit });
        expect(read.ok && read.quantity.unit, shown).toBe(unit);
        expect(read.ok && read.quantity.value.equals(exact), shown).toBe(true);
      }),
      { numRuns: 1000 },
    );
  });
  it.each(keys.filter((key) => key !== 'count'))('with the name of %s written out', (unit) => {
    for (const locale of locales) {
      for (const many of [1, 2]) {
        const shown = `${many} ${unitWord(unit, { locale, value: rational(many) })}`;
        const read = parseQuantity(shown, { locale, defaultUnit: 'count' });
        expect(read.ok && read.quantity.unit, shown).toBe(unit);
      }
    }
  });
});

describe('spellings', () => {
  it('belong to one unit each', () => {
    const all = Object.values(spellings).flatMap((row) => row.split('|'));
    expect(all.filter((spelling, place) => all.indexOf(spelling) !== place)).toEqual([]);
  });
  it.each(Object.entries(spellings) as [UnitKey, string][])('of %s are understood after a number', (unit, row) => {
    for (const spelling of row.split('|')) {
      const read = parseQuantity(`2 ${spelling}`, { locale: 'en', defaultUnit: 'count' });
      expect(read.ok && read.quantity.unit, spelling).toBe(unit);
      const capitals = parseQuantity(`2 ${spelling.toUpperCase()}`, { locale: 'en', defaultUnit: 'count' });
      const expected = spelling === 't' ? 'tbsp' : unit;
      expect(capitals.ok && capitals.quantity.unit, spelling.toUpperCase()).toBe(expected);
    }
  });
});
