import { availableParallelism } from 'node:os';

import { Piscina } from 'piscina';

import { OperationalError, UnavailableError } from '../http/errors.ts';
import type { Tasks } from './engine-tasks.ts';
import type { Order } from './engine-thread.ts';

const MAX_WAITING = 200;
const LIMIT_MS = 30_000;

/** An answer of the engine as JSON text; typed, so that what needs it as an object may read it. */
export interface Computed<T> {
  readonly json: Uint8Array;
  read(): T;
}

/** The request would take far longer than any sensible one; says what makes it so. */
class TooCostlyError extends OperationalError {
  readonly status = 400;
  readonly type = 'too-costly';

  constructor() {
    super('This takes too long to compute. Leave out bands, stations or candidates.');
  }
}

/** The radio engine in threads of its own: the event loop only hands over and takes back. */
export class Engine {
  private readonly pool = new Piscina({
    filename: new URL('./engine-thread.mjs', import.meta.url).href,
    minThreads: 0,
    maxThreads: availableParallelism(),
    maxQueue: MAX_WAITING,
    idleTimeout: 10 * 60_000,
  });
  private readonly limitMs: number;

  constructor(limitMs = LIMIT_MS) {
    this.limitMs = limitMs;
  }

  /**
   * Runs a computation. When the signal comes while it waits, it is dropped; one that has begun is
   * short as a rule, and ending its thread would cost more than letting it finish. At the limit of
   * time its thread is ended.
   */
  async run<K extends keyof Tasks>(
    name: K,
    task: Tasks[K]['takes'],
    signal?: AbortSignal,
  ): Promise<Computed<Tasks[K]['answers']>> {
    if (this.pool.queueSize >= MAX_WAITING) throw new UnavailableError();
    const order: Order = { task, begun: new Int32Array(new SharedArrayBuffer(4)) };
    const waiting = new AbortController();
    const hasBegun = () => Atomics.load(order.begun, 0) === 1;
    const drop = () => {
      if (!hasBegun()) waiting.abort();
    };
    signal?.addEventListener('abort', drop, { once: true });
    const limit = setTimeout(() => waiting.abort(), this.limitMs);
    try {
      const json = (await this.pool.run(order, { name, signal: waiting.signal })) as Uint8Array;
      return {
        json,
        read: () => JSON.parse(new TextDecoder().decode(json)) as Tasks[K]['answers'],
      };
    } catch (error) {
      if (!waiting.signal.aborted) throw error;
      throw hasBegun() ? new TooCostlyError() : new UnavailableError();
    } finally {
      clearTimeout(limit);
      signal?.removeEventListener('abort', drop);
    }
  }

  close(): Promise<void> {
    return this.pool.close({ force: true });
  }
}
