import { readdirSync, readFileSync } from 'node:fs';
import { basename } from 'node:path';

export interface RunningProcess {
  readonly pid: number;
  readonly parentPid: number;
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
    return command.length === 0 ? undefined : { pid, parentPid: Number(parent ?? 0), command };
  } catch {
    return undefined;
  }
}

export function programOf({ command }: RunningProcess): string {
  return basename(command[0] ?? '');
}
