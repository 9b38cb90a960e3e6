import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { rational } from '../quantity/rational.ts';
import { mustBePositive } from './positive.ts';

/** 43,560 ÷ 128 = 340.3125 sq ft: the exact 1/128 acre. */
export const oneOf128Acre = quantity(rational(43560, 128), 'sq-ft');
/** What the trade measures out for it. */
export const tradeTestPlot = quantity(340, 'sq-ft');

/**
 * The 1/128-acre method: the fluid ounces that 1/128 acre takes are the gallons that an acre takes, since a gallon is 128
 * fluid ounces.
 * Units: a volume in any unit; the result is in gallons per acre, exact for a plot of 340.3125 sq ft (0.1 % low for 340).
 * Domain: above zero.
 * @throws RangeError when it is zero or less, or not a volume
 * Source: Calibrating Turfgrass Chemical Application Equipment (Bulletin 817-00), Ohio State University Extension, 2000,
 * section 7; Ounces Equal Gallons: Sprayer Calibration, LSU AgCenter.
 */
export function gallonsPerAcreFrom128th(test: { readonly caught: Quantity }): Quantity {
  mustBePositive({ caught: test.caught });
  return quantity(inUnit(test.caught, 'fl-oz'), 'gal/acre');
}
