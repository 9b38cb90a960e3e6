import { describe, expect, test } from 'vitest';
import { quantity, type Quantity } from '../../shared/quantity/quantity.ts';
import { rational } from '../../shared/quantity/rational.ts';
import type { PartKey } from '../../shared/vocabulary.ts';
import { generate, NoDrawError } from './engine.ts';
import { defineFamily, type Family, type Part } from './family.ts';
import { gradePart, isUnreadable } from './grade.ts';

// A family with fixed numbers: the exemplar's lawn, so that every verdict can be worked out by hand.
const text = (en: string) => ({ en, es: en });

interface Given {
  whole: Quantity;
  patio: Quantity;
}

const part = (key: PartKey, answer: Quantity, step: string): Part => ({
  kind: 'number',
  key,
  topic: key === 'a' ? 'area' : 'rate',
  ask: text('?'),
  answer,
  step: rational(step),
  units: [answer.unit],
});

const lawn: Family<unknown> = defineFamily<Given>({
  key: 'test-lawn',
  version: 1,
  topic: 'rate',
  tiers: [1, 2],
  title: text('Test lawn'),
  sources: [],
  draw: () => ({ whole: quantity(1800, 'sq-ft'), patio: quantity(200, 'sq-ft') }),
  heading: () => text('Lawn'),
  statement: () => text('Lawn.'),
  parts: ({ whole, patio }, earlier) => {
    const area = earlier.a ?? quantity(whole.value.sub(patio.value), 'sq-ft');
    const product = earlier.b ?? quantity(area.value.mul('1.5').div(1000), 'fl-oz');
    const spoons = quantity(product.value.mul(2), 'tbsp');
    return [
      part('a', area, '1'),
      part('b', quantity(area.value.mul('1.5').div(1000), 'fl-oz'), '0.1'),
      part('c', spoons, '0.1'),
    ];
  },
  hints: () => [text('1'), text('2'), text('3')],
  working: () => [],
  slips: [
    {
      key: 'left-in-obstacle',
      part: 'a',
      answer: ({ whole }) => whole,
      message: () => text('The patio is still in your area. Take it off.'),
    },
    {
      key: 'added-obstacle',
      part: 'a',
      answer: () => quantity(2000, 'sq-ft'),
      message: () => text('You added the patio. It comes off.'),
    },
    {
      key: 'full-label-amount',
      part: 'b',
      answer: () => quantity('1.5', 'fl-oz'),
      message: () => text('That is for 1,000 sq ft. Scale it.'),
    },
    {
      key: 'half-the-spoons',
      part: 'c',
      answer: () => quantity('2.4', 'tbsp'),
      message: () => text('That is the fluid ounces. Turn them into spoons.'),
    },
    {
      key: 'same-as-the-answer',
      part: 'b',
      answer: () => quantity('2.41', 'fl-oz'),
      message: () => text('Collides. Always.'),
    },
  ],
});
const problem = generate(lawn, { seed: '1', tier: 2 });

function verdict(key: PartKey, typed: string, earlier: Partial<Record<PartKey, Quantity>> = {}): string {
  const result = gradePart({ problem, part: key, response: { kind: 'number', text: typed }, earlier, locale: 'en' });
  if (isUnreadable(result)) return `unreadable ${result.unreadable}`;
  return result.verdict === 'slip' ? `slip ${result.slip}` : result.verdict;
}

describe('slips of a draw', () => {
  test('one that collides with the answer is left out of the problem', () => {
    expect(problem.slips.map((live) => live.key)).toEqual([
      'left-in-obstacle',
      'added-obstacle',
      'full-label-amount',
      'half-the-spoons',
    ]);
  });
  test('a family that cannot give a draw fails by name, seed and tier', () => {
    const never = { ...lawn, key: 'never', draw: () => null };
    expect(() => generate(never, { seed: 's9', tier: 2 })).toThrow(NoDrawError);
    expect(() => generate(never, { seed: 's9', tier: 2 })).toThrow(/never.*s9.*2/);
    expect(() => generate(lawn, { seed: '1', tier: 3 })).toThrow(RangeError);
  });
});

describe('grading one number', () => {
  test.each(['2.4', '2,4 fl oz', '2 2/5', '4.8 Tbsp', '71 mL', '2.42', '2.36', '~2.4', '14.4 tsp'])(
    '%s is right',
    (typed) => {
      expect(verdict('b', typed)).toBe('right');
    },
  );
  test('just outside half a step it is not', () => {
    expect(verdict('b', '2.45')).toBe('right');
    expect(verdict('b', '2.4501')).toBe('rounding');
    expect(verdict('b', '2.35')).toBe('right');
  });
  test('1 % counts where it is wider than half a step', () => {
    expect(verdict('a', '1616')).toBe('right');
    expect(verdict('a', '1617')).not.toBe('right');
  });
  test.each([
    ['2.4 oz', 'unit-kind'],
    ['1.5', 'slip full-label-amount'],
    ['4.8 fl oz', 'unit-name'],
    ['24', 'decimal-place'],
    ['0.24', 'decimal-place'],
    ['2', 'rounding'],
    ['7.7', 'unrecognised'],
    ['-2.4', 'unrecognised'],
    ['0', 'unrecognised'],
    ['', 'unreadable empty'],
    ['two', 'unreadable no-number'],
    ['1 2', 'unreadable two-numbers'],
    ['3/0', 'unreadable zero-denominator'],
  ])('%s is %s', (typed, expected) => {
    expect(verdict('b', typed)).toBe(expected);
  });
  test('a slip of the family says more than the unit name when both fit', () => {
    expect(verdict('c', '2.4')).toBe('slip half-the-spoons');
  });
  test('credit is carried through a chain of parts', () => {
    const a = quantity(1800, 'sq-ft');
    expect(verdict('b', '2.7', { a })).toBe('carried');
    expect(verdict('b', '2.7')).toBe('unrecognised');
    expect(verdict('c', '5.4', { a, b: quantity('2.7', 'fl-oz') })).toBe('carried');
    expect(verdict('b', '2.4', { a })).toBe('right');
  });
  test('an entry in another form is refused, not graded', () => {
    const result = gradePart({
      problem,
      part: 'a',
      response: { kind: 'choice', option: 'x' },
      earlier: {},
      locale: 'en',
    });
    expect(result).toEqual({ unreadable: 'wrong-form' });
    expect(() =>
      gradePart({ problem, part: 'f', response: { kind: 'number', text: '1' }, earlier: {}, locale: 'en' }),
    ).toThrow(RangeError);
  });
  test('a slip is told with its first sentence as the headline', () => {
    const result = gradePart({
      problem,
      part: 'a',
      response: { kind: 'number', text: '1,800' },
      earlier: {},
      locale: 'en',
    });
    expect(isUnreadable(result) ? null : result.message).toEqual({
      headline: text('The patio is still in your area.'),
      detail: text('Take it off.'),
    });
  });
});
