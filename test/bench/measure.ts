/** How benchmarks measure: the best of several turns, and the growth of the heap. */

/** A thing measured, beside the least it could cost. */
export interface Measured {
  readonly name: string;
  readonly ms: number;
  readonly bareMs: number;
}

/**
 * Shortest processor time of several turns, after one to warm up, milliseconds. Processor time, so
 * that what else runs on the machine does not count; collecting garbage on other threads does.
 */
export function best(turns: number, work: () => void): number {
  work();
  let shortest = Infinity;
  for (let turn = 0; turn < turns; turn++) {
    const begin = process.cpuUsage();
    work();
    const { user, system } = process.cpuUsage(begin);
    shortest = Math.min(shortest, (user + system) / 1000);
  }
  return shortest;
}

/** Growth of the resident set over one turn, megabytes, including what is garbage afterwards. */
export function megabytesOf(work: () => void): number {
  globalThis.gc?.();
  const before = process.memoryUsage().rss;
  work();
  return (process.memoryUsage().rss - before) / 2 ** 20;
}
