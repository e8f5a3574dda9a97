import type { ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { freshDatabase } from './database.ts';
import { launch, type ServerProcess, stop } from './launch-server.ts';

/** Server processes beside one database of their own. */
export interface ServerProcesses {
  readonly databaseUrl: string;
  readonly start: (settings?: NodeJS.ProcessEnv) => ServerProcess;
  /** Ends those that run, in good order. */
  readonly stopAll: () => Promise<void>;
  /** Removes what they kept. */
  readonly remove: () => Promise<void>;
}

export async function serverProcesses(): Promise<ServerProcesses> {
  const database = await freshDatabase();
  const folder = mkdtempSync(join(tmpdir(), 'fallow-process-'));
  const running: ChildProcess[] = [];
  return {
    databaseUrl: database.url,
    start: (settings = {}) => {
      const started = launch({ DATABASE_URL: database.url, DATA_DIR: folder, ...settings });
      running.push(started.child);
      return started;
    },
    stopAll: async () => {
      for (const child of running.splice(0)) await stop(child);
    },
    remove: async () => {
      await database.drop();
      rmSync(folder, { recursive: true });
    },
  };
}
