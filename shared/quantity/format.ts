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

/** The number as a fraction people measure ("2 1/2", "3/4"); null when none fits exactly. */
function measured(value: Rational, maxDenominator: number): string | null {
  if (!denominators.has(value.d) || value.d > BigInt(maxDenominator)) return null;
  const sign = value.compare(0) < 0 ? '−' : '';
  const whole = withCommas(String(value.n / value.d));
  const rest = value.n % value.d;
  if (rest === 0n) return sign + whole;
  return value.n < value.d ? `${sign}${rest}/${value.d}` : `${sign}${whole} ${rest}/${value.d}`;
}

/**
 * The number as a fraction people measure ("2 1/2", "3/4"): halves, thirds, quarters, eighths, sixteenths. A decimal when
 * none fits exactly.
 */
export function formatMeasure(value: Rational, options: { maxDenominator?: number } = {}): string {
  return measured(value, options.maxDenominator ?? 16) ?? formatNumber(value);
}

function isMany(value: Rational | undefined): boolean {
  // "1 acre", "1/2 acre" and "0.5 acre" are one; everything else, and a bare unit, is many.
  return value === undefined || value.abs().compare(1) > 0 || value.compare(0) === 0;
}

/** The unit as written after a number: "sq ft", "Tbsp", "gal per acre"; empty for plain counts. */
export function unitSymbol(
  unit: UnitKey,
  options: { locale?: Locale | undefined; value?: Rational | undefined } = {},
): string {
  return unitName({ unit, locale: options.locale ?? 'en', form: 'symbol', many: isMany(options.value) });
}

/** The unit written out: "fluid ounces", "tablespoon", "onzas líquidas". */
export function unitWord(unit: UnitKey, options: { locale: Locale; value?: Rational | undefined }): string {
  return unitName({ unit, locale: options.locale, form: 'word', many: isMany(options.value) });
}

interface QuantityStyle {
  style?: 'decimal' | 'fraction' | undefined;
  places?: number | undefined;
  maxPlaces?: number | undefined;
  locale?: Locale | undefined;
}

/** "$13.40", "$12 per acre": whole dollars or cents, unless the caller says how many places. */
function formatMoney(q: Quantity, options: QuantityStyle): string {
  const free = options.places === undefined && options.maxPlaces === undefined;
  const places = free ? (q.value.d === 1n ? 0 : 2) : options.places;
  const number = formatNumber(q.value, { ...options, places });
  const sign = number.startsWith('−') ? '−' : '';
  return `${sign}$${number.slice(sign.length)}${unitSymbol(q.unit, { locale: options.locale }).replace('$', '')}`;
}

/** A quantity as people write it: "2.4 fl oz", "2 1/2 Tbsp", "1,600 sq ft", "2%", "$13.40", "1 acre". */
export function formatQuantity(q: Quantity, options: QuantityStyle = {}): string {
  if (q.unit === 'usd' || q.unit.startsWith('usd/')) return formatMoney(q, options);
  const { locale } = options;
  const fraction = options.style === 'fraction' ? measured(q.value, 16) : null;
  const number = fraction ?? formatNumber(q.value, options);
  if (q.unit === 'percent' || q.unit === 'deg') return `${number}${unitSymbol(q.unit, { locale })}`;
  // The number that is read decides between one and many: 1.00001 shown as 1 is "1 acre".
  const shown = fraction === null && /^−?1(\.0+)?$/.test(number) ? one : q.value;
  const symbol = unitSymbol(q.unit, { locale, value: shown });
  return symbol === '' ? number : `${number} ${symbol}`;
}
