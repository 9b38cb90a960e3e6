import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { rational } from '../quantity/rational.ts';
import { mustBePositive } from './positive.ts';

/** 1 mile per hour is 5,280 ft ÷ 60 min = 88 ft per minute, exactly. */
export const feetPerMinuteAtOneMph = rational(88);

/**
 * Speed over a measured course: miles per hour = feet × 60 ÷ (seconds × 88).
 * Units: a length and a time in any unit; the result is in miles per hour, exact (the trade's 0.682 is 60/88 rounded).
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Math for Pesticide Applicators, University of Nebraska-Lincoln Pesticide Education (1 mph = 88 ft per minute);
 * Sprayer / spreader operator manual, calibration worksheets, equipment manual.
 */
export function speedOverCourse(run: { readonly course: Quantity; readonly time: Quantity }): Quantity {
  mustBePositive({ course: run.course, time: run.time });
  const feetPerMinute = inUnit(run.course, 'ft').div(inUnit(run.time, 'min'));
  return quantity(feetPerMinute.div(feetPerMinuteAtOneMph), 'mph');
}
