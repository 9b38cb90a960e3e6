import { convert, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * An area in acres: square feet ÷ 43,560.
 * Units: any area unit; the result is in acres, exact.
 * Domain: above zero.
 * @throws RangeError when the area is zero or less, or not an area
 * Source: Pesticide Calculations for Small Acreages (ENTFACT-800), University of Kentucky Cooperative Extension, eq. 2.
 */
export function acresOf(site: { readonly area: Quantity }): Quantity {
  mustBePositive({ area: site.area });
  return convert(site.area, 'acre');
}
