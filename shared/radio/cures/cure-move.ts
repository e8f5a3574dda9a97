/**
 * Where to move the IF.
 *
 * @module radio/cures/cure-move
 */
import { judgeCandidates } from '../candidates/candidates.ts';
import type { CuresInput } from './cure-bench.ts';
import type { Receiver } from '../receiver.ts';

const MOST_CANDIDATES = 120;
const FEWEST_CANDIDATES = 24;
/** Candidates times listed frequencies, bands and periods: what bounds the time it takes. */
const BUDGET = 3_000_000;
/** Finer than an IF is aligned, hertz. */
const FINEST_STEP_HZ = 100;

/**
 * The best reachable IF, in the order of candidates. The longer the list and the more the bands,
 * the wider the steps.
 *
 * @param input Receiver, site and stations.
 * @returns Hertz; null where none within reach has a smaller deficit than the present IF.
 *
 * @example
 *   betterIf(input); // 555000 for an IF of 560 kHz with strong stations on 550 and 560 kHz
 */
export function betterIf(input: CuresInput): number | null {
  const { receiver, site, stations, fields, raster, ...ask } = input;
  const range = reachableRange(receiver, candidatesFor(input));
  if (range === null) return null;
  const cases = [{ site, stations, fields, raster }];
  const { present, candidates } = judgeCandidates({ ...ask, ...range, receiver, cases });
  const [best] = candidates;
  const pays = best?.reachable.ok === true && best.deficitDb < present.deficitDb;
  return pays ? best.ifHz : null;
}

function candidatesFor({ receiver, stations, periods }: CuresInput): number {
  const frequencies = new Set(stations.map(({ frequencyHz }) => frequencyHz)).size;
  const each = Math.max(1, frequencies) * receiver.bands.length * periods.length;
  return Math.min(MOST_CANDIDATES, Math.max(FEWEST_CANDIDATES, Math.floor(BUDGET / each)));
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
