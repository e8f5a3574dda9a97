import type { ChildProcess } from 'node:child_process';
import { closeSync, fstatSync, openSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';

import { exitOf, spawnBound } from './bound-process.ts';

const LARGEST_LOG_BYTES = 10_000_000;

/** An account of the demo club and the password this installation gave it. */
export interface DemoSignIn {
  readonly role: string;
  readonly email: string;
  readonly password: string;
}

/** What the API process says to the process that started it, once it serves. */
export interface Listening {
  readonly type: 'listening';
  readonly port: number;
  readonly demo?: readonly DemoSignIn[];
}

export interface ApiLaunch {
  readonly root: string;
  readonly logFile: string;
  readonly environment: NodeJS.ProcessEnv;
}

/**
 * Starts the API and waits until it listens.
 * @throws {Error} With what it logged last, when it ends before that.
 */
export async function launchApi(
  { root, logFile, environment }: ApiLaunch,
  onListening: (message: Listening) => void,
): Promise<ChildProcess> {
  const log = openLog(logFile);
  const begun = fstatSync(log).size;
  const main = join(root, 'server/main.ts');
  const child = spawnBound(process.execPath, ['--import', 'tsx', main], {
    cwd: root,
    env: environment,
    stdio: ['ignore', log, log, 'ipc'],
  });
  closeSync(log);
  const listening = new Promise<Listening>((resolve) => {
    child.on('message', (message) => {
      if (isListening(message)) resolve(message);
    });
  });
  const first = await Promise.race([listening, exitOf(child)]);
  if (typeof first === 'string') {
    throw new Error(
      `The API server ended (${first}). The end of ${logFile}:\n${logEnd(logFile, begun)}`,
    );
  }
  onListening(first);
  return child;
}

function isListening(message: unknown): message is Listening {
  return typeof message === 'object' && message !== null && 'type' in message
    ? message.type === 'listening'
    : false;
}

/** The log goes on from the last start, until it is large: then it begins anew. */
function openLog(path: string): number {
  const size = statSync(path, { throwIfNoEntry: false })?.size ?? 0;
  return openSync(path, size > LARGEST_LOG_BYTES ? 'w' : 'a', 0o600);
}

/** The last lines of a log; those of earlier starts would only mislead. */
function logEnd(path: string, begun: number): string {
  const ours = readFileSync(path).subarray(begun).toString('utf8');
  return ours.trimEnd().split('\n').slice(-20).join('\n');
}
