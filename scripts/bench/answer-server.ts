import { randomUUID } from 'node:crypto';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { Writable } from 'node:stream';
import express, { type Request, type Response } from 'express';
import { buildApp } from '../../server/app.ts';
import { openDatabase } from '../../server/db/client.ts';
import { migrateDatabase } from '../../server/db/migrate.ts';
import { readEnv } from '../../server/env.ts';
import { createLog } from '../../server/http/log.ts';

// The product with a bare route beside its own, in the same Express: one INSERT through pg and nothing else.

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
async function insertOne(request: Request, response: Response): Promise<void> {
  await database.pool.query({
    name: 'bench-bare',
    text: 'insert into bench_bare (id, body, at) values ($1, $2, now())',
    values: [randomUUID(), JSON.stringify(request.body)],
  });
  response.json({ ok: true });
}

// In the product's own Express: what the bar speaks of.
const { app } = buildApp({ env, database, mail, log, mount: (own) => void own.post('/api/bare', insertOne) });

// And in an Express with nothing else in it, for comparison.
const empty = express();
empty.post('/empty', express.json(), insertOne);
empty.use(app);

const server = createServer(empty);
server.listen(env.PORT, '127.0.0.1', () => {
  process.stdout.write(`${JSON.stringify({ port: (server.address() as AddressInfo).port })}\n`);
});
process.on('SIGTERM', () => {
  server.close();
  server.closeAllConnections();
  void database.close().then(() => process.exit(0));
});
