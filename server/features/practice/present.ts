import type { Figure } from '../../../shared/contracts/figure.ts';
import type { AttemptView, PartView, ProblemView } from '../../../shared/contracts/practice.ts';
import { formatQuantity, unitSymbol } from '../../../shared/quantity/format.ts';
import { quantity } from '../../../shared/quantity/quantity.ts';
import type { Locale } from '../../../shared/vocabulary.ts';
import { roundedAnswer } from '../../problems/answer-text.ts';
import type { Problem } from '../../problems/engine.ts';
import type { Part } from '../../problems/family.ts';
import type { Response } from '../../problems/grade.ts';
import { labelView } from '../../problems/labels/label-view.ts';
import { localize } from '../../problems/localize.ts';
import { shuffledOptions, shuffledSteps } from '../../problems/shuffle.ts';
import { isDone, type ReplayedAttempt, type Standing } from './replay.ts';
import { workingView } from './working-view.ts';

/** Where a problem stands in the product: what its page needs beside the problem itself. */
export interface Place {
  id: string;
  hints: number;
  drill: { id: string; position: number; length: number } | null;
}

const hintsInAll = 3;

function typedText(response: Response | null): string {
  if (!response) return '';
  if (response.kind === 'number') return response.text;
  return response.kind === 'choice' ? response.option : response.steps.join(' ');
}

export function attemptView({ row, graded }: ReplayedAttempt, locale: Locale): AttemptView {
  return {
    typed: typedText(row.response),
    read: graded.read[locale],
    verdict: row.verdict,
    slip: row.slip,
    headline: graded.message.headline[locale],
    detail: graded.message.detail[locale],
    counts: row.isFirst,
  };
}

function closedAnswer(part: Part, locale: Locale): string {
  if (part.kind === 'choice') return part.options.find((option) => option.right)?.text[locale] ?? '';
  if (part.kind === 'order') return part.steps.map((step, index) => `${index + 1}. ${step.text[locale]}`).join(' ');
  return roundedAnswer(part)[locale];
}

function form(problem: Problem, part: Part, closed: boolean, locale: Locale) {
  switch (part.kind) {
    case 'number':
      return {
        kind: part.kind,
        units: part.units.map((unit) => ({ key: unit, symbol: unitSymbol(unit, { locale }) })),
        rounding: formatQuantity(quantity(part.step, part.answer.unit), { locale }),
      };
    case 'count':
      return { kind: part.kind, thing: part.thing[locale] };
    case 'choice':
      return {
        kind: part.kind,
        // Which option is right, and why, stays on the server until the part is closed.
        options: shuffledOptions(problem, part).map((option) => ({
          key: option.key,
          text: option.text[locale],
          reason: closed ? option.reason[locale] : null,
          right: closed ? option.right : null,
        })),
      };
    case 'order': {
      const steps = closed ? part.steps : shuffledSteps(problem, part);
      return { kind: part.kind, steps: steps.map((step) => ({ key: step.key, text: step.text[locale] })) };
    }
  }
}

interface Shown {
  problem: Problem;
  standing: Standing;
  place: Place;
  locale: Locale;
}

/** The parts of a problem as its own person may see them now. Answers appear only in parts that are closed. */
export function partViews({ problem, standing, place, locale }: Shown): PartView[] {
  const { family, given } = problem;
  const current = problem.parts.find((part) => !standing.closed.has(part.key))?.key;
  const hints = current && place.hints > 0 ? family.hints(given).slice(0, place.hints) : [];
  return problem.parts.map((part): PartView => {
    const closed = standing.closed.has(part.key);
    return {
      key: part.key,
      topic: part.topic,
      ask: part.ask[locale],
      state: closed ? 'closed' : 'open',
      attempts: (standing.attempts.get(part.key) ?? []).map((attempt) => attemptView(attempt, locale)),
      hints: part.key === current ? hints.map((hint) => hint[locale]) : [],
      hintsLeft: closed ? 0 : hintsInAll - place.hints,
      answerText: closed ? closedAnswer(part, locale) : null,
      ...form(problem, part, closed, locale),
    };
  });
}

/** The whole view of a problem; the worked solution only once every part is closed. */
export function problemView(shown: Shown): ProblemView {
  const { problem, standing, place, locale } = shown;
  const { family, given } = problem;
  const use = family.label?.(given);
  const done = isDone(problem, standing);
  return {
    id: place.id,
    topic: family.topic,
    tier: problem.key.tier,
    heading: family.heading(given)[locale],
    statement: family.statement(given)[locale],
    figure: family.figure ? (localize(family.figure(given), locale) as Figure) : null,
    label: use ? labelView(use.label, locale) : null,
    parts: partViews(shown),
    working: done ? workingView(problem, locale) : null,
    state: done ? 'done' : 'open',
    drill: place.drill,
    locale,
  };
}
