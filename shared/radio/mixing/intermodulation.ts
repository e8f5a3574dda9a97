/**
 * Pairs of stations that make the IF between them, whatever the dial says.
 *
 * Source: arithmetic of sums and differences; the level is told by no model here.
 *
 * @module radio/mixing/intermodulation
 */
import type { Response } from '../assessment/response.ts';
import type { Spectrum } from '../channels/spectrum.ts';

/** How many of the strongest stations are paired. */
const STRONGEST = 50;

/** Two stations whose sum or difference lies near the IF. */
export interface IntermodulatingPair {
  readonly stronger: StrongStation;
  readonly weaker: StrongStation;
  /** `||f1 +- f2| - IF|`, hertz; the smaller of the two. */
  readonly beatHz: number;
  readonly relation: 'sum' | 'difference';
}

/** A station that may take part. */
export interface StrongStation {
  /** Position in the spectrum. */
  readonly position: number;
  readonly id: number;
  readonly hz: number;
}

/**
 * The 50 strongest stations, the strongest first; of equals the one with the lower number.
 *
 * @param spectrum The stations.
 * @returns At most 50 stations.
 */
export function strongestStations(spectrum: Spectrum): StrongStation[] {
  const { fieldDb, ids } = spectrum;
  const field = (position: number): number => fieldDb[position] ?? -Infinity;
  const least = fieldDb.toSorted().at(-STRONGEST) ?? -Infinity;
  return Array.from(fieldDb.keys())
    .filter((position) => field(position) >= least)
    .sort((a, b) => field(b) - field(a) || (ids[a] ?? 0) - (ids[b] ?? 0))
    .slice(0, STRONGEST)
    .map((position) => ({
      position,
      id: ids[position] ?? -1,
      hz: spectrum.hz[spectrum.groupOf(position)] ?? NaN,
    }));
}

/**
 * The pairs of strong stations whose second-order product lies on or near the IF.
 *
 * @param strongest The stations, the strongest first.
 * @param ifHz Intermediate frequency, hertz.
 * @param reachHz Largest beat that counts, hertz: half of B6.
 * @returns The pairs, by the numbers of stronger and weaker.
 *
 * @example
 *   const two = [{ position: 0, id: 0, hz: 1_000_000 }, { position: 1, id: 1, hz: 1_455_000 }];
 *   intermodulatingPairs(two, 455_000, 3_000).length; // 1
 */
export function intermodulatingPairs(
  strongest: readonly StrongStation[],
  ifHz: number,
  reachHz: number,
): IntermodulatingPair[] {
  const pairs: IntermodulatingPair[] = [];
  strongest.forEach((stronger, index) => {
    for (let next = index + 1; next < strongest.length; next++) {
      const weaker = strongest[next];
      if (weaker === undefined) continue;
      const sum = Math.abs(stronger.hz + weaker.hz - ifHz);
      const difference = Math.abs(Math.abs(stronger.hz - weaker.hz) - ifHz);
      const beatHz = Math.min(sum, difference);
      if (beatHz > reachHz) continue;
      pairs.push({ stronger, weaker, beatHz, relation: sum < difference ? 'sum' : 'difference' });
    }
  });
  return pairs.sort((a, b) => a.stronger.id - b.stronger.id || a.weaker.id - b.weaker.id);
}

/**
 * A pair as a response: heard at every dial setting, its level not computed.
 *
 * @param spectrum The stations.
 * @param pair The pair.
 * @returns The response.
 */
export function intermodulationResponse(spectrum: Spectrum, pair: IntermodulatingPair): Response {
  const { stronger, weaker, beatHz, relation } = pair;
  return {
    station: stronger.id,
    secondStation: weaker.id,
    cause: 'intermodulation',
    name: `${relation} of two stations`,
    m: null,
    n: null,
    dialHz: null,
    beatHz: Math.round(beatHz),
    fieldDb: null,
    distanceM: spectrum.distanceM[stronger.position] ?? null,
    interferenceDb: null,
    weightingDb: null,
    wantedDb: null,
    wantedStation: null,
    noiseDb: null,
    bandDb: null,
    ratioDb: null,
    marginDb: null,
    grade: null,
    hidden: null,
    borderline: false,
    ledger: [],
  };
}
