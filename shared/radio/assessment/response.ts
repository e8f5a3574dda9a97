/**
 * What is answered about one response of a receiver.
 *
 * @module radio/assessment/response
 */
import type { Grade } from '../hearing/grades.ts';

/** Why a station is heard where it does not belong. */
export type Cause =
  | 'image'
  | 'breakthrough'
  | 'half-if'
  | 'oscillator-harmonic'
  | 'product'
  | 'intermodulation'
  | 'second-image';

/** What a response disappears under; null: it is heard. */
export type Hidden = 'noise' | 'band' | null;

/** Name of a line of the working. */
export type LedgerTerm =
  | 'field'
  | `circuit-${number}`
  | 'aerial'
  | 'trap'
  | 'mixer'
  | 'signal-order'
  | 'signal-level'
  | 'second-conversion'
  | 'stray-limit'
  | 'interference'
  | 'weighting'
  | 'weighted-interference'
  | 'wanted'
  | 'noise'
  | 'band'
  | 'ratio'
  | 'protection-ratio'
  | 'margin'
  | 'uncertainty';

/**
 * One line of the working. The lines from `field` to `signal-level` add up to `interference`,
 * unless `stray-limit` stands above their sum and takes its place.
 */
export interface LedgerEntry {
  readonly term: LedgerTerm;
  readonly valueDb: number;
}

/** A station heard through a product of the mixer at one dial setting. */
export interface Response {
  readonly station: number;
  /** The weaker of the pair; only for intermodulation. */
  readonly secondStation?: number;
  readonly cause: Cause;
  /** The product in words. */
  readonly name: string;
  /** Order of the oscillator; null for intermodulation. */
  readonly m: number | null;
  /** Order of the signal; null for intermodulation. */
  readonly n: number | null;
  /** Dial setting, whole hertz; null: everywhere. */
  readonly dialHz: number | null;
  /** Distance of the product from the IF at that setting, whole hertz. */
  readonly beatHz: number;
  /** Field of the station, dB(uV/m). */
  readonly fieldDb: number | null;
  /** Distance of the station, metres; null when its field was given. */
  readonly distanceM: number | null;
  /** Equivalent field of the interference, dB(uV/m). */
  readonly interferenceDb: number | null;
  readonly weightingDb: number | null;
  readonly wantedDb: number | null;
  /** Station whose field `wantedDb` is; null: an assumed field. */
  readonly wantedStation: number | null;
  readonly noiseDb: number | null;
  /** What the band itself does at the setting, dB(uV/m); null: nothing within reach. */
  readonly bandDb: number | null;
  readonly ratioDb: number | null;
  readonly marginDb: number | null;
  readonly grade: Grade | null;
  readonly hidden: Hidden;
  /** The margin is smaller than its own uncertainty. */
  readonly borderline: boolean;
  readonly ledger: readonly LedgerEntry[];
}
