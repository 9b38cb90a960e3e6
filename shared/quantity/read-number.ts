import { rational, type Rational } from './rational.ts';

/** Why a number could not be read. */
export interface NumberFailure {
  readonly problem: 'zero-denominator' | 'too-long' | 'ambiguous-comma' | 'not-a-number';
  readonly detail?: string;
}
/** A number and where its text ends. */
export interface NumberRead {
  readonly value: Rational;
  readonly end: number;
}

/** Digits of one number: more than any measure has. */
const mostDigits = 30;

/** Digits with commas and points as people write them: 1,250 | 2.5 | 2,5 | .5 | 1.250,5. */
function decimal(text: string): Rational | NumberFailure {
  if (text.length > 2 * mostDigits) return { problem: 'too-long' };
  const body = text.replace(/[.,]$/, '');
  const digits = body.replace(/[.,]/g, '');
  if (digits.length > mostDigits) return { problem: 'too-long' };
  if (body === digits) return rational(digits);
  if (/^\d*\.\d+$/.test(body)) return rational(`0${body}`);
  // A comma before groups of three is a thousands comma; any other single comma is a decimal comma.
  if (/^[1-9]\d{0,2}(,\d{3})+(\.\d+)?$/.test(body)) return rational(body.replaceAll(',', ''));
  if (/^\d*,\d+$/.test(body)) return rational(`0${body.replace(',', '.')}`);
  // Thousands points only where nothing else is possible: a single one is a decimal point.
  if (/^[1-9]\d{0,2}(\.\d{3})+,\d+$/.test(body)) return rational(body.replaceAll('.', '').replace(',', '.'));
  if (/^[1-9]\d{0,2}(\.\d{3}){2,}$/.test(body)) return rational(digits);
  return { problem: /^\d*(,\d*)+$/.test(body) ? 'ambiguous-comma' : 'not-a-number', detail: text };
}

function divided(top: string, bottom: string): Rational | NumberFailure {
  if (top.length > mostDigits || bottom.length > mostDigits) return { problem: 'too-long' };
  if (/^0+$/.test(bottom)) return { problem: 'zero-denominator' };
  return rational(BigInt(top), BigInt(bottom));
}

const numeral = /[.,]?\d[\d.,]*/y;
const fraction = /(\d+) ?\/ ?(\d+)/y;
const join = / and | y | & | \+ |[ -]/y;

function at(pattern: RegExp, text: string, from: number): RegExpExecArray | null {
  pattern.lastIndex = from;
  return pattern.exec(text);
}

/** Whether the outcome of a reading is a failure. */
export function isFailure<T extends object>(outcome: T): outcome is Extract<T, { readonly problem: unknown }> {
  return 'problem' in outcome;
}

function fractionAt(text: string, from: number): NumberRead | NumberFailure | null {
  const found = at(fraction, text, from);
  if (!found) return null;
  const value = divided(found[1] as string, found[2] as string);
  return isFailure(value) ? value : { value, end: from + found[0].length };
}

/**
 * The unsigned number that starts at `from` in a tidied text: a decimal, a fraction, or a whole number and a fraction
 * ("1 1/4", "1-1/4", "1 and 1/4"). Null when none starts there. Linear in the text.
 */
export function readNumber(text: string, from: number): NumberRead | NumberFailure | null {
  const alone = fractionAt(text, from);
  if (alone) return alone;
  const digits = at(numeral, text, from);
  if (!digits) return null;
  const whole = decimal(digits[0]);
  if (isFailure(whole)) return whole;
  const end = from + digits[0].length;
  const joined = whole.d === 1n ? at(join, text, end) : null;
  const part = joined && fractionAt(text, end + joined[0].length);
  if (!part) return { value: whole, end };
  return isFailure(part) ? part : { value: whole.add(part.value), end: part.end };
}
