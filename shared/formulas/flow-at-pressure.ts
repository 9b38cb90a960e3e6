import { quantity, ratio, type Quantity } from '../quantity/quantity.ts';
import { rational, type Rational } from '../quantity/rational.ts';
import { mustBePositive } from './positive.ts';

/** The largest whole number whose square is at most `n`. */
function wholeRoot(n: bigint): bigint {
  if (n < 2n) return n;
  let guess = 1n << BigInt(Math.ceil(n.toString(2).length / 2));
  for (;;) {
    const next = (guess + n / guess) / 2n;
    if (next >= guess) return guess;
    guess = next;
  }
}

/** The square root of a fraction to the nearest `step`, in whole numbers only. */
function rootToStep(value: Rational, step: Rational): Rational {
  const inHalfSteps = value.mul(4).div(step).div(step);
  const halves = wholeRoot(inHalfSteps.n / inHalfSteps.d);
  return rational((halves + 1n) / 2n).mul(step);
}

/**
 * Flow at another pressure (the square-root law): new flow = old flow × √(new pressure ÷ old pressure).
 * Units: a flow, or a rate that follows it, in any unit; two pressures in any unit; the result is in the flow's unit,
 * to the nearest `step` of that unit, which the problem announces: a root is seldom an exact number.
 * Domain: all above zero.
 * @throws RangeError when one is zero or less, or a pressure is not a pressure
 * Source: Tow-behind sprayer owner manual, Appendix A (boom spray calibration tables), equipment manual; What does the
 * coding of a nozzle mean?, horticultural supplier.
 */
export function flowAtPressure(change: {
  readonly flow: Quantity;
  readonly oldPressure: Quantity;
  readonly newPressure: Quantity;
  readonly step: Rational;
}): Quantity {
  const { flow, oldPressure, newPressure, step } = change;
  mustBePositive({ flow, oldPressure, newPressure });
  if (step.compare(0) <= 0) throw new RangeError('step must be above zero');
  const squared = flow.value.mul(flow.value).mul(ratio(newPressure, oldPressure));
  return quantity(rootToStep(squared, step), flow.unit);
}
