import type { Reporter, TestModule } from 'vitest/node';

/** Ends a run with one plain line of counts, whatever the terminal is. */
export default class PlainLine implements Reporter {
  onTestRunEnd(modules: readonly TestModule[]): void {
    let passed = 0;
    let failed = 0;
    for (const module of modules) {
      for (const test of module.children.allTests()) {
        if (test.result().state === 'passed') passed++;
        if (test.result().state === 'failed') failed++;
      }
      failed += module.errors().length;
    }
    process.stdout.write(`${passed} passed, ${failed} failed\n`);
  }
}
