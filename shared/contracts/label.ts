import { z } from 'zod';

/** A practice label as the reader sees it: a black-ruled panel of headed lines. */
export const labelViewSchema = z.object({
  key: z.string(),
  name: z.string(),
  /** "Herbicide", "Insecticide" ... */
  type: z.string(),
  /** "Practice no. 000-14": invented, and said to be so. */
  number: z.string(),
  /** "Practice label. Not a real product." */
  notice: z.string(),
  rows: z.array(z.object({ heading: z.string(), text: z.string() })),
});
export type LabelView = z.infer<typeof labelViewSchema>;
