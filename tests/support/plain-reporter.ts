import type { Reporter, TestModule } from 'vitest/node';

/** Prints the closing line `N passed, N failed`; a module that could not be collected counts as one failure. */
export default class PlainReporter implements Reporter {
  onTestRunEnd(modules: readonly TestModule[]): void {
    const count = { passed: 0, failed: 0, skipped: 0 };
    for (const module of modules) {
      if (module.errors().length > 0) count.failed += 1;
      for (const test of module.children.allTests()) {
        const { state } = test.result();
        count[state === 'passed' ? 'passed' : state === 'failed' ? 'failed' : 'skipped'] += 1;
      }
    }
    const skipped = count.skipped > 0 ? `, ${count.skipped} skipped` : '';
    console.log(`${count.passed} passed, ${count.failed} failed${skipped}`);
  }
}
