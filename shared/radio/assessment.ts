/**
 * Assessment of a receiver at a site: what it lets through, where on the dial, and how bad it is.
 *
 * @module radio/assessment
 */
import type { FieldStrength } from './field-strength.ts';
import type { Grade } from './grades.ts';
import type { Receiver } from './receiver.ts';
import type { Response } from './response.ts';
import type { Period, Site } from './site.ts';
import type { RasterRange, Station } from './station.ts';
import type { Verdict } from './verdict.ts';

/** What is assessed. */
export interface AssessmentInput {
  readonly receiver: Receiver;
  readonly site: Site;
  readonly stations: readonly Station[];
  /** Fields of the stations at the site, by `fieldStrengths`. */
  readonly fields: readonly FieldStrength[];
  readonly raster: readonly RasterRange[];
  readonly period: Period;
  /** Highest order of the oscillator, 0 to 5. */
  readonly maxM: number;
  /** Highest order of the signal, 1 to 3. */
  readonly maxN: number;
  /** Mildest grade that is still answered; null: all, hidden ones too. */
  readonly leaveOutBetterThan: Grade | null;
  /** Most responses answered for a band. */
  readonly limit: number;
}

/** Something the user should know about the input; `path` names the field. */
export interface Warning {
  readonly path: string;
  readonly message: string;
}

/** A station that was not computed. */
export interface SkippedStation {
  readonly station: number;
  readonly reason: string;
}

/** Two frequencies, the lower first. */
export interface FrequencySpan {
  readonly low: number;
  readonly high: number;
}

/** Rejection at one dial setting, stray pick-up included. */
export interface RejectionPoint {
  readonly dialHz: number;
  readonly imageDb: number;
  readonly ifDb: number;
}

/** Where a harmonic of the IF falls on a band. */
export interface HarmonicPoint {
  readonly harmonic: number;
  readonly dialHz: number;
}

/** Power sum of all that is heard at one dial setting. */
export interface DialTotal {
  readonly dialHz: number;
  readonly ratioDb: number;
  readonly grade: Grade;
  /** The stations that are heard, ascending. */
  readonly stations: readonly number[];
}

/** One band of the receiver, assessed. */
export interface BandAssessment {
  readonly name: string;
  readonly oscillatorHz: FrequencySpan;
  readonly imageHz: FrequencySpan;
  readonly rejection: readonly RejectionPoint[];
  readonly harmonics: readonly HarmonicPoint[];
  readonly totals: readonly DialTotal[];
  /** Number of responses before `limit`. */
  readonly total: number;
  readonly responses: readonly Response[];
}

/** The whole answer. */
export interface Assessment {
  readonly verdict: Verdict;
  readonly warnings: readonly Warning[];
  readonly skipped: readonly SkippedStation[];
  readonly bands: readonly BandAssessment[];
}
