import { describe as group, expect, test } from 'vitest';
import { inUnit } from '../../shared/quantity/quantity.ts';
import { rational } from '../../shared/quantity/rational.ts';
import type { PartKey, Tier } from '../../shared/vocabulary.ts';
import { roundedAnswer } from './answer-text.ts';
import { choiceForm } from './choice-form.ts';
import { describe, describeGiven } from './describe.ts';
import { generate, type Problem } from './engine.ts';
import type { Family } from './family.ts';
import { gradePart, isUnreadable } from './grade.ts';
import { families } from './registry.ts';
import { apart, inPartUnit, isNumeric } from './tolerance.ts';

// The rules every family obeys, over many draws. One family alone: FAMILY=area-circle DRAWS=5000 npx vitest run server/problems/families.test.ts

const only = process.env.FAMILY;
const draws = Number(process.env.DRAWS ?? 2000);
/** Texts are slower to make than numbers: every so many draws are read as well. */
const readEvery = 10;

const chosen = families.filter((family) => !only || family.key === only);

function seeds(): string[] {
  return Array.from({ length: draws }, (_, index) => `property-${index}`);
}

function words(text: string): number {
  return text.split(/\s+/).filter(Boolean).length;
}

/** The answer as it could stand in a text: "1,600 sq ft" and the bare "1,600", but only where it is long enough to tell. */
function revealing(problem: Problem, part: PartKey): string[] {
  const found = problem.parts.find((one) => one.key === part);
  if (!found || !isNumeric(found)) return [];
  return [roundedAnswer(found).en];
}

function checkNumbers(family: Family<unknown>, problem: Problem, tier: Tier): void {
  const where = `${family.key} tier ${tier} seed ${problem.key.seed}`;
  const numeric = problem.parts.filter(isNumeric);
  const known = family.slips.filter((slip) => slip.answer && numeric.some((part) => part.key === slip.part)).length;
  expect(problem.slips.length, `${where}: slips kept`).toBeGreaterThanOrEqual(Math.min(tier === 1 ? 2 : 3, known));
  for (const part of numeric) {
    const answer = part.answer.value;
    expect(answer.compare(0), `${where} (${part.key}) is above zero`).toBe(1);
    if (part.kind === 'count') expect(answer.d, `${where} (${part.key}) is whole`).toBe(1n);
    else expect(part.units[0], `${where} (${part.key}) offers the asked unit first`).toBe(part.answer.unit);
    const values = problem.slips.filter((live) => live.part === part.key);
    values.forEach((live, index) => {
      expect(apart(part, live.value, answer), `${where} (${part.key}) ${live.key} against the answer`).toBe(true);
      for (const other of values.slice(index + 1)) {
        expect(apart(part, live.value, other.value), `${where} (${part.key}) ${live.key}, ${other.key}`).toBe(true);
      }
    });
  }
}

function checkChoices(problem: Problem): void {
  for (const part of problem.parts.filter(isNumeric)) {
    const options = choiceForm(problem, part);
    expect(options).toHaveLength(4);
    expect(options.filter((option) => option.right)).toHaveLength(1);
    options.slice(1).forEach((option, index) => {
      const smaller = inUnit((options[index] as (typeof options)[number]).value, part.answer.unit);
      const bigger = inUnit(option.value, part.answer.unit);
      expect(bigger.sub(smaller).compare(bigger.mul(rational(8, 100)))).toBeGreaterThanOrEqual(0);
    });
  }
}

function checkGrading(problem: Problem): void {
  const typed = (part: PartKey, text: string) =>
    gradePart({ problem, part, response: { kind: 'number', text }, earlier: {}, locale: 'en' });
  for (const part of problem.parts.filter(isNumeric)) {
    const right = typed(part.key, roundedAnswer(part).en);
    expect(isUnreadable(right) ? right : right.verdict, `${problem.key.family} "${roundedAnswer(part).en}"`).toBe(
      'right',
    );
    for (const live of problem.slips.filter((one) => one.part === part.key)) {
      const graded = typed(part.key, live.value.toFraction());
      expect(isUnreadable(graded) ? graded : graded.slip, `${problem.key.family} ${live.key}`).toBe(live.key);
    }
    if (part.kind === 'number') {
      for (const also of part.alsoRight ?? []) {
        const graded = typed(part.key, inPartUnit(part, also).toFraction());
        expect(isUnreadable(graded) ? graded : graded.verdict, `${problem.key.family} also right`).toBe('right');
      }
    }
  }
}

function checkTexts(family: Family<unknown>, problem: Problem): void {
  const where = `${family.key} seed ${problem.key.seed}`;
  for (const locale of ['en', 'es'] as const) {
    const told = describe(problem, locale);
    const texts = JSON.stringify(told);
    expect(texts, where).not.toMatch(/undefined|NaN|\[object|\$\{|null fl|null sq/);
    expect(words(told.statement), `${where}: words of the statement`).toBeLessThanOrEqual(locale === 'en' ? 60 : 75);
    expect(told.hints).toHaveLength(3);
    for (const part of told.parts) expect(part.ask.trim(), where).not.toBe('');
    for (const slip of told.slips) expect(slip.message.length, `${where} ${slip.key}`).toBeGreaterThan(20);
    if (family.figure) expect((told.figure as { alt: string }).alt.length, where).toBeGreaterThan(20);
  }
  const told = describe(problem, 'en');
  const last = problem.parts.findLast(isNumeric);
  if (last) expect(told.solution.join(' '), `${where}: solution reaches the answer`).toContain(roundedAnswer(last).en);
  for (const part of problem.parts) {
    for (const answer of revealing(problem, part.key)) {
      const sum = new RegExp(`(^|[^0-9.,])${answer.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')}([^0-9]|$)`);
      // A given number may by chance be the answer; then it stands in the statement, figure or label already.
      if (sum.test(`${told.statement} ${JSON.stringify(told.figure)} ${JSON.stringify(told.label)}`)) continue;
      for (const hint of told.hints) expect(hint, `${where}: hint gives the answer ${answer}`).not.toMatch(sum);
      for (const slip of told.slips) {
        if (slip.part === part.key)
          expect(slip.message, `${where}: ${slip.key} gives the answer ${answer}`).not.toMatch(sum);
      }
    }
  }
}

group('every family', () => {
  test('the registry holds families', () => expect(chosen.length).toBeGreaterThan(0));

  for (const family of chosen) {
    for (const tier of family.tiers) {
      test(`${family.key} tier ${tier} obeys the rules over ${draws} draws`, () => {
        const statements = new Set<string>();
        seeds().forEach((seed, index) => {
          const problem = generate(family, { seed, tier });
          checkNumbers(family, problem, tier);
          checkGrading(problem);
          if (index % readEvery !== 0) return;
          checkChoices(problem);
          checkTexts(family, problem);
          statements.add(family.statement(problem.given).en);
          const again = generate(family, { seed, tier });
          expect(describeGiven(again.given)).toEqual(describeGiven(problem.given));
        });
        expect(statements.size, `${family.key}: different statements`).toBeGreaterThanOrEqual(4);
      });
    }
  }
});
