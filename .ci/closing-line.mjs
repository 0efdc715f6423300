/** Prints "N passed, N failed" from Vitest's JSON report; fails when there is no report or something failed. */
import { readFileSync } from 'node:fs';

/** @type {{ numPassedTests: number, numFailedTests: number, numPendingTests: number, numTodoTests: number,
 *   testResults: { status: string, assertionResults: unknown[] }[] }} */
let report;
try {
  report = JSON.parse(readFileSync(process.argv[2], 'utf8'));
} catch {
  console.log('The test runner left no report: it did not get as far as running tests.');
  process.exit(1);
}

// A file that could not be loaded has no tests of its own to count.
const unloaded = report.testResults.filter(
  (file) => file.status === 'failed' && file.assertionResults.length === 0
).length;
const failed = report.numFailedTests + unloaded;
const skipped = report.numPendingTests + report.numTodoTests;
console.log(`${report.numPassedTests} passed, ${failed} failed${skipped ? `, ${skipped} skipped` : ''}`);
process.exit(failed > 0 || report.numPassedTests === 0 ? 1 : 0);
