import type { Quantity } from '../../../shared/quantity/quantity.ts';
import { quantity } from '../../../shared/quantity/quantity.ts';
import { rational } from '../../../shared/quantity/rational.ts';
import type { Locale, PartKey, Verdict } from '../../../shared/vocabulary.ts';
import { partOf, type Problem } from '../../problems/engine.ts';
import { earnsMark, gradePart, isUnreadable, type Graded, type Response } from '../../problems/grade.ts';
import { isNumeric } from '../../problems/tolerance.ts';
import { blankMessage } from '../../problems/verdict-messages.ts';

/** One row of the answer log, as far as a problem's own page needs it. */
export interface LoggedAnswer {
  part: PartKey;
  response: Response | null;
  read: string;
  value: string | null;
  verdict: Verdict;
  slip: string | null;
  attempt: number;
  isFirst: boolean;
  key: string;
}

export interface ReplayedAttempt {
  row: LoggedAnswer;
  graded: Graded;
}

/** Where a problem stands after its answers so far. */
export interface Standing {
  attempts: Map<PartKey, ReplayedAttempt[]>;
  closed: Set<PartKey>;
  /** The person's own latest answers, for parts that are not right: what later parts may carry. */
  own: Partial<Record<PartKey, Quantity>>;
}

export function newStanding(): Standing {
  return { attempts: new Map(), closed: new Set(), own: {} };
}

function ownBefore(standing: Standing, part: PartKey): Partial<Record<PartKey, Quantity>> {
  return Object.fromEntries(Object.entries(standing.own).filter(([key]) => key < part));
}

/** What the person's own earlier answers are for a part, at this moment. */
export function earlierFor(standing: Standing, part: PartKey): Partial<Record<PartKey, Quantity>> {
  return ownBefore(standing, part);
}

/**
 * Takes one more graded answer into the standing. Going on to a part closes the ones before it: what is said of a later part
 * may rest on their answers.
 */
export function take(standing: Standing, attempt: ReplayedAttempt): void {
  const { part, verdict } = attempt.row;
  const list = standing.attempts.get(part) ?? [];
  list.push(attempt);
  standing.attempts.set(part, list);
  if (verdict === 'blank') {
    standing.closed.add(part);
    return;
  }
  for (const earlier of standing.attempts.keys()) if (earlier < part) standing.closed.add(earlier);
  if (earnsMark(verdict)) standing.closed.add(part);
  // A carried value stays the person's own for the parts after it; a right one is the exact value anyway.
  if (verdict !== 'right' && attempt.graded.value) standing.own[part] = attempt.graded.value;
  if (verdict === 'right') delete standing.own[part];
}

function gradedAgain(problem: Problem, standing: Standing, row: LoggedAnswer, locale: Locale): Graded {
  const blank = { read: { en: row.read, es: row.read }, value: null, message: blankMessage } as const;
  if (!row.response) return { ...blank, verdict: row.verdict, slip: row.slip };
  const earlier = ownBefore(standing, row.part);
  const result = gradePart({ problem, part: row.part, response: row.response, earlier, locale });
  if (isUnreadable(result)) return { ...blank, verdict: row.verdict, slip: row.slip };
  const part = partOf(problem, row.part);
  // What was recorded stands: a later mending of the grader never changes an old verdict.
  const value = row.value !== null && part && isNumeric(part) ? quantity(rational(row.value), part.answer.unit) : null;
  return { ...result, verdict: row.verdict, slip: row.slip, value };
}

/** Rebuilds the standing of a problem from its rows of the log, oldest first, with messages in one language. */
export function replay(problem: Problem, rows: readonly LoggedAnswer[], locale: Locale): Standing {
  const standing = newStanding();
  for (const row of rows) take(standing, { row, graded: gradedAgain(problem, standing, row, locale) });
  return standing;
}

/** Whether every part is closed. */
export function isDone(problem: Problem, standing: Standing): boolean {
  return problem.parts.every((part) => standing.closed.has(part.key));
}
