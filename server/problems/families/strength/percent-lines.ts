import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { labelByKey, labelsWithRate, oneFigure, rateByKey } from '../../labels/pick.ts';
import { both } from '../both.ts';
import { targetOf } from '../spot/mix-lines.ts';

/** A label line that gives one percent by volume, as a problem draws it. */
export interface PercentLine {
  readonly labelKey: string;
  readonly rateKey: string;
  readonly percent: Quantity;
}

export const percentLines: readonly PercentLine[] = labelsWithRate(
  'percent',
  ({ percent }) => !!oneFigure(percent),
).map(([label, rate]) => ({ labelKey: label.key, rateKey: rate.key, percent: rate.percent.least }));

function rateOf(line: PercentLine) {
  return rateByKey(labelByKey(line.labelKey), line.rateKey, 'percent');
}
export function percentHeading(line: PercentLine): Text {
  return rateOf(line).heading;
}

/** What is sprayed; trees on a line for dormant trees are dormant. */
export function percentTarget(line: PercentLine): Text {
  const rate = rateOf(line);
  return rate.note?.en.includes('Dormant') ? both('the dormant trees', 'los árboles en reposo') : targetOf(rate.site);
}
