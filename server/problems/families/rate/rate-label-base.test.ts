import { describe, expect, it } from 'vitest';
import { quantity } from '../../../../shared/quantity/quantity.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import { generate, type Problem } from '../../engine.ts';
import type { Earlier, Family } from '../../family.ts';
import { gradePart, isUnreadable } from '../../grade.ts';
import { labelByKey, rateByKey } from '../../labels/pick.ts';
import { lineToPlain } from '../../working.ts';
import { drawnLine } from './label-lines.ts';
import { rateLabelBaseFamily } from './rate-label-base.ts';
import type { LabelBaseGiven } from './rate-label-base-texts.ts';

const ft = (value: number) => quantity(value, 'ft');
const korrin = labelByKey('korrin-2l');
const { water, ...line } = drawnLine([korrin, rateByKey(korrin, 'lawns', 'area')]);
if (!water) throw new Error('the line names its water');

/** Lawn 60 ft by 30 ft, patio 20 ft by 10 ft left out, 1.5 fl oz in 1 gal of water for each 1,000 sq ft. */
const lawn: LabelBaseGiven = {
  situation: 0,
  person: 'Wanjiru',
  place: {
    key: 'clinic',
    the: { en: 'the clinic', es: 'la clínica' },
    of: { en: 'of the clinic', es: 'de la clínica' },
    to: { en: 'to the clinic', es: 'a la clínica' },
    at: { en: 'at the clinic', es: 'en la clínica' },
  },
  season: { en: 'in early spring', es: 'a principios de la primavera' },
  line: { ...line, water },
  rateTold: false,
  length: ft(60),
  width: ft(30),
  obstacles: [{ kind: 'patio', length: ft(20), width: ft(10), xFt: 20, yFt: 0 }],
};
const fixed: Family<LabelBaseGiven> = { ...rateLabelBaseFamily, draw: () => lawn };
const problem: Problem = generate(fixed as Family<unknown>, { seed: 'fixed', tier: 2 });

function verdict(part: PartKey, text: string, earlier: Earlier = {}) {
  const graded = gradePart({ problem, part, response: { kind: 'number', text }, earlier, locale: 'en' });
  if (isUnreadable(graded)) throw new Error(graded.unreadable);
  return graded;
}

describe('a lawn of 60 ft by 30 ft with a patio of 20 ft by 10 ft', () => {
  it.each([
    ['a', '1,600 sq ft'],
    ['b', '2.4 fl oz'],
    ['b', '4.8 Tbsp'],
    ['b', '2 2/5'],
    ['c', '1.6 gal'],
  ] as const)('(%s) %s is right', (part, text) => {
    expect(verdict(part, text).verdict).toBe('right');
  });

  it.each([
    ['a', '1800', 'left-in-obstacle'],
    ['a', '2000', 'added-obstacle'],
    ['a', '180', 'perimeter'],
    ['b', '1.5', 'full-label-amount'],
    ['b', '0.9', 'inverted-share'],
    ['b', '2400', 'forgot-to-divide-by-1000'],
    ['c', '1', 'product-only'],
  ] as const)('(%s) %s shows the slip %s', (part, text, slip) => {
    expect(verdict(part, text)).toMatchObject({ verdict: 'slip', slip });
  });

  it('earns credit for product and water that follow from the patio left in', () => {
    const earlier = { a: quantity(1800, 'sq-ft') };
    expect(verdict('b', '2.7', earlier).verdict).toBe('carried');
    expect(verdict('c', '1.8', earlier).verdict).toBe('carried');
  });

  it('names the slip with the numbers of this lawn', () => {
    expect(verdict('a', '1800').message).toMatchObject({
      headline: { en: 'You left in the patio.' },
      detail: { en: 'Take off 200 sq ft that is not sprayed.' },
    });
  });

  it('works it out line by line, the last with a check that the amount is sensible', () => {
    const lines = rateLabelBaseFamily.working(lawn).map((one) => lineToPlain(one, 'en'));
    expect(lines).toEqual([
      'whole lawn = 60 ft × 30 ft = 1,800 sq ft. Length times width.',
      'the patio = 20 ft × 10 ft = 200 sq ft. Not treated, so it comes off.',
      'area treated = 1,800 sq ft − 200 sq ft = 1,600 sq ft. Only the ground that is treated counts.',
      'product = 1,600 sq ft × 1.5 fl oz / 1,000 sq ft = 2.4 fl oz. To measure it: 2.4 fl oz × 2 = 4.8 Tbsp.',
      "water = 1,600 sq ft × 1 gal / 1,000 sq ft = 1.6 gal. Check: the area is between 1 and 2 times the label's, so the water must lie between 1 gal and 2 gal. It does.",
    ]);
  });
});
