import { inUnit, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Active ingredient in a weight of dry product: weight × percent ÷ 100.
 * Units: a weight in any unit and a percent; the result is in the weight's unit, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or the percent is not a percent
 * Source: Dry chemical applicator calibration, alternative procedure, Florida Cooperative Extension Service.
 */
export function activeInDry(use: { readonly product: Quantity; readonly percent: Quantity }): Quantity {
  mustBePositive({ product: use.product, percent: use.percent });
  return scale(use.product, inUnit(use.percent, 'percent').div(100));
}
