/**
 * A superheterodyne receiver as the engine computes with it: every field present, defaults filled.
 * The names carry their units, so that the same object is sent, stored and computed with.
 *
 * @module radio/receiver
 */

/** On which side of the signal the oscillator runs. */
export type OscillatorSide = 'above' | 'below';

/** Service a band is listened to for; it sets the assumed wanted field and the protection ratio. */
export type Service = 'broadcast' | 'beacon' | 'marine' | 'telegraphy';

/** How the selectivity of the IF amplifier is known. */
export type Selectivity = SelectivityWidths | SelectivityTransformers | SelectivityTable;

/** Two total widths, at -6 dB and at -60 dB. */
export interface SelectivityWidths {
  readonly kind: 'widths';
  readonly b6Hz: number;
  readonly b60Hz: number;
}

/** A number of equal IF transformers, each a coupled pair with kQ = `coupling` (1: critical). */
export interface SelectivityTransformers {
  readonly kind: 'transformers';
  readonly count: number;
  readonly q: number;
  readonly coupling: number;
}

/** A measured curve: rejection against the distance from the centre. */
export interface SelectivityTable {
  readonly kind: 'table';
  readonly points: readonly { readonly offsetHz: number; readonly rejectionDb: number }[];
}

/** One tuned signal circuit: its loaded Q at both ends of the band, linear between. */
export interface TunedCircuit {
  readonly qLow: number;
  readonly qHigh: number;
}

/** Rejection that stray pick-up past the tuned circuits never lets be exceeded; null: no limit. */
export interface StrayPickUp {
  readonly if: number;
  readonly image: number;
}

/** A crystal, mechanical or ceramic filter that fixes the IF. */
export interface FixedFilter {
  readonly kind: 'crystal' | 'mechanical' | 'ceramic';
  readonly centreHz: number;
  readonly widthHz: number;
}

/** Beat-frequency oscillator: where it stands, how far it reaches to either side, usual pitch. */
export interface BeatOscillator {
  readonly centreHz: number;
  readonly rangeHz: number;
  readonly pitchHz: number;
}

/** A wave trap at the aerial terminal. */
export interface Trap {
  /** Parallel: in series with the aerial lead. Series: across the input. */
  readonly kind: 'parallel' | 'series';
  readonly inductanceH: number;
  readonly capacitanceF: number;
  readonly q: number;
  readonly sourceOhms: number;
  readonly loadOhms: number;
}

/** What the aerial adds to the tuned circuits. */
export type Aerial =
  | { readonly kind: 'primary'; readonly resonanceHz: number; readonly q: number }
  | { readonly kind: 'loop' };

/** Second conversion of a double superheterodyne. */
export interface SecondConversion {
  readonly ifHz: number;
  readonly oscillator: OscillatorSide;
}

/** Design of the padded oscillator circuit, without what the band itself gives. */
export interface TrackingDesign {
  readonly gangMinF: number;
  readonly gangMaxF: number;
  readonly strayF: number;
  readonly trimmer: 'gang' | 'coil';
  readonly points: readonly [number, number, number] | 'best';
  readonly fixedPadderF?: number | undefined;
  readonly alignHz?: readonly [number, number] | undefined;
}

/** One tuning range. */
export interface Band {
  readonly name: string;
  readonly lowHz: number;
  readonly highHz: number;
  readonly oscillator: OscillatorSide;
  readonly circuits: readonly TunedCircuit[];
  /** Harmonic of the oscillator that mixes on this band; 1 as a rule. */
  readonly oscillatorHarmonic: number;
  readonly service: Service;
  /** Field assumed for a wanted station where none is listed, dB(uV/m); null: by service. */
  readonly assumedWantedDb: number | null;
  /** How far a listener may sit off the centre, hertz; null: by frequency. */
  readonly tuningToleranceHz: number | null;
  readonly dialStepHz: number | null;
  readonly tracking: TrackingDesign | null;
}

/** A receiver, whole. */
export interface Receiver {
  readonly name: string;
  readonly ifHz: number;
  readonly selectivity: Selectivity;
  /** Corner of the audio stage, hertz; null: none. */
  readonly audioCornerHz: number | null;
  readonly strayDb: StrayPickUp | null;
  /** Level at which the mixer passes its input at the IF, relative to conversion. */
  readonly ifFeedthroughDb: number;
  /** A signal of 80 dB(uV/m) at resonance relative to the oscillator at the mixer's grid. */
  readonly signalToOscillatorDb: number;
  /** Fraction of its frequency by which the IF can be moved by cores and trimmers. */
  readonly ifRange: number;
  readonly fixedFilter: FixedFilter | null;
  readonly bfo: BeatOscillator | null;
  readonly trap: Trap | null;
  readonly aerial: Aerial | null;
  readonly secondConversion: SecondConversion | null;
  readonly bands: readonly Band[];
}
