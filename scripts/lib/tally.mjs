/** Counts of checks over all stages of a test run. */
export class Tally {
  passed = 0;
  failed = 0;
  skipped = 0;

  add({ passed = 0, failed = 0, skipped = 0 }) {
    this.passed += passed;
    this.failed += failed;
    this.skipped += skipped;
  }
}
