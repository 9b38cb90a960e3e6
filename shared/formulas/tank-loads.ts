import { quantity, ratio, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Loads a job takes, the last part load counted as one: mix ÷ tank, rounded up.
 * Units: two volumes in any unit; the result is a whole count.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or they are of different kinds
 * Source: common practice, no source (the arithmetic only).
 */
export function tankLoads(job: { readonly mix: Quantity; readonly tank: Quantity }): Quantity {
  mustBePositive({ mix: job.mix, tank: job.tank });
  return quantity(ratio(job.mix, job.tank).ceil(), 'count');
}
