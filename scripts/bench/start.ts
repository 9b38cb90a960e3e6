import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { performance } from 'node:perf_hooks';
import { setTimeout as pause } from 'node:timers/promises';
import { projectRoot } from '../../server/project-root.ts';
import { median, type BenchFigure } from './figure.ts';

const mostSeconds = 2;
const runs = 5;
const patienceMs = 20_000;

async function oneStart(databaseUrl: string, port: number): Promise<number> {
  const began = performance.now();
  const child = spawn(process.execPath, ['dist/server/main.js'], {
    cwd: projectRoot,
    stdio: 'ignore',
    env: {
      ...process.env,
      NODE_ENV: 'production',
      DATABASE_URL: databaseUrl,
      PORT: String(port),
      AUTH_SECRET: 'a secret of the benchmark, long enough',
      SMTP_URL: 'smtp://127.0.0.1:9',
      MAIL_FROM: 'Tankmark <office@example.test>',
    },
  });
  try {
    for (;;) {
      const ready = await fetch(`http://127.0.0.1:${port}/readyz`).then(
        (reply) => reply.ok,
        () => false,
      );
      if (ready) return (performance.now() - began) / 1000;
      if (child.exitCode !== null || performance.now() - began > patienceMs)
        throw new Error('the built server did not start');
      await pause(10);
    }
  } finally {
    child.kill('SIGTERM');
    if (child.exitCode === null) await once(child, 'exit');
  }
}

/** From starting the built server's process to its first good answer on /readyz. */
export async function benchStart(options: { databaseUrl: string; port: number }): Promise<BenchFigure[]> {
  const times: number[] = [];
  for (let run = 0; run < runs; run += 1) times.push(await oneStart(options.databaseUrl, options.port));
  return [{ name: 'start', figure: median(times), unit: 's until ready', bar: mostSeconds, atLeast: false }];
}
