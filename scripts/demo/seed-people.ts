import { eq } from 'drizzle-orm';
import type { Db } from '../../server/db/client.ts';
import { user } from '../../server/db/schema/auth.ts';
import { createPerson } from './create-person.ts';
import { demoPassword, demoPeople, type DemoPerson } from './people.ts';

/** Makes the demonstration's people where they are missing; gives back everyone's id. */
export async function seedPeople(db: Db): Promise<Map<DemoPerson, string>> {
  const ids = new Map<DemoPerson, string>();
  for (const person of demoPeople) {
    const found = await db.select({ id: user.id }).from(user).where(eq(user.email, person.email));
    ids.set(person, found[0]?.id ?? (await createPerson(db, { ...person, password: demoPassword })));
  }
  return ids;
}
