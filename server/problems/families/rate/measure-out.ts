import { convert, quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import { roundToStep } from '../../../../shared/quantity/round.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es } from '../../say.ts';
import { about, given, type Expression } from '../../working.ts';

const tenth = rational('0.1');

/**
 * How one would measure out an amount of product: small volumes in tablespoons, larger ones in quarts and fluid ounces,
 * weights on a scale. The amount in fl oz or oz.
 */
export function measuredOut(amount: Quantity): Text {
  const value = roundToStep(amount.value, tenth);
  const shown = quantity(value, amount.unit);
  if (amount.unit === 'oz') return weighedOut(shown);
  if (value.compare(8) < 0) {
    const spoons = convert(shown, 'tbsp');
    return {
      en: en`To measure it: ${shown} × 2 = ${spoons}.`,
      es: es`Para medirlo: ${shown} × 2 = ${spoons}.`,
    };
  }
  const quarts = value.div(32).floor();
  if (quarts.compare(1) < 0) {
    return {
      en: en`Measure ${shown} in a marked measuring cup.`,
      es: es`Mida ${shown} en una taza medidora con marcas.`,
    };
  }
  const rest = quantity(value.sub(quarts.mul(32)), 'fl-oz');
  const whole = quantity(quarts, 'qt');
  return rest.value.compare(0) === 0
    ? { en: en`To measure it: ${whole}.`, es: es`Para medirlo: ${whole}.` }
    : { en: en`To measure it: ${whole} and ${rest}.`, es: es`Para medirlo: ${whole} y ${rest}.` };
}

function weighedOut(shown: Quantity): Text {
  const pounds = shown.value.div(16).floor();
  if (pounds.compare(1) < 0) {
    return {
      en: en`Weigh ${shown} on a scale; do not use a measuring cup.`,
      es: es`Pese ${shown} en una balanza; no use taza medidora.`,
    };
  }
  const rest = quantity(shown.value.sub(pounds.mul(16)), 'oz');
  return {
    en: en`On a scale that is ${quantity(pounds, 'lb')} ${rest}.`,
    es: es`En una balanza son ${quantity(pounds, 'lb')} ${rest}.`,
  };
}

/** The last step of an amount asked to a tenth: the exact figure, then the rounded one where they differ. */
export function toTenth(amount: Quantity): Expression {
  const rounded = given(amount, { places: 1 });
  return roundToStep(amount.value, tenth).compare(amount.value) === 0 ? rounded : about(given(amount), rounded);
}
