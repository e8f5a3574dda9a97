import { availableParallelism } from 'node:os';

import { Piscina } from 'piscina';

import { type Issue, OperationalError, UnavailableError } from '../http/errors.ts';
import type { Tasks } from './engine-tasks.ts';
import { BEGUN, type Order, type Refused, STOP } from './engine-order.ts';

const MAX_WAITING = 200;
const LIMIT_MS = 30_000;
/** How long a thread may take to notice that it is to stop, before it is ended. */
const GRACE_MS = 2000;
const VISITORS_LIMIT_MS = 10_000;
/** Dial settings that a request may have judged: 20 to 50 million are judged in a second. */
const MOST_SETTINGS = 400_000_000;
const VISITORS_SETTINGS = 100_000_000;

/** Who asks. */
export interface Caller {
  /** Comes when the client leaves. */
  readonly signal?: AbortSignal | undefined;
  /** Nobody is signed in. */
  readonly isVisitor?: boolean;
}

/** An answer of the engine as JSON text; typed, so that what needs it as an object may read it. */
export interface Computed<T> {
  readonly json: Uint8Array;
  read(): T;
}

/** The request would take far longer than any sensible one; says what makes it so. */
class TooCostlyError extends OperationalError {
  readonly status = 400;
  readonly type = 'too-costly';

  override readonly issues: readonly Issue[];

  constructor(issues: readonly Issue[] = []) {
    super('This takes too long to compute. Leave out bands, stations or candidates.');
    this.issues = issues;
  }
}

/** The flags of one computation, shared with its thread. */
class Flags {
  readonly shared = new Int32Array(new SharedArrayBuffer(8));

  get hasBegun(): boolean {
    return Atomics.load(this.shared, BEGUN) === 1;
  }

  get isToStop(): boolean {
    return Atomics.load(this.shared, STOP) === 1;
  }

  stop(): void {
    Atomics.store(this.shared, STOP, 1);
  }
}

/**
 * The radio engine in threads of its own: the event loop only hands over and takes back.
 *
 * Visitors share one thread that members never wait for, and get less time: whoever asks without
 * signing in, from however many addresses, holds up nobody but other visitors.
 */
export class Engine {
  private readonly members = pool(availableParallelism());
  private readonly visitors = pool(1);
  private readonly limitMs: number;

  constructor(limitMs = LIMIT_MS) {
    this.limitMs = limitMs;
  }

  /**
   * Runs a computation. When the signal comes, or the limit of time, it is dropped while it waits
   * and stops at its next checkpoint when it runs; a thread that does not notice is ended.
   */
  async run<K extends keyof Tasks>(
    name: K,
    task: Tasks[K]['takes'],
    { signal, isVisitor = false }: Caller = {},
  ): Promise<Computed<Tasks[K]['answers']>> {
    const threads = isVisitor ? this.visitors : this.members;
    if (threads.queueSize >= MAX_WAITING) throw new UnavailableError();
    const flags = new Flags();
    const mostSettings = isVisitor ? VISITORS_SETTINGS : MOST_SETTINGS;
    const order: Order = { task, mostSettings, flags: flags.shared };
    const ending = new AbortController();
    const stop = () => {
      flags.stop();
      if (!flags.hasBegun) ending.abort();
    };
    signal?.addEventListener('abort', stop, { once: true });
    const limitMs = isVisitor ? Math.min(this.limitMs, VISITORS_LIMIT_MS) : this.limitMs;
    const limit = setTimeout(stop, limitMs);
    const grace = setTimeout(() => ending.abort(), limitMs + GRACE_MS);
    try {
      return computed((await threads.run(order, { name, signal: ending.signal })) as Answer);
    } catch (error) {
      if (!flags.isToStop) throw error;
      const isLate = flags.hasBegun && signal?.aborted !== true;
      throw isLate ? new TooCostlyError() : new UnavailableError();
    } finally {
      clearTimeout(limit);
      clearTimeout(grace);
      signal?.removeEventListener('abort', stop);
    }
  }

  async close(): Promise<void> {
    await Promise.all([this.members, this.visitors].map((each) => each.close({ force: true })));
  }
}

type Answer = Uint8Array | Refused;

function computed<T>(answer: Answer): Computed<T> {
  if (!(answer instanceof Uint8Array)) throw new TooCostlyError(answer.issues);
  return { json: answer, read: () => JSON.parse(new TextDecoder().decode(answer)) as T };
}

const pool = (maxThreads: number): Piscina =>
  new Piscina({
    filename: new URL('./engine-thread.mjs', import.meta.url).href,
    minThreads: 0,
    maxThreads,
    maxQueue: MAX_WAITING,
    idleTimeout: 10 * 60_000,
  });
