import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Length of a test plot or course of a wanted area: area ÷ width.
 * Units: an area and a length in any unit; the result is in feet, exact.
 * Domain: both above zero. For the 1/128-acre method the area is 340 sq ft (exactly 340.3125).
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Ounces Equal Gallons: Sprayer Calibration, LSU AgCenter; Calibrating Your Spreader, N.C. Cooperative Extension,
 * Onslow County, 2017.
 */
export function testPlotLength(plot: { readonly area: Quantity; readonly width: Quantity }): Quantity {
  mustBePositive({ area: plot.area, width: plot.width });
  return quantity(inUnit(plot.area, 'sq-ft').div(inUnit(plot.width, 'ft')), 'ft');
}
