import { quantity } from '../../../shared/quantity/quantity.ts';
import type { UnitKey } from '../../../shared/quantity/units.ts';
import type { Text } from '../../../shared/vocabulary.ts';
import type { LabelRate, LabelSite, Span } from './practice-label.ts';

/** An amount as a label prints it: one figure, or the least and the most of a range. Decimal text, read exactly. */
export type Printed = string | readonly [least: string, most: string];

export function span(printed: Printed, unit: UnitKey): Span {
  const [least, most] = typeof printed === 'string' ? [printed, printed] : printed;
  return { least: quantity(least, unit), most: quantity(most, unit) };
}

interface LineHead {
  readonly key: string;
  readonly site: LabelSite;
  readonly heading: Text;
  readonly note?: Text;
}
interface AreaLine extends LineHead {
  readonly product: Printed;
  readonly unit: UnitKey;
  readonly waterGal?: Printed;
}

function areaLine(line: AreaLine, area: readonly [size: string, unit: UnitKey]): LabelRate {
  const { product, unit, waterGal, ...head } = line;
  const water = waterGal === undefined ? {} : { water: span(waterGal, 'gal') };
  return { ...head, basis: 'area', product: span(product, unit), ...water, area: quantity(...area) };
}

/** A line for each so many square feet, 1,000 unless said otherwise. */
export function perSqFt(line: AreaLine & { readonly sqFt?: string }): LabelRate {
  const { sqFt, ...rest } = line;
  return areaLine(rest, [sqFt ?? '1000', 'sq-ft']);
}

/** A line for each acre. */
export function perAcre(line: AreaLine): LabelRate {
  return areaLine(line, ['1', 'acre']);
}

/** A line for each gallon of finished spray. */
export function perGallon(line: LineHead & { readonly product: Printed; readonly unit: UnitKey }): LabelRate {
  const { product, unit, ...head } = line;
  return { ...head, basis: 'mix', product: span(product, unit), mix: quantity('1', 'gal') };
}

/** A line in percent by volume of the finished spray. */
export function percentMix(line: LineHead & { readonly percent: Printed }): LabelRate {
  const { percent, ...head } = line;
  return { ...head, basis: 'percent', percent: span(percent, 'percent') };
}

/** A line of a product that is used as it comes. */
export function readyToUse(line: LineHead): LabelRate {
  return { ...line, basis: 'ready' };
}
