/**
 * The verdict on a receiver at a site: a count, not its worst figure.
 *
 * @module radio/verdict
 */
import type { Grade } from './grades.ts';

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
