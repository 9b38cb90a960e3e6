import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { boomConstant } from './gallons-per-acre-from-flow.ts';
import { mustBePositive } from './positive.ts';

/**
 * Flow that one nozzle needs: gallons per minute = gallons per acre × miles per hour × spacing in inches ÷ 5,940.
 * Units: a volume per area, a speed and a length in any unit; the result is in gallons per minute, exact.
 * Domain: all above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Boom Sprayer Calibration worksheet, Cornell University, Agricultural and Biological Engineering.
 */
export function flowForGallonsPerAcre(boom: {
  readonly rate: Quantity;
  readonly speed: Quantity;
  readonly spacing: Quantity;
}): Quantity {
  const { rate, speed, spacing } = boom;
  mustBePositive({ rate, speed, spacing });
  const product = inUnit(rate, 'gal/acre').mul(inUnit(speed, 'mph')).mul(inUnit(spacing, 'in'));
  return quantity(product.div(boomConstant), 'gal/min');
}
