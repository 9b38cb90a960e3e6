import { convert, inUnit, quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational, type Rational } from '../../../../shared/quantity/rational.ts';
import { roundToStep } from '../../../../shared/quantity/round.ts';
import type { UnitKey } from '../../../../shared/quantity/units.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, rounded } from '../../say.ts';
import { about, given, over, struck, type Expression } from '../../working.ts';

const one = rational(1);
const twentyNineFiftySeven = rational('29.5735295625');
/** The fluid ounce of 30 mL that many bulletins and measures use. */
const thirty = rational(30);

/** How many `to` one `from` holds. */
export function perUnit(from: UnitKey, to: UnitKey): Rational {
  return inUnit(quantity(1, from), to);
}

/** Decimals a factor is known by: 29.57 mL in a fluid ounce, 3.785 L in a gallon. */
function placesShown(a: UnitKey, b: UnitKey): number {
  return a === 'l' || b === 'l' ? 3 : 2;
}

/** The factor of a step as a fraction whose lower unit cancels: 128 fl oz / 1 gal, or 1 gal / 128 fl oz. */
export function factorOver(from: UnitKey, to: UnitKey, strikeTop = false): Expression {
  const many = perUnit(from, to);
  const top = many.compare(one) >= 0 ? quantity(many, to) : quantity(1, to);
  const bottom = many.compare(one) >= 0 ? quantity(1, from) : quantity(many.inverse(), from);
  const maxPlaces = placesShown(from, to);
  return over(given(top, { cancel: strikeTop, maxPlaces }), struck(bottom, maxPlaces));
}

/** "1 gal = 128 fl oz", the larger unit first. */
export function fact(a: UnitKey, b: UnitKey): Text {
  const [large, small] = perUnit(a, b).compare(one) >= 0 ? [a, b] : [b, a];
  const many = rounded(convert(quantity(1, large), small), placesShown(large, small));
  return { en: en`${quantity(1, large)} = ${many}`, es: es`${quantity(1, large)} = ${many}` };
}

export function isMetric(unit: UnitKey): boolean {
  return unit === 'ml' || unit === 'l';
}

/** What a fluid ounce of 30 mL gives instead of the exact answer; nothing where no metric unit is involved. */
export function byThirtyMl(answer: Quantity, from: UnitKey): Quantity[] {
  if (isMetric(from) === isMetric(answer.unit)) return [];
  const share = thirty.div(twentyNineFiftySeven);
  return [quantity(isMetric(answer.unit) ? answer.value.mul(share) : answer.value.div(share), answer.unit)];
}

/** The result of a change: the exact figure, then the rounded one where they differ. */
export function toStep(answer: Quantity, step: Rational, places: number): Expression {
  const shown = given(quantity(roundToStep(answer.value, step), answer.unit), { places });
  return roundToStep(answer.value, step).compare(answer.value) === 0
    ? shown
    : about(given(answer, { maxPlaces: 3 }), shown);
}
