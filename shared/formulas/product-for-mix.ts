import { ratio, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Product for a volume of finished spray: amount × (mix ÷ the mix the amount is for). Serves rates per gallon and per 100 gal.
 * Units: amount a volume or a weight in any unit, both mixes volumes in any unit; the result is in the amount's unit, exact.
 * Domain: all above zero.
 * @throws RangeError when one is zero or less, or a mix is not a volume
 * Source: Agrochemical and Pesticide Safety (handbook), mixing chapter, Example 1, M. F. Waxman, CRC/Lewis, 1998 (author,
 * publisher and year from memory); Guidelines for Spot Spraying, herbicide manufacturer guidance.
 */
export function productForMix(use: {
  readonly amount: Quantity;
  readonly perMix: Quantity;
  readonly mix: Quantity;
}): Quantity {
  const { amount, perMix, mix } = use;
  mustBePositive({ amount, perMix, mix });
  return scale(amount, ratio(mix, perMix));
}
