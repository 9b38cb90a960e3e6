import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { rational, type Rational } from '../quantity/rational.ts';
import { mustBePositive } from './positive.ts';

/** The pi of the trade's bulletins: with it a circle's area is one exact number. */
export const tradePi = rational('3.14');

/**
 * Area of a circle: pi × radius × radius.
 * Units: radius in any length unit; the result is in square feet, exact for the pi given (3.14 unless said otherwise).
 * Domain: radius and pi above zero.
 * @throws RangeError when one is zero or less, or the radius is not a length
 * Source: Calibrating Application Equipment (turfgrass management slides), Oklahoma State University - Oklahoma City, 2013.
 */
export function circleArea(circle: { readonly radius: Quantity; readonly pi?: Rational }): Quantity {
  mustBePositive({ radius: circle.radius });
  const pi = circle.pi ?? tradePi;
  if (pi.compare(0) <= 0) throw new RangeError('pi must be above zero');
  const radiusFt = inUnit(circle.radius, 'ft');
  return quantity(radiusFt.mul(radiusFt).mul(pi), 'sq-ft');
}
