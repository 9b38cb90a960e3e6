import { parseQuantity } from '../../shared/quantity/parse.ts';
import { inUnit, quantity, type Quantity } from '../../shared/quantity/quantity.ts';
import { rational, type Rational } from '../../shared/quantity/rational.ts';
import { roundToStep } from '../../shared/quantity/round.ts';
import { kindOf, units, unitsOfKind, type UnitKey } from '../../shared/quantity/units.ts';
import type { Locale } from '../../shared/vocabulary.ts';
import { asWritten, placesOf, roundedAnswer } from './answer-text.ts';
import { partsGivenEarlier, type Problem } from './engine.ts';
import type { CountPart, Earlier, NumberPart } from './family.ts';
import type { Graded, Unreadable } from './grade.ts';
import { counts, inPartUnit, isNumeric, toleranceAround } from './tolerance.ts';
import * as say from './verdict-messages.ts';

interface Entry {
  readonly part: NumberPart | CountPart;
  readonly value: Rational;
  readonly typed: Quantity;
}

/** Whether a value in the part's unit is right: the exact answer, or one that a rounded constant of the trade gives. */
export function isRight(part: NumberPart | CountPart, value: Rational): boolean {
  if (counts(part, value, part.answer.value)) return true;
  if (part.kind === 'count') return false;
  return (part.alsoRight ?? []).some((also) => counts(part, value, inPartUnit(part, also)));
}

function otherKind(part: NumberPart | CountPart, typed: Quantity): Omit<Graded, 'read'> {
  const asked = part.answer.unit;
  // The same number in the asked unit, or in another unit of the asked kind that a tool would show.
  const same = unitsOfKind(kindOf(asked)).some((unit) => isRight(part, inUnit(quantity(typed.value, unit), asked)));
  return {
    verdict: same ? 'unit-kind' : 'unrecognised',
    slip: same ? 'unit-kind' : null,
    value: null,
    message: say.unitKindMessage(typed.unit, asked, same),
  };
}

function carried({ part, value }: Entry, problem: Problem, earlier: Earlier): Omit<Graded, 'read'> | null {
  const own = partsGivenEarlier(problem, earlier).find((one) => one.key === part.key);
  if (!own || !isNumeric(own)) return null;
  const ownValue = inPartUnit(part, own.answer);
  if (ownValue.compare(0) <= 0 || counts(part, ownValue, part.answer.value)) return null;
  if (!isRight(own, inUnit(quantity(value, part.answer.unit), own.answer.unit))) return null;
  return {
    verdict: 'carried',
    slip: null,
    value: quantity(value, part.answer.unit),
    message: say.carriedMessage(roundedAnswer(own), roundedAnswer(part)),
  };
}

/** The slip whose own value the entry matches best, with the exact earlier answers or with the trainee's own. */
function matchedSlip({ part, value }: Entry, problem: Problem, earlier: Earlier): Omit<Graded, 'read'> | null {
  let best: { key: string; off: Rational; message: say.Message } | null = null;
  const consider = (key: string, target: Rational, message: () => say.Message) => {
    const off = value.sub(target).abs();
    if (off.compare(toleranceAround(part, target)) > 0) return;
    if (best && best.off.compare(off) <= 0) return;
    best = { key, off, message: message() };
  };
  const ownEarlier = Object.keys(earlier).length > 0;
  for (const live of problem.slips) {
    if (live.part !== part.key) continue;
    const text = (from: Earlier) => () => say.asMessage(live.slip.message(problem.given, from));
    consider(live.key, live.value, text({}));
    if (!ownEarlier || !live.slip.answer) continue;
    const own = live.slip.answer(problem.given, earlier);
    if (own) consider(live.key, inPartUnit(part, own), text(earlier));
  }
  const found = best as { key: string; message: say.Message } | null;
  return (
    found && { verdict: 'slip', slip: found.key, value: quantity(value, part.answer.unit), message: found.message }
  );
}

function unitName({ part, typed }: Entry): Omit<Graded, 'read'> | null {
  const asked = part.answer.unit;
  const fits = unitsOfKind(kindOf(asked)).find(
    (unit) => unit !== typed.unit && isRight(part, inUnit(quantity(typed.value, unit), asked)),
  );
  if (!fits || units[fits].offset) return null;
  return {
    verdict: 'unit-name',
    slip: 'unit-name',
    value: inAsked(part, typed),
    message: say.unitNameMessage(typed.unit, fits),
  };
}

function inAsked(part: NumberPart | CountPart, typed: Quantity): Quantity {
  return quantity(inPartUnit(part, typed), part.answer.unit);
}

const powersOfTen = [10, 100, 1000].map((power) => rational(power));

function decimalPlace({ part, value, typed }: Entry): Omit<Graded, 'read'> | null {
  for (const power of powersOfTen) {
    const tooLarge = isRight(part, value.div(power));
    if (tooLarge || isRight(part, value.mul(power))) {
      return {
        verdict: 'decimal-place',
        slip: 'decimal-place',
        value: inAsked(part, typed),
        message: say.decimalPlaceMessage(tooLarge),
      };
    }
  }
  return null;
}

/** Less than one whole step off, or rounded to a place too coarse: right before rounding, wrong after. */
function rounding({ part, value, typed }: Entry): Omit<Graded, 'read'> | null {
  if (part.kind === 'count') return null;
  const exact = part.answer.value;
  const within = value.sub(exact).abs().compare(part.step) < 0;
  const coarser = part.step.mul(10);
  const coarse = (['nearest', 'up', 'down'] as const).some((mode) => {
    const rounded = roundToStep(exact, coarser, mode);
    return rounded.compare(0) > 0 && rounded.compare(value) === 0 && rounded.sub(exact).abs().compare(exact.div(2)) < 0;
  });
  if (!within && !coarse) return null;
  return { verdict: 'rounding', slip: 'rounding', value: inAsked(part, typed), message: say.roundingMessage(part) };
}

function isUnit(unit: string): unit is UnitKey {
  return Object.hasOwn(units, unit);
}

/**
 * Grades one entered number. Order: unreadable; wrong kind of unit; right; carried (only where the trainee's own earlier
 * answer changes what is right, so that a mark earned by method is never lost to a slip that happens to give the same);
 * a slip of the family (before `unit-name`, since it says more when both fit); right in another unit; decimal place;
 * rounding; unrecognised.
 */
export function gradeNumber(options: {
  problem: Problem;
  part: NumberPart | CountPart;
  text: string;
  unit?: string | undefined;
  earlier: Earlier;
  locale: Locale;
}): Graded | Unreadable {
  const { problem, part, earlier, locale } = options;
  const defaultUnit = options.unit !== undefined && isUnit(options.unit) ? options.unit : part.answer.unit;
  const parsed = parseQuantity(options.text, { locale, defaultUnit });
  if (!parsed.ok) return { unreadable: parsed.problem };
  const typed = parsed.quantity;
  const read = asWritten(typed, options.text);
  if (kindOf(typed.unit) !== kindOf(part.answer.unit)) return { read, ...otherKind(part, typed) };
  const entry: Entry = { part, typed, value: inPartUnit(part, typed) };
  const value = quantity(entry.value, part.answer.unit);
  if (isRight(part, entry.value)) {
    return { read, verdict: 'right', slip: null, value, message: say.rightNumber(part, roundedAnswer(part)) };
  }
  if (entry.value.compare(0) <= 0) {
    return { read, verdict: 'unrecognised', slip: null, value: null, message: say.negativeMessage };
  }
  const found =
    carried(entry, problem, earlier) ??
    matchedSlip(entry, problem, earlier) ??
    unitName(entry) ??
    decimalPlace(entry) ??
    rounding(entry);
  if (found) return { read, ...found };
  const whole = part.kind === 'count' && placesOf(entry.value) > 0;
  return {
    read,
    verdict: 'unrecognised',
    slip: null,
    value,
    message: whole ? say.wholeOnlyMessage : say.unrecognisedMessage,
  };
}
