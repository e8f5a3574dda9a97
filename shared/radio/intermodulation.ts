/**
 * Pairs of stations that make the IF between them, whatever the dial says.
 *
 * @module radio/intermodulation
 */
import type { Response } from './response.ts';
import type { Spectrum } from './spectrum.ts';

/** How many of the strongest stations are paired. */
const STRONGEST = 50;

/** Two stations whose sum or difference lies near the IF. */
export interface IntermodulatingPair {
  /** Positions in the spectrum. */
  readonly stronger: number;
  readonly weaker: number;
  /** `||f1 +- f2| - IF|`, hertz; the smaller of the two. */
  readonly beatHz: number;
  readonly relation: 'sum' | 'difference';
}

/**
 * The pairs among the 50 strongest stations whose second-order product lies on or near the IF.
 *
 * @param spectrum The stations.
 * @param ifHz Intermediate frequency, hertz.
 * @param reachHz Largest beat that counts, hertz: half of B6.
 * @returns The pairs, by the station numbers of stronger and weaker.
 *
 * @example
 *   intermodulatingPairs(spectrumOf([1000e3, 1455e3]), 455e3, 3e3).length; // 1
 */
export function intermodulatingPairs(
  spectrum: Spectrum,
  ifHz: number,
  reachHz: number,
): IntermodulatingPair[] {
  const strongest = strongestOf(spectrum);
  const pairs: IntermodulatingPair[] = [];
  strongest.forEach(({ position: stronger, hz: f1 }, index) => {
    for (const { position: weaker, hz: f2 } of strongest.slice(index + 1)) {
      const sum = Math.abs(f1 + f2 - ifHz);
      const difference = Math.abs(Math.abs(f1 - f2) - ifHz);
      const beatHz = Math.min(sum, difference);
      if (beatHz > reachHz) continue;
      pairs.push({ stronger, weaker, beatHz, relation: sum < difference ? 'sum' : 'difference' });
    }
  });
  const id = (position: number): number => spectrum.ids[position] ?? 0;
  return pairs.sort((a, b) => id(a.stronger) - id(b.stronger) || id(a.weaker) - id(b.weaker));
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
    station: spectrum.ids[stronger] ?? -1,
    secondStation: spectrum.ids[weaker] ?? -1,
    cause: 'intermodulation',
    name: `${relation} of two stations`,
    m: null,
    n: null,
    dialHz: null,
    beatHz: Math.round(beatHz),
    fieldDb: null,
    distanceM: spectrum.distanceM[stronger] ?? null,
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

/** Strongest first; of equals the one with the lower number. */
function strongestOf(spectrum: Spectrum): { position: number; hz: number }[] {
  const { fieldDb, ids } = spectrum;
  const field = (position: number): number => fieldDb[position] ?? -Infinity;
  return Array.from({ length: fieldDb.length }, (_, position) => position)
    .sort((a, b) => field(b) - field(a) || (ids[a] ?? 0) - (ids[b] ?? 0))
    .slice(0, STRONGEST)
    .map((position) => ({ position, hz: spectrum.hz[spectrum.groupOf(position)] ?? NaN }));
}
