import { convert, inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import type { UnitKey } from '../quantity/units.ts';
import { mustBePositive } from './positive.ts';

/**
 * Rate put on a measured plot: what left the sprayer ÷ the area it covered.
 * Units: a volume and an area in any unit; the result is in the volume-per-area unit asked for, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Turf resource: boom and backpack sprayer calibration, herbicide manufacturer guidance; Sprayer calibration table
 * for band-spraying of herbicides, Florida Cooperative Extension Service.
 */
export function rateFromTestPlot(test: {
  readonly used: Quantity;
  readonly area: Quantity;
  readonly unit: UnitKey;
}): Quantity {
  const { used, area, unit } = test;
  mustBePositive({ used, area });
  const perThousand = inUnit(used, 'gal').div(inUnit(area, '1000-sq-ft'));
  return convert(quantity(perThousand, 'gal/1000-sq-ft'), unit);
}
