import type { Quantity } from '../../../shared/quantity/quantity.ts';
import type { Text } from '../../../shared/vocabulary.ts';

/** Formulations the practice labels cover. */
export const formulations = ['EC', 'SC', 'SL', 'WP', 'WG', 'G', 'RTU', 'soap', 'oil', 'bait'] as const;
export type Formulation = (typeof formulations)[number];

/** Sites a rate line can be for. */
export const labelSites = ['lawn', 'turf', 'bed', 'ornamentals', 'trees', 'fence-line', 'paving', 'perimeter'] as const;
export type LabelSite = (typeof labelSites)[number];

/** Least and most of a rate; equal when the label gives one figure. */
export interface Span {
  readonly least: Quantity;
  readonly most: Quantity;
}

/** One rate line of a label's directions for use. */
export type LabelRate = {
  readonly key: string;
  readonly site: LabelSite;
  /** Heading of the line: "Lawns". */
  readonly heading: Text;
  /** Said after the rate: "wet leaves but not to run-off". */
  readonly note?: Text;
} & (
  | {
      /** Product (volume or weight) in water for each `area`. */
      readonly basis: 'area';
      readonly product: Span;
      readonly water?: Span;
      readonly area: Quantity;
    }
  | {
      /** Product for each `mix` of finished spray. */ readonly basis: 'mix';
      readonly product: Span;
      readonly mix: Quantity;
    }
  | { /** Percent by volume of the finished spray. */ readonly basis: 'percent'; readonly percent: Span }
  | { /** Used as it comes. */ readonly basis: 'ready' }
);

/** An invented label, used only in practice. Every rate stays inside the ranges that a crew would meet. */
export interface PracticeLabel {
  readonly key: string;
  /** Invented product name: "Korrin 2 L". */
  readonly name: string;
  readonly number: string;
  readonly type: Text;
  readonly formulation: Formulation;
  /** Invented active ingredient and its strength in words. */
  readonly active: Text;
  /** Pounds of active per gallon, or percent by weight. */
  readonly strength: Quantity;
  readonly signalWord: 'CAUTION' | 'WARNING' | 'DANGER';
  readonly sites: Text;
  readonly pests: Text;
  readonly rates: readonly LabelRate[];
  /** Most applications a year and the days between. */
  readonly limit: { readonly applications: number; readonly daysApart: number };
  /** Most wind, mph, and the buffer to water, ft. */
  readonly wind: { readonly mostMph: number; readonly waterBufferFt: number };
  readonly reentry: Text;
  readonly ppe: Text;
  readonly precaution: Text;
  readonly firstAid: Text;
  readonly storage: Text;
}
