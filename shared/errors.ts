/**
 * The closed list of what can fail on purpose. A code is what the server says and what the client finds its message by;
 * the mapping to HTTP stands in `server/http/problem.ts`, one entry a code.
 */
export const failureCodes = [
  'bad-request',
  'bad-json',
  'bad-body',
  'bad-query',
  'body-too-large',
  'media-type',
  'not-signed-in',
  'foreign-origin',
  'role-missing',
  'seat-missing',
  'account-locked',
  'address-unconfirmed',
  'sign-in-wrong',
  'password-wrong',
  'token-invalid',
  'not-found',
  'too-many-requests',
  'lesson-unfinished',
  'key-reused',
  'part-closed',
  'out-of-turn',
  'drill-done',
  'nothing-to-drill',
  'busy',
  'mailbox-unreachable',
  'mail-failed',
  'internal',
] as const;
export type FailureCode = (typeof failureCodes)[number];

/** One field that is wrong: its path ("response.text"; "" for the whole) and what was expected. */
export interface FieldFault {
  field: string;
  message: string;
}

export interface AppErrorOptions {
  /** Fields at fault, for the codes that name them. */
  errors?: readonly FieldFault[];
  /** Seconds after which the same request may be tried again. */
  retryAfterSeconds?: number;
  /** What lies behind it; logged, never sent. */
  cause?: unknown;
}

/** A failure the product foresees. Thrown anywhere on the server, turned into problem+json at the edge. */
export class AppError extends Error {
  readonly code: FailureCode;
  readonly errors: readonly FieldFault[];
  readonly retryAfterSeconds: number | null;

  constructor(code: FailureCode, options: AppErrorOptions = {}) {
    super(code, options.cause === undefined ? undefined : { cause: options.cause });
    this.name = 'AppError';
    this.code = code;
    this.errors = options.errors ?? [];
    this.retryAfterSeconds = options.retryAfterSeconds ?? null;
  }
}
