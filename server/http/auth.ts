import { betterAuth } from 'better-auth';
import { drizzleAdapter } from 'better-auth/adapters/drizzle';
import { APIError } from 'better-auth/api';
import { eq } from 'drizzle-orm';
import type { Logger } from 'pino';
import { v7 as uuidv7 } from 'uuid';
import { passwordLength } from '../../shared/contracts/auth.ts';
import type { Db } from '../db/client.ts';
import * as tables from '../db/schema/auth.ts';
import { userRole } from '../db/schema/roles.ts';
import type { AuthMail } from './auth-mail.ts';
import type { Background } from './background.ts';
import { cookiePrefix } from './cookie.ts';
import { withoutAddresses } from './log.ts';
import { originsOf } from './origin.ts';

/** The header better-auth takes the caller's address from. Ours alone: it is overwritten on every request. */
export const addressHeader = 'x-client-address';
const day = 86_400;

export interface AuthDeps {
  db: Db;
  appUrl: string;
  secret: string;
  mail: AuthMail;
  background: Background;
  log: Logger;
  /** Told when a password was chosen anew: whoever was kept out by guesses at it may try again. */
  onNewPassword: (email: string) => Promise<void>;
}

async function grantTrainee(db: Db, userId: string): Promise<void> {
  await db.insert(userRole).values({ userId, role: 'trainee' }).onConflictDoNothing();
}

/** Refuses what must not be written: an address that another account took meanwhile, a session of a locked account. */
function guards(db: Db) {
  return {
    async freeAddress(email: unknown): Promise<void> {
      if (typeof email !== 'string') return;
      const taken = await db.select({ id: tables.user.id }).from(tables.user).where(eq(tables.user.email, email));
      if (taken.length > 0) throw new APIError('BAD_REQUEST', { code: 'INVALID_TOKEN', message: 'Address in use' });
    },
    async notLocked(userId: string): Promise<void> {
      const rows = await db
        .select({ lockedAt: tables.user.lockedAt })
        .from(tables.user)
        .where(eq(tables.user.id, userId));
      if (rows[0]?.lockedAt) throw new APIError('FORBIDDEN', { code: 'ACCOUNT_LOCKED', message: 'Account locked' });
    },
  };
}

// A class of forty sits behind one router, so the limits by address are wide: they stop floods, not people. Guessing at
// one account is limited by account instead (tries.ts).
const wide = { window: 10, max: 300 };
const rateLimit = {
  enabled: true,
  storage: 'database' as const,
  window: 10,
  max: 2_000,
  customRules: {
    '/sign-in/email': wide,
    '/sign-up/email': wide,
    '/change-password': wide,
    '/change-email': wide,
    '/request-password-reset': wide,
    '/reset-password': wide,
    '/send-verification-email': wide,
  },
};

/** better-auth with our tables, our mail and our limits. */
export function buildAuth({ db, appUrl, secret, mail, background, log, onNewPassword }: AuthDeps) {
  const guard = guards(db);
  return betterAuth({
    appName: 'Tankmark',
    baseURL: appUrl,
    basePath: '/api/auth',
    secret,
    trustedOrigins: originsOf(appUrl),
    database: drizzleAdapter(db, { provider: 'pg', schema: { ...tables }, transaction: true }),
    telemetry: { enabled: false },
    logger: {
      level: 'error',
      log: (_level, message, ...rest) => log.error({ err: rest[0] }, `auth: ${withoutAddresses(message)}`),
    },
    user: {
      additionalFields: {
        language: { type: 'string', required: false, defaultValue: 'en', input: true },
        lockedAt: { type: 'date', required: false, input: false, returned: false },
      },
      changeEmail: {
        enabled: true,
        sendChangeEmailConfirmation: ({ user, newEmail, token }) => mail.allowAddress(user, newEmail, token),
      },
    },
    emailAndPassword: {
      enabled: true,
      requireEmailVerification: true,
      minPasswordLength: passwordLength.least,
      maxPasswordLength: passwordLength.most,
      revokeSessionsOnPasswordReset: true,
      resetPasswordTokenExpiresIn: 3_600,
      sendResetPassword: ({ user, token }) => mail.reset(user, token),
      onPasswordReset: ({ user }) => onNewPassword(user.email),
      onExistingUserSignUp: ({ user }) => mail.alreadyHere(user),
    },
    emailVerification: {
      sendOnSignUp: true,
      sendOnSignIn: true,
      autoSignInAfterVerification: true,
      expiresIn: day,
      sendVerificationEmail: ({ user, token }) => mail.confirm(user, token),
      afterEmailVerification: (user) => grantTrainee(db, user.id),
    },
    session: { expiresIn: 30 * day, updateAge: day, cookieCache: { enabled: false } },
    rateLimit,
    advanced: {
      cookiePrefix,
      useSecureCookies: appUrl.startsWith('https:'),
      disableOriginCheck: false,
      disableCSRFCheck: false,
      database: { generateId: () => uuidv7() },
      ipAddress: { ipAddressHeaders: [addressHeader] },
      backgroundTasks: { handler: (work) => background.run(work) },
    },
    databaseHooks: {
      user: {
        create: { after: (user) => grantTrainee(db, user.id) },
        update: { before: (changes) => guard.freeAddress(changes.email) },
      },
      session: { create: { before: (session) => guard.notLocked(session.userId) } },
    },
  });
}
export type Auth = ReturnType<typeof buildAuth>;
