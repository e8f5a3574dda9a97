/**
 * Whistles of the harmonics of the IF, which leak from the detector back to the aerial.
 *
 * Source: arithmetic.
 *
 * @module radio/mixing/harmonic-whistles
 */

const HARMONICS = [2, 3, 4, 5, 6, 7, 8] as const;

/** A harmonic of the IF on a band. */
export interface IfHarmonic {
  readonly harmonic: number;
  readonly dialHz: number;
}

/**
 * Harmonics of the IF, from the 2nd to the 8th, that fall on a band.
 *
 * Their level cannot be predicted; the frequency can: `k IF`. Limits of the band count as inside.
 *
 * @param ifHz Intermediate frequency, hertz, above 0.
 * @param lowHz Low end of the band, hertz.
 * @param highHz High end of the band, hertz.
 * @returns The harmonics, ascending.
 * @throws {RangeError} If the IF is not above 0.
 *
 * @example
 *   ifHarmonics(455_000, 520_000, 1_710_000).map(({ dialHz }) => dialHz); // [910000, 1365000]
 */
export function ifHarmonics(ifHz: number, lowHz: number, highHz: number): IfHarmonic[] {
  if (!(ifHz > 0)) throw new RangeError(`ifHz must be above 0, got ${ifHz}`);
  return HARMONICS.map((harmonic) => ({ harmonic, dialHz: harmonic * ifHz })).filter(
    ({ dialHz }) => dialHz >= lowHz && dialHz <= highHz,
  );
}

/**
 * Pitch of the whistle of the k-th harmonic of the IF on a station: `|d - k e|`.
 *
 * A station at `k IF + d`, tuned with an error e, comes out at `IF + e`, whose k-th harmonic beats
 * with it. The pitch moves k times as fast as the tuning: that is how the bench tells it apart.
 *
 * @param harmonic Order k of the harmonic.
 * @param ifHz Intermediate frequency, hertz.
 * @param stationHz Frequency of the station, hertz.
 * @param tuningErrorHz Tuning error e, hertz.
 * @returns Pitch, hertz.
 *
 * @example
 *   whistlePitch(2, 455_000, 909_000, 0); // 1000
 */
export function whistlePitch(
  harmonic: number,
  ifHz: number,
  stationHz: number,
  tuningErrorHz: number,
): number {
  return Math.abs(stationHz - harmonic * ifHz - harmonic * tuningErrorHz);
}
