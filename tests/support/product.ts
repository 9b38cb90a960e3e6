import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import type { TestProject } from 'vitest/node';
import { removeCluster, removeStaleTestClusters, startCluster } from '../../scripts/lib/cluster.mjs';
import { freePort } from '../../scripts/lib/ports.mjs';
import { projectRoot } from '../../server/project-root.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** Where the built product answers, started once for all browser tests. */
    productUrl: string;
    /** Its database, for tests that look at what was stored. */
    productDatabase: string;
  }
}

const readySeconds = 30;

function program(args: readonly string[], env: NodeJS.ProcessEnv, stdout: 'pipe' | 'ignore'): ChildProcess {
  return spawn(process.execPath, args, { cwd: projectRoot, env, stdio: ['ignore', stdout, 'inherit'] });
}

async function toEnd(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null) return;
  child.kill('SIGTERM');
  await once(child, 'exit');
}

async function finished(child: ChildProcess, what: string): Promise<void> {
  const [code] = (await once(child, 'exit')) as [number | null];
  if (code !== 0) throw new Error(`${what} failed with exit code ${code}`);
}

async function ready(url: string): Promise<void> {
  for (let tenth = 0; tenth < readySeconds * 10; tenth += 1) {
    const ok = await fetch(`${url}/readyz`).then(
      (reply) => reply.ok,
      () => false,
    );
    if (ok) return;
    await pause(100);
  }
  throw new Error('the product did not become ready');
}

/** Starts the built product with its demonstration people on a database of its own. Needs `npm run build` before. */
export default async function product(project: TestProject): Promise<() => Promise<void>> {
  await removeStaleTestClusters();
  const name = `test-${process.pid}-browser`;
  const cluster = await startCluster({ name, fast: true });
  const folder = await mkdtemp(join(tmpdir(), 'tankmark-product-'));
  const mailbox = program(['dist/server/mailbox.js', join(folder, 'mailbox')], process.env, 'pipe');
  const [line] = (await once(mailbox.stdout as NodeJS.ReadableStream, 'data')) as [Buffer];
  const mail = JSON.parse(line.toString()) as { smtp: number; http: number };
  const port = await freePort();
  const url = `http://localhost:${port}`;
  const env = {
    ...process.env,
    NODE_ENV: 'production',
    DATABASE_URL: cluster.url,
    PORT: String(port),
    APP_URL: url,
    AUTH_SECRET: 'a secret of the browser tests, long enough',
    SMTP_URL: `smtp://127.0.0.1:${mail.smtp}`,
    MAILBOX_URL: `http://127.0.0.1:${mail.http}`,
    MAIL_FROM: 'Tankmark <office@example.test>',
    DEMO: '1',
    LOG_LEVEL: 'warn',
    TANKMARK_DATA: folder,
  };
  const tsx = ['--import', 'tsx'];
  await finished(program([...tsx, 'scripts/migrate.ts'], env, 'ignore'), 'the migration');
  await finished(program([...tsx, 'scripts/seed.ts'], env, 'ignore'), 'the seed');
  const server = program(['dist/server/main.js'], env, 'ignore');
  await ready(url);
  project.provide('productUrl', url);
  project.provide('productDatabase', cluster.url);
  return async () => {
    await toEnd(server);
    await toEnd(mailbox);
    await cluster.stop();
    await removeCluster(name);
    await rm(folder, { recursive: true, force: true });
  };
}
