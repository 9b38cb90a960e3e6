import type { z } from 'zod';
import {
  changeEmailBodySchema,
  changePasswordBodySchema,
  confirmQuerySchema,
  emailBodySchema,
  noBodySchema,
  resetPasswordBodySchema,
  signInBodySchema,
  signUpBodySchema,
} from '../../shared/contracts/auth.ts';
import type { FailureCode } from '../../shared/errors.ts';
import type { Limit } from './tries.ts';

/** One of better-auth's endpoints that we open, with our contract in front of it. */
export interface AuthEndpoint {
  method: 'GET' | 'POST';
  path: string;
  body?: z.ZodType<Record<string, unknown>>;
  query?: z.ZodType<Record<string, unknown>>;
  /** What each call counts against, and the field of the body that says whose; `person` is whoever is signed in. */
  counts?: { limit: Limit; by: 'email' | 'person' };
}

/** All that is reachable under /api/auth. The rest of the library is not. */
export const authEndpoints: readonly AuthEndpoint[] = [
  { method: 'POST', path: '/sign-up/email', body: signUpBodySchema, counts: { limit: 'mail', by: 'email' } },
  { method: 'POST', path: '/sign-in/email', body: signInBodySchema, counts: { limit: 'password', by: 'email' } },
  { method: 'POST', path: '/sign-out', body: noBodySchema },
  { method: 'GET', path: '/verify-email', query: confirmQuerySchema },
  { method: 'POST', path: '/send-verification-email', body: emailBodySchema, counts: { limit: 'mail', by: 'email' } },
  { method: 'POST', path: '/request-password-reset', body: emailBodySchema, counts: { limit: 'mail', by: 'email' } },
  { method: 'POST', path: '/reset-password', body: resetPasswordBodySchema },
  { method: 'POST', path: '/change-email', body: changeEmailBodySchema, counts: { limit: 'mail', by: 'person' } },
  {
    method: 'POST',
    path: '/change-password',
    body: changePasswordBodySchema,
    counts: { limit: 'password', by: 'person' },
  },
];

const codes: Readonly<Record<string, FailureCode>> = {
  INVALID_EMAIL_OR_PASSWORD: 'sign-in-wrong',
  EMAIL_NOT_VERIFIED: 'address-unconfirmed',
  ACCOUNT_LOCKED: 'account-locked',
  INVALID_PASSWORD: 'password-wrong',
  INVALID_TOKEN: 'token-invalid',
  TOKEN_EXPIRED: 'token-invalid',
  USER_NOT_FOUND: 'token-invalid',
  INVALID_USER: 'token-invalid',
  // Two sign-ups of one address at the same moment.
  FAILED_TO_CREATE_USER: 'busy',
  INVALID_ORIGIN: 'foreign-origin',
  MISSING_OR_NULL_ORIGIN: 'foreign-origin',
  CROSS_SITE_NAVIGATION_LOGIN_BLOCKED: 'foreign-origin',
};

/** What a refusal of better-auth is called here. */
export function authFailure(status: number, code: unknown): FailureCode {
  const known = typeof code === 'string' ? codes[code] : undefined;
  if (known) return known;
  if (status === 401) return 'not-signed-in';
  if (status === 404) return 'not-found';
  if (status === 429) return 'too-many-requests';
  return status >= 500 ? 'internal' : 'bad-request';
}
