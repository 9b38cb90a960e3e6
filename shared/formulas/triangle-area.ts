import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Area of a triangle: base × height ÷ 2, the height measured square to the base.
 * Units: two lengths in any unit; the result is in square feet, exact.
 * Domain: base and height above zero.
 * @throws RangeError when one is zero or less, or not a length
 * Source: Calibrating Application Equipment (turfgrass management slides), Oklahoma State University - Oklahoma City, 2013.
 */
export function triangleArea(sides: { readonly base: Quantity; readonly height: Quantity }): Quantity {
  mustBePositive({ base: sides.base, height: sides.height });
  return quantity(inUnit(sides.base, 'ft').mul(inUnit(sides.height, 'ft')).div(2), 'sq-ft');
}
