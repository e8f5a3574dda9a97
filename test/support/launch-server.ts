import { type ChildProcess, fork } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';

const MAIN = fileURLToPath(new URL('../../server/main.ts', import.meta.url));

export interface ServerProcess {
  readonly child: ChildProcess;
  readonly errors: () => string;
}

/** Starts a server process, as it runs beside a database. */
export function launch(settings: NodeJS.ProcessEnv): ServerProcess {
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
