import { randomBytes } from 'node:crypto';
import { spawn } from 'node:child_process';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { startCluster } from './cluster.mjs';
import { dataPath, Plain, root, say } from './project.mjs';
import { cleanEnv, must, run, tsArgs } from './run.mjs';

/** A secret of this machine, made once. */
function secret() {
  const file = join(dataPath(), 'auth-secret');
  if (!existsSync(file)) writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600 });
  return readFileSync(file, 'utf8');
}

/** Starts a program that prints one line of JSON when it is ready. */
export function startProgram(args, { env = cleanEnv(), onExit }) {
  const child = spawn(process.execPath, args, {
    cwd: root,
    env,
    stdio: ['ignore', 'pipe', 'inherit', 'ipc'],
    detached: true,
  });
  child.on('exit', (code) => onExit(code));
  return new Promise((resolve, reject) => {
    let text = '';
    child.on('error', reject);
    child.on('exit', () => reject(new Plain(`${args.at(-1)} ended before it was ready.`)));
    child.stdout.on('data', (chunk) => {
      text += chunk;
      if (text.includes('\n')) resolve({ child, ready: JSON.parse(text.split('\n')[0]) });
    });
  });
}

/** Ends a child kindly, then by force. */
export function endChild(child, seconds = 10) {
  if (!child || child.exitCode !== null || child.signalCode !== null) return Promise.resolve();
  return new Promise((resolve) => {
    const timer = setTimeout(() => child.kill('SIGKILL'), seconds * 1000);
    child.on('exit', () => {
      clearTimeout(timer);
      resolve();
    });
    child.kill('SIGTERM');
  });
}

/** The database to use: the one in DATABASE_URL, or the private cluster of this folder. */
export async function database({ onExit }) {
  const given = process.env.DATABASE_URL;
  if (given) return { url: given, stop: async () => undefined };
  return startCluster({ name: 'postgres', onExit });
}

/** Everything the server is told; what the caller has set stands. */
export function serverEnv({ databaseUrl, port, mail, nodeEnv, defaults = {} }) {
  const wanted = {
    NODE_ENV: nodeEnv,
    DATABASE_URL: databaseUrl,
    PORT: String(port),
    APP_URL: `http://localhost:${port}`,
    AUTH_SECRET: process.env.AUTH_SECRET ?? secret(),
    SMTP_URL: mail ? `smtp://127.0.0.1:${mail.smtp}` : undefined,
    MAILBOX_URL: mail ? `http://127.0.0.1:${mail.http}` : undefined,
    MAIL_FROM: 'Tankmark <office@example.test>',
    DEMO: '1',
    ...defaults,
  };
  const env = cleanEnv();
  for (const [key, value] of Object.entries(wanted)) if (value !== undefined && !env[key]) env[key] = value;
  env.NODE_ENV = nodeEnv;
  return env;
}

/** Migrations, then the demonstration's people and their history, once. */
export async function prepareDatabase(env) {
  await must('The migration', process.execPath, tsArgs('scripts/migrate.ts'), { env });
  const { code } = await run(process.execPath, tsArgs('scripts/seed.ts'), { env });
  if (code !== 0) throw new Plain('The demonstration data could not be written.');
}

/** The accounts anyone may try, as the seed wrote them down. */
export function demoAccounts() {
  const file = join(dataPath(), 'demo-accounts.json');
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : [];
}

export function tellAccounts() {
  const accounts = demoAccounts();
  if (accounts.length === 0) return;
  say('\nDemonstration accounts:');
  const width = Math.max(...accounts.map((account) => account.email.length));
  for (const { email, password, roles, note } of accounts) {
    say(`  ${email.padEnd(width)}  ${password}  ${roles.join(', ')}${note ? ` (${note})` : ''}`);
  }
}
