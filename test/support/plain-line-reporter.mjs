/** Closes a run with one plain line that a build pipeline can count. A suite that could not even load is a failure. */
export default class PlainLineReporter {
  onRunComplete(_contexts, results) {
    const failed = results.numFailedTests + results.numRuntimeErrorTestSuites;
    const skipped = results.numPendingTests + results.numTodoTests;
    console.log(`Tests: ${results.numPassedTests} passed, ${failed} failed, ${skipped} skipped`);
  }
}
