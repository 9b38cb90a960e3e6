import { describe, expect, test } from 'vitest';
import { generate } from '../../problems/engine.ts';
import { families } from '../../problems/registry.ts';
import { workingView } from './working-view.ts';

describe('worked solutions as formulas', () => {
  for (const family of families) {
    test(`${family.key} renders in both languages, strictly`, () => {
      for (const tier of family.tiers) {
        for (let seed = 1; seed <= 8; seed += 1) {
          const problem = generate(family, { seed: `view-${seed}`, tier });
          for (const locale of ['en', 'es'] as const) {
            const lines = workingView(problem, locale);
            expect(lines.length).toBeGreaterThan(0);
            for (const line of lines) {
              if (line.html !== '') expect(line.html).toContain('<math');
              expect(line.plain).not.toBe('');
            }
          }
        }
      }
    });
  }
});
