import { ratio, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Rate at another speed with the same flow: new rate = old rate × old speed ÷ new speed.
 * Units: a volume per area and two speeds in any unit; the result is in the rate's unit, exact.
 * Domain: all above zero; pressure and nozzles unchanged.
 * @throws RangeError when one is zero or less, or a speed is not a speed
 * Source: The Calibration of Turfgrass and Boom Sprayers and Spreaders, NC State Extension.
 */
export function rateAtNewSpeed(change: {
  readonly rate: Quantity;
  readonly oldSpeed: Quantity;
  readonly newSpeed: Quantity;
}): Quantity {
  const { rate, oldSpeed, newSpeed } = change;
  mustBePositive({ rate, oldSpeed, newSpeed });
  return scale(rate, ratio(oldSpeed, newSpeed));
}
