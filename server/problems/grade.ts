import type { Quantity } from '../../shared/quantity/quantity.ts';
import type { Locale, PartKey, Text, Verdict } from '../../shared/vocabulary.ts';
import type { Problem } from './engine.ts';
import { partOf } from './engine.ts';
import type { ChoicePart, Earlier, OrderPart } from './family.ts';
import { gradeNumber } from './grade-number.ts';
import {
  asMessage,
  orderMessage,
  rightMessage,
  unrecognisedMessage,
  type Message,
  type UnreadableCode,
} from './verdict-messages.ts';

/** What a trainee sent for one part; the shape of `shared/contracts/practice.ts`. */
export type Response =
  | { kind: 'number'; text: string; unit?: string | undefined }
  | { kind: 'choice'; option: string }
  | { kind: 'order'; steps: string[] };

/** The verdict on one answer. */
export interface Graded {
  readonly verdict: Verdict;
  /** Key of the slip: a family's own, or one of the four shared ones; null when there is none. */
  readonly slip: string | null;
  /** How the entry was read: "2 1/2 Tbsp". */
  readonly read: Text;
  /** The entry in the part's unit, for carrying into later parts; null when it cannot be carried. */
  readonly value: Quantity | null;
  readonly message: Message;
}

/** The entry could not be read; it is not an attempt. */
export interface Unreadable {
  readonly unreadable: UnreadableCode;
}

/** Tells an entry that could not be read from a graded one. */
export function isUnreadable(result: Graded | Unreadable): result is Unreadable {
  return 'unreadable' in result;
}

/** Right answers and carried ones earn the mark. */
export function earnsMark(verdict: Verdict): boolean {
  return verdict === 'right' || verdict === 'carried';
}

function gradeChoice(part: ChoicePart, option: string): Graded | Unreadable {
  const chosen = part.options.find((one) => one.key === option);
  if (!chosen) return { unreadable: 'no-such-option' };
  if (chosen.right) {
    return {
      verdict: 'right',
      slip: null,
      read: chosen.text,
      value: null,
      message: { ...rightMessage, detail: chosen.reason },
    };
  }
  return {
    verdict: 'slip',
    slip: chosen.slip ?? chosen.key,
    read: chosen.text,
    value: null,
    message: asMessage(chosen.reason),
  };
}

/** The first rule an order breaks, as [should come first, should come after]; null when it keeps all. */
function brokenRule(part: OrderPart, order: readonly string[]): readonly [string, string] | null {
  const place = new Map(order.map((key, index) => [key, index]));
  const rules =
    part.mustPrecede ?? part.steps.slice(1).map((step, index) => [part.steps[index]?.key ?? '', step.key] as const);
  for (const [before, after] of rules) {
    if ((place.get(before) ?? 0) > (place.get(after) ?? 0)) return [before, after];
  }
  return null;
}

function gradeOrder(problem: Problem, part: OrderPart, order: readonly string[]): Graded | Unreadable {
  const texts = new Map(part.steps.map((step) => [step.key, step.text]));
  const all = new Set(order);
  if (order.length !== texts.size || all.size !== texts.size || !order.every((key) => texts.has(key))) {
    return { unreadable: 'not-these-steps' };
  }
  const joined = (locale: Locale) =>
    order.map((key, index) => `${index + 1}. ${texts.get(key)?.[locale] ?? ''}`).join(' ');
  const read: Text = { en: joined('en'), es: joined('es') };
  const broken = brokenRule(part, order);
  if (!broken) return { verdict: 'right', slip: null, read, value: null, message: rightMessage };
  const slip = problem.family.slips.find((one) => one.part === part.key && one.inOrder?.(problem.given, order));
  if (slip) {
    return { verdict: 'slip', slip: slip.key, read, value: null, message: asMessage(slip.message(problem.given, {})) };
  }
  const [before, after] = broken;
  const first = texts.get(before);
  const then = texts.get(after);
  const message = first && then ? orderMessage(first, then) : unrecognisedMessage;
  return { verdict: 'unrecognised', slip: null, read, value: null, message };
}

/**
 * Grades one answer.
 * @param options.earlier the trainee's own readable answers to earlier numeric parts, as they first gave them
 * @throws RangeError when the problem has no such part
 */
export function gradePart(options: {
  problem: Problem;
  part: PartKey;
  response: Response;
  earlier: Earlier;
  locale: Locale;
}): Graded | Unreadable {
  const { problem, response, earlier, locale } = options;
  const part = partOf(problem, options.part);
  if (!part) throw new RangeError(`problem ${problem.key.family} has no part ${options.part}`);
  if (part.kind === 'choice' && response.kind === 'choice') return gradeChoice(part, response.option);
  if (part.kind === 'order' && response.kind === 'order') return gradeOrder(problem, part, response.steps);
  if ((part.kind === 'number' || part.kind === 'count') && response.kind === 'number') {
    return gradeNumber({ problem, part, text: response.text, unit: response.unit, earlier, locale });
  }
  return { unreadable: 'wrong-form' };
}
