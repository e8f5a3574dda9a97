import { resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

import { CHROMIUM, ensurePrograms, MARIADB, NGSPICE } from '../../server/dev/programs.ts';
import { add, closingLine, NOTHING } from './counts.ts';
import { runGate } from './gate.ts';
import { makeScratch, removeScratch } from './scratch.ts';
import { StepRunner } from './step.ts';
import { requireSuites, runSuites } from './suites.ts';

const root = resolve(fileURLToPath(new URL('../..', import.meta.url)));
const INTERRUPTED = 130;

const say = (line: string): void => {
  console.log(line);
};

export interface Run {
  /** Whether format, lint, import rules and types are checked before the tests. */
  readonly gate: boolean;
  /** Names of suites; none means all. */
  readonly suites: readonly string[];
}

/**
 * Runs the checks asked for, prints their sum as the last line and ends the process. Everything the
 * tests write goes to one folder, which is removed whatever happens.
 */
export async function runAll({ gate, suites }: Run): Promise<void> {
  const scratch = makeScratch();
  const runner = new StepRunner(root, testEnvironment(scratch));
  const leave = async (code: number): Promise<never> => {
    await removeScratch(scratch);
    process.exit(code);
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) {
    process.once(signal, () => {
      say('\nInterrupted; stopping what was started.');
      void runner.stop().then(() => leave(INTERRUPTED));
    });
  }
  try {
    requireSuites(suites);
    ensurePrograms([MARIADB, CHROMIUM], say);
    ensureSimulator();
    const checked = gate ? await runGate(runner, say) : NOTHING;
    const total = add(checked, await runSuites(runner, suites, scratch, say));
    say(`\n${closingLine(total)}`);
    await leave(total.failed === 0 ? 0 : 1);
  } catch (error) {
    say(error instanceof Error ? error.message : String(error));
    say(`\n${closingLine({ ...NOTHING, failed: 1 })}`);
    await leave(1);
  }
}

/** Without the circuit simulator the rest can still be tested; what it would check says so itself. */
function ensureSimulator(): void {
  try {
    ensurePrograms([NGSPICE], say);
  } catch (error) {
    say(error instanceof Error ? error.message : String(error));
  }
}

/** Settings of the user's own must not steer the tests, nor may the tests touch their database. */
function testEnvironment(scratch: string): NodeJS.ProcessEnv {
  const own = ['DATABASE_URL', 'PORT', 'HOST', 'DATA_DIR', 'NODE_ENV', 'SESSION_SECRET'];
  const kept = Object.entries(process.env).filter(([name]) => !own.includes(name));
  return { ...Object.fromEntries(kept), TMPDIR: scratch, NG_CLI_ANALYTICS: 'false' };
}
