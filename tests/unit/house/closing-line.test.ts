import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';

const counts = { numPassedTests: 12, numFailedTests: 0, numPendingTests: 0, numTodoTests: 0 };
const passed = { status: 'passed', assertionResults: [{}] };

describe('the closing line of CI', () => {
  it('is what the runner counted', () => {
    expect(close({ ...counts, testResults: [passed] })).toEqual({ code: 0, line: '12 passed, 0 failed' });
  });

  it('counts failures, and a file that could not be loaded as one', () => {
    const report = {
      ...counts,
      numFailedTests: 2,
      testResults: [passed, { status: 'failed', assertionResults: [] }]
    };
    expect(close(report)).toEqual({ code: 1, line: '12 passed, 3 failed' });
  });

  it('tells of tests that did not run', () => {
    expect(close({ ...counts, numPendingTests: 1, testResults: [passed] }).line).toBe(
      '12 passed, 0 failed, 1 skipped'
    );
  });

  it('fails when nothing ran', () => {
    expect(close({ ...counts, numPassedTests: 0, testResults: [] }).code).toBe(1);
    expect(close(null).code).toBe(1);
  });
});

/** Exit code and last line for a report; null writes no report. */
function close(report: object | null): { code: number | null; line: string } {
  const folder = mkdtempSync(join(tmpdir(), 'severalty-closing-'));
  const path = join(folder, 'report.json');
  if (report) writeFileSync(path, JSON.stringify(report));
  const { status, stdout } = spawnSync(process.execPath, ['.ci/closing-line.mjs', path], {
    encoding: 'utf8'
  });
  rmSync(folder, { recursive: true });
  return { code: status, line: stdout.trim().split('\n').at(-1) ?? '' };
}
