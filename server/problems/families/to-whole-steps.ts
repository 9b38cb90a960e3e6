import { quantity, type Quantity } from '../../../shared/quantity/quantity.ts';
import type { Rational } from '../../../shared/quantity/rational.ts';
import { roundToStep } from '../../../shared/quantity/round.ts';

/** The quantity rounded to a whole number of steps of its unit: what a person who rounds an earlier part goes on with. */
export function toWholeSteps(value: Quantity, step: Rational): Quantity {
  return quantity(roundToStep(value.value, step), value.unit);
}
