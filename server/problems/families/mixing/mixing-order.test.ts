import { describe, expect, it } from 'vitest';
import { generate } from '../../engine.ts';
import { gradePart, isUnreadable } from '../../grade.ts';
import { mixingOrderFamily } from './mixing-order.ts';

const problem = generate(mixingOrderFamily, { seed: 'order', tier: 3 });

/** The slip, or the verdict where there is none, of an order on the third tier. */
function graded(order: string): string {
  const response = { kind: 'order', steps: order.split(' ') } as const;
  const result = gradePart({ problem, part: 'a', response, earlier: {}, locale: 'en' });
  return isUnreadable(result) ? result.unreadable : (result.slip ?? result.verdict);
}

describe('order of filling a tank', () => {
  it.each([
    ['gloves water agitate dry liquid surfactant rinse fill', 'right'],
    ['gloves water agitate dry liquid rinse surfactant fill', 'right'],
    ['water gloves agitate dry liquid surfactant rinse fill', 'gloves-late'],
    ['gloves dry water agitate liquid surfactant rinse fill', 'product-before-water'],
    ['gloves water agitate surfactant dry liquid rinse fill', 'surfactant-first'],
    ['gloves water dry agitate liquid surfactant rinse fill', 'no-agitation'],
    ['gloves water agitate liquid dry surfactant rinse fill', 'liquid-before-dry'],
    ['gloves water agitate dry liquid surfactant fill rinse', 'filled-too-soon'],
    ['gloves water rinse agitate dry liquid surfactant fill', 'rinse-too-soon'],
    ['gloves water agitate dry liquid surfactant rinse', 'not-these-steps'],
  ])('%s is %s', (order, verdict) => {
    expect(graded(order)).toBe(verdict);
  });
});
