import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { rational } from '../quantity/rational.ts';
import { mustBePositive } from './positive.ts';

/** 43,560 sq ft an acre × 12 in a foot ÷ 88 ft a minute at 1 mph: exactly 5,940. */
export const boomConstant = rational(5940);

/**
 * Rate of one nozzle of a boom: gallons per acre = 5,940 × gallons per minute ÷ (miles per hour × nozzle spacing in inches).
 * Units: a flow, a speed and a length in any unit; the result is in gallons per acre, exact.
 * Domain: all above zero. For a whole boom take its whole flow and its whole width.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Tow-behind sprayer owner manual, Appendix A (boom spray calibration tables), equipment manual; Calibrating Your
 * Sprayer, Albany County (Wyoming) Weed and Pest Control District.
 */
export function gallonsPerAcreFromFlow(boom: {
  readonly flow: Quantity;
  readonly speed: Quantity;
  readonly spacing: Quantity;
}): Quantity {
  const { flow, speed, spacing } = boom;
  mustBePositive({ flow, speed, spacing });
  const below = inUnit(speed, 'mph').mul(inUnit(spacing, 'in'));
  return quantity(boomConstant.mul(inUnit(flow, 'gal/min')).div(below), 'gal/acre');
}
