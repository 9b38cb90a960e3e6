import { createHash } from 'node:crypto';
import type { Pool } from 'pg';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { AppError } from '../../shared/errors.ts';

/** What is counted against one account. Counts live in the database, so that every process sees them. */
const limits = {
  /** Passwords tried for one account. */
  password: { points: 10, duration: 15 * 60 },
  /** Messages asked for to one address. */
  mail: { points: 6, duration: 60 * 60 },
} as const;
export type Limit = keyof typeof limits;

export interface Tries {
  /** Counts one try; fails with `too-many-requests` when there were too many. The count is taken before the try is made. */
  spend: (limit: Limit, subject: string) => Promise<void>;
  /** Forgets the tries after a success. */
  forgive: (limit: Limit, subject: string) => Promise<void>;
}

/** `subject` is an address or a person's id; only its hash is stored. */
function keyOf(subject: string): string {
  return createHash('sha256').update(subject).digest('base64url');
}

export function accountTries(pool: Pool): Tries {
  const limiter = (limit: Limit): RateLimiterPostgres =>
    new RateLimiterPostgres({
      storeClient: pool,
      tableName: 'attempts',
      tableCreated: true,
      keyPrefix: limit,
      clearExpiredByTimeout: limit === 'password',
      ...limits[limit],
    });
  const limiters: Record<Limit, RateLimiterPostgres> = { password: limiter('password'), mail: limiter('mail') };
  return {
    async spend(limit, subject) {
      try {
        await limiters[limit].consume(keyOf(subject));
      } catch (reason) {
        if (!(reason instanceof RateLimiterRes)) throw reason;
        throw new AppError('too-many-requests', { retryAfterSeconds: Math.ceil(reason.msBeforeNext / 1_000) });
      }
    },
    async forgive(limit, subject) {
      await limiters[limit].delete(keyOf(subject));
    },
  };
}
