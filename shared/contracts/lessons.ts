import { z } from 'zod';
import { topics } from '../vocabulary.ts';

/** The front matter of a lesson's file. */
export const lessonFrontSchema = z.object({
  title: z.string().min(1),
  topic: z.enum(topics),
  minutes: z.number().int().min(1).max(60),
  objectives: z.array(z.string().min(1)).min(1),
  families: z.array(z.string().min(1)).default([]),
  sources: z
    .array(z.object({ title: z.string().min(1), publisher: z.string().min(1), year: z.number().int().nullable() }))
    .min(1),
  /** Day of the last revision. */
  revised: z.iso.date(),
});

export const lessonStates = ['not-started', 'reading', 'read'] as const;
export type LessonState = (typeof lessonStates)[number];

export const lessonProgressViewSchema = z.object({
  state: z.enum(lessonStates),
  /** Where the reader was last, 0 to 1 of the lesson's length. */
  position: z.number().min(0).max(1),
  startedAt: z.iso.datetime().nullable(),
  readAt: z.iso.datetime().nullable(),
});
export type LessonProgressView = z.infer<typeof lessonProgressViewSchema>;

export const lessonSummarySchema = z.object({
  slug: z.string(),
  topic: z.enum(topics),
  /** Place in its module, from 1. */
  number: z.number().int(),
  title: z.string(),
  minutes: z.number().int(),
  objectives: z.array(z.string()),
  families: z.array(z.string()),
  /** Names of its checkpoints, in the order of the text. */
  checkpoints: z.array(z.string()),
  /** Null for a visitor. */
  progress: lessonProgressViewSchema.nullable(),
});
export const lessonListSchema = z.array(lessonSummarySchema);
export type LessonSummary = z.infer<typeof lessonSummarySchema>;

export const lessonParamsSchema = z.object({ slug: z.string().regex(/^[a-z0-9-]{1,80}$/) });
export const lessonProgressBodySchema = z.object({
  position: z.number().min(0).max(1),
  state: z.enum(['reading', 'read']),
});
export type LessonProgressBody = z.infer<typeof lessonProgressBodySchema>;
