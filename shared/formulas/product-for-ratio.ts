import { scale, type Quantity } from '../quantity/quantity.ts';
import { rational, type Rational } from '../quantity/rational.ts';
import { mustBePositive } from './positive.ts';

/**
 * Product for a dilution of 1 part to so many parts of water. Charts differ: `added-to` takes the parts of the water alone
 * (128 ÷ n fluid ounces to a gallon of water), `made-up-to` takes 1 part in n + 1 parts of finished mix (128 ÷ (n + 1) in a
 * finished gallon). A problem says which.
 * Units: a volume in any unit (the water, or the finished mix); the result is in the same unit, exact.
 * Domain: volume and parts above zero.
 * @throws RangeError when one is zero or less
 * Source: Dilution charts and conversion tables, janitorial chemical supplier (charts A and B add to; chart C makes up to).
 */
export function productForRatio(use: {
  readonly volume: Quantity;
  readonly waterParts: Rational;
  readonly convention: 'added-to' | 'made-up-to';
}): Quantity {
  mustBePositive({ volume: use.volume });
  if (use.waterParts.compare(0) <= 0) throw new RangeError('waterParts must be above zero');
  const parts = use.convention === 'added-to' ? use.waterParts : use.waterParts.add(rational(1));
  return scale(use.volume, parts.inverse());
}
