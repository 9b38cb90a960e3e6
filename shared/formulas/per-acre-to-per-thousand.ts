import { quantity, type Quantity } from '../quantity/quantity.ts';
import { productForArea } from './product-for-area.ts';

/**
 * What 1,000 sq ft get of an amount given for an acre: amount ÷ 43.56.
 * Units: a volume or a weight in any unit; the result is in the same unit, exact.
 * Domain: above zero.
 * @throws RangeError when the amount is zero or less
 * Source: Calibrating Application Equipment (turfgrass management slides), Oklahoma State University - Oklahoma City, 2013.
 */
export function perAcreToPerThousand(rate: { readonly perAcre: Quantity }): Quantity {
  return productForArea({
    amount: rate.perAcre,
    labelArea: quantity(1, 'acre'),
    area: quantity(1000, 'sq-ft'),
  });
}
