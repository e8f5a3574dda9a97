import { readdirSync, readFileSync, readlinkSync } from 'node:fs';
import { basename } from 'node:path';

export interface RunningProcess {
  readonly pid: number;
  readonly parentPid: number;
  /** Name of the program's file: a process may call itself anything, as npm and vitest do. */
  readonly program: string;
  readonly command: readonly string[];
}

/** Every process on this machine that we may look at. */
export function runningProcesses(): readonly RunningProcess[] {
  try {
    return readdirSync('/proc')
      .filter((name) => /^\d+$/.test(name))
      .map((name) => readProcess(Number(name)))
      .filter((found) => found !== undefined);
  } catch {
    return [];
  }
}

export function readProcess(pid: number): RunningProcess | undefined {
  try {
    const command = readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0').slice(0, -1);
    const parent = /^PPid:\s*(\d+)/m.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1];
    const program = basename(readlinkSync(`/proc/${pid}/exe`)).replace(/ \(deleted\)$/, '');
    return { pid, parentPid: Number(parent ?? 0), program, command };
  } catch {
    return undefined;
  }
}
