import { inUnit, type Quantity } from '../../../shared/quantity/quantity.ts';
import { rational } from '../../../shared/quantity/rational.ts';
import { kindOf, type UnitKey } from '../../../shared/quantity/units.ts';
import type { LabelRate, PracticeLabel, Span } from './practice-label.ts';

/** Least and most a rate may be, both included, in `unit`. */
interface Range {
  readonly what: string;
  readonly least: string;
  readonly most: string;
  readonly unit: UnitKey;
}

/** The ranges a practice label's figures must stay in, as a crew would meet them. Common practice, no source. */
const ranges = {
  liquidPerThousand: { what: 'liquid product for 1,000 sq ft', least: '0.3', most: '6', unit: 'fl-oz' },
  dryPerThousand: { what: 'dry product for 1,000 sq ft', least: '0.1', most: '4', unit: 'oz' },
  granulesPerThousand: { what: 'granules for 1,000 sq ft', least: '1', most: '12', unit: 'lb' },
  liquidPerAcre: { what: 'liquid product for an acre', least: '0.5', most: '8', unit: 'pt' },
  dryPerAcre: { what: 'dry product for an acre', least: '0.25', most: '6', unit: 'lb' },
  waterPerThousand: { what: 'water for 1,000 sq ft', least: '0.5', most: '4', unit: 'gal' },
  waterPerAcre: { what: 'water for an acre', least: '20', most: '100', unit: 'gal' },
  tablespoonsPerGallon: { what: 'product in a gallon', least: '0.5', most: '6', unit: 'tbsp' },
  fluidOuncesPerGallon: { what: 'product in a gallon', least: '0.5', most: '6', unit: 'fl-oz' },
  percent: { what: 'percent by volume', least: '0.25', most: '5', unit: 'percent' },
} as const satisfies Record<string, Range>;

/** What is wrong with a span scaled by `times`, in words; nothing when it lies in the range. */
function checkSpan(span: Span, range: Range, times = rational(1)): string[] {
  const inRange = (value: Quantity) => {
    const scaled = inUnit(value, range.unit).mul(times);
    return scaled.compare(rational(range.least)) >= 0 && scaled.compare(rational(range.most)) <= 0;
  };
  if (inUnit(span.least, range.unit).compare(inUnit(span.most, range.unit)) > 0)
    return [`${range.what}: least above most`];
  return inRange(span.least) && inRange(span.most)
    ? []
    : [`${range.what}: outside ${range.least} to ${range.most} ${range.unit}`];
}

function productRange(rate: Extract<LabelRate, { basis: 'area' }>, label: PracticeLabel): Range {
  const acre = rate.area.unit === 'acre';
  if (kindOf(rate.product.least.unit) === 'volume') return acre ? ranges.liquidPerAcre : ranges.liquidPerThousand;
  if (acre) return ranges.dryPerAcre;
  return label.formulation === 'G' || label.formulation === 'bait' ? ranges.granulesPerThousand : ranges.dryPerThousand;
}

function checkRate(rate: LabelRate, label: PracticeLabel): string[] {
  switch (rate.basis) {
    case 'area': {
      const acre = rate.area.unit === 'acre';
      const times = rational(acre ? 1 : 1000).div(rate.area.value);
      const water = rate.water
        ? checkSpan(rate.water, acre ? ranges.waterPerAcre : ranges.waterPerThousand, times)
        : [];
      return [...checkSpan(rate.product, productRange(rate, label), times), ...water];
    }
    case 'mix': {
      const range = rate.product.least.unit === 'fl-oz' ? ranges.fluidOuncesPerGallon : ranges.tablespoonsPerGallon;
      return checkSpan(rate.product, range, rational(1).div(inUnit(rate.mix, 'gal')));
    }
    case 'percent':
      return checkSpan(rate.percent, ranges.percent);
    case 'ready':
      return label.formulation === 'RTU' ? [] : ['only a ready-to-use product is used as it comes'];
  }
}

/** Everything wrong with a practice label, each line naming label and rate; an empty list when it is fit for use. */
export function labelFaults(label: PracticeLabel): string[] {
  const faults: string[] = [];
  if (label.rates.length === 0) faults.push('no rate line');
  if (new Set(label.rates.map((rate) => rate.key)).size < label.rates.length) faults.push('two rate lines of one key');
  if (!/^000-\d\d$/.test(label.number)) faults.push(`number ${label.number} is not of the invented series 000-nn`);
  if (label.limit.applications < 1 || label.limit.daysApart < 1) faults.push('yearly limit below one');
  if (label.wind.mostMph < 5 || label.wind.mostMph > 15) faults.push('wind limit outside 5 to 15 mph');
  for (const rate of label.rates) faults.push(...checkRate(rate, label).map((fault) => `${rate.key}: ${fault}`));
  return faults.map((fault) => `${label.key}: ${fault}`);
}
