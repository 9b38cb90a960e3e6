import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import type { Pool } from 'pg';
import { projectRoot } from '../project-root.ts';

const migrationsFolder = join(projectRoot, 'drizzle');
/** Any fixed number: two processes that migrate at once take turns on it. */
const lockNumber = 4_180_128;

/** Brings the database to the newest migration. Safe to run from several processes at once. */
export async function migrateDatabase(pool: Pool): Promise<void> {
  const client = await pool.connect();
  try {
    await client.query('set statement_timeout = 0');
    await client.query('select pg_advisory_lock($1)', [lockNumber]);
    await migrate(drizzle(client), { migrationsFolder });
  } finally {
    // Ends the session and with it the lock.
    client.release(true);
  }
}

interface Journal {
  entries: { tag: string }[];
}

/** Hashes of the migrations in the project, the way they are written to the database when they have run. */
async function knownHashes(): Promise<string[]> {
  const journal = JSON.parse(await readFile(join(migrationsFolder, 'meta', '_journal.json'), 'utf8')) as Journal;
  return Promise.all(
    journal.entries.map(async ({ tag }) => {
      const text = await readFile(join(migrationsFolder, `${tag}.sql`), 'utf8');
      return createHash('sha256').update(text).digest('hex');
    }),
  );
}

/** How many of the project's migrations the database lacks. Rejects when the database is unreachable. */
export async function missingMigrations(pool: Pool): Promise<number> {
  const { rows: found } = await pool.query<{ there: boolean }>(
    `select to_regclass('drizzle.__drizzle_migrations') is not null as there`,
  );
  const hashes = await knownHashes();
  if (!found[0]?.there) return hashes.length;
  const { rows } = await pool.query<{ hash: string }>('select hash from drizzle.__drizzle_migrations');
  const done = new Set(rows.map((row) => row.hash));
  return hashes.filter((hash) => !done.has(hash)).length;
}
