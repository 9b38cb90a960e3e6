import { randomUUID } from 'node:crypto';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { Writable } from 'node:stream';
import express from 'express';
import { buildApp } from '../../server/app.ts';
import { openDatabase } from '../../server/db/client.ts';
import { migrateDatabase } from '../../server/db/migrate.ts';
import { readEnv } from '../../server/env.ts';
import { createLog } from '../../server/http/log.ts';

// The product and, beside it in the same process, a bare Express route that does one INSERT through pg: what the
// benchmark of a graded answer is held against.

const env = readEnv();
const database = openDatabase({ url: env.DATABASE_URL, connections: env.DATABASE_POOL, onIdleError: () => undefined });
await migrateDatabase(database.pool);
await database.pool.query(
  'create table if not exists bench_bare (id uuid primary key, body jsonb not null, at timestamptz not null)',
);

// Logs are written as in production, to a sink that keeps nothing.
const nowhere = new Writable({ write: (_chunk, _encoding, done) => done() });
const log = createLog({ level: 'info', stream: nowhere });
const mail = { send: () => Promise.resolve(), close: () => undefined };
const { app } = buildApp({ env, database, mail, log });

const bare = express();
bare.disable('x-powered-by');
bare.post('/bare', express.json(), async (request, response) => {
  await database.pool.query({
    name: 'bench-bare',
    text: 'insert into bench_bare (id, body, at) values ($1, $2, now())',
    values: [randomUUID(), JSON.stringify(request.body)],
  });
  response.json({ ok: true });
});
bare.use(app);

const server = createServer(bare);
server.listen(env.PORT, '127.0.0.1', () => {
  process.stdout.write(`${JSON.stringify({ port: (server.address() as AddressInfo).port })}\n`);
});
process.on('SIGTERM', () => {
  server.close();
  server.closeAllConnections();
  void database.close().then(() => process.exit(0));
});
