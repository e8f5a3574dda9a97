import { type ChildProcess, spawn, type SpawnOptions } from 'node:child_process';
import { once } from 'node:events';
import { setTimeout as wait } from 'node:timers/promises';

import { findProgram } from './programs.ts';

/**
 * Starts a program that ends when we do, even when we are killed outright: the kernel then sends
 * it SIGTERM (setpriv is part of every Debian). It gets a group of its own, so that Ctrl-C reaches
 * only us and we end things in their order.
 */
export function spawnBound(
  program: string,
  args: readonly string[],
  options: SpawnOptions = {},
): ChildProcess {
  const setpriv = findProgram('setpriv');
  const command = [program, ...args];
  if (setpriv !== undefined) command.unshift(setpriv, '--pdeathsig', 'SIGTERM', '--');
  const [first = program, ...rest] = command;
  return spawn(first, rest, { detached: true, ...options });
}

export function isRunning(child: ChildProcess): boolean {
  return child.pid !== undefined && child.exitCode === null && child.signalCode === null;
}

/** Settles when the process is gone. Rejects when it could not be started at all. */
export async function exitOf(child: ChildProcess): Promise<string> {
  if (isRunning(child)) await once(child, 'exit');
  return child.signalCode ?? `exit code ${child.exitCode ?? 'unknown'}`;
}

/** Asks the process and its own children to end, and insists when the time given is over. */
export async function endProcess(child: ChildProcess, graceMs: number): Promise<void> {
  if (!isRunning(child) || child.pid === undefined) return;
  const gone = exitOf(child);
  signalGroup(child.pid, 'SIGTERM');
  const timer = new AbortController();
  const late = wait(graceMs, 'late', { signal: timer.signal }).catch(() => 'ended');
  if ((await Promise.race([gone, late])) === 'late') signalGroup(child.pid, 'SIGKILL');
  await gone;
  timer.abort();
}

function signalGroup(pid: number, signal: NodeJS.Signals): void {
  try {
    process.kill(-pid, signal);
  } catch {
    // It ended by itself in the meantime.
  }
}
