import { type ChildProcess, fork } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';

import type { Logger } from '../logger.ts';
import { releaseJobsOf } from './import-claims.ts';
import type { ImportWorker } from './import-worker.ts';

const MAIN = fileURLToPath(new URL('../import-worker-main.ts', import.meta.url));
const LOOK_EVERY_MS = 1000;
const STOP_MS = 10_000;

/** What the worker's process says. */
export interface WorkerMessage {
  readonly changed: number;
}

/**
 * Keeps the worker's process: starts it when there is work, and again when it died over it. Now and
 * then it looks for work that a worker elsewhere left behind.
 */
export class WorkerProcess implements ImportWorker {
  private readonly log: Logger;
  private readonly onChange: (importId: number) => void;
  private readonly findWork: () => Promise<boolean>;
  private readonly timer: NodeJS.Timeout;
  private child: ChildProcess | undefined;
  private isStopping = false;

  constructor(log: Logger, findWork: () => Promise<boolean>, onChange: (importId: number) => void) {
    this.log = log;
    this.findWork = findWork;
    this.onChange = onChange;
    this.timer = setInterval(() => void this.look(), LOOK_EVERY_MS);
    this.timer.unref();
    void this.look();
  }

  wake(): void {
    if (this.isStopping) return;
    this.child ??= this.launch();
    if (this.child.connected) this.child.send('wake');
  }

  async stop(): Promise<void> {
    this.isStopping = true;
    clearInterval(this.timer);
    const { child } = this;
    if (!child) return;
    const gone = once(child, 'exit');
    const insist = setTimeout(() => child.kill('SIGKILL'), STOP_MS);
    if (child.connected) child.disconnect();
    await gone;
    clearTimeout(insist);
  }

  private launch(): ChildProcess {
    const id = randomUUID();
    const child = fork(MAIN, [id]);
    child.on('message', ({ changed }: WorkerMessage) => this.onChange(changed));
    child.on('error', (error) => this.log.error({ error }, 'import worker'));
    child.once('exit', (code, signal) => void this.bury(id, code, signal));
    return child;
  }

  /** The next worker takes over what this one left. */
  private async bury(id: string, code: number | null, signal: NodeJS.Signals | null) {
    this.child = undefined;
    if (this.isStopping || code === 0) return;
    this.log.error({ code, signal }, 'import worker died');
    await releaseJobsOf(id).catch(() => undefined); // Else the leases end by themselves.
    await this.look();
  }

  private async look(): Promise<void> {
    try {
      if (await this.findWork()) this.wake();
    } catch (error) {
      this.log.warn({ error }, 'import jobs cannot be looked for');
    }
  }
}
