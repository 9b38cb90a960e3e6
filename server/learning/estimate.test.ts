import { describe, expect, test } from 'vitest';
import {
  authorsDifficulty,
  evidenceWeight,
  forgettingGap,
  newAbility,
  newTopic,
  update,
  type Evidence,
} from './estimate.ts';
import { chanceAtMark, levelOf, normalCdf, type TopicState } from './level.ts';

const plain: Evidence = { right: true, hints: 0, guess: 0, daysSince: null, difficulty: authorsDifficulty(2) };
const fresh = { ability: newAbility, topic: newTopic };

function after(rights: readonly boolean[], evidence: Partial<Evidence> = {}) {
  return rights.reduce((state, right) => update(state, { ...plain, ...evidence, right }), fresh);
}
function state(beliefs: ReturnType<typeof after>, answers: number, more: Partial<TopicState> = {}): TopicState {
  return { belief: beliefs.topic, answers, days: 2, daysSince: 0, reached: false, ...more };
}

describe('the update', () => {
  test('one step worked by hand: q = .8 logit shrunk by the summed variance 2.46, c = 0', () => {
    // V = .81 + .49 + 1 + .16 = 2.46; q = 1/(1+exp(-.8/sqrt(1+pi*2.46/8))) = 0.63807; w = q(1-q); D = 1 + wV
    const q = 1 / (1 + Math.exp(-0.8 / Math.sqrt(1 + (Math.PI * 2.46) / 8)));
    const d = 1 + q * (1 - q) * 2.46;
    const next = update(fresh, plain);
    expect(next.ability.mean).toBeCloseTo((0.81 * (1 - q)) / d, 12);
    expect(next.topic.mean).toBeCloseTo((0.49 * (1 - q)) / d, 12);
    expect(next.ability.variance).toBeCloseTo(0.81 - (0.81 ** 2 * q * (1 - q)) / d + 0.01, 12);
  });
  test('right raises, wrong lowers, and a wrong answer also teaches a little', () => {
    expect(update(fresh, plain).topic.mean).toBeGreaterThan(0);
    const wrong = update(fresh, { ...plain, right: false });
    expect(wrong.ability.mean).toBeLessThan(0);
    expect(wrong.topic.mean).toBeLessThan(0);
    expect(wrong.topic.mean / wrong.ability.mean).toBeLessThan(0.49 / 0.81);
  });
  test('hints weaken a right answer and leave a wrong one whole', () => {
    expect([0, 1, 2, 3].map((hints) => evidenceWeight({ right: true, hints }))).toEqual([1, 0.6, 0.35, 0]);
    expect(evidenceWeight({ right: false, hints: 3 })).toBe(1);
    const moved = [0, 1, 2, 3].map((hints) => update(fresh, { ...plain, hints }).ability.mean);
    expect(moved[0]).toBeGreaterThan(moved[1] ?? 0);
    expect(moved[1]).toBeGreaterThan(moved[2] ?? 0);
    expect(moved[3]).toBe(0);
  });
  test('a choice of four proves less when right than an entered answer', () => {
    expect(update(fresh, { ...plain, guess: 0.25 }).ability.mean).toBeLessThan(update(fresh, plain).ability.mean);
  });
  test('forgetting grows with the log of the days and is 0 for a topic never answered', () => {
    expect(forgettingGap(null)).toBe(0);
    expect(forgettingGap(0)).toBe(0);
    expect(forgettingGap(Math.E - 1)).toBeCloseTo(0.3, 12);
    expect(forgettingGap(-5)).toBe(0);
  });
});

describe('the level shown', () => {
  test('no figure on fewer than three answers', () => {
    const two = after([true, true]);
    expect(levelOf(two.ability, state(two, 2))).toEqual({ state: 'not-started', fill: null, range: null });
  });
  test('three right answers are not the mark; a dozen over two days are', () => {
    const three = after([true, true, true]);
    expect(levelOf(three.ability, state(three, 3)).state).toBe('filling');
    const twelve = after(new Array<boolean>(12).fill(true));
    expect(levelOf(twelve.ability, state(twelve, 12)).state).toBe('at-the-mark');
    expect(levelOf(twelve.ability, state(twelve, 12, { days: 1 })).state).toBe('filling');
  });
  test('what was at the mark becomes top up when the prediction has fallen to it', () => {
    const twelve = after(new Array<boolean>(12).fill(true));
    const later = levelOf(twelve.ability, state(twelve, 12, { reached: true, daysSince: 60 }));
    expect(later.state).toBe('top-up');
    expect(later.fill).toBeLessThanOrEqual(0.8);
    expect(levelOf(twelve.ability, state(twelve, 12, { reached: true, daysSince: 0.1 })).state).toBe('at-the-mark');
  });
  test('the fill lies inside its range, and more answers narrow it', () => {
    const mixed = [true, false, true, true, false, true, true, true];
    const some = after(mixed);
    const many = after([...mixed, ...mixed, ...mixed]);
    const width = (level: ReturnType<typeof levelOf>) =>
      level.range ? level.range.high - level.range.low : Number.NaN;
    const a = levelOf(some.ability, state(some, 8));
    const b = levelOf(many.ability, state(many, 24));
    for (const level of [a, b]) {
      expect(level.fill).toBeGreaterThan(level.range?.low ?? 1);
      expect(level.fill).toBeLessThan(level.range?.high ?? 0);
    }
    expect(width(b)).toBeLessThan(width(a));
  });
  test('the normal distribution function at table values (NIST/SEMATECH e-Handbook, 1.3.6.7.1)', () => {
    for (const [x, p] of [
      [0, 0.5],
      [1, 0.84134],
      [1.28, 0.89973],
      [1.96, 0.975],
      [-1, 0.15866],
    ] as const) {
      expect(normalCdf(x)).toBeCloseTo(p, 4);
    }
  });
  test('the chance at the mark rises with the evidence', () => {
    const chances = [1, 4, 8, 16].map((count) => {
      const beliefs = after(new Array<boolean>(count).fill(true));
      return chanceAtMark(beliefs.ability, state(beliefs, count));
    });
    expect([...chances].sort((a, b) => a - b)).toEqual(chances);
  });
});
