import { inUnit, type Quantity } from './quantity.ts';
import { rational, type Rational } from './rational.ts';
import { unitAt } from './unit-aliases.ts';
import { kindOf, type UnitKey } from './units.ts';

/** Why an entry could not be read. */
export type ParseProblem =
  | 'empty'
  | 'no-number'
  | 'two-numbers'
  | 'unknown-unit'
  | 'zero-denominator'
  | 'too-long'
  | 'mixed-kinds'
  | 'ambiguous-comma'
  | 'not-a-number';

export type ParseResult =
  | { ok: true; quantity: Quantity; unitGiven: boolean }
  | { ok: false; problem: ParseProblem; detail?: string };

/** Longer entries are refused unread: no measure takes more. */
const mostCharacters = 200;
/** Digits of one number: more than any measure has. */
const mostDigits = 30;

const vulgar: Readonly<Record<string, string>> = {
  '½': '1/2',
  '⅓': '1/3',
  '⅔': '2/3',
  '¼': '1/4',
  '¾': '3/4',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};

/** One form for all ways to write the same: plain spaces, slashes, hyphens, quotes; T told from t; lower case. */
function tidy(text: string): string {
  return text
    .replace(/[½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞]/g, (sign) => ` ${vulgar[sign] ?? ''}`)
    .normalize('NFKC')
    .replace(/[\s\u200b\ufeff]+/g, ' ')
    .replace(/[\u2044\u2215\u00f7]/g, '/')
    .replace(/[\u2010-\u2015\u2212]/g, '-')
    .replace(/[\u2018\u2019\u2032]/g, "'")
    .replace(/[\u201c\u201d\u2033]/g, '"')
    .replace(/(?<![A-Za-z])T(?![A-Za-z])/g, 'tbsp')
    .toLowerCase()
    .replace(/([\p{L}])\./gu, '$1')
    .replace(/^[ ~=≈]+/, '')
    .trim();
}

type Failure = { ok: false; problem: ParseProblem; detail?: string };

function fail(problem: ParseProblem, detail?: string): Failure {
  return detail === undefined ? { ok: false, problem } : { ok: false, problem, detail };
}

/** Digits with commas and points as people write them: 1,250 | 2.5 | 2,5 | .5 | 1.250,5. */
function decimal(text: string): Rational | Failure {
  if (text.replace(/[.,]/g, '').length > mostDigits) return fail('too-long');
  if (/^\d+$/.test(text)) return rational(text);
  if (/^\d*\.\d+$/.test(text) || /^\d+\.$/.test(text)) return rational(text.startsWith('.') ? `0${text}` : text.replace(/\.$/, ''));
  if (/^[1-9]\d{0,2}(,\d{3})+(\.\d*)?$/.test(text)) return rational(text.replaceAll(',', '').replace(/\.$/, ''));
  if (/^\d*,\d+$/.test(text)) return rational(`0${text}`.replace(',', '.'));
  if (/^[1-9]\d{0,2}(\.\d{3})+,\d+$/.test(text)) return rational(text.replaceAll('.', '').replace(',', '.'));
  if (/^\d+,$/.test(text)) return rational(text.replace(',', ''));
  return fail('not-a-number', text);
}

const numeral = /[\d.,]+/y;
const fraction = /(\d+) ?\/ ?(\d+)/y;
const mixedJoin = /[ -]?/y;

function at(pattern: RegExp, text: string, from: number): RegExpExecArray | null {
  pattern.lastIndex = from;
  return pattern.exec(text);
}

function divided(top: string, bottom: string): Rational | Failure {
  if (top.length > mostDigits || bottom.length > mostDigits) return fail('too-long');
  if (/^0+$/.test(bottom)) return fail('zero-denominator');
  return rational(BigInt(top), BigInt(bottom));
}

function isFailure(value: object): value is Failure {
  return 'problem' in value;
}

/** A number at `from`: a decimal, a fraction, or a whole number and a fraction. Null when none starts there. */
function numberAt(text: string, from: number): { value: Rational; end: number } | Failure | null {
  const plain = at(fraction, text, from);
  if (plain) {
    const value = divided(plain[1] as string, plain[2] as string);
    return isFailure(value) ? value : { value, end: from + plain[0].length };
  }
  const digits = at(numeral, text, from);
  if (!digits || !/\d/.test(digits[0])) return null;
  const shown = digits[0].replace(/[.,]+$/, (tail) => (tail.length > 1 ? '' : tail));
  const value = decimal(shown);
  if (isFailure(value)) return value;
  const end = from + digits[0].length;
  const join = at(mixedJoin, text, end);
  const rest = at(fraction, text, end + (join?.[0].length ?? 0));
  if (!rest || !join || join[0] === '' || value.d !== 1n) return { value, end };
  const part = divided(rest[1] as string, rest[2] as string);
  if (isFailure(part)) return part;
  return { value: value.add(part), end: end + join[0].length + rest[0].length };
}

interface Term {
  value: Rational;
  unit: UnitKey | null;
}

/** Splits a tidied text into numbers, each with its unit where one follows. */
function terms(text: string): Term[] | Failure {
  const found: Term[] = [];
  let place = 0;
  let dollars = false;
  const skip = () => {
    while (text[place] === ' ') place += 1;
  };
  while (place < text.length) {
    skip();
    if (place >= text.length) break;
    let negative = false;
    if (text[place] === '$') {
      dollars = true;
      place += 1;
      skip();
    }
    if (text[place] === '-' || text[place] === '+') {
      negative = text[place] === '-';
      place += 1;
      skip();
    }
    const number = numberAt(text, place);
    if (number === null) return fail(found.length === 0 && !/\d/.test(text) ? 'no-number' : 'unknown-unit', text.slice(place));
    if (isFailure(number)) return number;
    place = number.end;
    skip();
    const unit = unitAt(text, place);
    if (unit) place = unit.end;
    found.push({ value: negative ? number.value.neg() : number.value, unit: unit?.unit ?? (dollars ? 'usd' : null) });
    skip();
    const join = /^(and|y|,|&|\+)(?= )/.exec(text.slice(place, place + 5));
    if (unit && join) place += join[0].length;
  }
  return found;
}

/**
 * Reads one quantity as people type it: "1,250", "2,5", "1 1/4", "1¼", ".5", "1.25 fl oz", "2 T", "1 qt 6 fl oz".
 * Never throws; refuses anything longer than 200 characters unread. `defaultUnit` is used when no unit is typed.
 */
export function parseQuantity(text: string, options: { locale: 'en' | 'es'; defaultUnit: UnitKey }): ParseResult {
  if (text.length > mostCharacters) return fail('too-long');
  const tidied = tidy(text);
  if (tidied === '') return fail('empty');
  const found = terms(tidied);
  if (!Array.isArray(found)) return found;
  const [first, ...rest] = found;
  if (!first) return fail('no-number');
  if (rest.length === 0) {
    const unit = first.unit ?? options.defaultUnit;
    return { ok: true, quantity: { value: first.value, unit }, unitGiven: first.unit !== null };
  }
  let sum: Quantity | null = null;
  for (const term of found) {
    if (term.unit === null) return fail('two-numbers');
    if (sum && kindOf(sum.unit) !== kindOf(term.unit)) return fail('mixed-kinds');
    const next: Quantity = { value: term.value, unit: term.unit };
    sum = sum ? { value: sum.value.add(inUnit(next, sum.unit)), unit: sum.unit } : next;
  }
  return sum ? { ok: true, quantity: sum, unitGiven: true } : fail('no-number');
}
