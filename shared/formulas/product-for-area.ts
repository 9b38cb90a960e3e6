import { ratio, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * What an area needs when a label gives an amount for some area: amount × (area ÷ label area). Serves product and water.
 * Units: amount a volume or a weight in any unit, both areas in any area unit; the result is in the amount's unit, exact.
 * Domain: all above zero.
 * @throws RangeError when one is zero or less, or an area is not an area
 * Source: Pesticides in the Military, Subcourse MD0173, U.S. Army Medical Department Center and School, 2006 (application
 * calculations); Calibrating Application Equipment, Oklahoma State University - Oklahoma City, 2013 (rate × area).
 */
export function productForArea(use: {
  readonly amount: Quantity;
  readonly labelArea: Quantity;
  readonly area: Quantity;
}): Quantity {
  const { amount, labelArea, area } = use;
  mustBePositive({ amount, labelArea, area });
  return scale(amount, ratio(area, labelArea));
}
