import { writeFileSync } from 'node:fs';
import type { Reporter, TestModule } from 'vitest/node';

/** Writes how many tests passed and failed to the file named in TANKMARK_COUNTS, for the line the whole run ends with. */
export default class CountReporter implements Reporter {
  onTestRunEnd(modules: readonly TestModule[], errors: readonly unknown[]): void {
    const file = process.env.TANKMARK_COUNTS;
    if (!file) return;
    let passed = 0;
    let failed = errors.length;
    for (const module of modules) {
      const tests = [...module.children.allTests()];
      for (const test of tests) {
        const { state } = test.result();
        if (state === 'passed') passed += 1;
        // A test that did not run at all is no pass.
        else failed += 1;
      }
      if (module.state() === 'failed' && tests.length === 0) failed += 1;
      else if (module.errors().length > 0) failed += module.errors().length;
    }
    writeFileSync(file, JSON.stringify({ passed, failed }));
  }
}
