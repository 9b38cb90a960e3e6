import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { inject } from 'vitest';
import { migrateDatabase } from '../../server/db/migrate.ts';

const templateName = 'tankmark_template';
/** Any fixed number: test files that come at once take turns to make the template. */
const lockNumber = 4_180_001;

function urlOf(name: string): string {
  const url = new URL(inject('adminUrl'));
  url.pathname = `/${name}`;
  return url.href;
}

async function makeTemplate(admin: pg.Client): Promise<void> {
  const { rowCount } = await admin.query('select 1 from pg_database where datname = $1', [templateName]);
  if (rowCount) return;
  await admin.query('create database tankmark_half_made');
  const pool = new pg.Pool({ connectionString: urlOf('tankmark_half_made'), max: 2 });
  pool.on('error', () => undefined);
  await migrateDatabase(pool);
  await pool.end();
  await admin.query(`alter database tankmark_half_made rename to ${templateName}`);
}

/** A migrated database of its own, copied from a template that the first caller makes. */
export async function createTestDatabase(): Promise<{ url: string; drop: () => Promise<void> }> {
  const name = `t_${randomBytes(6).toString('hex')}`;
  const admin = new pg.Client({ connectionString: inject('adminUrl') });
  admin.on('error', () => undefined);
  await admin.connect();
  // The lock also keeps two copies of the template from being made at once, which PostgreSQL refuses.
  await admin.query('select pg_advisory_lock($1)', [lockNumber]);
  try {
    await makeTemplate(admin);
    await admin.query(`create database ${name} template ${templateName}`);
  } finally {
    await admin.query('select pg_advisory_unlock($1)', [lockNumber]);
  }
  return {
    url: urlOf(name),
    async drop() {
      await admin.query(`drop database ${name} with (force)`);
      await admin.end();
    },
  };
}
