import { roundToStep } from '../../shared/quantity/round.ts';
import { inUnit, type Quantity } from '../../shared/quantity/quantity.ts';
import { rational } from '../../shared/quantity/rational.ts';
import type { UnitKey } from '../../shared/quantity/units.ts';

/** A figure as a publication prints it: rounded to a step, in its unit. */
export interface Printed {
  readonly value: string;
  readonly unit: UnitKey;
  /** The step it is rounded or cut to; exact figures have none. */
  readonly step?: string;
  readonly cut?: boolean;
}

/** A computed quantity as the publication would print it, as a fraction in text, to compare with `printedText`. */
export function asPrinted(computed: Quantity, printed: Printed): string {
  const value = inUnit(computed, printed.unit);
  const shown = printed.step ? roundToStep(value, rational(printed.step), printed.cut ? 'down' : 'nearest') : value;
  return shown.toFraction();
}
export function printedText(printed: Printed): string {
  return rational(printed.value).toFraction();
}
