/**
 * Field strength of every station of a list at a receiving site.
 *
 * @module radio/field-strength
 */
import type { Period, Site } from './site.ts';
import type { Station } from './station.ts';

/** Field of one station at the site; null where it could not be computed, with the reason noted. */
export interface FieldStrength {
  /** The station's `id`. */
  readonly station: number;
  readonly distanceM: number | null;
  readonly groundDb: number | null;
  readonly skyDb: number | null;
  /** Powers of ground and sky wave added, or the field that was given, dB(uV/m). */
  readonly fieldDb: number | null;
  /** Sentences that say what is missing or assumed. */
  readonly notes: string[];
}

export function fieldStrengths(
  _site: Site,
  stations: readonly Station[],
  _period: Period,
): FieldStrength[] {
  return stations.map(({ id, fieldDb }) => ({
    station: id,
    distanceM: null,
    groundDb: null,
    skyDb: null,
    fieldDb,
    notes: [],
  }));
}
