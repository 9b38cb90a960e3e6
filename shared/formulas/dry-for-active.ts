import { inUnit, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Dry product that holds a wanted weight of active ingredient: weight wanted ÷ (percent ÷ 100).
 * Units: a weight in any unit and a percent; the result is in the weight's unit, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or the percent is not a percent
 * Source: Agrochemical and Pesticide Safety (handbook), mixing chapter, Example 5, M. F. Waxman, CRC/Lewis, 1998 (author,
 * publisher and year from memory).
 */
export function dryForActive(use: { readonly active: Quantity; readonly percent: Quantity }): Quantity {
  mustBePositive({ active: use.active, percent: use.percent });
  return scale(use.active, inUnit(use.percent, 'percent').div(100).inverse());
}
