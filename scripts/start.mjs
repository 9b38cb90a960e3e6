import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { buildIfStale } from './lib/build.mjs';
import { installPackages } from './lib/install.mjs';
import { lifetime } from './lib/lifetime.mjs';
import { isFree } from './lib/ports.mjs';
import { database, endChild, prepareDatabase, serverEnv, startProgram, tellAccounts } from './lib/product.mjs';
import { dataPath, Plain, root, say } from './lib/project.mjs';
import { claim } from './lib/runner.mjs';

// npm start: all the set-up, then the product, until it is told to stop.

const readySeconds = 20;
const portPatienceTenths = 40;

async function waitUntilReady(port, child) {
  const deadline = Date.now() + readySeconds * 1000;
  while (Date.now() < deadline && child.exitCode === null) {
    const ready = await fetch(`http://127.0.0.1:${port}/readyz`)
      .then((reply) => reply.ok)
      .catch(() => false);
    if (ready) return;
    await pause(50);
  }
  throw new Plain('The server did not become ready; its messages stand above.');
}

/** What a killed earlier run has left stops within a moment: its port is waited for. */
async function freeSoon(port) {
  for (let tenth = 0; tenth < portPatienceTenths; tenth += 1) {
    if (await isFree(port)) return true;
    await pause(100);
  }
  return false;
}

await lifetime(async ({ onEnd, end }) => {
  const port = Number(process.env.PORT || 4180);
  if (!Number.isInteger(port) || port < 1 || port > 65_535)
    throw new Plain(`PORT must be a port number, got "${process.env.PORT}".`);
  onEnd(claim('start'));
  if (!(await freeSoon(port))) {
    throw new Plain(`Port ${port} is in use. Stop what uses it, or choose another: PORT=4190 npm start`);
  }
  await installPackages();
  const db = await database({
    onExit: () => {
      process.stderr.write('The database ended by itself; stopping.\n');
      void end(1);
    },
  });
  onEnd(() => db.stop());
  await buildIfStale();
  let stopping = false;
  onEnd(() => void (stopping = true));
  const mail = process.env.SMTP_URL
    ? null
    : await startProgram([join(root, 'dist/server/mailbox.js'), dataPath('mailbox')], {
        onExit: () => !stopping && void end(1),
      });
  onEnd(() => endChild(mail?.child));
  const env = serverEnv({ databaseUrl: db.url, port, mail: mail?.ready, nodeEnv: 'production' });
  await prepareDatabase(env);
  const server = spawn(process.execPath, [join(root, 'dist/server/main.js')], {
    cwd: root,
    env,
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    detached: true,
  });
  server.on('exit', (code) => {
    if (!stopping) void end(code ?? 1);
  });
  onEnd(() => {
    stopping = true;
    return endChild(server);
  });
  await waitUntilReady(port, server);
  say(`\nTankmark is ready: ${env.APP_URL}`);
  if (env.MAILBOX_URL) say(`Mail that it sends: ${env.APP_URL}/mailbox`);
  tellAccounts();
  say('\nStop it with Ctrl-C.');
});
