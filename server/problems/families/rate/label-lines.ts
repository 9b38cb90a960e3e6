import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import type { LabelUse } from '../../family.ts';
import { rateText } from '../../labels/label-view.ts';
import { labelByKey, oneFigure, rateByKey, type LabelAndRate } from '../../labels/pick.ts';

/** A rate line of a practice label as a problem draws it: keys to find it again, and its figures. */
export interface DrawnLine {
  readonly labelKey: string;
  readonly rateKey: string;
  readonly product: Quantity;
  /** Null where the line names no water. */
  readonly water: Quantity | null;
  readonly labelArea: Quantity;
}

/** The figures of a line that gives one figure each. @throws RangeError for a line with a range. */
export function drawnLine([label, rate]: LabelAndRate<'area'>): DrawnLine {
  const product = oneFigure(rate.product);
  if (!product) throw new RangeError(`${label.key} ${rate.key} gives a range`);
  const water = rate.water ? oneFigure(rate.water) : null;
  return { labelKey: label.key, rateKey: rate.key, product, water, labelArea: rate.area };
}

export function labelUse(line: DrawnLine): LabelUse {
  return { label: labelByKey(line.labelKey), rate: line.rateKey };
}
export function labelName(line: DrawnLine): string {
  return labelByKey(line.labelKey).name;
}

/** What the label's line says, for a first tier that states the rate as well. */
export function lineInWords(line: DrawnLine): Text {
  const rate = rateByKey(labelByKey(line.labelKey), line.rateKey, 'area');
  return { en: rateText(rate, 'en'), es: rateText(rate, 'es') };
}
/** Heading of the line on the label: "Lawns". */
export function lineHeading(line: DrawnLine): Text {
  return rateByKey(labelByKey(line.labelKey), line.rateKey, 'area').heading;
}
