import { hashPassword } from 'better-auth/crypto';
import { v7 as uuidv7 } from 'uuid';
import type { Db } from '../../server/db/client.ts';
import { account, user } from '../../server/db/schema/auth.ts';
import { userRole } from '../../server/db/schema/roles.ts';
import type { Locale, Role } from '../../shared/vocabulary.ts';

export interface NewPerson {
  name: string;
  email: string;
  password: string;
  language: Locale;
  roles: readonly Role[];
}

// The demonstration's people share one password, and hashing one is slow on purpose.
const hashes = new Map<string, Promise<string>>();

function hashOf(password: string): Promise<string> {
  const known = hashes.get(password) ?? hashPassword(password);
  hashes.set(password, known);
  return known;
}

/** Makes an account as signing up and confirming would; gives back the person's id. */
export async function createPerson(db: Db, person: NewPerson): Promise<string> {
  const { name, email, password, language, roles } = person;
  const id = uuidv7();
  const hash = await hashOf(password);
  await db.transaction(async (tx) => {
    await tx.insert(user).values({ id, name, email, language, emailVerified: true });
    await tx
      .insert(account)
      .values({ id: uuidv7(), userId: id, accountId: id, providerId: 'credential', password: hash });
    if (roles.length > 0) await tx.insert(userRole).values(roles.map((role) => ({ userId: id, role })));
  });
  return id;
}
