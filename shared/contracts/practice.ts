import { z } from 'zod';
import { levelStates, locales, partKeys, tiers, topics, verdicts } from '../vocabulary.ts';
import type { Figure } from './figure.ts';
import { labelViewSchema } from './label.ts';

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
export const attemptViewSchema = z.object({
  typed: z.string(),
  /** How the entry was read: "2 1/2 Tbsp"; the option's text; the order in words. */
  read: z.string(),
  verdict: z.enum(verdicts),
  slip: z.string().nullable(),
  /** "The patio is still in your area." */
  headline: z.string(),
  /** The rest, with these numbers. */
  detail: z.string(),
  /** First answers count for the level; later ones are practice. */
  counts: z.boolean(),
});
export type AttemptView = z.infer<typeof attemptViewSchema>;

const partBase = {
  key: z.enum(partKeys),
  topic: z.enum(topics),
  ask: z.string(),
  state: z.enum(['open', 'closed']),
  attempts: z.array(attemptViewSchema),
  hints: z.array(z.string()),
  hintsLeft: z.number(),
  /** Only once the part is closed: the answer as one would measure it. */
  answerText: z.string().nullable(),
};
const keyed = z.object({ key: z.string(), text: z.string() });

export const partViewSchema = z.discriminatedUnion('kind', [
  z.object({
    ...partBase,
    kind: z.literal('number'),
    units: z.array(z.object({ key: z.string(), symbol: z.string() })),
    rounding: z.string(),
  }),
  z.object({ ...partBase, kind: z.literal('count'), thing: z.string() }),
  z.object({
    ...partBase,
    kind: z.literal('choice'),
    /** `reason` and `right` only once the part is closed. */
    options: z.array(keyed.extend({ reason: z.string().nullable(), right: z.boolean().nullable() })),
  }),
  z.object({ ...partBase, kind: z.literal('order'), steps: z.array(keyed) }),
]);
export type PartView = z.infer<typeof partViewSchema>;

/** A line of a worked solution: KaTeX already rendered to HTML with MathML on the server. */
export const workingLineViewSchema = z.object({
  html: z.string(),
  plain: z.string(),
  reason: z.string(),
  answers: z.boolean(),
});
export type WorkingLineView = z.infer<typeof workingLineViewSchema>;

export const problemViewSchema = z.object({
  id: z.string(),
  topic: z.enum(topics),
  tier: z.union([z.literal(1), z.literal(2), z.literal(3)]),
  heading: z.string(),
  statement: z.string(),
  figure: z.custom<Figure>((value) => typeof value === 'object').nullable(),
  label: labelViewSchema.nullable(),
  parts: z.array(partViewSchema),
  /** Given once every part is closed. */
  working: z.array(workingLineViewSchema).nullable(),
  state: z.enum(['open', 'done']),
  /** Where it belongs: the drill and its place in it, or nothing. */
  drill: z.object({ id: z.string(), position: z.number(), length: z.number() }).nullable(),
  locale: z.enum(locales),
});
export type ProblemView = z.infer<typeof problemViewSchema>;

const tierSchema = z.union([z.literal(1), z.literal(2), z.literal(3)]);

export const levelViewSchema = z.object({
  topic: z.enum(topics),
  state: z.enum(levelStates),
  answers: z.number(),
  /** Predicted share right on an average tier-2 problem of the topic, and its 80 % range; null while not started. */
  fill: z.number().nullable(),
  range: z.object({ low: z.number(), high: z.number() }).nullable(),
  /** Tiers that problems of this topic come in; empty where none can be drilled yet. */
  tiers: z.array(tierSchema),
});
export type LevelView = z.infer<typeof levelViewSchema>;

const unreadableSchema = z.object({ code: z.string(), message: z.string() }).nullable();

export const answerReplySchema = z.object({
  /** The entry could not be read: the reason; nothing was recorded. */
  unreadable: unreadableSchema,
  /** The parts as they now stand. The rest of the problem has not changed and is not sent again. */
  parts: z.array(partViewSchema),
  /** Once `done`, the worked solution stands at the problem's own address. */
  state: z.enum(['open', 'done']),
  /** The level of the part's topic after this answer, when it counted. */
  level: levelViewSchema.nullable(),
});
export type AnswerReply = z.infer<typeof answerReplySchema>;

export const drillViewSchema = z.object({
  id: z.string(),
  topics: z.array(z.enum(topics)),
  tier: z.union([tierSchema, z.literal('rising')]),
  length: z.number(),
  state: z.enum(['open', 'done']),
  /** One entry a place: not reached, in front of the person, or done with its outcome. */
  places: z.array(
    z.object({
      position: z.number(),
      problemId: z.string().nullable(),
      outcome: z.enum(['waiting', 'open', 'right', 'partly', 'wrong']),
    }),
  ),
  /** The problem to work now; null when the drill is done or the next one is not drawn yet. */
  currentProblemId: z.string().nullable(),
});
export type DrillView = z.infer<typeof drillViewSchema>;
export const drillListSchema = z.array(drillViewSchema);

/** Slips a person makes, most frequent first. */
export const slipViewSchema = z.object({
  topic: z.enum(topics),
  family: z.string(),
  familyTitle: z.string(),
  slip: z.string(),
  /** What the slip is, in a few words: the first sentence of its message on a sample. */
  headline: z.string(),
  times: z.number(),
  lastAt: z.iso.datetime(),
});
export type SlipView = z.infer<typeof slipViewSchema>;

export const levelListSchema = z.array(levelViewSchema);
export const progressViewSchema = z.object({
  levels: levelListSchema,
  answered: z.number(),
  right: z.number(),
  seconds: z.number(),
  slips: z.array(slipViewSchema),
  /** Days with answers, oldest first, the last 60 at most. */
  days: z.array(z.object({ date: z.iso.date(), answered: z.number(), right: z.number() })),
});
export type ProgressView = z.infer<typeof progressViewSchema>;

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
export const sampleReplySchema = z.object({ unreadable: unreadableSchema, attempt: attemptViewSchema.nullable() });
export type SampleReply = z.infer<typeof sampleReplySchema>;
