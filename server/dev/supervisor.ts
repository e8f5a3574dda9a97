import type { ChildProcess } from 'node:child_process';

import { endProcess, exitOf } from './bound-process.ts';

const MOST_DEATHS = 3;
const WINDOW_MS = 60_000;

export interface Ward {
  readonly name: string;
  /** Starts the process and settles when it is ready to serve. */
  readonly launch: () => Promise<ChildProcess>;
  /** How long it may take to end in good order. */
  readonly graceMs: number;
}

/**
 * Keeps one process running: starts it again when it dies unasked, and gives up when it has died
 * three times within a minute.
 */
export class Supervisor {
  private child: ChildProcess | undefined;
  private isStopping = false;
  private readonly deaths: number[] = [];

  private readonly ward: Ward;
  private readonly say: (line: string) => void;
  private readonly giveUp: (reason: Error) => void;

  constructor(ward: Ward, say: (line: string) => void, giveUp: (reason: Error) => void) {
    this.ward = ward;
    this.say = say;
    this.giveUp = giveUp;
  }

  async start(): Promise<void> {
    const child = await this.ward.launch();
    this.child = child;
    void exitOf(child).then((ending) => this.afterDeath(ending));
  }

  async stop(): Promise<void> {
    this.isStopping = true;
    if (this.child) await endProcess(this.child, this.ward.graceMs);
  }

  private async afterDeath(ending: string): Promise<void> {
    if (this.isStopping) return;
    const now = Date.now();
    this.deaths.push(now);
    const recent = this.deaths.filter((at) => now - at < WINDOW_MS).length;
    if (recent >= MOST_DEATHS) {
      this.giveUp(new Error(`${this.ward.name} ended ${recent} times within a minute.`));
      return;
    }
    this.say(`${this.ward.name} ended unasked (${ending}); starting it again.`);
    try {
      await this.start();
      this.say(`${this.ward.name} runs again.`);
    } catch (error) {
      this.giveUp(error instanceof Error ? error : new Error(String(error)));
    }
  }
}
