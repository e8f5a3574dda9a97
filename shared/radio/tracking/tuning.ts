/**
 * Where tracking leaves the signal circuits while the dial shows a frequency.
 *
 * Source: as in `trackingError`.
 *
 * @module radio/tracking/tuning
 */
import type { Band } from '../receiver.ts';
import { sideSign } from '../mixing/superheterodyne.ts';
import { trackedDesign } from './tracking.ts';

/** Frequency the signal circuits are tuned to at a dial setting, hertz. */
export type Tuning = (dialHz: number) => number;

/** A tuning, or the reason why the tracking data give none. */
export interface TuningFound {
  /** Null: the circuits are taken to stand on the dial frequency. */
  readonly tuning: Tuning | null;
  readonly refused: string | null;
}

/**
 * The tuning that a band's tracking data give at an IF.
 *
 * The dial shows what is heard, so the oscillator is right and the circuits stand where the gang
 * puts them: at fc with `fc + e(fc) = fs`. At another IF than the present one the padder stays, and
 * coil and trimmer are refitted at the alignment points.
 *
 * @param band The band.
 * @param presentHz The present IF, hertz, for which the circuit was designed.
 * @param ifHz The IF asked about, hertz.
 * @returns The tuning; null without tracking data or where they are refused.
 * @throws {RangeError} If the tracking data cannot be.
 *
 * @example
 *   const tracking = trackedGang;
 *   tuningOf({ ...band, lowHz: 550e3, tracking }, 455e3, 455e3).tuning?.(1e6); // 1000000: a point
 */
export function tuningOf(band: Band, presentHz: number, ifHz: number): TuningFound {
  const { tracking, lowHz, highHz, oscillator } = band;
  if (tracking === null) return { tuning: null, refused: null };
  const input = { ...tracking, lowHz, highHz, oscillator };
  let design = trackedDesign({ ...input, ifHz: presentHz });
  if (design.refused === null && ifHz !== presentHz) {
    const [first = NaN, last = NaN] = [design.pointsHz[0], design.pointsHz.at(-1)];
    design = trackedDesign({
      ...input,
      ifHz,
      fixedPadderF: design.padded.padderF,
      alignHz: tracking.alignHz ?? [first, last],
    });
  }
  if (design.refused !== null) return { tuning: null, refused: design.refused };
  const { curve } = design;
  const signedIfHz = sideSign(oscillator) * ifHz;
  return {
    refused: null,
    tuning: (dialHz) => {
      const tunedHz = curve.signalHz(dialHz + signedIfHz);
      return tunedHz > 0 ? tunedHz : dialHz;
    },
  };
}
