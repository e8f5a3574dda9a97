/**
 * Where to move the IF.
 *
 * Source: own rule, as in `judgeCandidates`.
 *
 * @module radio/cures/cure-move
 */
import { judgedSettings } from '../assessment/judged-settings.ts';
import type { Listening } from '../assessment/listening.ts';
import { compareCandidates, type Orderable } from '../candidates/candidate-order.ts';
import { listeningsOf } from '../candidates/candidates.ts';
import { harmonicsOnChannels } from '../candidates/harmonics-on-channels.ts';
import { outOfReach } from '../candidates/if-reach.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import type { Receiver } from '../receiver.ts';
import type { CuresInput } from './cure-bench.ts';

const MOST_CANDIDATES = 120;
const FEWEST_JUDGED = 6;
/** Dial settings judged for all candidates together: what bounds the time it takes. */
const BUDGET = 15_000_000;
/** Finer than an IF is aligned, hertz. */
const FINEST_STEP_HZ = 100;

/**
 * The best reachable IF, in the order of candidates. On lists far denser than a raster not all of
 * them are judged: half of those that are have the least breakthrough, half lie evenly over the range.
 *
 * @param input Receiver, site and stations.
 * @returns Hertz; null where none within reach has a smaller deficit than the present IF.
 *
 * @example
 *   betterIf({ receiver, ...judged, periods: ['night'], ...orders }); // 572600, clear of 550 and 560 kHz
 */
export function betterIf(input: CuresInput): number | null {
  const { receiver, periods, raster } = input;
  const selectivity = ifSelectivity(receiver.selectivity, receiver.ifHz);
  const at = periods.flatMap((period) =>
    listeningsOf({ ...input, cases: [input] }, period, selectivity),
  );
  const judge = (ifHz: number): Orderable => ({
    ifHz,
    reachable: { ok: true },
    deficitDb: Math.max(0, ...at.map((listening) => listening.judge(ifHz).deficitDb)),
    harmonics: harmonicsOnChannels(ifHz, receiver.bands, raster),
  });
  const [best] = promising(reachable(receiver), mostJudged(input), at)
    .map(judge)
    .sort((one, other) => compareCandidates(one, other, receiver.ifHz));
  const pays = best !== undefined && best.deficitDb < judge(receiver.ifHz).deficitDb;
  return pays ? best.ifHz : null;
}

function mostJudged(input: CuresInput): number {
  const listed = new Set(input.stations.map(({ frequencyHz }) => frequencyHz));
  const frequencies = [...listed].sort((a, b) => a - b);
  const each = judgedSettings(input.receiver, frequencies, input) * input.periods.length;
  return Math.max(FEWEST_JUDGED, Math.floor(BUDGET / Math.max(1, each)));
}

/** All of them where there are few enough. */
function promising(all: readonly number[], most: number, at: readonly Listening[]): number[] {
  if (all.length <= most) return [...all];
  const quiet = all
    .map((ifHz) => ({ ifHz, leastDb: Math.min(...at.map((each) => each.breakthroughDb(ifHz))) }))
    .sort((one, other) => (one.leastDb === other.leastDb ? 0 : other.leastDb - one.leastDb))
    .slice(0, most / 2)
    .map(({ ifHz }) => ifHz);
  const step = all.length / Math.ceil(most / 2);
  const spread = all.filter(
    (_, index) => Math.floor((index + 1) / step) > Math.floor(index / step),
  );
  return [...new Set([...quiet, ...spread])];
}

/** The candidates within reach, evenly spaced from the present IF. */
function reachable(receiver: Receiver): number[] {
  const range = reachableRange(receiver, MOST_CANDIDATES);
  if (range === null) return [];
  const { fromHz, toHz, stepHz } = range;
  const count = Math.floor((toHz - fromHz) / stepHz) + 1;
  return Array.from({ length: count }, (_, index) => fromHz + index * stepHz).filter(
    (ifHz) => outOfReach(receiver, ifHz) === null,
  );
}

/** What cores, a fixed filter and the beat oscillator allow, in steps from the present IF. */
function reachableRange(
  receiver: Receiver,
  candidates: number,
): { readonly fromHz: number; readonly toHz: number; readonly stepHz: number } | null {
  const { ifHz, ifRange, bfo, fixedFilter } = receiver;
  const eitherSideHz = Math.min(ifRange * ifHz, bfo?.rangeHz ?? Infinity);
  const { centreHz = ifHz, widthHz = Infinity } = fixedFilter ?? {};
  const lowHz = Math.max(ifHz - eitherSideHz, centreHz - widthHz / 2);
  const highHz = Math.min(ifHz + eitherSideHz, centreHz + widthHz / 2);
  const share = (highHz - lowHz) / candidates;
  const stepHz = Math.max(1, Math.ceil(share / FINEST_STEP_HZ)) * FINEST_STEP_HZ;
  const fromHz = ifHz - Math.floor((ifHz - lowHz) / stepHz) * stepHz;
  const toHz = ifHz + Math.floor((highHz - ifHz) / stepHz) * stepHz;
  return toHz >= fromHz ? { fromHz, toHz, stepHz } : null;
}
