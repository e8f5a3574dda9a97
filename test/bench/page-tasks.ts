/** Tasks of a page's main thread, as Chromium traces them. */
import type { Page } from 'playwright-core';

/** Above this a task keeps a frame waiting. */
const LONG_MS = 50;

interface TraceEvent {
  readonly name: string;
  readonly ph: string;
  readonly pid: number;
  readonly tid: number;
  /** Microseconds by the clock, and of processor time. */
  readonly dur?: number;
  readonly tdur?: number;
  readonly args?: { readonly name?: string };
}

export interface Tasks {
  /** Tasks over 50 ms by the clock, as the page's own observer of long tasks counts them. */
  readonly count: number;
  readonly longestMs: number;
  readonly longestCpuMs: number;
}

/** What runs on the page's main thread while something is done to it. */
export async function tasksDuring(page: Page, act: () => Promise<void>): Promise<Tasks> {
  await page.evaluate(() => {
    const long: number[] = [];
    Object.assign(window, { longTasks: long });
    new PerformanceObserver((list) => {
      for (const { duration } of list.getEntries()) long.push(duration);
    }).observe({ type: 'longtask' });
  });
  const browser = page.context().browser();
  if (!browser) throw new Error('The page has no browser.');
  await browser.startTracing(page, {
    categories: ['toplevel', 'disabled-by-default-devtools.timeline'],
  });
  await act();
  const trace = JSON.parse((await browser.stopTracing()).toString()) as {
    traceEvents: TraceEvent[];
  };
  const observed = await page.evaluate(
    () => (window as unknown as { longTasks: number[] }).longTasks,
  );
  const tasks = mainThreadTasks(trace.traceEvents);
  return {
    count: observed.filter((each) => each > LONG_MS).length,
    longestMs: Math.max(0, ...tasks.map(({ dur = 0 }) => dur)) / 1000,
    longestCpuMs: Math.max(0, ...tasks.map(({ tdur = 0 }) => tdur)) / 1000,
  };
}

/** @throws {Error} When the trace holds no task, or none with its processor time. */
function mainThreadTasks(events: readonly TraceEvent[]): TraceEvent[] {
  const threads = new Set(
    events
      .filter(({ name, args }) => name === 'thread_name' && args?.name === 'CrRendererMain')
      .map(({ pid, tid }) => `${pid}.${tid}`),
  );
  const tasks = events.filter(
    ({ name, ph, pid, tid }) =>
      ph === 'X' && name.endsWith('RunTask') && threads.has(`${pid}.${tid}`),
  );
  if (!tasks.some(({ tdur }) => tdur !== undefined)) {
    throw new Error('The trace tells no processor time of tasks.');
  }
  return tasks;
}
