import { openDatabase } from '../server/db/client.ts';
import { migrateDatabase } from '../server/db/migrate.ts';

// Brings the database in DATABASE_URL to the newest migration.

const url = process.env.DATABASE_URL;
if (!url) {
  process.stderr.write('DATABASE_URL is not set.\n');
  process.exit(2);
}
const database = openDatabase({ url, connections: 1, onIdleError: () => undefined });
await migrateDatabase(database.pool);
await database.close();
