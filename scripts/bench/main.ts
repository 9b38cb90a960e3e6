import { parseArgs } from 'node:util';
import { benchLine, type BenchFigure } from './figure.ts';

// npm run bench: each figure beside its bar; `-- --json` prints [{ name, figure, unit, bar, ok }]; `-- --only NAME` runs one.

const names = ['problems', 'answer', 'bundle', 'start'] as const;

const { values } = parseArgs({
  options: { only: { type: 'string' }, json: { type: 'boolean', default: false } },
});
const { only, json } = values;
if (only !== undefined && !names.some((name) => name === only)) {
  console.error(`There is no benchmark "${only}". There are: ${names.join(', ')}.`);
  process.exit(2);
}
const databaseUrl = process.env.DATABASE_URL ?? '';
const port = Number(process.env.BENCH_PORT);

const benchmarks: Record<(typeof names)[number], () => Promise<BenchFigure[]>> = {
  problems: async () => (await import('./problems.ts')).benchProblems({ verbose: !json }),
  answer: async () => (await import('./answer.ts')).benchAnswer({ databaseUrl, port, verbose: !json }),
  bundle: async () => (await import('./bundle.ts')).benchBundle(),
  start: async () => (await import('./start.ts')).benchStart({ databaseUrl, port }),
};

const figures: BenchFigure[] = [];
for (const name of names) {
  if (only !== undefined && name !== only) continue;
  if (!json) console.log(`${name} ...`);
  figures.push(...(await benchmarks[name]()));
}
const lines = figures.map(benchLine);
if (json) console.log(JSON.stringify(lines));
else {
  for (const { name, figure, unit, bar, ok } of lines) {
    console.log(`${ok ? 'ok  ' : 'MISS'}  ${name.padEnd(26)} ${String(figure).padStart(9)} ${unit} (bar ${bar})`);
  }
}
if (lines.some((line) => !line.ok)) process.exitCode = 1;
