import { describe, expect, test } from 'vitest';
import type { PartKey } from '../../../shared/vocabulary.ts';
import { roundedAnswer } from '../../problems/answer-text.ts';
import { generate, partsGivenEarlier, type Problem } from '../../problems/engine.ts';
import { gradePart, isUnreadable } from '../../problems/grade.ts';
import { familyByKey } from '../../problems/registry.ts';
import { isNumeric } from '../../problems/tolerance.ts';
import { problemView } from './present.ts';
import { earlierFor, isDone, newStanding, replay, take, type LoggedAnswer, type Standing } from './replay.ts';

function lawn(): Problem {
  const family = familyByKey('rate-label-base');
  if (!family) throw new Error('rate-label-base is not registered');
  return generate(family, { seed: 'replay', tier: 2 });
}

/** Answers as a trainee would, and keeps the log rows. */
function answer(problem: Problem, standing: Standing, rows: LoggedAnswer[], part: PartKey, text: string): LoggedAnswer {
  const response = { kind: 'number' as const, text };
  const graded = gradePart({ problem, part, response, earlier: earlierFor(standing, part), locale: 'en' });
  if (isUnreadable(graded)) throw new Error(`${text} could not be read`);
  const attempt = rows.filter((row) => row.part === part).length + 1;
  const value = graded.value?.value.toFraction() ?? null;
  const { verdict, slip } = graded;
  const row: LoggedAnswer = {
    part,
    response,
    read: graded.read.en,
    value,
    verdict,
    slip,
    attempt,
    isFirst: attempt === 1,
    key: `${rows.length}`,
  };
  rows.push(row);
  take(standing, { row, graded });
  return row;
}

function right(problem: Problem, part: PartKey): string {
  const found = problem.parts.find((one) => one.key === part);
  if (!found || !isNumeric(found)) throw new Error(`no number in ${part}`);
  return roundedAnswer(found).en;
}

describe('a problem replayed from its log', () => {
  test('credit is carried, and closes the wrong part it rests on', () => {
    const problem = lawn();
    const slip = problem.slips.find((live) => live.part === 'a');
    if (!slip) throw new Error('no slip in part a');
    const standing = newStanding();
    const rows: LoggedAnswer[] = [];
    expect(answer(problem, standing, rows, 'a', slip.value.toFraction()).slip).toBe(slip.key);
    expect(standing.closed.has('a')).toBe(false);
    const carried = partsGivenEarlier(problem, earlierFor(standing, 'b')).find((part) => part.key === 'b');
    if (!carried || !isNumeric(carried)) throw new Error('no part b');
    expect(answer(problem, standing, rows, 'b', roundedAnswer(carried).en).verdict).toBe('carried');
    expect([...standing.closed].sort()).toEqual(['a', 'b']);
    expect(replay(problem, rows, 'en').closed).toEqual(standing.closed);
  });

  test('once the earlier part is mended, later parts are held to the right answer', () => {
    const problem = lawn();
    const slip = problem.slips.find((live) => live.part === 'a');
    const standing = newStanding();
    const rows: LoggedAnswer[] = [];
    answer(problem, standing, rows, 'a', slip?.value.toFraction() ?? '');
    answer(problem, standing, rows, 'a', right(problem, 'a'));
    expect(earlierFor(standing, 'b')).toEqual({});
    for (const part of ['b', 'c'] as const)
      expect(answer(problem, standing, rows, part, right(problem, part)).verdict).toBe('right');
    expect(isDone(problem, standing)).toBe(true);
  });

  test('nothing that tells an open answer is in the view; once all is closed the worked solution is', () => {
    const problem = lawn();
    const standing = newStanding();
    const rows: LoggedAnswer[] = [];
    const place = { id: 'x', hints: 0, drill: null };
    const open = problemView({ problem, standing, place, locale: 'en' });
    expect(open.working).toBeNull();
    expect(open.parts.map((part) => part.answerText)).toEqual([null, null, null]);
    const told = JSON.stringify(open);
    expect(told).not.toContain(problem.key.seed);
    expect(told).not.toContain(right(problem, 'a'));
    for (const live of problem.slips) expect(told).not.toContain(live.key);
    for (const part of ['a', 'b', 'c'] as const) answer(problem, standing, rows, part, right(problem, part));
    const done = problemView({ problem, standing, place, locale: 'en' });
    expect(done.state).toBe('done');
    expect(done.parts.map((part) => part.answerText)).toEqual(
      ['a', 'b', 'c'].map((part) => right(problem, part as PartKey)),
    );
    expect(done.working?.at(-1)?.html).toContain('<math');
  });
});
