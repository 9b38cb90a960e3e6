import { convert, inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Spray mix for a site: sprayer's rate × area.
 * Units: a volume per area and an area in any unit; the result is in gallons, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Agrochemical and Pesticide Safety (handbook), mixing chapter, Example 4, M. F. Waxman, CRC/Lewis, 1998 (author,
 * publisher and year from memory).
 */
export function mixForArea(site: { readonly rate: Quantity; readonly area: Quantity }): Quantity {
  mustBePositive({ rate: site.rate, area: site.area });
  const perThousand = convert(site.rate, 'gal/1000-sq-ft').value;
  return quantity(perThousand.mul(inUnit(site.area, '1000-sq-ft')), 'gal');
}
