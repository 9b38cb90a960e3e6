import { compare, type Quantity } from '../../../shared/quantity/quantity.ts';
import { labels } from './labels.ts';
import type { LabelRate, PracticeLabel, Span } from './practice-label.ts';

/** How a rate line states its amount. */
export type Basis = LabelRate['basis'];
/** A rate line of one basis. */
export type RateOf<B extends Basis> = Extract<LabelRate, { readonly basis: B }>;
/** A practice label and one of its rate lines. */
export type LabelAndRate<B extends Basis = Basis> = readonly [label: PracticeLabel, rate: RateOf<B>];

/** Every label with a rate line of this basis that suits, one pair a line. Call it once when a module loads, not in a draw. */
export function labelsWithRate<B extends Basis>(
  basis: B,
  suits: (rate: RateOf<B>, label: PracticeLabel) => boolean = () => true,
): readonly LabelAndRate<B>[] {
  const found: LabelAndRate<B>[] = [];
  for (const label of labels) {
    for (const rate of label.rates) {
      if (hasBasis(rate, basis) && suits(rate, label)) found.push([label, rate]);
    }
  }
  return found;
}

function hasBasis<B extends Basis>(rate: LabelRate, basis: B): rate is RateOf<B> {
  return rate.basis === basis;
}

/** The one figure a line gives; null where it gives a range. */
export function oneFigure(span: Span): Quantity | null {
  return compare(span.least, span.most) === 0 ? span.least : null;
}

/** The label of this key; a wrong key is a mistake in the program. @throws RangeError when there is none. */
export function labelByKey(key: string): PracticeLabel {
  const found = labels.find((label) => label.key === key);
  if (!found) throw new RangeError(`no practice label is called ${key}`);
  return found;
}

/** A label's rate line by key. @throws RangeError when the label has none of this key and basis. */
export function rateByKey<B extends Basis>(label: PracticeLabel, key: string, basis: B): RateOf<B> {
  for (const rate of label.rates) if (rate.key === key && hasBasis(rate, basis)) return rate;
  throw new RangeError(`practice label ${label.key} has no ${basis} rate called ${key}`);
}
