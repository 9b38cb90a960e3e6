import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { rational } from '../quantity/rational.ts';
import { mustBePositive } from './positive.ts';

/** Weight of a gallon of water as the trade takes it, 8.34 lb. */
export const waterWeight = quantity(rational('8.34'), 'lb/gal');

/**
 * Dry product for a mix of a percent of active ingredient by weight: gallons × 8.34 × wanted percent ÷ product's percent.
 * Units: a volume, two percents and (8.34 lb/gal unless given) a weight per volume; the result is in pounds, exact.
 * Domain: all above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Pesticides in the Military, Subcourse MD0173, U.S. Army Medical Department Center and School, 2006.
 */
export function powderForPercentWeight(use: {
  readonly mix: Quantity;
  readonly wanted: Quantity;
  readonly product: Quantity;
  readonly density?: Quantity;
}): Quantity {
  const { mix, wanted, product } = use;
  const density = use.density ?? waterWeight;
  mustBePositive({ mix, wanted, product, density });
  const pounds = inUnit(mix, 'gal').mul(inUnit(density, 'lb/gal'));
  return quantity(pounds.mul(inUnit(wanted, 'percent')).div(inUnit(product, 'percent')), 'lb');
}
