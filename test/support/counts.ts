import { readFileSync } from 'node:fs';

import * as z from 'zod';

export interface Counts {
  readonly passed: number;
  readonly failed: number;
  readonly skipped: number;
}

export const NOTHING: Counts = { passed: 0, failed: 0, skipped: 0 };

const testResult = z.object({
  status: z.string(),
  name: z.string(),
  assertionResults: z.array(z.object({ status: z.string() })),
});
const report = z.object({
  numPassedTests: z.number(),
  numFailedTests: z.number(),
  numPendingTests: z.number(),
  testResults: z.array(testResult),
});

export function add(a: Counts, b: Counts): Counts {
  return {
    passed: a.passed + b.passed,
    failed: a.failed + b.failed,
    skipped: a.skipped + b.skipped,
  };
}

/**
 * Counts of a suite from vitest's JSON report. A file that could not be loaded is one failure, and
 * so is a suite that ended badly, left no report, or ran no test, without a failed test to show.
 */
export function readCounts(path: string, exitCode: number): Counts {
  const counts = readReport(path);
  const isSilentFailure = counts.failed === 0 && (exitCode !== 0 || counts.passed === 0);
  return isSilentFailure ? { ...counts, failed: 1 } : counts;
}

function readReport(path: string): Counts {
  try {
    const read = report.parse(JSON.parse(readFileSync(path, 'utf8')));
    const unloaded = read.testResults.filter(
      ({ status, assertionResults }) =>
        status === 'failed' && !assertionResults.some((result) => result.status === 'failed'),
    ).length;
    return {
      passed: read.numPassedTests,
      failed: read.numFailedTests + unloaded,
      skipped: read.numPendingTests,
    };
  } catch {
    return NOTHING;
  }
}

/** The closing line: what CI reads. */
export function closingLine({ passed, failed, skipped }: Counts): string {
  const line = `${passed} passed, ${failed} failed`;
  return skipped > 0 ? `${line}, ${skipped} skipped` : line;
}
