/**
 * The verdict on a receiver at a site: a count, not its worst figure.
 *
 * Source: own rule: a count of stations, since one weak station would condemn every set.
 *
 * @module radio/assessment/verdict
 */
import type { Deficit, Loudest } from './deficit.ts';
import { type Grade, grade } from '../hearing/grades.ts';
import type { Band } from '../receiver.ts';
import type { Spectrum } from '../channels/spectrum.ts';

/** A usable station that the receiver harms. */
export interface HarmedStation {
  readonly station: number;
  readonly dialHz: number;
  /** Wanted over the power sum of all responses heard at that setting, decibels. */
  readonly ratioDb: number;
  readonly grade: Grade;
}

/** The loudest response where no usable station is. */
export interface EmptyDial {
  readonly dialHz: number;
  readonly station: number;
  readonly overNoiseDb: number;
}

/** The verdict. */
export interface Verdict {
  /** Number of usable stations that the receiver tunes. */
  readonly usable: number;
  /** Worst first. */
  readonly harmed: readonly HarmedStation[];
  /** Null: nothing is heard on an empty dial. */
  readonly emptyDial: EmptyDial | null;
  /** Decibels missing to the protection ratio, summed over the usable stations. */
  readonly deficitDb: number;
}

/** One band with what was added up on it. */
export interface BandDeficit {
  readonly band: Band;
  readonly protectionDb: number;
  readonly deficit: Deficit;
}

/**
 * Sums up the bands of a receiver.
 *
 * A station that two bands tune counts once, by the band on which it fares worse; the deficit is
 * summed over the bands.
 *
 * @param spectrum The stations.
 * @param bands The bands.
 * @returns The verdict.
 */
export function verdictOf(spectrum: Spectrum, bands: readonly BandDeficit[]): Verdict {
  const usable = new Set<number>();
  const harmed = new Map<number, HarmedStation>();
  for (const { band, protectionDb, deficit } of bands) {
    for (const { position, dialHz, ratioDb } of deficit.usable()) {
      usable.add(position);
      const known = harmed.get(position)?.ratioDb ?? Infinity;
      if (ratioDb >= protectionDb || ratioDb >= known) continue;
      harmed.set(position, {
        station: spectrum.ids[position] ?? -1,
        dialHz,
        ratioDb,
        grade: grade(band.service, ratioDb, protectionDb),
      });
    }
  }
  return {
    usable: usable.size,
    harmed: [...harmed.values()].sort((a, b) => a.ratioDb - b.ratioDb || a.dialHz - b.dialHz),
    emptyDial: emptyDialOf(spectrum, bands),
    deficitDb: bands.reduce((sum, { deficit }) => sum + deficit.deficitDb(), 0),
  };
}

function emptyDialOf(spectrum: Spectrum, bands: readonly BandDeficit[]): EmptyDial | null {
  let loudest: Loudest | null = null;
  for (const { deficit } of bands) {
    if ((deficit.loudest?.overNoiseDb ?? -Infinity) > (loudest?.overNoiseDb ?? -Infinity)) {
      loudest = deficit.loudest;
    }
  }
  if (loudest === null) return null;
  return {
    dialHz: Math.round(loudest.dialHz),
    station: spectrum.ids[loudest.position] ?? -1,
    overNoiseDb: loudest.overNoiseDb,
  };
}
