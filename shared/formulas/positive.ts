import type { Quantity } from '../quantity/quantity.ts';

/** Checks that a measure handed to a formula is above zero. @throws RangeError naming the measure when it is not. */
export function mustBePositive(measures: Readonly<Record<string, Quantity>>): void {
  for (const [name, measure] of Object.entries(measures)) {
    if (measure.value.compare(0) <= 0) throw new RangeError(`${name} must be above zero`);
  }
}
