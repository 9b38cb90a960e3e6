import Fraction from 'fraction.js';

/** An exact number: a fraction of two whole numbers of any size. */
export type Rational = Fraction;

/** A number by its shortest decimal text, also where that text has an exponent (1e-7). */
function fromNumber(value: number): Rational {
  if (Number.isSafeInteger(value)) return new Fraction(value);
  if (!Number.isFinite(value)) throw new RangeError(`${value} is not a number to reckon with`);
  const [digits, exponent] = String(value).split('e') as [string, string | undefined];
  if (exponent === undefined) return new Fraction(digits);
  const power = 10n ** BigInt(exponent.replace(/^[+-]/, ''));
  return exponent.startsWith('-') ? new Fraction(digits).div(power) : new Fraction(digits).mul(power);
}

/**
 * An exact number from whole numbers, decimal text ("2.4") or a number, which is read from its shortest decimal text, so
 * that `rational(0.1)` is one tenth.
 * @throws Error when the text is not a number, the number not finite, or the denominator zero
 */
export function rational(value: number | string | bigint | Rational, denominator?: number | bigint): Rational {
  if (value instanceof Fraction) return denominator === undefined ? value : value.div(new Fraction(denominator));
  const top = typeof value === 'number' ? fromNumber(value) : new Fraction(value);
  return denominator === undefined ? top : top.div(new Fraction(denominator));
}
