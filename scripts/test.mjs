import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { performance } from 'node:perf_hooks';
import { buildIfStale } from './lib/build.mjs';
import { chromium, postgresBin } from './lib/debian.mjs';
import { installPackages } from './lib/install.mjs';
import { lifetime } from './lib/lifetime.mjs';
import { dataPath, root, say } from './lib/project.mjs';
import { cleanEnv, run, tsArgs } from './lib/run.mjs';

// npm test: all the set-up, every check, every test. `npm test -- PATH ...` runs the tests of those paths only.
// The last line says how many passed and failed.

const bin = (name) => join(root, 'node_modules', '.bin', name);

/** Checks besides the tests; each counts as one passed or failed. */
const checks = [
  { name: 'lint', command: bin('oxlint'), args: ['--type-aware', '--deny-warnings'] },
  { name: 'types', command: bin('tsc'), args: ['-b'] },
  { name: 'format', command: bin('prettier'), args: ['--check', '--log-level', 'warn', '.'] },
  { name: 'unused code and packages', command: bin('knip'), args: [] },
  { name: 'structure', command: process.execPath, args: tsArgs('scripts/check-structure.ts') },
];

async function check({ name, command, args }) {
  const began = performance.now();
  const { code, output } = await run(command, args, { capture: true });
  const seconds = ((performance.now() - began) / 1000).toFixed(1);
  say(`${code === 0 ? 'ok    ' : 'FAILED'} ${name} (${seconds} s)`);
  if (code !== 0) say(output.trimEnd());
  return code === 0;
}

async function tests(paths) {
  const file = join(dataPath(), `counts-${process.pid}.json`);
  const env = cleanEnv({ TANKMARK_COUNTS: file });
  const reporters = ['--reporter=default', '--reporter=./tests/support/count-reporter.ts'];
  const { code } = await run(bin('vitest'), ['run', ...reporters, ...paths], { env });
  try {
    const counts = JSON.parse(readFileSync(file, 'utf8'));
    rmSync(file);
    // A run that ended badly without a failed test still failed.
    return code !== 0 && counts.failed === 0 ? { ...counts, failed: 1 } : counts;
  } catch {
    return { passed: 0, failed: 1 };
  }
}

await lifetime(async ({ end }) => {
  const paths = process.argv.slice(2);
  await installPackages();
  await postgresBin();
  await chromium();
  let passed = 0;
  let failed = 0;
  if (paths.length === 0) {
    for (const one of checks) {
      if (await check(one)) passed += 1;
      else failed += 1;
    }
  }
  try {
    await buildIfStale();
    passed += 1;
    say('ok     build');
  } catch (error) {
    failed += 1;
    say(`FAILED build\n${error.message}`);
  }
  const counts = await tests(paths);
  passed += counts.passed;
  failed += counts.failed;
  say(`\n${passed} passed, ${failed} failed`);
  await end(failed === 0 ? 0 : 1);
});
