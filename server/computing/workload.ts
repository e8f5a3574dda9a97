import { judgedSettings } from '../../shared/radio/assessment/judged-settings.ts';
import type { Orders } from '../../shared/radio/assessment/finding.ts';
import type { Receiver } from '../../shared/radio/receiver.ts';
import type { Issue } from '../http/errors.ts';
import type { ListAtSite, Tasks } from './engine-tasks.ts';
import { frequenciesOf } from './station-columns.ts';

/** What has to be judged: a receiver over lists, so many times. */
interface Workload {
  readonly receiver: Receiver;
  readonly lists: readonly ListAtSite[];
  readonly orders: Orders;
  /** How often each list is judged: for each candidate, cure, period or moment. */
  readonly times: number;
  readonly candidates?: number;
}

/** Beyond the usual orders products are many and weak. */
const USUAL = { maxM: 3, maxN: 2 } as const;
/** Listed frequencies within the width of the IF, from where on a list is called dense. */
const DENSE = 10;
/** Judgements of a set-up that the cures take besides the oscillator sides, with those of a move. */
const CURES = 14;

/** The workload of a task; null: one that is always small. */
export function workloadOf(name: keyof Tasks, task: unknown): Workload | null {
  switch (name) {
    case 'assess': {
      const { list, ask } = task as Tasks['assess']['takes'];
      return { receiver: ask.receiver, lists: [list], orders: ask, times: 1 };
    }
    case 'judgeBriefly': {
      const { list, receiver } = task as Tasks['judgeBriefly']['takes'];
      return { receiver, lists: [list], orders: USUAL, times: 1 };
    }
    case 'judgeCandidates': {
      const { lists, ask } = task as Tasks['judgeCandidates']['takes'];
      const candidates = Math.floor((ask.toHz - ask.fromHz) / ask.stepHz) + 1;
      const times = (candidates + 1) * ask.periods.length;
      return { receiver: ask.receiver, lists, orders: ask, times, candidates };
    }
    case 'findCures': {
      const { list, ask } = task as Tasks['findCures']['takes'];
      const times = (CURES + ask.receiver.bands.length) * ask.periods.length;
      return { receiver: ask.receiver, lists: [list], orders: ask, times };
    }
    case 'breakthroughHours': {
      const { list, receiver, times } = task as Tasks['breakthroughHours']['takes'];
      const maxM = Math.max(...receiver.bands.map(({ oscillatorHarmonic }) => oscillatorHarmonic));
      return { receiver, lists: [list], orders: { maxM, maxN: 1 }, times: times.length };
    }
    default:
      return null;
  }
}

/**
 * What to leave out of a request that would take too long, before it takes any time.
 *
 * @param most Dial settings that may be judged: some 20 to 50 million a second.
 * @returns What to leave out, field by field; none where the request is well within bounds.
 */
export function tooCostly(workload: Workload | null, most: number): Issue[] {
  if (workload === null) return [];
  const { receiver, lists, orders, times } = workload;
  const frequencies = lists.map(({ columns }) => frequenciesOf(columns));
  const settings = frequencies.reduce(
    (sum, list) => sum + judgedSettings(receiver, list, orders) * times,
    0,
  );
  if (settings <= most) return [];
  const share = `${Math.ceil(settings / most)} times what is computed at once`;
  const found = [...savings(workload, frequencies)];
  return found.map((issue) => ({ ...issue, message: `${issue.message} This asks for ${share}.` }));
}

function* savings(
  { receiver, lists, orders, candidates = 0 }: Workload,
  frequencies: readonly (readonly number[])[],
): Generator<Issue> {
  if (candidates > 1) {
    yield { path: 'stepHz', message: `Give a wider step: there are ${candidates} candidates.` };
  }
  if (orders.maxM > USUAL.maxM) yield { path: 'maxM', message: `Give ${USUAL.maxM} or less.` };
  if (orders.maxN > USUAL.maxN) yield { path: 'maxN', message: `Give ${USUAL.maxN} or less.` };
  if (lists.length > 1) yield { path: 'cases', message: 'Leave out cases.' };
  const { length } = receiver.bands;
  if (length > 1) yield { path: 'receiver.bands', message: `Leave out some of ${length} bands.` };
  const dense = frequencies.some((list) => densest(list, receiver) >= DENSE);
  yield {
    path: 'stations',
    message: dense
      ? 'Leave out stations: they stand far closer than the channels of a raster.'
      : 'Leave out stations.',
  };
}

/** Listed frequencies for each band's width of 20 kHz, on the band where there are most. */
function densest(frequencies: readonly number[], { bands }: Receiver): number {
  return Math.max(
    ...bands.map(({ lowHz, highHz }) => {
      const inside = frequencies.filter((hz) => hz >= lowHz && hz <= highHz);
      return (inside.length / (highHz - lowHz)) * 20_000;
    }),
  );
}
