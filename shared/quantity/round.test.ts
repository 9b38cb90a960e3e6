import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rational } from './rational.ts';
import { roundToStep } from './round.ts';

describe('roundToStep', () => {
  it.each([
    ['2.44', '0.1', 'nearest', '2.4'],
    ['2.45', '0.1', 'nearest', '2.5'],
    ['-2.45', '0.1', 'nearest', '-2.5'],
    ['-2.44', '0.1', 'nearest', '-2.4'],
    ['1.005', '0.01', 'nearest', '1.01'],
    ['37', '5', 'nearest', '35'],
    ['2.1', '0.5', 'up', '2.5'],
    ['2.1', '1', 'down', '2'],
    ['-2.1', '1', 'up', '-2'],
    ['-2.1', '1', 'down', '-3'],
    ['6', '1', 'up', '6'],
    ['0', '0.25', 'nearest', '0'],
  ] as const)('%s to %s, %s, is %s', (value, step, mode, expected) => {
    expect(roundToStep(rational(value), rational(step), mode).equals(rational(expected))).toBe(true);
  });

  it('goes to the nearest unless told', () => {
    expect(roundToStep(rational(1, 2), rational(1, 8)).toFraction()).toBe('1/2');
    expect(roundToStep(rational(2, 3), rational(1, 4)).toFraction()).toBe('3/4');
  });
  it.each(['0', '-1'])('refuses a step of %s', (step) => {
    expect(() => roundToStep(rational(1), rational(step))).toThrow(RangeError);
  });

  it('gives whole steps, at most half a step away', () => {
    const value = fc.tuple(fc.bigInt({ min: -(10n ** 9n), max: 10n ** 9n }), fc.bigInt({ min: 1n, max: 9999n }));
    const step = fc.tuple(fc.bigInt({ min: 1n, max: 1000n }), fc.bigInt({ min: 1n, max: 1000n }));
    fc.assert(
      fc.property(value, step, ([top, bottom], [stepTop, stepBottom]) => {
        const exact = rational(top, bottom);
        const by = rational(stepTop, stepBottom);
        const rounded = roundToStep(exact, by);
        expect(rounded.div(by).d).toBe(1n);
        expect(rounded.sub(exact).abs().compare(by.div(2))).toBeLessThanOrEqual(0);
        expect(roundToStep(exact, by, 'down').compare(exact)).toBeLessThanOrEqual(0);
        expect(roundToStep(exact, by, 'up').compare(exact)).toBeGreaterThanOrEqual(0);
      }),
    );
  });
});
