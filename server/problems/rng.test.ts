import { describe, expect, test } from 'vitest';
import { makeRng } from './rng.ts';

describe('the seeded source of choices', () => {
  test('the same text draws the same, another text another', () => {
    const draw = (seed: string) => {
      const rng = makeRng(seed);
      return Array.from({ length: 12 }, () => rng.int(0, 999_999));
    };
    expect(draw('a')).toEqual(draw('a'));
    expect(draw('a')).not.toEqual(draw('b'));
  });

  test('its numbers never change: problems are stored by their seed', () => {
    const rng = makeRng('for ever');
    expect(Array.from({ length: 6 }, () => rng.int(1, 1000))).toMatchInlineSnapshot(`
      [
        212,
        905,
        388,
        967,
        674,
        981,
      ]
    `);
    expect(rng.shuffle(['a', 'b', 'c', 'd', 'e'])).toMatchInlineSnapshot(`
      [
        "a",
        "d",
        "b",
        "e",
        "c",
      ]
    `);
    expect(rng.step('0.3', '6', '0.1').toFraction()).toMatchInlineSnapshot(`"11/5"`);
  });

  test('whole numbers are equally likely (chi-squared over ten values, 20,000 draws, below the 0.1 % point 27.9)', () => {
    const rng = makeRng('even');
    const counts = new Array<number>(10).fill(0);
    for (let i = 0; i < 20_000; i += 1) {
      const value = rng.int(0, 9);
      counts[value] = (counts[value] ?? 0) + 1;
    }
    const chiSquared = counts.reduce((sum, count) => sum + (count - 2000) ** 2 / 2000, 0);
    expect(chiSquared).toBeLessThan(27.9);
  });

  test('steps are exact and stay inside', () => {
    const rng = makeRng('steps');
    for (let i = 0; i < 500; i += 1) {
      const value = rng.step('0.5', '4', '0.25');
      expect(value.compare('0.5')).toBeGreaterThanOrEqual(0);
      expect(value.compare(4)).toBeLessThanOrEqual(0);
      expect(value.mul(4).d).toBe(1n);
    }
  });

  test('refuses what it cannot draw', () => {
    const rng = makeRng('no');
    expect(() => rng.int(3, 2)).toThrow(RangeError);
    expect(() => rng.int(0.5, 2)).toThrow(RangeError);
    expect(() => rng.pick([])).toThrow(RangeError);
    expect(() => rng.sample([1], 2)).toThrow(RangeError);
  });
});
