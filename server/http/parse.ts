import type { Request } from 'express';
import type { z } from 'zod';
import { AppError, type FailureCode, type FieldFault } from '../../shared/errors.ts';

export type Schema = z.ZodType | undefined;
export type Parsed<S extends Schema> = S extends z.ZodType ? z.output<S> : undefined;

const loneSurrogate = /\p{Surrogate}/u;

/** Where a value holds text the database can't store (a NUL, half a surrogate pair); null when nowhere. */
function unstorable(value: unknown, path: readonly string[] = []): string | null {
  if (typeof value === 'string') return value.includes('\0') || loneSurrogate.test(value) ? path.join('.') : null;
  if (typeof value !== 'object' || value === null) return null;
  for (const [key, inner] of Object.entries(value)) {
    const found = unstorable(inner, [...path, key]);
    if (found !== null) return found;
  }
  return null;
}

function faultsOf(error: z.ZodError): FieldFault[] {
  return error.issues.map((issue) => ({ field: issue.path.join('.'), message: issue.message }));
}

/** Parses one part of a request by its contract, or fails with the code that belongs to that part. */
export function parsePart<S extends Schema>(schema: S, value: unknown, code: FailureCode): Parsed<S> {
  if (schema === undefined) return undefined as Parsed<S>;
  const result = schema.safeParse(value);
  if (!result.success) throw new AppError(code, { errors: code === 'not-found' ? [] : faultsOf(result.error) });
  const bad = unstorable(result.data);
  if (bad !== null) {
    throw new AppError(code, {
      errors: code === 'not-found' ? [] : [{ field: bad, message: 'Unreadable characters' }],
    });
  }
  return result.data as Parsed<S>;
}

/** The body of a request, refused when it is there and not JSON. */
export function jsonBody(request: Request): unknown {
  if (request.is('application/json') === false) throw new AppError('media-type');
  return request.body as unknown;
}
