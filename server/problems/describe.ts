import Fraction from 'fraction.js';
import { formatNumber, formatQuantity, unitSymbol } from '../../shared/quantity/format.ts';
import type { Quantity } from '../../shared/quantity/quantity.ts';
import type { Locale } from '../../shared/vocabulary.ts';
import { placesOf, roundedAnswer } from './answer-text.ts';
import { choiceForm } from './choice-form.ts';
import type { Problem } from './engine.ts';
import type { Part } from './family.ts';
import { labelView } from './labels/label-view.ts';
import { localize } from './localize.ts';
import { shuffledOptions, shuffledSteps } from './shuffle.ts';
import { isNumeric } from './tolerance.ts';
import { lineToPlain } from './working.ts';

/** A quantity as the published form of a problem writes it: `exact` is a whole number or a fraction, as text. */
export interface DescribedQuantity {
  exact: string;
  decimal: string;
  unit: string;
}

/** One part with its answer and, for numbers, its timed-set form. */
export interface DescribedPart {
  key: string;
  topic: string;
  kind: Part['kind'];
  ask: string;
  /** A quantity; the key of the right option; the keys in the right order. */
  answer: DescribedQuantity | string | string[];
  /** The step to round to, with its unit; null where nothing is rounded. */
  rounding: { step: string; unit: string; text: string } | null;
  options: { text: string; right: boolean; slip: string | null; reason?: string }[];
}

/** The whole of a problem, answers and slips included: for authors and checkers, never for a trainee. */
export interface DescribedProblem {
  family: string;
  version: number;
  seed: string;
  tier: number;
  topic: string;
  given: unknown;
  label: { name: string; rate: string; rows: readonly { heading: string; text: string }[] } | null;
  heading: string;
  statement: string;
  figure: unknown;
  parts: DescribedPart[];
  slips: { key: string; part: string; answer: DescribedQuantity; message: string }[];
  hints: string[];
  solution: string[];
}

function isQuantity(value: object): value is Quantity {
  return 'unit' in value && 'value' in value && typeof value.value === 'object';
}

function describeQuantity(value: Quantity): DescribedQuantity {
  return {
    exact: value.value.toFraction(),
    decimal: formatNumber(value.value, { maxPlaces: 6 }).replaceAll(',', ''),
    unit: unitSymbol(value.unit, { locale: 'en', value: value.value }),
  };
}

/** The drawn numbers as plain JSON: quantities as {exact, decimal, unit}, bare rationals as text. */
export function describeGiven(value: unknown): unknown {
  if (value === null || typeof value !== 'object') return typeof value === 'bigint' ? String(value) : value;
  if (Array.isArray(value)) return value.map(describeGiven);
  if (isQuantity(value)) return describeQuantity(value);
  if (value instanceof Fraction) return value.toFraction();
  return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, describeGiven(inner)]));
}

function describePart(problem: Problem, part: Part, locale: Locale): DescribedPart {
  const base = { key: part.key, topic: part.topic, kind: part.kind, ask: part.ask[locale] };
  if (part.kind === 'choice') {
    const options = shuffledOptions(problem, part).map((one) => ({
      text: one.text[locale],
      right: one.right,
      slip: one.right ? null : (one.slip ?? one.key),
      reason: one.reason[locale],
    }));
    return { ...base, answer: part.options.find((one) => one.right)?.key ?? '', rounding: null, options };
  }
  if (part.kind === 'order') {
    const options = shuffledSteps(problem, part).map((one) => ({ text: one.text[locale], right: true, slip: null }));
    return { ...base, answer: part.steps.map((one) => one.key), rounding: null, options };
  }
  const places = part.kind === 'count' ? 0 : placesOf(part.step);
  const options = choiceForm(problem, part).map((one) => ({
    text: formatQuantity(one.value, { locale, places }),
    right: one.right,
    slip: one.slip,
  }));
  const unit = unitSymbol(part.answer.unit, { locale: 'en', value: part.answer.value });
  const rounding =
    part.kind === 'count'
      ? { step: '1', unit: '', text: roundedAnswer(part)[locale] }
      : { step: part.step.toFraction(), unit, text: roundedAnswer(part)[locale] };
  return { ...base, answer: describeQuantity(part.answer), rounding, options };
}

/** The published form of a problem, one JSON object. */
export function describe(problem: Problem, locale: Locale): DescribedProblem {
  const { family, given } = problem;
  const use = family.label?.(given) ?? null;
  return {
    family: family.key,
    version: family.version,
    seed: problem.key.seed,
    tier: problem.key.tier,
    topic: family.topic,
    given: describeGiven(given),
    label: use && { name: use.label.name, rate: use.rate, rows: labelView(use.label, locale).rows },
    heading: family.heading(given)[locale],
    statement: family.statement(given)[locale],
    figure: family.figure ? localize(family.figure(given), locale) : null,
    parts: problem.parts.map((part) => describePart(problem, part, locale)),
    slips: problem.slips.map((live) => {
      const part = problem.parts.find((one) => one.key === live.part);
      if (!part || !isNumeric(part)) throw new Error(`slip ${live.key} belongs to no numeric part`);
      const answer = { value: live.value, unit: part.answer.unit };
      return {
        key: live.key,
        part: live.part,
        answer: describeQuantity(answer),
        message: live.slip.message(given, {})[locale],
      };
    }),
    hints: family.hints(given).map((hint) => hint[locale]),
    solution: family.working(given).map((line) => lineToPlain(line, locale)),
  };
}
