import { ratio, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Mix for all plants from a trial with plain water on some of them: water used × (all plants ÷ plants in the trial).
 * Units: a volume in any unit and two counts; the result is in the volume's unit, exact.
 * Domain: all above zero.
 * @throws RangeError when one is zero or less, or a count is not a count
 * Source: How do I calibrate a hose-end sprayer?, Pesticide Environmental Stewardship (land-grant university consortium).
 */
export function mixFromWaterTrial(trial: {
  readonly used: Quantity;
  readonly tried: Quantity;
  readonly all: Quantity;
}): Quantity {
  const { used, tried, all } = trial;
  mustBePositive({ used, tried, all });
  return scale(used, ratio(all, tried));
}
