import { rational, type Rational } from './rational.ts';

const half = rational(1, 2);

/** A value as a whole number of steps; halves go away from zero. `step` must be above zero. */
export function roundToStep(value: Rational, step: Rational, mode: 'nearest' | 'up' | 'down' = 'nearest'): Rational {
  if (step.compare(0) <= 0) throw new RangeError('a rounding step must be above zero');
  const steps = value.div(step);
  if (mode === 'up') return steps.ceil().mul(step);
  if (mode === 'down') return steps.floor().mul(step);
  const away = steps.abs().add(half).floor().mul(step);
  return value.compare(0) < 0 ? away.neg() : away;
}
