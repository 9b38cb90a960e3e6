import type { Quantity } from './quantity.ts';
import { rational, type Rational } from './rational.ts';
import { roundToStep } from './round.ts';
import { unitName } from './unit-names.ts';
import type { UnitKey } from './units.ts';

type Locale = 'en' | 'es';

const one = rational(1);

function withCommas(digits: string): string {
  return digits.replace(/\B(?=(\d{3})+$)/g, ',');
}

/**
 * A number with thousands commas and a decimal point, rounded exactly. `places` fixes the decimals; `maxPlaces` (default
 * 4) bounds them and drops trailing zeros. Crews in both languages read US figures, so the locale changes nothing here.
 */
export function formatNumber(
  value: Rational,
  options: { places?: number | undefined; maxPlaces?: number | undefined; locale?: Locale | undefined } = {},
): string {
  const places = options.places ?? options.maxPlaces ?? 4;
  const power = 10n ** BigInt(places);
  const scaled = roundToStep(value.abs().mul(rational(power)), one).n;
  const whole = withCommas(String(scaled / power));
  let decimals = places === 0 ? '' : String(scaled % power).padStart(places, '0');
  if (options.places === undefined) decimals = decimals.replace(/0+$/, '');
  const sign = value.compare(0) < 0 && scaled !== 0n ? '−' : '';
  return `${sign}${whole}${decimals === '' ? '' : `.${decimals}`}`;
}

const denominators = new Set([1n, 2n, 3n, 4n, 8n, 16n]);

/** The number as a fraction people measure ("2 1/2", "3/4"); a decimal when none fits exactly. */
export function formatMeasure(value: Rational, options: { maxDenominator?: number } = {}): string {
  const most = BigInt(options.maxDenominator ?? 16);
  if (value.compare(0) < 0 || !denominators.has(value.d) || value.d > most) return formatNumber(value);
  const whole = value.n / value.d;
  const rest = value.n % value.d;
  if (rest === 0n) return withCommas(String(whole));
  return whole === 0n ? `${rest}/${value.d}` : `${withCommas(String(whole))} ${rest}/${value.d}`;
}

function isMany(value: Rational | undefined): boolean {
  // "1 acre", "1/2 acre" and "0.5 acre" are one; everything else, and a bare unit, is many.
  return value === undefined || value.abs().compare(1) > 0 || value.compare(0) === 0;
}

/** The unit as written after a number: "sq ft", "Tbsp", "gal per acre"; empty for plain counts. */
export function unitSymbol(unit: UnitKey, options: { locale?: Locale | undefined; value?: Rational | undefined } = {}): string {
  return unitName({ unit, locale: options.locale ?? 'en', form: 'symbol', many: isMany(options.value) });
}

/** The unit written out: "fluid ounces", "tablespoon", "onzas líquidas". */
export function unitWord(unit: UnitKey, options: { locale: Locale; value?: Rational | undefined }): string {
  return unitName({ unit, locale: options.locale, form: 'word', many: isMany(options.value) });
}

/** A quantity as people write it: "2.4 fl oz", "2 1/2 Tbsp", "1,600 sq ft", "2%", "$13.40", "1 acre". */
export function formatQuantity(
  q: Quantity,
  options: {
    style?: 'decimal' | 'fraction' | undefined;
    places?: number | undefined;
    maxPlaces?: number | undefined;
    locale?: Locale | undefined;
  } = {},
): string {
  const locale = options.locale ?? 'en';
  const decimal = { places: options.places, maxPlaces: options.maxPlaces, locale };
  const number = options.style === 'fraction' ? formatMeasure(q.value) : formatNumber(q.value, decimal);
  if (q.unit === 'usd' || q.unit.startsWith('usd/')) {
    const cents = options.places === undefined && options.maxPlaces === undefined ? formatNumber(q.value, { places: q.value.d === 1n ? 0 : 2 }) : number;
    const rest = unitName({ unit: q.unit, locale, form: 'symbol', many: true }).replace('$', '');
    return `$${cents}${rest}`;
  }
  if (q.unit === 'percent' || q.unit === 'deg') return `${number}${unitSymbol(q.unit, { locale })}`;
  const symbol = unitSymbol(q.unit, { locale, value: q.value });
  return symbol === '' ? number : `${number} ${symbol}`;
}
