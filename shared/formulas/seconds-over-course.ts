import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';
import { feetPerMinuteAtOneMph } from './speed-over-course.ts';

/**
 * Time a course takes at a speed: seconds = feet × 60 ÷ (miles per hour × 88).
 * Units: a length and a speed in any unit; the result is in seconds, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Tow-behind sprayer owner manual, Appendix A (speed table), equipment manual; How to Calibrate Herbicide
 * Application Equipment, T&D World, 2014.
 */
export function secondsOverCourse(run: { readonly course: Quantity; readonly speed: Quantity }): Quantity {
  mustBePositive({ course: run.course, speed: run.speed });
  const minutes = inUnit(run.course, 'ft').div(inUnit(run.speed, 'mph').mul(feetPerMinuteAtOneMph));
  return quantity(minutes.mul(60), 's');
}
