import { ratio, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Stock for a weaker mix: amount wanted × wanted strength ÷ stock's strength (Q = A × S ÷ C).
 * Units: an amount (volume or weight) in any unit, two strengths of one kind; the result is in the amount's unit, exact.
 * Domain: all above zero, the wanted strength at most the stock's.
 * @throws RangeError when one is zero or less, the kinds differ, or the wanted mix is stronger than the stock
 * Source: Pesticides in the Military, Subcourse MD0173, U.S. Army Medical Department Center and School, 2006 (volumetric
 * calculations).
 */
export function stockForDilution(use: {
  readonly amount: Quantity;
  readonly wanted: Quantity;
  readonly stock: Quantity;
}): Quantity {
  const { amount, wanted, stock } = use;
  mustBePositive({ amount, wanted, stock });
  const share = ratio(wanted, stock);
  if (share.compare(1) > 0) throw new RangeError('the wanted mix is stronger than the stock');
  return scale(amount, share);
}
