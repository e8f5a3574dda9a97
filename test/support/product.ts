import { type ChildProcess, fork } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

import type { DemoSignIn } from '../../server/dev/api-process.ts';
import { endProcess, exitOf } from '../../server/dev/bound-process.ts';
import { anyFreePort } from '../../server/dev/free-port.ts';
import { type RunningProcess, runningProcesses } from '../../server/dev/process-table.ts';

const root = resolve(fileURLToPath(new URL('../..', import.meta.url)));
const GRACE_MS = 60_000;

interface Ready {
  readonly type: 'ready';
  readonly url: string;
  readonly demo: readonly DemoSignIn[];
}

/** The product as `npm start` runs it, with data of its own, on a port of its own. */
export class Product {
  private readonly dataFolder = mkdtempSync(join(tmpdir(), 'fallow-product-'));
  private child: ChildProcess | undefined;
  private ready: Ready | undefined;

  get url(): string {
    return this.whenReady().url;
  }

  /** The demo club's accounts: one member, one librarian, one admin. */
  get signIns(): readonly DemoSignIn[] {
    return this.whenReady().demo;
  }

  /** The processes it consists of, by the name of their program. */
  processes(program: 'node' | 'mariadbd'): readonly RunningProcess[] {
    const parent = this.child?.pid;
    return runningProcesses().filter(
      (found) => found.parentPid === parent && found.program === program,
    );
  }

  /** @param settings Environment of the start beside what keeps it apart from everything else. */
  async start(settings: NodeJS.ProcessEnv = {}): Promise<void> {
    const port = await anyFreePort('127.0.0.1');
    const child = fork(join(root, 'server/dev/start.mjs'), {
      cwd: root,
      detached: true,
      execArgv: [],
      env: { ...process.env, ...settings, PORT: String(port), DATA_DIR: this.dataFolder },
      stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
    });
    this.child = child;
    const output: string[] = [];
    for (const stream of [child.stdout, child.stderr]) {
      stream?.setEncoding('utf8').on('data', (text: string) => output.push(text));
    }
    const first = Promise.race([once(child, 'message'), once(child, 'exit')]);
    const [message] = (await first) as readonly unknown[];
    if (!isReady(message)) throw new Error(`The product did not start:\n${output.join('')}`);
    this.ready = message;
  }

  /** Ends it as Ctrl-C would; its data stay for the next start. */
  async stop(): Promise<void> {
    this.ready = undefined;
    if (this.child) await endProcess(this.child, GRACE_MS);
  }

  /** Kills the starter alone, as a power cut would, and waits until it is gone. */
  async kill(): Promise<void> {
    this.ready = undefined;
    if (!this.child) return;
    this.child.kill('SIGKILL');
    await exitOf(this.child);
  }

  async remove(): Promise<void> {
    await this.stop();
    rmSync(this.dataFolder, { recursive: true, force: true });
  }

  private whenReady(): Ready {
    if (!this.ready) throw new Error('The product is not running.');
    return this.ready;
  }
}

function isReady(message: unknown): message is Ready {
  return typeof message === 'object' && message !== null && 'type' in message
    ? message.type === 'ready'
    : false;
}
