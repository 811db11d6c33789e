/** Adds up what passed and failed over all kinds of check, and ends with the one line a machine reads. */
export class Tally {
  #passed = 0;
  #failed = 0;
  #failures = [];

  /** Counts one part's results; a part with a failure is named at the end. */
  add(name, { passed, failed }) {
    this.#passed += passed;
    this.#failed += failed;
    if (failed > 0) this.#failures.push(`${name}: ${failed}`);
  }

  /** Counts a check that either passes or fails as a whole. */
  addGate(name, ok) {
    this.add(name, ok ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 });
  }

  /** Prints the failures and, last, `N passed, N failed`; sets the exit code. */
  close() {
    if (this.#failures.length > 0) console.log(`\nFailed:\n${this.#failures.map((line) => `  ${line}`).join('\n')}`);
    if (this.#failed > 0) process.exitCode = 1;
    console.log(`\n${this.#passed} passed, ${this.#failed} failed`);
  }
}
