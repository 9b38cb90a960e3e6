import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Flow of a nozzle from what is caught in a time: gallons per minute = fluid ounces ÷ 128 × 60 ÷ seconds.
 * Units: a volume and a time in any unit; the result is in gallons per minute, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Calibrating Your Sprayer, Albany County (Wyoming) Weed and Pest Control District (480 fl oz a minute is 3.75 gal).
 */
export function flowFromCatch(test: { readonly caught: Quantity; readonly time: Quantity }): Quantity {
  mustBePositive({ caught: test.caught, time: test.time });
  return quantity(inUnit(test.caught, 'gal').div(inUnit(test.time, 'min')), 'gal/min');
}
