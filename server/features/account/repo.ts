import { and, desc, eq, gt, ne } from 'drizzle-orm';
import type { Db } from '../../db/client.ts';
import { account, session, user, verification } from '../../db/schema/auth.ts';
import { userRole } from '../../db/schema/roles.ts';
import type { Locale } from '../../../shared/vocabulary.ts';

/** A transaction, or the database itself. */
export type Writer = Pick<Db, 'update' | 'delete' | 'insert' | 'select' | 'execute'>;

/** Reads and writes of one's own account; the owner stands in every WHERE. */
export function accountRepo(db: Db) {
  return {
    async change(userId: string, changes: { name?: string; language?: Locale }): Promise<void> {
      await db
        .update(user)
        .set({ ...changes, updatedAt: new Date() })
        .where(eq(user.id, userId));
    },

    sessions: (userId: string) =>
      db
        .select({
          id: session.id,
          userAgent: session.userAgent,
          createdAt: session.createdAt,
          updatedAt: session.updatedAt,
        })
        .from(session)
        .where(and(eq(session.userId, userId), gt(session.expiresAt, new Date())))
        .orderBy(desc(session.updatedAt)),

    /** Ends one session; false when the person has none of that id. */
    async endSession(userId: string, id: string): Promise<boolean> {
      const ended = await db
        .delete(session)
        .where(and(eq(session.userId, userId), eq(session.id, id)))
        .returning({ id: session.id });
      return ended.length > 0;
    },

    async endOtherSessions(userId: string, currentId: string): Promise<number> {
      const ended = await db
        .delete(session)
        .where(and(eq(session.userId, userId), ne(session.id, currentId)))
        .returning({ id: session.id });
      return ended.length;
    },

    async passwordHash(userId: string): Promise<string | null> {
      const rows = await db
        .select({ password: account.password })
        .from(account)
        .where(and(eq(account.userId, userId), eq(account.providerId, 'credential')));
      return rows[0]?.password ?? null;
    },

    async ownData(userId: string): Promise<Record<string, unknown>> {
      const [people, roles, sessions] = await Promise.all([
        db
          .select({
            name: user.name,
            email: user.email,
            emailConfirmed: user.emailVerified,
            language: user.language,
            createdAt: user.createdAt,
            updatedAt: user.updatedAt,
          })
          .from(user)
          .where(eq(user.id, userId)),
        db
          .select({ role: userRole.role, grantedAt: userRole.grantedAt })
          .from(userRole)
          .where(eq(userRole.userId, userId)),
        db
          .select({
            since: session.createdAt,
            lastSeen: session.updatedAt,
            address: session.ipAddress,
            browser: session.userAgent,
          })
          .from(session)
          .where(eq(session.userId, userId)),
      ]);
      return { account: people[0] ?? null, roles, sessions };
    },

    /** Drops a sign-up that was never confirmed; an account once confirmed is never touched. */
    async dropUnconfirmed(email: string): Promise<void> {
      await db.delete(user).where(and(eq(user.email, email), eq(user.emailVerified, false)));
    },

    /** Removes the person with sessions, sign-in and roles, after `before` has dealt with what refers to them; all or nothing. */
    async remove(userId: string, before: (writer: Writer) => Promise<void>): Promise<void> {
      await db.transaction(async (writer) => {
        await before(writer);
        await writer.delete(verification).where(eq(verification.value, userId));
        await writer.delete(user).where(eq(user.id, userId));
      });
    },
  };
}
export type AccountRepo = ReturnType<typeof accountRepo>;
