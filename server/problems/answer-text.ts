import { formatQuantity } from '../../shared/quantity/format.ts';
import { quantity, type Quantity } from '../../shared/quantity/quantity.ts';
import type { Rational } from '../../shared/quantity/rational.ts';
import { roundToStep } from '../../shared/quantity/round.ts';
import type { Text } from '../../shared/vocabulary.ts';
import type { CountPart, NumberPart } from './family.ts';

/** Decimal places that a number needs, at most 6: 0 for whole numbers, 1 for 0.5, 2 for 0.25. */
export function placesOf(value: Rational): number {
  let scaled = value;
  for (let places = 0; places < 6; places += 1) {
    if (scaled.d === 1n) return places;
    scaled = scaled.mul(10);
  }
  return 6;
}

/** The answer rounded as the statement says, in the asked unit. */
export function roundedValue(part: NumberPart | CountPart): Quantity {
  if (part.kind === 'count') return part.answer;
  return quantity(roundToStep(part.answer.value, part.step), part.answer.unit);
}

/** The answer as one would write it down, in both languages: "2.4 fl oz", "3 loads". */
export function roundedAnswer(part: NumberPart | CountPart): Text {
  const value = roundedValue(part);
  const places = part.kind === 'count' ? 0 : placesOf(part.step);
  const text = (locale: 'en' | 'es') =>
    formatQuantity(
      value,
      placesOf(part.kind === 'count' ? value.value : part.step) === 6 ? { locale, maxPlaces: 4 } : { locale, places },
    );
  return { en: text('en'), es: text('es') };
}

/** What was understood of an entry, kept in the form it was written: fractions stay fractions. */
export function asWritten(typed: Quantity, text: string): Text {
  const fraction = /[/¼½¾⅓⅔⅛⅜⅝⅞]/.test(text);
  const show = (locale: 'en' | 'es') =>
    formatQuantity(typed, fraction ? { locale, style: 'fraction' } : { locale, maxPlaces: 6 });
  return { en: show('en'), es: show('es') };
}
