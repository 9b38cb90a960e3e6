import { z } from 'zod';
import type { Tier, Topic } from '../vocabulary.ts';
import type { Figure } from './figure.ts';
import type { LabelView } from './label.ts';
import type { WorkingLineView } from './practice.ts';

/** The authors' proof sheet: staff only, since it shows answers. */
export const proofQuerySchema = z.object({
  tier: z.coerce.number().int().min(1).max(3).optional(),
  seed: z.string().min(1).max(60).default('1'),
  count: z.coerce.number().int().min(1).max(20).default(5),
});
export const familyParamsSchema = z.object({ family: z.string().min(1).max(60) });

export interface FamilySummary {
  key: string;
  topic: Topic;
  version: number;
  tiers: Tier[];
  title: string;
  slips: number;
}

export interface ProofSample {
  seed: string;
  tier: Tier;
  heading: string;
  statement: string;
  figure: Figure | null;
  label: LabelView | null;
  parts: {
    key: string;
    topic: Topic;
    ask: string;
    answer: string;
    /** The timed-set form, in the order shown. */
    options: { text: string; right: boolean; slip: string | null; reason: string | null }[];
  }[];
  slips: { key: string; part: string; answer: string; message: string }[];
  hints: string[];
  working: WorkingLineView[];
}

export interface ProofSheet {
  family: FamilySummary;
  sources: { title: string; publisher: string; year: number | null; ref: string | null }[];
  samples: ProofSample[];
}
