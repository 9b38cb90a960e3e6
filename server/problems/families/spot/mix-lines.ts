import { inUnit, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import type { LabelUse } from '../../family.ts';
import { labelByKey, labelsWithRate, oneFigure, rateByKey } from '../../labels/pick.ts';
import type { LabelSite } from '../../labels/practice-label.ts';
import { both } from '../both.ts';

/** A label line that gives one amount for each gallon of finished spray, as a problem draws it. */
export interface MixLine {
  readonly labelKey: string;
  readonly rateKey: string;
  readonly site: LabelSite;
  readonly product: Quantity;
}

/** Lines in tablespoons or fluid ounces for each gallon, one figure each. */
export const mixLines: readonly MixLine[] = labelsWithRate(
  'mix',
  ({ product, mix }) =>
    (product.least.unit === 'fl-oz' || product.least.unit === 'tbsp') &&
    inUnit(mix, 'gal').compare(1) === 0 &&
    !!oneFigure(product),
).map(([label, rate]) => ({
  labelKey: label.key,
  rateKey: rate.key,
  site: rate.site,
  product: rate.product.least,
}));

export function labelUse(line: { readonly labelKey: string; readonly rateKey: string }): LabelUse {
  return { label: labelByKey(line.labelKey), rate: line.rateKey };
}
export function productName(line: { readonly labelKey: string }): string {
  return labelByKey(line.labelKey).name;
}
export function lineHeading(line: MixLine): Text {
  return rateByKey(labelByKey(line.labelKey), line.rateKey, 'mix').heading;
}

const targets: Record<LabelSite, Text> = {
  lawn: both('the weed patches in the lawn', 'los manchones de maleza del césped'),
  turf: both('the weed patches in the turf', 'los manchones de maleza del campo'),
  bed: both('the flower beds', 'los arriates de flores'),
  ornamentals: both('the ornamental shrubs', 'los arbustos ornamentales'),
  trees: both('the young trees', 'los árboles jóvenes'),
  'fence-line': both('the weeds along the fence', 'las malezas a lo largo de la cerca'),
  paving: both('the cracks in the paving', 'las grietas del pavimento'),
  perimeter: both('the foot of the walls', 'el pie de los muros'),
};

/** What is sprayed on a site, to stand after "sprays": "the ornamental shrubs". */
export function targetOf(site: LabelSite): Text {
  return targets[site];
}

/** The step an amount of product is asked to: half tablespoons, tenths of a fluid ounce. */
export function stepOf(unit: Quantity['unit']) {
  return rational(unit === 'tbsp' ? '0.5' : '0.1');
}
