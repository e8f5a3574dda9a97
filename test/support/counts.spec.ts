import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterEach, beforeEach, describe, expect, it } from 'vitest';

import { closingLine, readCounts } from './counts.ts';

describe('the counts of a suite', () => {
  let folder: string;
  let path: string;

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'fallow-counts-'));
    path = join(folder, 'report.json');
  });

  afterEach(() => {
    rmSync(folder, { recursive: true });
  });

  const write = (passed: number, failed: number, testResults: readonly unknown[] = []) => {
    const numbers = { numPassedTests: passed, numFailedTests: failed, numPendingTests: 0 };
    writeFileSync(path, JSON.stringify({ ...numbers, testResults }));
  };

  it('are those of the report', () => {
    write(3, 2);

    expect(readCounts(path, 1)).toEqual({ passed: 3, failed: 2, skipped: 0 });
  });

  it('hold a file that could not be loaded as one failure', () => {
    write(3, 0, [{ status: 'failed', name: 'broken.spec.ts', assertionResults: [] }]);

    expect(readCounts(path, 1)).toEqual({ passed: 3, failed: 1, skipped: 0 });
  });

  it('hold a failure when there is no report', () => {
    expect(readCounts(path, 0)).toEqual({ passed: 0, failed: 1, skipped: 0 });
  });

  it('hold a failure when all tests passed but the run ended badly', () => {
    write(3, 0);

    expect(readCounts(path, 1)).toEqual({ passed: 3, failed: 1, skipped: 0 });
  });

  it('hold a failure when no test ran', () => {
    write(0, 0);

    expect(readCounts(path, 0)).toEqual({ passed: 0, failed: 1, skipped: 0 });
  });

  it('close with one line for CI', () => {
    expect(closingLine({ passed: 12, failed: 1, skipped: 0 })).toBe('12 passed, 1 failed');
    expect(closingLine({ passed: 12, failed: 0, skipped: 2 })).toBe(
      '12 passed, 0 failed, 2 skipped',
    );
  });
});
