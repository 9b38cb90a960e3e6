import { describe, expect, it } from 'vitest';
import { quantity } from '../../../../shared/quantity/quantity.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import { generate } from '../../engine.ts';
import type { Earlier, Family } from '../../family.ts';
import { gradePart, isUnreadable } from '../../grade.ts';
import { makeRng } from '../../rng.ts';
import { drawScene } from '../../situations.ts';
import { tankLoadsFamily } from './tank-loads.ts';

const job = { as: 'area', area: quantity(26000, 'sq-ft'), rate: quantity('1.5', 'gal/1000-sq-ft') };
const given = { ...drawScene(makeRng('loads'), 4), tank: quantity(15, 'gal'), job };
const family: Family<unknown> = { ...tankLoadsFamily, draw: () => given };
const problem = generate(family, { seed: 'loads', tier: 2 });

function graded(part: PartKey, text: string, earlier: Earlier = {}): string {
  const result = gradePart({ problem, part, response: { kind: 'number', text }, earlier, locale: 'en' });
  return isUnreadable(result) ? result.unreadable : (result.slip ?? result.verdict);
}

describe('26,000 sq ft at 1.5 gal per 1,000 sq ft with a 15 gal tank: 39 gal, three loads, the last of 9 gal', () => {
  it('takes the right answers', () => {
    expect(graded('a', '39')).toBe('right');
    expect(graded('b', '3')).toBe('right');
    expect(graded('c', '9')).toBe('right');
  });

  it('names the slips', () => {
    expect(graded('b', '2')).toBe('rounded-down');
    expect(graded('c', '15')).toBe('full-last-load');
    expect(graded('c', '6')).toBe('space-left');
    expect(graded('c', '13')).toBe('evened-out');
  });

  it('gives credit for a right method on a wrong mix', () => {
    const earlier = { a: quantity(52, 'gal') };
    expect(graded('b', '4', earlier)).toBe('carried');
    expect(graded('c', '7', earlier)).toBe('carried');
  });
});
