/**
 * What is answered about one possible cause of a whistle.
 *
 * @module radio/whistles/whistle-cause
 */
import type { Cause } from '../assessment/response.ts';

/** Why a second carrier is in the IF. */
export type WhistleSource =
  Cause | 'adjacent-carrier' | 'if-harmonic' | 'bfo-harmonic' | 'second-oscillator';

/** A carrier in the IF amplifier beside the one that is listened to. */
export interface UnwantedCarrier {
  readonly cause: WhistleSource;
  /** In words, such as "oscillator's 2nd harmonic less IF". */
  readonly name: string;
  readonly station: number | null;
  /** The weaker of the pair; only for intermodulation. */
  readonly secondStation?: number;
  /** Where it comes from: the station, or the harmonic inside the set; whole hertz. */
  readonly frequencyHz: number;
  /** Order of the signal: its level moves n times as fast as the field; null inside the set. */
  readonly n: number | null;
  /** Where it lies in the IF, hertz. */
  readonly inIfHz: number;
  /** How it moves there, hertz per hertz of dial, with its sign. */
  readonly moves: number;
  /** Equivalent field after the IF amplifier, dB(uV/m); null: cannot be predicted. */
  readonly levelDb: number | null;
}

/** A possible cause, as it is answered. */
export interface WhistleCause {
  readonly cause: WhistleSource;
  readonly name: string;
  readonly station: number | null;
  readonly secondStation?: number;
  readonly frequencyHz: number;
  /** Pitch at the dial setting, whole hertz. */
  readonly pitchHz: number;
  /** How fast the pitch moves, hertz per hertz of dial; never negative. */
  readonly slope: number;
  /** Tone relative to that of full modulation, decibels; null: cannot be predicted. */
  readonly levelDb: number | null;
  /** What to do at the bench. */
  readonly test: string;
}
