import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

import { runningProcesses } from '../../server/dev/process-table.ts';

const PATIENCE_MS = 10_000;

/** A folder for everything that a run of tests writes. */
export function makeScratch(): string {
  return mkdtempSync(join(tmpdir(), 'fallow-test-'));
}

/** Removes the folder, when the databases and browsers that worked in it are gone. */
export async function removeScratch(folder: string): Promise<void> {
  const users = () =>
    runningProcesses().filter(({ command }) => command.some((word) => word.includes(folder)));
  const deadline = Date.now() + PATIENCE_MS;
  while (users().length > 0 && Date.now() < deadline) await wait(100);
  for (const { pid } of users()) process.kill(pid, 'SIGKILL');
  rmSync(folder, { recursive: true, force: true, maxRetries: 10, retryDelay: 100 });
}
