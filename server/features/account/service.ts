import { v7 as uuidv7 } from 'uuid';
import { accessKeys } from '../../../shared/contracts/access.ts';
import type { ChangeMeBody, MeView, SignedInView } from '../../../shared/contracts/account.ts';
import { AppError } from '../../../shared/errors.ts';
import { may } from '../../http/access.ts';
import type { Person } from '../../http/session.ts';
import type { Tries } from '../../http/tries.ts';
import { deviceOf } from './device.ts';
import { entitlement } from './entitlement.ts';
import type { AccountRepo, Writer } from './repo.ts';

/** Reads one feature's data of a person for the export, under the names it gives. */
export type ExportPart = (userId: string) => Promise<Record<string, unknown>>;
/** Deals with one feature's rows of a person who leaves: hands them to `anonymousId`, or deletes them. */
export type OnDelete = (writer: Writer, owner: { userId: string; anonymousId: string }) => Promise<void>;

export interface AccountDeps {
  repo: AccountRepo;
  tries: Tries;
  verifyPassword: (given: { hash: string; password: string }) => Promise<boolean>;
  exportParts: readonly ExportPart[];
  onDelete: readonly OnDelete[];
  now: () => Date;
}

export function accountService({ repo, tries, verifyPassword, exportParts, onDelete, now }: AccountDeps) {
  function me(person: Person): MeView {
    const { id, name, email, language, roles } = person;
    const allowed = accessKeys.filter((key) => may(person, key));
    return { id, name, email, language, roles: [...roles], may: allowed, full: entitlement(person).full };
  }

  return {
    me,

    async change(person: Person, changes: ChangeMeBody): Promise<MeView> {
      await repo.change(person.id, changes);
      return me({ ...person, ...changes });
    },

    async sessions(person: Person): Promise<SignedInView[]> {
      const rows = await repo.sessions(person.id);
      return rows.map((row) => ({
        id: row.id,
        current: row.id === person.sessionId,
        ...deviceOf(row.userAgent),
        since: row.createdAt.toISOString(),
        lastSeen: row.updatedAt.toISOString(),
      }));
    },

    async endSession(person: Person, id: string): Promise<void> {
      if (!(await repo.endSession(person.id, id))) throw new AppError('not-found');
    },

    endOtherSessions: (person: Person) => repo.endOtherSessions(person.id, person.sessionId),

    async exportAll(person: Person): Promise<Record<string, unknown>> {
      const parts = await Promise.all([repo.ownData, ...exportParts].map((read) => read(person.id)));
      return Object.assign({ exportedAt: now().toISOString() }, ...parts) as Record<string, unknown>;
    },

    /** Deletes the account for good. What was answered stays for the statistics, under an id that leads to nobody. */
    async remove(person: Person, password: string): Promise<void> {
      await tries.spend('password', person.id);
      const hash = await repo.passwordHash(person.id);
      if (hash === null || !(await verifyPassword({ hash, password }))) {
        throw new AppError('password-wrong', { errors: [{ field: 'password', message: 'The password is not right' }] });
      }
      await tries.forgive('password', person.id);
      const owner = { userId: person.id, anonymousId: uuidv7() };
      await repo.remove(person.id, async (writer) => {
        for (const part of onDelete) await part(writer, owner);
      });
    },
  };
}
export type AccountService = ReturnType<typeof accountService>;
