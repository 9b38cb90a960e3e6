import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Ground that one tank covers: tank ÷ sprayer's rate.
 * Units: a volume and a volume per area in any unit; the result is in acres, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Turf resource: boom and backpack sprayer calibration, herbicide manufacturer guidance; Sprayer Calibration
 * Methods: how to calibrate a handgun, Mesa County, Colorado, Noxious Weed program.
 */
export function areaPerTank(sprayer: { readonly tank: Quantity; readonly rate: Quantity }): Quantity {
  mustBePositive({ tank: sprayer.tank, rate: sprayer.rate });
  return quantity(inUnit(sprayer.tank, 'gal').div(inUnit(sprayer.rate, 'gal/acre')), 'acre');
}
