import type { UnitKey } from './units.ts';
import { belowSpellings, inContext, rateUnits, spellings } from './unit-aliases.ts';
import { kindOf, units } from './units.ts';

/** A unit found in a text, and where its name ends. */
export interface UnitFound {
  readonly unit: UnitKey;
  readonly end: number;
}

interface Names<T> {
  readonly of: ReadonlyMap<string, T>;
  readonly longest: number;
}

function names<T>(rows: Iterable<readonly [T, string]>): Names<T> {
  const of = new Map<string, T>();
  for (const [key, row] of rows) for (const spelling of row.split('|')) of.set(spelling, key);
  return { of, longest: Math.max(...[...of.keys()].map((spelling) => spelling.length)) };
}

const unitNames = names(Object.entries(spellings) as [UnitKey, string][]);
const belowNames = names(Object.entries(belowSpellings));
const letter = /\p{L}/u;
const digit = /[0-9]/;

/** Whether a name ending before `end` is cut out of a longer word: "gal" of "gallop", but not "ft" of "5ft6in". */
function isCut(text: string, end: number): boolean {
  const last = text[end - 1] ?? '';
  const next = text[end] ?? '';
  if (letter.test(last)) return letter.test(next);
  return digit.test(last) && (letter.test(next) || digit.test(next));
}

/** The longest name that starts at `from`; at most as many look-ups as the longest name has characters. */
function longestAt<T>(table: Names<T>, text: string, from: number): { key: T; name: string; end: number } | null {
  for (let end = Math.min(text.length, from + table.longest); end > from; end -= 1) {
    const name = text.slice(from, end);
    const key = table.of.get(name);
    if (key !== undefined && !isCut(text, end)) return { key, name, end };
  }
  return null;
}

const per = / ?\/ ?| (?:per|a|an|por|cada|por cada|each|for each|for every|every) /y;
const one = /(?:1|one|un|una) /y;

function skip(pattern: RegExp, text: string, from: number): number {
  pattern.lastIndex = from;
  return pattern.test(text) ? pattern.lastIndex : from;
}

function isUnit(key: string): key is UnitKey {
  return Object.hasOwn(units, key);
}

/** The rate that `top` begins when "per ..." stands at `from`: gal, " per acre" -> gal/acre. Null when none does. */
export function rateAt(top: UnitKey, text: string, from: number): UnitFound | null {
  const start = skip(per, text, from);
  if (start === from) return null;
  const below = longestAt(belowNames, text, start) ?? longestAt(belowNames, text, skip(one, text, start));
  if (!below) return null;
  const key = `${top}/${below.key}`;
  const unit = rateUnits[key] ?? key;
  return isUnit(unit) ? { unit, end: below.end } : null;
}

/**
 * The unit whose name a tidied text has at `from`, rates included; null when it has none there. A few letters mean one
 * thing or another by what is asked (`near`): c is a cup, but Celsius where a temperature is asked.
 */
export function unitAt(text: string, from: number, near: UnitKey): UnitFound | null {
  const top = longestAt(unitNames, text, from);
  if (!top) return null;
  const rate = rateAt(top.key, text, top.end);
  if (rate) return rate;
  const meant = inContext[kindOf(near)]?.[top.name] ?? top.key;
  return { unit: meant === 'asked' ? near : meant, end: top.end };
}
