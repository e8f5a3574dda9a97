import { type ChildProcess, fork } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

import { freshDatabase } from './database.ts';

const MAIN = fileURLToPath(new URL('../../server/main.ts', import.meta.url));

export interface ServerProcess {
  readonly child: ChildProcess;
  readonly errors: () => string;
}

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

function launch(settings: NodeJS.ProcessEnv): ServerProcess {
  let errors = '';
  const child = fork(MAIN, {
    execArgv: ['--import', 'tsx'],
    stdio: ['ignore', 'ignore', 'pipe', 'ipc'],
    env: {
      PATH: process.env['PATH'],
      SESSION_SECRET: 'Zr4uT1oP9kQ7sV2xW5yB8nM3cL6hJ0dG',
      PORT: '0',
      ...settings,
    },
  });
  child.stderr?.setEncoding('utf8').on('data', (text: string) => {
    errors += text;
  });
  return { child, errors: () => errors };
}

export async function listening({ child }: ServerProcess): Promise<{ url: string; port: number }> {
  const [message] = (await once(child, 'message')) as [{ url: string; port: number }];
  return message;
}

/** Asks a process to stop and answers its exit code. */
export async function stop(child: ChildProcess): Promise<number | null> {
  if (child.exitCode !== null || child.signalCode !== null) return child.exitCode;
  child.kill('SIGTERM');
  const [code] = (await once(child, 'exit')) as [number | null];
  return code;
}
