import { join } from 'node:path';

import { add, type Counts, NOTHING, readCounts } from './counts.ts';
import type { Step, StepRunner } from './step.ts';

const SUITES = ['engine', 'api', 'components', 'e2e'] as const;
type Suite = (typeof SUITES)[number];

/** Runs the suites one after another: two at a time would spoil each other's timing on two cores. */
export async function runSuites(
  runner: StepRunner,
  wanted: readonly string[],
  reports: string,
  say: (line: string) => void,
): Promise<Counts> {
  let total = NOTHING;
  for (const suite of SUITES) {
    if (wanted.length > 0 && !wanted.includes(suite)) continue;
    const report = join(reports, `${suite}.json`);
    say(`\n${suite} tests`);
    const { exitCode, seconds } = await runner.run(stepFor(suite, report), true);
    const counts = readCounts(report, exitCode);
    say(`${suite}: ${counts.passed} passed, ${counts.failed} failed in ${seconds.toFixed(1)} s`);
    total = add(total, counts);
  }
  return total;
}

/** @throws {Error} When a name is no suite's. */
export function requireSuites(names: readonly string[]): void {
  const unknown = names.filter((name) => !(SUITES as readonly string[]).includes(name));
  if (unknown.length === 0) return;
  throw new Error(`No such tests: ${unknown.join(', ')}. There are ${SUITES.join(', ')}.`);
}

/** Component tests are compiled by Angular's builder, the others run under vitest as they are. */
function stepFor(suite: Suite, report: string): Step {
  if (suite === 'components') {
    const args = ['test', '--no-watch', '--no-progress', '--reporters=json', '--reporters=default'];
    return {
      name: suite,
      script: '@angular/cli/bin/ng.js',
      args: [...args, `--output-file=${report}`],
    };
  }
  const args = ['run', '--config', 'test/vitest.config.ts', '--project', suite];
  args.push('--reporter=default', '--reporter=json', `--outputFile.json=${report}`);
  return { name: suite, script: 'vitest/vitest.mjs', args };
}
