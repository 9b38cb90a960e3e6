import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { installPackages } from './lib/install.mjs';
import { lifetime } from './lib/lifetime.mjs';
import { freePort, isFree } from './lib/ports.mjs';
import { database, endChild, prepareDatabase, serverEnv, startProgram, tellAccounts } from './lib/product.mjs';
import { dataPath, Plain, root, say } from './lib/project.mjs';
import { tsArgs } from './lib/run.mjs';
import { claim } from './lib/runner.mjs';

// npm run dev: the product with hot reload. The pages come from Vite, which passes the API on to a server that starts
// again at every change.

await lifetime(async ({ onEnd, end }) => {
  const port = Number(process.env.PORT || 4180);
  onEnd(claim('start'));
  if (!(await isFree(port))) throw new Plain(`Port ${port} is in use. Choose another: PORT=4190 npm run dev`);
  await installPackages();
  const db = await database({ onExit: () => void end(1) });
  onEnd(() => db.stop());
  const mail = await startProgram(tsArgs('server/fakes/mailbox/main.ts', dataPath('mailbox')), {
    onExit: () => undefined,
  });
  onEnd(() => endChild(mail.child));
  const apiPort = await freePort();
  const env = serverEnv({ databaseUrl: db.url, port, mail: mail.ready, nodeEnv: 'development' });
  await prepareDatabase(env);
  const tsx = join(root, 'node_modules', 'tsx', 'dist', 'cli.mjs');
  const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js');
  const api = spawn(process.execPath, [tsx, 'watch', '--clear-screen=false', 'server/main.ts'], {
    cwd: root,
    env: { ...env, PORT: String(apiPort) },
    stdio: ['ignore', 'inherit', 'inherit'],
    detached: true,
  });
  onEnd(() => endChild(api));
  const pages = spawn(process.execPath, [vite, '--port', String(port)], {
    cwd: root,
    env: { ...env, API_URL: `http://127.0.0.1:${apiPort}` },
    stdio: ['ignore', 'inherit', 'inherit'],
    detached: true,
  });
  onEnd(() => endChild(pages));
  for (const child of [api, pages]) child.on('exit', (code) => void end(code ?? 1));
  say(`\nTankmark for work: http://localhost:${port}`);
  tellAccounts();
});
