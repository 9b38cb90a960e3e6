import { z } from 'zod';
import { locales, partKeys, tiers, topics, verdicts } from '../vocabulary.ts';
import type { LevelState, Locale, PartKey, Tier, Topic, Verdict } from '../vocabulary.ts';
import type { Figure } from './figure.ts';
import type { LabelView } from './label.ts';

/** What a trainee sends for one part. `text` is what was typed; the unit comes with it or from the field's unit list. */
export const responseSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('number'), text: z.string().max(200), unit: z.string().max(40).optional() }),
  z.object({ kind: z.literal('choice'), option: z.string().min(1).max(80) }),
  z.object({ kind: z.literal('order'), steps: z.array(z.string().min(1).max(80)).min(2).max(20) }),
]);
export type Response = z.infer<typeof responseSchema>;

export const answerBodySchema = z.object({
  /** Made once by the client for one press of Check; the same key is recorded once however often it is sent. */
  key: z.uuid(),
  response: responseSchema,
  /** Seconds the part was in front of the person, as the client counted them. */
  seconds: z.number().int().min(0).max(86_400).default(0),
});
export type AnswerBody = z.input<typeof answerBodySchema>;

export const partParamsSchema = z.object({ problemId: z.uuid(), part: z.enum(partKeys) });
export const hintBodySchema = z.object({ number: z.number().int().min(1).max(3) });

export const newDrillBodySchema = z.object({
  topics: z.array(z.enum(topics)).min(1).max(topics.length),
  /** A fixed tier, or `rising` from one step to several. */
  tier: z.union([z.literal(tiers[0]), z.literal(tiers[1]), z.literal(tiers[2]), z.literal('rising')]),
  length: z.union([z.literal(5), z.literal(10), z.literal(20)]),
});
export type NewDrillBody = z.infer<typeof newDrillBodySchema>;

/** One answer as it stands in the record, with what may be said of it. */
export interface AttemptView {
  typed: string;
  /** How the entry was read: "2 1/2 Tbsp"; the option's text; the order in words. */
  read: string;
  verdict: Verdict;
  slip: string | null;
  /** "The patio is still in your area." */
  headline: string;
  /** The rest, with these numbers. */
  detail: string;
  /** First answers count for the level; later ones are practice. */
  counts: boolean;
}

export interface PartViewBase {
  key: PartKey;
  topic: Topic;
  ask: string;
  state: 'open' | 'closed';
  attempts: AttemptView[];
  hints: string[];
  hintsLeft: number;
  /** Only once the part is closed: the answer as one would measure it. */
  answerText: string | null;
}
export type PartView = PartViewBase &
  (
    | { kind: 'number'; units: { key: string; symbol: string }[]; rounding: string }
    | { kind: 'count'; thing: string }
    | { kind: 'choice'; options: { key: string; text: string; reason: string | null; right: boolean | null }[] }
    | { kind: 'order'; steps: { key: string; text: string }[] }
  );

/** A line of a worked solution: KaTeX already rendered to HTML with MathML on the server. */
export interface WorkingLineView {
  html: string;
  plain: string;
  reason: string;
  answers: boolean;
}

export interface ProblemView {
  id: string;
  topic: Topic;
  tier: Tier;
  heading: string;
  statement: string;
  figure: Figure | null;
  label: LabelView | null;
  parts: PartView[];
  /** Given once every part is closed. */
  working: WorkingLineView[] | null;
  state: 'open' | 'done';
  /** Where it belongs: the drill and its place in it, or nothing. */
  drill: { id: string; position: number; length: number } | null;
  locale: Locale;
}

export interface LevelView {
  topic: Topic;
  state: LevelState;
  answers: number;
  /** Predicted share right on an average tier-2 problem of the topic, and its 80 % range; null while not started. */
  fill: number | null;
  range: { low: number; high: number } | null;
  /** Tiers that problems of this topic come in; empty where none can be drilled yet. */
  tiers: Tier[];
}

export interface AnswerReply {
  /** The entry could not be read: the reason; nothing was recorded. */
  unreadable: { code: string; message: string } | null;
  problem: ProblemView;
  /** The level of the part's topic after this answer, when it counted. */
  level: LevelView | null;
}

export interface DrillView {
  id: string;
  topics: Topic[];
  tier: Tier | 'rising';
  length: number;
  state: 'open' | 'done';
  /** One entry a place: not reached, in front of the person, or done with its outcome. */
  places: { position: number; problemId: string | null; outcome: 'waiting' | 'open' | 'right' | 'partly' | 'wrong' }[];
  /** The problem to work now; null when the drill is done. */
  currentProblemId: string | null;
}

export const localeSchema = z.enum(locales);
export const verdictSchema = z.enum(verdicts);

/** Slips a person makes, most frequent first. */
export interface SlipView {
  topic: Topic;
  family: string;
  familyTitle: string;
  slip: string;
  /** What the slip is, in a few words: the first sentence of its message on a sample. */
  headline: string;
  times: number;
  lastAt: string;
}

export interface ProgressView {
  levels: LevelView[];
  answered: number;
  right: number;
  seconds: number;
  slips: SlipView[];
  /** Days with answers, oldest first, the last 60 at most. */
  days: { date: string; answered: number; right: number }[];
}

export const newCheckpointBodySchema = z.object({
  family: z.string().min(1).max(60),
  tier: z.union([z.literal(1), z.literal(2), z.literal(3)]),
  fresh: z.boolean().default(false),
});

export const sampleAnswerBodySchema = z.object({
  /** Which sample: its opaque id from the sample itself. */
  sample: z.string().min(1).max(40),
  part: z.enum(partKeys),
  response: responseSchema,
});

/** A graded answer to a visitor's sample problem; nothing of it is kept. */
export interface SampleReply {
  unreadable: { code: string; message: string } | null;
  attempt: AttemptView | null;
}
