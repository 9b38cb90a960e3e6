import { inUnit, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Product for a percent mix by volume: percent ÷ 100 × finished mix (made up to, not added to).
 * Units: a percent and a volume in any unit; the result is in the mix's unit, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or the percent is not a percent
 * Source: How Much Product to Add in Handheld Sprayers?, University of Illinois Extension, 2006.
 */
export function productForPercentVolume(use: { readonly percent: Quantity; readonly mix: Quantity }): Quantity {
  mustBePositive({ percent: use.percent, mix: use.mix });
  return scale(use.mix, inUnit(use.percent, 'percent').div(100));
}
