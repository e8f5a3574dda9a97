/**
 * What an interferer at a distance from the IF's centre is worth to a listener, relative to the
 * same programme on the same frequency.
 *
 * Source: own model; network of ITU-R BS.468, from memory, not re-read.
 *
 * @module radio/hearing/weighting
 */
import { earWeighting, earWeightingPower } from './ear-weighting.ts';
import type { ProgrammeBand } from './programme.ts';
import type { IfSelectivity } from '../circuits/selectivity.ts';

/** Below this beat the carriers count as locked: no whistle, and the sidebands add up. */
const LOCKED_HZ = 50;
/** Power of a carrier over that of its programme at 30 % modulation (rms), as a power of ten. */
const CARRIER_OVER_PROGRAMME = 10 ** 0.74;

/** Weighting against distance from the centre, decibels. */
export type Weighting = (beatHz: number) => number;

/**
 * Weighting of a carrier with a programme, heard by a listener to a programme.
 *
 *     G(d)  = 10^{[-A_IF(d) - A_audio(|d|) + w468(|d|)]/10}, G(0) = 0
 *     R     = sum p_j G(f_j)
 *     D(b)  = kappa sum p_j [G(b - f_j) + G(b + f_j)] / R, kappa 1/2 below 50 Hz, 1/4 from there
 *     C(b)  = 10^0.74 G(b) / R from 50 Hz, 0 below
 *     W0(b) = 10 log10[C(b) + D(b)],   A_audio(f) = 10 log10[1 + (f/fa)^4]
 *
 * Beside it, from memory: relative protection ratios of ITU-R BS.560 in HF planning (-3 dB at
 * 5 kHz, -35 at 10) and GE75 (-21 at 9 kHz) lie between those of a broad and a narrow set.
 *
 * @param selectivity The IF amplifier.
 * @param audioCornerHz Corner fa of the audio stage, hertz; null: none.
 * @param programme Third-octave bands of the emission.
 * @returns W0; 0 dB at 0.
 * @throws {RangeError} If the corner is not above 0.
 *
 * @example
 *   const w = programmeWeighting(ifSelectivity({ kind: 'widths', b6Hz: 6000, b60Hz: 22000 }, 455e3),
 *     3500, programmeBands(4500));
 *   w(1000); // 9.33
 */
export function programmeWeighting(
  selectivity: IfSelectivity,
  audioCornerHz: number | null,
  programme: readonly ProgrammeBand[],
): Weighting {
  if (audioCornerHz !== null && !(audioCornerHz > 0)) {
    throw new RangeError(`audioCornerHz must be above 0, got ${audioCornerHz}`);
  }
  const heard = remembered((f) => {
    const audio = audioCornerHz === null ? 1 : 1 + (f / audioCornerHz) ** 4;
    return (10 ** (-selectivity.rejectionDb(f) / 10) / audio) * earWeightingPower(f);
  });
  const reference = programme.reduce((sum, { hz, share }) => sum + share * heard(hz), 0);
  return (beatHz) => {
    const locked = beatHz < LOCKED_HZ;
    const sidebands = programme.reduce(
      (sum, { hz, share }) => sum + share * (heard(beatHz - hz) + heard(beatHz + hz)),
      0,
    );
    const carrier = locked ? 0 : CARRIER_OVER_PROGRAMME * heard(beatHz);
    return 10 * Math.log10((carrier + (locked ? 0.5 : 0.25) * sidebands) / reference);
  };
}

/**
 * Weighting of a carrier, heard beside a telegraphy signal or beacon through a beat oscillator.
 *
 *     W0(b) = -A_IF(b) + max[w468(|b - p|), w468(b + p)] - w468(p)
 *
 * @param selectivity The IF amplifier.
 * @param pitchHz Pitch p of the wanted signal, hertz, above 0.
 * @returns W0.
 * @throws {RangeError} If the pitch is not above 0.
 *
 * @example
 *   const w = toneWeighting(ifSelectivity({ kind: 'widths', b6Hz: 6000, b60Hz: 22000 }, 455e3), 1000);
 *   w(2000); // 8.4: the beat of 3 kHz is where the ear is keen
 */
export function toneWeighting(selectivity: IfSelectivity, pitchHz: number): Weighting {
  if (!(pitchHz > 0)) throw new RangeError(`pitchHz must be above 0, got ${pitchHz}`);
  const own = earWeighting(pitchHz);
  return (beatHz) =>
    Math.max(earWeighting(Math.abs(beatHz - pitchHz)), earWeighting(beatHz + pitchHz)) -
    own -
    selectivity.rejectionDb(beatHz);
}

/** A function of |x| that keeps its values: the same sums and differences come up again and again. */
function remembered(of: (x: number) => number): (x: number) => number {
  const known = new Map<number, number>();
  return (x) => {
    const size = Math.abs(x);
    const value = known.get(size) ?? of(size);
    known.set(size, value);
    return value;
  };
}
