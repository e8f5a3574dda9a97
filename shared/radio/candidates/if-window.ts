/**
 * How exactly an IF must be kept.
 *
 * Source: own rule: breakthrough within 3 dB of the best.
 *
 * @module radio/candidates/if-window
 */
import type { FrequencySpan } from '../mixing/tuning-spans.ts';

/** Breakthrough may grow by this inside the window, decibels. */
const ALLOWED_DB = 3;
/** The weighting changes at multiples of 100 Hz, so the window is followed in steps of 100 Hz. */
const STEP_HZ = 100;

/**
 * The range around an IF inside which the worst breakthrough stays within 3 dB: what the
 * generator, the counter and drift must keep.
 *
 * Followed outwards in steps of 100 Hz, at most to a limit on either side. Where no breakthrough
 * is heard, the window ends before one is.
 *
 * @param ifHz The IF, hertz.
 * @param breakthroughsDb Smallest ratio of a breakthrough at an IF, one function for each site and
 *   period; all of them must hold.
 * @param limitHz How far to follow, hertz.
 * @returns Whole hertz.
 *
 * @example
 *   breakthroughWindow(555_000, [(hz) => Math.abs(hz - 560_000) / 100], 11_000).high; // 555300
 */
export function breakthroughWindow(
  ifHz: number,
  breakthroughsDb: readonly ((ifHz: number) => number)[],
  limitHz: number,
): FrequencySpan {
  const leastDb = breakthroughsDb.map((ratioDb) => ratioDb(ifHz) - ALLOWED_DB);
  const holds = (hz: number): boolean =>
    breakthroughsDb.every((ratioDb, index) => ratioDb(hz) >= (leastDb[index] ?? NaN));
  const follow = (step: number): number => {
    let hz = ifHz;
    while (Math.abs(hz + step - ifHz) <= limitHz && hz + step > 0 && holds(hz + step)) hz += step;
    return hz;
  };
  return { low: follow(-STEP_HZ), high: follow(STEP_HZ) };
}
