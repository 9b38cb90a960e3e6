import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Area of a rectangle: length × width.
 * Units: two lengths in any unit; the result is in square feet, exact.
 * Domain: both sides above zero.
 * @throws RangeError when a side is zero or less, or not a length
 * Source: Pesticide Calculations for Small Acreages (ENTFACT-800), University of Kentucky Cooperative Extension, eq. 1.
 */
export function rectangleArea(sides: { readonly length: Quantity; readonly width: Quantity }): Quantity {
  mustBePositive({ length: sides.length, width: sides.width });
  return quantity(inUnit(sides.length, 'ft').mul(inUnit(sides.width, 'ft')), 'sq-ft');
}
