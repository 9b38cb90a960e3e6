import type { PartKey } from '../../../shared/vocabulary.ts';
import type { Slip } from '../family.ts';

/** A slip before it is known which part it belongs to. */
export type FloatingSlip<G> = Omit<Slip<G>, 'part'>;

/**
 * The same slips for every part that may ask the same thing: which part that is differs by tier, and elsewhere the slip
 * cannot happen.
 */
export function slipsAt<G>(
  parts: readonly PartKey[],
  askedIn: (given: G) => PartKey,
  slips: readonly FloatingSlip<G>[],
): Slip<G>[] {
  return parts.flatMap((part) =>
    slips.map((slip) => ({
      ...slip,
      part,
      answer: (given, earlier) => (askedIn(given) === part ? (slip.answer?.(given, earlier) ?? null) : null),
    })),
  );
}
