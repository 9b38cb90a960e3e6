import { performance } from 'node:perf_hooks';
import { roundedAnswer } from '../../server/problems/answer-text.ts';
import { generate, type Problem } from '../../server/problems/engine.ts';
import type { Part } from '../../server/problems/family.ts';
import { gradePart, type Response } from '../../server/problems/grade.ts';
import { families } from '../../server/problems/registry.ts';
import { median, type BenchFigure } from './figure.ts';

const drawsEach = 1_000;
const warmUp = 50;
const leastPerSecond = 3_000;
const mostMedianMs = 2;

function rightResponse(part: Part): Response {
  if (part.kind === 'choice') return { kind: 'choice', option: part.options.find((option) => option.right)?.key ?? '' };
  if (part.kind === 'order') return { kind: 'order', steps: part.steps.map((step) => step.key) };
  return { kind: 'number', text: roundedAnswer(part).en };
}

function gradeAll(problem: Problem, responses: readonly Response[]): void {
  problem.parts.forEach((part, index) => {
    const response = responses[index] as Response;
    gradePart({ problem, part: part.key, response, earlier: {}, locale: 'en' });
  });
}

/** Generates and grades every family in one thread; prints each family's own times when `verbose`. */
export function benchProblems(options: { verbose: boolean }): BenchFigure[] {
  let total = 0;
  let milliseconds = 0;
  let slowestMedian = 0;
  for (const family of families) {
    for (const tier of family.tiers) {
      const times: number[] = [];
      for (let index = 0; index < drawsEach + warmUp; index += 1) {
        const start = performance.now();
        const problem = generate(family, { seed: `bench-${index}`, tier });
        const generated = performance.now();
        // Writing down the right answers is the trainee's work, not the server's: it is left out of the time.
        const responses = problem.parts.map(rightResponse);
        const before = performance.now();
        gradeAll(problem, responses);
        const spent = generated - start + (performance.now() - before);
        if (index >= warmUp) times.push(spent);
      }
      const middle = median(times);
      const sum = times.reduce((a, b) => a + b, 0);
      total += times.length;
      milliseconds += sum;
      slowestMedian = Math.max(slowestMedian, middle);
      if (options.verbose) {
        const worst = Math.max(...times);
        console.log(`  ${family.key} tier ${tier}: median ${middle.toFixed(3)} ms, worst ${worst.toFixed(2)} ms`);
      }
    }
  }
  return [
    { name: 'problems', figure: (total / milliseconds) * 1000, unit: 'problems/s', bar: leastPerSecond, atLeast: true },
    { name: 'problems-slowest-family', figure: slowestMedian, unit: 'ms median', bar: mostMedianMs, atLeast: false },
  ];
}
