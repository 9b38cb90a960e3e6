import { describe, expect, it } from 'vitest';
import { areaCircleFamily } from '../../server/problems/families/area/area-circle.ts';
import { areaRectangleFamily } from '../../server/problems/families/area/area-rectangle.ts';
import { areaTriangleFamily } from '../../server/problems/families/area/area-triangle.ts';
import { generate } from '../../server/problems/engine.ts';
import type { Family } from '../../server/problems/family.ts';
import { gradePart, isUnreadable } from '../../server/problems/grade.ts';
import { makeRng } from '../../server/problems/rng.ts';
import { drawScene } from '../../server/problems/situations.ts';
import { quantity } from '../../shared/quantity/quantity.ts';
import type { Tier } from '../../shared/vocabulary.ts';

const ft = (value: number) => quantity(value, 'ft');
const scene = drawScene(makeRng('published'), 4);

/** What grading says of an answer when the family asks the publication's own question. */
function graded(question: { family: Family<unknown>; tier: Tier; given: object; answer: string }): string {
  const { family, tier, given, answer } = question;
  const asked: Family<unknown> = { ...family, draw: () => ({ ...scene, ...given }) };
  const problem = generate(asked, { seed: 'published', tier });
  const result = gradePart({
    problem,
    part: 'a',
    response: { kind: 'number', text: answer },
    earlier: {},
    locale: 'en',
  });
  if (isUnreadable(result)) return result.unreadable;
  return result.slip ?? result.verdict;
}

describe("published answers, graded as a trainee's", () => {
  it('a lawn panel 60 ft by 25 ft is 1,500 sq ft (Oklahoma State University - Oklahoma City, 2013)', () => {
    const given = { form: 'feet', length: ft(60), width: ft(25) };
    const question = { family: areaRectangleFamily, tier: 1, given } as const;
    expect(graded({ ...question, answer: '1,500 sq ft' })).toBe('right');
    expect(graded({ ...question, answer: '170' })).toBe('perimeter');
  });

  it('a triangle with base 30 ft and height 26 ft is 390 sq ft (Oklahoma State University - Oklahoma City, 2013)', () => {
    // The publication gives no sloping side; 40 ft is ours.
    const given = { form: 'right', base: ft(30), height: ft(26), slant: ft(40), otherSlant: ft(26), footFt: 0 };
    const question = { family: areaTriangleFamily, tier: 1, given } as const;
    expect(graded({ ...question, answer: '390' })).toBe('right');
    expect(graded({ ...question, answer: '780' })).toBe('no-half');
  });

  it('a round lawn 80 ft across is 5,024 sq ft (Oklahoma State University - Oklahoma City, 2013)', () => {
    const given = { size: 'lawn', half: false, measured: 'diameter', radius: ft(40) };
    const question = { family: areaCircleFamily, tier: 2, given } as const;
    expect(graded({ ...question, answer: '5024' })).toBe('right');
    expect(graded({ ...question, answer: '20,096' })).toBe('diameter-as-radius');
  });
});
