import { z } from 'zod';
import { failureCodes } from '../errors.ts';

/** What every failure of the API looks like: application/problem+json (RFC 9457) with our code and the fields at fault. */
export const problemJsonSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  code: z.enum(failureCodes),
  detail: z.string(),
  /** The request's id: the one thing to tell support. */
  instance: z.string().optional(),
  errors: z.array(z.object({ field: z.string(), message: z.string() })).optional(),
});
export type ProblemJson = z.infer<typeof problemJsonSchema>;
