import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { buildApp } from './app.ts';
import { openDatabase } from './db/client.ts';
import { missingMigrations } from './db/migrate.ts';
import { EnvError, readEnv } from './env.ts';
import { createLog } from './http/log.ts';
import { smtpMail } from './outside/mail.ts';

const finishWithinMs = 5_000;

function fail(message: string): never {
  process.stderr.write(`${message}\n`);
  process.exit(1);
}

function configuration() {
  try {
    return readEnv();
  } catch (error) {
    if (error instanceof EnvError) return fail(error.message);
    throw error;
  }
}

const env = configuration();
const log = createLog({ level: env.LOG_LEVEL });
const database = openDatabase({
  url: env.DATABASE_URL,
  connections: env.DATABASE_POOL,
  onIdleError: (error) => log.error({ err: error }, 'a database connection was lost'),
});
const missing = await missingMigrations(database.pool).catch((error: NodeJS.ErrnoException) =>
  fail(`The database does not answer (${error.code ?? 'no connection'}). Check DATABASE_URL.`),
);
if (missing > 0) fail(`The database lacks ${missing} migration(s). Run the migrations, then start again.`);

const mail = smtpMail({ url: env.SMTP_URL, from: env.MAIL_FROM });
const { app, background, beginStopping } = buildApp({ env, database, mail, log });
const server = createServer(app);
server.requestTimeout = 30_000;
server.headersTimeout = 15_000;

server.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EADDRINUSE') fail(`Port ${env.PORT} on ${env.HOST} is in use. Set PORT to another one.`);
  fail(`The server could not listen: ${error.message}`);
});
server.listen(env.PORT, env.HOST, () => {
  const { port } = server.address() as AddressInfo;
  log.info({ host: env.HOST, port, url: env.APP_URL, ms: Math.round(process.uptime() * 1000) }, 'server listening');
});

let stopping = false;
/** Takes no more requests, lets those begun finish, sends the mail that waits, closes the pool. */
async function stop(signal: string): Promise<void> {
  if (stopping) return;
  stopping = true;
  beginStopping();
  log.info({ signal }, 'server stopping');
  setTimeout(() => process.exit(1), 2 * finishWithinMs).unref();
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  // A connection becomes idle when its request has ended; kept alive, it would hold the server open.
  const sweep = setInterval(() => server.closeIdleConnections(), 50);
  const cut = setTimeout(() => server.closeAllConnections(), finishWithinMs);
  await closed;
  clearInterval(sweep);
  clearTimeout(cut);
  await background.settled();
  mail.close();
  await database.close();
  log.info('server stopped');
}
process.on('SIGTERM', () => void stop('SIGTERM'));
process.on('SIGINT', () => void stop('SIGINT'));
// Started by a script that was killed: nobody is left to stop us.
process.on('disconnect', () => void stop('disconnect'));
process.on('uncaughtException', (error) => {
  log.fatal({ err: error }, 'a fault nobody caught');
  process.exitCode = 1;
  void stop('fault');
});
