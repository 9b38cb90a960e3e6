import Fraction from 'fraction.js';

/** An exact number: a fraction of two whole numbers of any size. */
export type Rational = Fraction;

/**
 * An exact number from whole numbers, decimal text ("2.4") or a number, which is read from its shortest decimal text, so
 * that `rational(0.1)` is one tenth.
 * @throws Error when the text is not a number or the denominator is zero
 */
export function rational(value: number | string | bigint | Rational, denominator?: number | bigint): Rational {
  if (value instanceof Fraction) return denominator === undefined ? value : value.div(new Fraction(denominator));
  const top = typeof value === 'number' ? new Fraction(String(value)) : new Fraction(value);
  return denominator === undefined ? top : top.div(new Fraction(denominator));
}
