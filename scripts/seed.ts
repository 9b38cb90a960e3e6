import { mkdir, rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { eq, inArray } from 'drizzle-orm';
import { openDatabase, type Database } from '../server/db/client.ts';
import { ability, answer, dayCount, drill, problem, slipCount, topicLevel } from '../server/db/schema/practice.ts';
import { seeded } from '../server/db/schema/seeded.ts';
import { readEnv } from '../server/env.ts';
import { projectRoot } from '../server/project-root.ts';
import { demoPassword, demoPeople, type DemoPerson } from './demo/people.ts';
import { seedPeople } from './demo/seed-people.ts';
import { seedHistory, type HistoryPerson } from './seed-history.ts';

// The demonstration's data, written once: running it again, or after a run that was cut short, leaves the same behind.

async function once(database: Database, part: string, work: () => Promise<void>): Promise<boolean> {
  const done = await database.db.select().from(seeded).where(eq(seeded.part, part));
  if (done.length > 0) return false;
  await work();
  await database.db.insert(seeded).values({ part }).onConflictDoNothing();
  return true;
}

function historyOf(ids: ReadonlyMap<DemoPerson, string>): HistoryPerson[] {
  return [...ids].flatMap(([{ history, email, language }, id]) =>
    history === undefined ? [] : [{ ...history, id, language, seed: email }],
  );
}

/** Takes away what a run that was cut short may have left. */
async function clearHistory(database: Database, people: readonly HistoryPerson[]): Promise<void> {
  const ids = people.map((person) => person.id);
  for (const table of [answer, problem, drill, ability, topicLevel, slipCount, dayCount]) {
    await database.db.delete(table).where(inArray(table.userId, ids));
  }
}

/** Writes down the accounts anyone may try, for the start script to tell. */
async function writeAccounts(folder: string): Promise<void> {
  const accounts = demoPeople.map(({ email, roles, note }) => ({ email, password: demoPassword, roles, note }));
  await mkdir(folder, { recursive: true });
  const path = join(folder, 'demo-accounts.json');
  await writeFile(`${path}.part`, `${JSON.stringify(accounts, null, 2)}\n`);
  await rename(`${path}.part`, path);
}

const env = readEnv();
if (!env.DEMO && env.NODE_ENV === 'production') {
  process.stdout.write('No demonstration data: DEMO is not set.\n');
} else {
  const database = openDatabase({ url: env.DATABASE_URL, connections: 6, onIdleError: () => undefined });
  const began = performance.now();
  const wrote = await once(database, 'demonstration', async () => {
    const people = historyOf(await seedPeople(database.db));
    await clearHistory(database, people);
    await seedHistory({ database, zone: env.TIME_ZONE, people, today: new Date() });
  });
  await writeAccounts(process.env.TANKMARK_DATA ?? join(projectRoot, '.data'));
  await database.close();
  if (wrote) process.stdout.write(`Demonstration data written in ${Math.round(performance.now() - began)} ms.\n`);
}
