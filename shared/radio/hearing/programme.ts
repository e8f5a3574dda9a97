/**
 * The spectrum of an average broadcast programme.
 *
 * Source: own model, after the shape of the coloured noise of ITU-R BS.559, from memory, not re-
 * read.
 *
 * @module radio/hearing/programme
 */
import type { ItuRegion } from '../site.ts';

/** Centres of third-octave bands, hertz. */
const CENTRES_HZ = [
  100, 125, 160, 200, 250, 315, 400, 500, 630, 800, 1000, 1250, 1600, 2000, 2500, 3150, 4000, 5000,
  6300, 8000, 10000,
] as const;

/** Up to here the power in a third of an octave rises with frequency. */
const KNEE_HZ = 600;

/** One third-octave band of a programme. */
export interface ProgrammeBand {
  readonly hz: number;
  /** Share of the power; all shares add up to 1. */
  readonly share: number;
}

/**
 * Audio width that stations of a Region emit: 4.5 kHz in Regions 1 and 3, 10 kHz in Region 2.
 *
 * @returns Hertz.
 * @example
 *   emissionWidth(2); // 10000
 */
export function emissionWidth(ituRegion: ItuRegion): number {
  return ituRegion === 2 ? 10_000 : 4_500;
}

/**
 * Third-octave bands of a programme up to an audio width, with shares in proportion to
 * `f min(1, (600/f)^2)`.
 *
 * Our own model, after the shape of the coloured noise of ITU-R BS.559 (from memory, not re-read).
 *
 * @param widthHz Highest audio frequency emitted, hertz, from 100.
 * @returns The bands, ascending.
 * @throws {RangeError} If the width leaves no band.
 *
 * @example
 *   programmeBands(4500).length; // 17
 */
export function programmeBands(widthHz: number): ProgrammeBand[] {
  const centres = CENTRES_HZ.filter((hz) => hz <= widthHz);
  if (centres.length === 0) throw new RangeError(`widthHz must be 100 or more, got ${widthHz}`);
  const powers = centres.map((hz) => hz * Math.min(1, (KNEE_HZ / hz) ** 2));
  const total = powers.reduce((sum, power) => sum + power, 0);
  return centres.map((hz, index) => ({ hz, share: (powers[index] ?? 0) / total }));
}
