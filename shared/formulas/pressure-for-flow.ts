import { ratio, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Pressure for another flow: new pressure = old pressure × (new flow ÷ old flow) squared.
 * Units: a pressure and two flows in any unit; the result is in the pressure's unit, exact.
 * Domain: all above zero.
 * @throws RangeError when one is zero or less, or the flows are of different kinds
 * Source: Tow-behind sprayer owner manual, Appendix A (boom spray calibration tables), equipment manual (the square-root
 * law turned round).
 */
export function pressureForFlow(change: {
  readonly pressure: Quantity;
  readonly oldFlow: Quantity;
  readonly newFlow: Quantity;
}): Quantity {
  const { pressure, oldFlow, newFlow } = change;
  mustBePositive({ pressure, oldFlow, newFlow });
  const times = ratio(newFlow, oldFlow);
  return scale(pressure, times.mul(times));
}
