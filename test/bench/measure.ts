/** How benchmarks measure, and how they hold a figure against its aim. */

/** One line to print, and whether its aim is missed by more than a noisy machine explains. */
export interface Verdict {
  readonly text: string;
  readonly farOff: boolean;
}

/** A machine that others use too may be this much off. */
const FAR = 1.5;

/** A figure that is to be at most its aim. */
export const held = (text: string, figure: number, aim: number, unit = ''): Verdict => ({
  text: `${text}; aim: at most ${aim} ${unit}`.trimEnd() + (figure <= aim ? '' : ' - MISSED'),
  farOff: !(figure <= FAR * aim),
});

/** A figure that is to be at least its aim. */
export const reached = (text: string, figure: number, aim: number): Verdict => ({
  text: `${text}; aim: at least ${aim}${figure >= aim ? '' : ' - MISSED'}`,
  farOff: !(figure >= aim / FAR),
});

/** A figure without an aim. */
export const told = (text: string): Verdict => ({ text, farOff: false });

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
