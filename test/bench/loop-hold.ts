/** How long the event loop is held: the longest stretch of its thread's processor time in one go. */
import { readFileSync } from 'node:fs';

const TICK_MS = 1;

/**
 * Watches the loop with a timer of 1 ms while work is under way. Between two ticks the loop did one
 * thing or several; the processor time of this thread between them is at least the longest of them.
 * Waiting for a processor that other threads use is not holding, so the clock on the wall is only
 * told beside it.
 */
export async function longestHold(work: () => Promise<unknown>): Promise<{
  readonly holdMs: number;
  readonly gapMs: number;
}> {
  let holdMs = 0;
  let gapMs = 0;
  let at = performance.now();
  let used = threadMs();
  const tick = (): void => {
    const [now, usedNow] = [performance.now(), threadMs()];
    gapMs = Math.max(gapMs, now - at);
    holdMs = Math.max(holdMs, usedNow - used);
    [at, used] = [now, usedNow];
  };
  const timer = setInterval(tick, TICK_MS);
  await work();
  tick();
  clearInterval(timer);
  return { holdMs, gapMs };
}

/** Processor time of the main thread, milliseconds; Linux counts it in nanoseconds. */
const threadMs = (): number =>
  Number(readFileSync(`/proc/self/task/${process.pid}/schedstat`, 'utf8').split(' ')[0]) / 1e6;
