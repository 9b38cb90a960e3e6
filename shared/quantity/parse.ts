import { add, scale, type Quantity } from './quantity.ts';
import type { Rational } from './rational.ts';
import { isFailure, readNumber } from './read-number.ts';
import { tidyEntry } from './tidy-entry.ts';
import { rateAt, unitAt } from './unit-at.ts';
import { kindOf, units, type Kind, type UnitKey } from './units.ts';

/** Why an entry could not be read. */
export type ParseProblem =
  | 'empty'
  | 'no-number'
  | 'two-numbers'
  | 'unknown-unit'
  | 'zero-denominator'
  | 'too-long'
  | 'mixed-kinds'
  | 'ambiguous-comma'
  | 'not-a-number';

export type ParseResult =
  { ok: true; quantity: Quantity; unitGiven: boolean } | { ok: false; problem: ParseProblem; detail?: string };

interface Failure {
  readonly problem: ParseProblem;
  readonly detail?: string;
}

/** One number of an entry with its unit, if it has one. */
interface Term {
  readonly value: Rational;
  readonly unit: UnitKey | null;
  readonly signed: boolean;
  /** Joined to the next by "and", a comma or a plus. */
  readonly joined: boolean;
  readonly end: number;
}

/** Longer entries are refused unread: no measure takes more. */
const mostCharacters = 200;

const before = / ?([-+]?) ?(\$?) ?([-+]?) ?/y;
const filler = / ?(?:(?:of an?|de) )?/y;
// A hyphen joins only without spaces, as in 5'-6": with spaces it could be a subtraction.
const joint = / ?(?:and|y|[,&+]) | ?[,&+](?=\d)|-(?=\d)/y;

function match(pattern: RegExp, text: string, from: number): RegExpExecArray | null {
  pattern.lastIndex = from;
  return pattern.exec(text);
}

/** Why no number stands at `from`. */
function noNumber(text: string, from: number): Failure {
  if (!/\d/.test(text)) return { problem: 'no-number' };
  const detail = text.slice(from, from + 40).trim();
  const word = from > 0 && /^[\p{L}°%#'"]/u.test(detail) && !/^e[-+]?\d/.test(detail);
  return { problem: word ? 'unknown-unit' : 'not-a-number', detail };
}

function termAt(text: string, from: number, asked: UnitKey): Term | Failure {
  const [space, sign, dollar, innerSign] = match(before, text, from) as unknown as [string, string, string, string];
  const number = readNumber(text, from + space.length);
  if (number === null) return noNumber(text, from);
  if (isFailure(number)) return number;
  const afterFiller = number.end + (match(filler, text, number.end)?.[0].length ?? 0);
  let found = unitAt(text, afterFiller, asked);
  if (dollar) {
    if (found && found.unit !== 'usd') return { problem: 'mixed-kinds' };
    found = rateAt('usd', text, number.end) ?? found ?? { unit: 'usd', end: number.end };
  }
  const end = found?.end ?? number.end;
  const joined = found ? match(joint, text, end) : null;
  const signs = sign + innerSign;
  if (signs.length > 1) return { problem: 'not-a-number', detail: signs };
  return {
    value: signs === '-' ? number.value.neg() : number.value,
    unit: found?.unit ?? null,
    signed: signs !== '',
    joined: joined !== null,
    end: end + (joined?.[0].length ?? 0),
  };
}

/** Splits a tidied text into numbers, each with its unit where one follows. */
function terms(text: string, asked: UnitKey): Term[] | Failure {
  const found: Term[] = [];
  for (let place = 0; place < text.length;) {
    const term = termAt(text, place, asked);
    if (isFailure(term)) return term;
    found.push(term);
    place = term.end;
  }
  return found;
}

/** Kinds that people give in steps of units. */
const kindsInSteps = new Set<Kind>(['length', 'area', 'volume', 'weight', 'time']);
const metric = new Set<UnitKey>(['mm', 'cm', 'm', 'km', 'sq-m', 'ha', 'ml', 'l', 'g', 'kg']);

/**
 * Whether `next` goes on from `last` as in "1 qt 6 fl oz": a smaller unit of the same system after a whole number.
 * "1.25 fl oz 37 mL" and "2 Tbsp 1 fl oz" say one amount twice; they are not added up.
 */
function goesOn(last: Term & { unit: UnitKey }, next: Term & { unit: UnitKey }): boolean {
  const from = units[last.unit];
  const to = units[next.unit];
  return (
    kindsInSteps.has(from.kind) &&
    from.toBase.compare(to.toBase) > 0 &&
    metric.has(last.unit) === metric.has(next.unit) &&
    (last.joined || last.value.d === 1n) &&
    !next.signed
  );
}

function hasUnit(term: Term): term is Term & { unit: UnitKey } {
  return term.unit !== null;
}

/** Several numbers as one quantity in the first one's unit; a minus before the first holds for all. */
function addUp(all: readonly Term[]): Quantity | Failure {
  const found = all.filter(hasUnit);
  const [first, ...rest] = found;
  if (!first || found.length < all.length) return { problem: 'two-numbers' };
  const negative = first.value.s < 0n;
  let sum: Quantity = { value: first.value.abs(), unit: first.unit };
  let last = first;
  for (const next of rest) {
    if (kindOf(next.unit) !== kindOf(first.unit)) return { problem: 'mixed-kinds' };
    if (!goesOn(last, next)) return { problem: 'two-numbers' };
    sum = add(sum, { value: next.value, unit: next.unit });
    last = next;
  }
  return negative ? scale(sum, -1) : sum;
}

/**
 * Reads one quantity as people type it: "1,250", "2,5", "1 1/4", "1¼", ".5", "1.25 fl oz", "2 T", "1 qt 6 fl oz".
 * Names of units are understood in both languages, and digits as crews of both write them (a point or a comma before
 * decimals, commas before groups of three), whatever `locale` is: many people mix the two.
 * Never throws; refuses anything longer than 200 characters unread. `defaultUnit` is used when no unit is typed. A bare
 * ounce is a weight, never a fluid ounce.
 */
export function parseQuantity(text: string, options: { locale: 'en' | 'es'; defaultUnit: UnitKey }): ParseResult {
  if (text.length > mostCharacters) return { ok: false, problem: 'too-long' };
  if (text.trim() === '') return { ok: false, problem: 'empty' };
  const found = terms(tidyEntry(text), options.defaultUnit);
  if (isFailure(found)) return { ok: false, ...found };
  const [first, second] = found;
  if (!first) return { ok: false, problem: 'no-number' };
  if (!second) {
    const quantity = { value: first.value, unit: first.unit ?? options.defaultUnit };
    return { ok: true, quantity, unitGiven: first.unit !== null };
  }
  const sum = addUp(found);
  return isFailure(sum) ? { ok: false, ...sum } : { ok: true, quantity: sum, unitGiven: true };
}
