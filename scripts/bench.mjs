import { spawn } from 'node:child_process';
import { buildIfStale } from './lib/build.mjs';
import { removeCluster, removeStaleTestClusters, startCluster } from './lib/cluster.mjs';
import { installPackages } from './lib/install.mjs';
import { lifetime } from './lib/lifetime.mjs';
import { freePort } from './lib/ports.mjs';
import { root } from './lib/project.mjs';
import { cleanEnv, must, tsArgs } from './lib/run.mjs';

// npm run bench: sets up a database of its own, builds, measures.

await lifetime(async ({ onEnd, end }) => {
  const args = process.argv.slice(2);
  await installPackages();
  await removeStaleTestClusters();
  const name = `test-${process.pid}`;
  // Safe settings, as in production: what is measured is what people get.
  const cluster = await startCluster({ name });
  onEnd(() => removeCluster(name));
  onEnd(() => cluster.stop());
  if (!args.includes('problems') && !args.includes('answer')) await buildIfStale();
  const env = cleanEnv({ DATABASE_URL: cluster.url, BENCH_PORT: String(await freePort()) });
  await must('The migration', process.execPath, tsArgs('scripts/migrate.ts'), { env });
  const child = spawn(process.execPath, tsArgs('scripts/bench/main.ts', ...args), { cwd: root, env, stdio: 'inherit' });
  child.on('exit', (code) => void end(code ?? 1));
  onEnd(() => void child.kill('SIGTERM'));
});
