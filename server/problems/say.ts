import { formatNumber, formatQuantity, unitSymbol, unitWord } from '../../shared/quantity/format.ts';
import type { Quantity } from '../../shared/quantity/quantity.ts';
import { rational, type Rational } from '../../shared/quantity/rational.ts';
import type { UnitKey } from '../../shared/quantity/units.ts';
import type { Locale, Text } from '../../shared/vocabulary.ts';

/** What can stand in a sentence: a quantity or number is written in the sentence's language, a text taken in it. */
export type Sayable = string | number | Rational | Quantity | Text;

function spoken(value: Sayable, locale: Locale): string {
  if (typeof value === 'string') return value;
  if (typeof value === 'number') return formatNumber(rational(value), { locale });
  if ('en' in value) return value[locale];
  if ('unit' in value) return formatQuantity(value, { locale });
  return formatNumber(value, { locale });
}

function sentence(locale: Locale) {
  return (words: TemplateStringsArray, ...values: readonly Sayable[]): string =>
    words.reduce((said, next, at) => said + spoken(values[at - 1] as Sayable, locale) + next);
}

/** Template tags: en`Take off ${area}.` writes the area as US English does. */
export const en = sentence('en');
/** The same tag for Spanish. */
export const es = sentence('es');

/** A quantity rounded to at most `maxPlaces`, for a sentence. */
export function rounded(value: Quantity, maxPlaces: number): Text {
  return {
    en: formatQuantity(value, { locale: 'en', maxPlaces }),
    es: formatQuantity(value, { locale: 'es', maxPlaces }),
  };
}

/** A quantity with its unit written out, as at first use: "62 feet", "1 fluid ounce". */
export function inWords(value: Quantity): Text {
  const text = (locale: Locale) =>
    `${formatNumber(value.value, { locale })} ${unitWord(value.unit, { locale, value: value.value })}`;
  return { en: text('en'), es: text('es') };
}

/** A unit as at first use, many of it: "square feet (sq ft)"; only the word where word and symbol are the same. */
export function unitFirst(unit: UnitKey): Text {
  const text = (locale: Locale) => withSymbol(unitWord(unit, { locale }), unitSymbol(unit, { locale }));
  return { en: text('en'), es: text('es') };
}

/** A quantity as at first use: "62 feet (ft)". */
export function firstUse(value: Quantity): Text {
  const text = (locale: Locale) => {
    const options = { locale, value: value.value };
    const unit = withSymbol(unitWord(value.unit, options), unitSymbol(value.unit, options));
    return `${formatNumber(value.value, { locale })} ${unit}`;
  };
  return { en: text('en'), es: text('es') };
}

function withSymbol(word: string, symbol: string): string {
  return word === symbol || symbol === '' ? word : `${word} (${symbol})`;
}
