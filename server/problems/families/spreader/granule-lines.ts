import { inUnit, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { labelByKey, labelsWithRate, oneFigure, rateByKey } from '../../labels/pick.ts';
import { both } from '../both.ts';

/** A label line for granules, in pounds for each 1,000 sq ft, as a problem draws it. */
export interface GranuleLine {
  readonly labelKey: string;
  readonly rateKey: string;
  readonly site: 'lawn' | 'turf' | 'bed';
  readonly product: Quantity;
}

const siteOf: Record<string, GranuleLine['site'] | undefined> = { lawn: 'lawn', turf: 'turf', bed: 'bed' };

export const granuleLines: readonly GranuleLine[] = labelsWithRate(
  'area',
  ({ product, area, water }) =>
    product.least.unit === 'lb' && !water && inUnit(area, 'sq-ft').compare(1000) === 0 && !!oneFigure(product),
).flatMap(([label, rate]) => {
  const site = siteOf[rate.site];
  return site ? [{ labelKey: label.key, rateKey: rate.key, site, product: rate.product.least }] : [];
});

export function granuleHeading(line: GranuleLine): Text {
  return rateByKey(labelByKey(line.labelKey), line.rateKey, 'area').heading;
}

const names = {
  lawn: both('lawn', 'césped'),
  turf: both('sports field', 'campo deportivo'),
  bed: both('shrub bed', 'arriate de arbustos'),
} as const satisfies Record<GranuleLine['site'], Text>;

/** "lawn" / "césped": always masculine in Spanish. */
export function granuleSite(line: GranuleLine): Text {
  return names[line.site];
}
