import { add, ratio, scale, subtract, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * What the last load holds: mix − full loads × tank; a whole tank when nothing is left over.
 * Units: two volumes in any unit; the result is in the mix's unit, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or they are of different kinds
 * Source: common practice, no source (the arithmetic only).
 */
export function lastLoad(job: { readonly mix: Quantity; readonly tank: Quantity }): Quantity {
  const { mix, tank } = job;
  mustBePositive({ mix, tank });
  const left = subtract(mix, scale(tank, ratio(mix, tank).floor()));
  return left.value.compare(0) === 0 ? add(left, tank) : left;
}
