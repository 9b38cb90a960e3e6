import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { rational } from '../quantity/rational.ts';
import { mustBePositive } from './positive.ts';
import { waterWeight } from './powder-for-percent-weight.ts';

const million = rational(1_000_000);

/**
 * Parts per million by weight of something in water: its weight ÷ the weight of the water × 1,000,000.
 * Units: a weight and a volume of water in any unit, and (8.34 lb/gal unless given) the weight of water; the result is in
 * ppm, exact for that weight.
 * Domain: all above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Formulas for Determining Application Rates, Virginia Department of Wildlife Resources; Nutrition and fertility:
 * ppm calculations, Texas A&M AgriLife Extension, greenhouse IPM guide.
 */
export function partsPerMillion(mix: {
  readonly dissolved: Quantity;
  readonly water: Quantity;
  readonly density?: Quantity;
}): Quantity {
  const { dissolved, water } = mix;
  const density = mix.density ?? waterWeight;
  mustBePositive({ dissolved, water, density });
  const pounds = inUnit(water, 'gal').mul(inUnit(density, 'lb/gal'));
  return quantity(inUnit(dissolved, 'lb').div(pounds).mul(million), 'ppm');
}
