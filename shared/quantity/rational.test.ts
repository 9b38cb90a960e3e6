import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rational } from './rational.ts';

describe('rational', () => {
  it.each([
    [0.1, '1/10'],
    [-2.5, '-5/2'],
    [0, '0'],
    [-0, '0'],
    [1e-7, '1/10000000'],
    [1.5e21, '1500000000000000000000'],
    ['2.4', '12/5'],
    ['-0.125', '-1/8'],
    [43560n, '43560'],
  ])('reads %s exactly', (value, text) => {
    expect(rational(value).toFraction()).toBe(text);
  });

  it('divides by a denominator', () => {
    expect(rational(2, 6).toFraction()).toBe('1/3');
    expect(rational('0.5', 2n).toFraction()).toBe('1/4');
    expect(rational(rational(1, 2), 3).toFraction()).toBe('1/6');
  });

  it('gives a rational back as it is', () => {
    const third = rational(1, 3);
    expect(rational(third)).toBe(third);
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, '', 'abc', '1,250'])('refuses %s', (value) => {
    expect(() => rational(value)).toThrow(Error);
  });
  it('refuses a zero denominator', () => {
    expect(() => rational(1, 0)).toThrow(/zero/i);
  });

  it('reads every number as its own decimal text says', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        const [digits = '', exponent = '0'] = String(value).split('e');
        const [whole = '', decimals = ''] = digits.split('.');
        const power = Number(exponent) - decimals.length;
        const factor = rational(10n ** BigInt(Math.abs(power)));
        const top = rational(BigInt(whole + decimals));
        const expected = power < 0 ? top.div(factor) : top.mul(factor);
        expect(rational(value).equals(expected)).toBe(true);
      }),
      { numRuns: 1000 },
    );
  });
});
