/**
 * Order of the possible causes of a whistle.
 *
 * Source: own rule.
 *
 * @module radio/whistles/whistle-order
 */
import type { WhistleCause } from './whistle-cause.ts';

/** What was heard; null: not noted. */
export interface HeardWhistle {
  readonly pitchHz: number | null;
  /** Hertz of pitch per hertz of dial; the sign does not matter. */
  readonly pitchSlope: number | null;
}

/** A pitch judged by ear is right within this share, and no better than within this much. */
const PITCH_SHARE = 0.1;
const PITCH_HZ = 100;
/** Slopes are whole numbers or simple fractions: nearer than this counts as the same. */
const SLOPE_SHARE = 0.2;
const LEAST_SLOPE = 0.25;

/**
 * Orders causes: those that agree with what was heard before those that do not, then the stronger;
 * of equal ones the one with the lower pitch. The limits of agreement are an own estimate.
 *
 * A pitch agrees fully when it is right at the dial setting, and in part when a dial that is read
 * wrong by the tuning tolerance would make it right; a slope agrees or does not.
 *
 * @param causes The causes.
 * @param heard Pitch and slope that were noted.
 * @param toleranceHz How far the dial may be read wrong, hertz.
 * @returns The causes, the most likely first.
 * @example
 *   const { causes } = whistleCauses({ ...imageAtSite, dialHz: 612_000, pitchHz: null, pitchSlope: null });
 *   orderCauses(causes, { pitchHz: 1000, slope: 2 }, 0)[0].cause; // 'image'
 */
export function orderCauses(
  causes: readonly WhistleCause[],
  heard: HeardWhistle,
  toleranceHz: number,
): WhistleCause[] {
  return causes
    .map((cause) => ({ cause, misfit: misfit(cause, heard, toleranceHz) }))
    .sort(
      (a, b) =>
        a.misfit - b.misfit ||
        (b.cause.levelDb ?? -Infinity) - (a.cause.levelDb ?? -Infinity) ||
        a.cause.pitchHz - b.cause.pitchHz,
    )
    .map(({ cause }) => cause);
}

/** 0: agrees in all that was noted. A wrong slope weighs as much as a wrong pitch. */
function misfit(cause: WhistleCause, heard: HeardWhistle, toleranceHz: number): number {
  return pitchMisfit(cause, heard.pitchHz, toleranceHz) + slopeMisfit(cause, heard.pitchSlope);
}

function pitchMisfit({ pitchHz, slope }: WhistleCause, heard: number | null, toleranceHz: number) {
  if (heard === null) return 0;
  const off = Math.abs(pitchHz - heard);
  const near = Math.max(PITCH_HZ, PITCH_SHARE * heard);
  if (off <= near) return 0;
  return off <= near + slope * toleranceHz ? 1 : 2;
}

function slopeMisfit({ slope }: WhistleCause, heard: number | null): number {
  if (heard === null) return 0;
  const noted = Math.abs(heard);
  return Math.abs(slope - noted) <= Math.max(LEAST_SLOPE, SLOPE_SHARE * noted) ? 0 : 2;
}
