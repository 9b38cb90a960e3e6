import { inUnit, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Product for each gallon of mix from a rate per acre: product for an acre ÷ the sprayer's gallons per acre.
 * Units: a volume or a weight for an acre in any unit, the sprayer's volume per area in any unit; the result is in the
 * product's unit, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or the rate is not a volume per area
 * Source: Backpack Sprayer Calibration Worksheet, NC State Extension, Christmas Trees; Calibrating Your Sprayer, Albany
 * County (Wyoming) Weed and Pest Control District.
 */
export function productPerGallon(use: { readonly perAcre: Quantity; readonly rate: Quantity }): Quantity {
  mustBePositive({ perAcre: use.perAcre, rate: use.rate });
  return scale(use.perAcre, inUnit(use.rate, 'gal/acre').inverse());
}
