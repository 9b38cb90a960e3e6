import { describe, expect, it } from 'vitest';
import { boomGpaFamily } from '../../server/problems/families/boom/boom-gpa.ts';
import { boomSpeedFamily } from '../../server/problems/families/boom/boom-speed.ts';
import { hand128thFamily } from '../../server/problems/families/handheld/hand-128th.ts';
import { spreaderNeedFamily } from '../../server/problems/families/spreader/spreader-need.ts';
import { strengthPercentVolumeFamily } from '../../server/problems/families/strength/strength-percent-volume.ts';
import { tankLoadsFamily } from '../../server/problems/families/tank/tank-loads.ts';
import { generate } from '../../server/problems/engine.ts';
import type { Family } from '../../server/problems/family.ts';
import { gradePart, isUnreadable } from '../../server/problems/grade.ts';
import { makeRng } from '../../server/problems/rng.ts';
import { drawScene } from '../../server/problems/situations.ts';
import { quantity } from '../../shared/quantity/quantity.ts';
import type { PartKey } from '../../shared/vocabulary.ts';

const scene = drawScene(makeRng('published'), 4);
const line = { labelKey: 'dellamar-4ec', rateKey: 'trees', percent: quantity('0.5', 'percent') };
const granules = { labelKey: 'bexholm-g', rateKey: 'lawns', site: 'lawn', product: quantity(5, 'lb') };

interface Question {
  readonly family: Family<unknown>;
  readonly given: object;
  readonly part?: PartKey;
}

/** What grading says of an answer when the family asks the publication's own question, on the first tier. */
function graded({ family, given, part = 'a' }: Question, answer: string): string {
  const asked: Family<unknown> = { ...family, draw: () => ({ ...scene, ...given }) };
  const problem = generate(asked, { seed: 'published', tier: 1 });
  const response = { kind: 'number', text: answer } as const;
  const result = gradePart({ problem, part, response, earlier: {}, locale: 'en' });
  return isUnreadable(result) ? result.unreadable : (result.slip ?? result.verdict);
}

describe("published mixes and calibrations, graded as a trainee's", () => {
  it('0.5% in 2 gal is 1.28 fl oz (University of Illinois Extension, 2006)', () => {
    const given = { line, job: { as: 'told', mix: quantity(2, 'gal') } };
    const question = { family: strengthPercentVolumeFamily, given };
    expect(graded(question, '1.28 fl oz')).toBe('right');
    expect(graded(question, '0.64')).toBe('one-gallon-only');
    expect(graded(question, '12.8')).toBe('percent-as-fraction-wrong');
  });

  it('44 fl oz on 1/128 acre are 44 gal an acre (SportsTurf magazine, April 2014)', () => {
    const plot = { length: quantity(20, 'ft'), width: quantity(17, 'ft'), plotTime: quantity(46, 's') };
    const given = { ...plot, test: { as: 'caught', caught: quantity(44, 'fl-oz') } };
    // The family's own draw keeps one nozzle to 20 to 70 fl oz a minute; the publication's 57 lie within.
    const question = { family: hand128thFamily, given };
    expect(graded(question, '44 gpa')).toBe('right');
    expect(graded(question, '5632')).toBe('multiplied-by-128');
  });

  it('0.8 gal a minute on 20 in at 3 mph are 79.2 gal an acre (tow-behind sprayer owner manual, Appendix A)', () => {
    const test = { as: 'flow', flow: quantity('0.8', 'gal/min'), speed: quantity(3, 'mph') };
    const question = { family: boomGpaFamily, given: { nozzles: 8, spacing: quantity(20, 'in'), test } };
    expect(graded(question, '79.2')).toBe('right');
    expect(graded(question, '950.4')).toBe('feet-for-inches');
  });

  it('150 ft in 19.7 s are 5.2 mph (sprayer / spreader operator manual, calibration worksheets)', () => {
    const given = { course: quantity(150, 'ft'), runs: [quantity('19.7', 's')], wanted: null };
    const question = { family: boomSpeedFamily, given };
    expect(graded(question, '5.2')).toBe('right');
    expect(graded(question, '7.6')).toBe('feet-per-second-as-mph');
  });

  it('5 lb per 1,000 sq ft is 15 lb on 3,000 sq ft (rate of LSU AgCenter, the area is ours)', () => {
    const known = { as: 'area', area: quantity(3000, 'sq-ft') };
    const question = {
      family: spreaderNeedFamily,
      given: { line: granules, bag: quantity(50, 'lb'), known, bagsAsked: false },
    };
    expect(graded(question, '15')).toBe('right');
    expect(graded(question, '15,000')).toBe('forgot-to-divide-by-1000');
  });

  it('140 gal in a 50 gal tank are three loads, the last of 40 gal (made for coverage)', () => {
    const given = { tank: quantity(50, 'gal'), job: { as: 'mix', mix: quantity(140, 'gal') } };
    const question = { family: tankLoadsFamily, given };
    expect(graded(question, '3')).toBe('right');
    expect(graded(question, '2')).toBe('rounded-down');
    expect(graded(question, '2.8')).toBe('not-rounded-up');
    expect(graded({ ...question, part: 'b' }, '40 gal')).toBe('right');
    expect(graded({ ...question, part: 'b' }, '50')).toBe('full-last-load');
  });
});
