import type { Quantity } from '../../shared/quantity/quantity.ts';
import type { Printed } from './as-printed.ts';

/** A worked example of a publication: what it computes, who prints it, and the figure as printed. */
export interface Example {
  readonly what: string;
  readonly source: string;
  readonly computed: () => Quantity;
  readonly printed: Printed;
}

/** A printed figure that the exact relation does not give, and the figure we follow instead. */
export interface Disagreement extends Example {
  readonly ours: Printed;
  readonly why: string;
}
