/**
 * Design of the padded circuit by which oscillator and signal circuits follow each other.
 *
 * Source: as in the parts; common practice for what is refused.
 *
 * @module radio/tracking/tracking
 */
import {
  curveOfParts,
  type PaddedCircuit,
  paddedCircuit,
  type PlainCircuit,
  plainCircuit,
  refitted,
  resonanceConstant,
} from './padded-circuit.ts';
import type { OscillatorSide, TrackingDesign } from '../receiver.ts';
import { sideSign } from '../mixing/superheterodyne.ts';
import { curveOf, trackingConstants, type TrackingCurve, trackingError } from './tracking-curve.ts';
import {
  bestTrackingPoints,
  type TrackedBand,
  type TrackingPoints,
  worstTrackingError,
} from './tracking-points.ts';

/** A band and its gang; what is asked of `designTracking`. */
export interface TrackingInput extends TrackingDesign {
  readonly lowHz: number;
  readonly highHz: number;
  readonly ifHz: number;
  readonly oscillator: OscillatorSide;
}

/** Error at one frequency of the signal circuits. */
export interface TrackingErrorPoint {
  readonly dialHz: number;
  readonly errorHz: number;
}

/** A design; all parts are null where it is refused. */
export interface Tracking {
  readonly refused: { readonly reason: string } | null;
  readonly signalCoilH: number | null;
  /** Stray included. */
  readonly signalTrimmerF: number | null;
  readonly oscillatorCoilH: number | null;
  /** In the oscillator above the signal, in the signal circuit below. */
  readonly padderF: number | null;
  /** Stray included, where it sits across the gang. */
  readonly oscillatorTrimmerF: number | null;
  readonly pointsHz: readonly number[];
  /** 41 settings evenly over the band, and the points. */
  readonly errors: readonly TrackingErrorPoint[];
  /** Largest size of the error over the band. */
  readonly worstErrorHz: number | null;
}

/** A design with the curve it gives. */
export interface TrackedDesign {
  readonly refused: string | null;
  readonly plain: PlainCircuit;
  readonly padded: PaddedCircuit;
  readonly pointsHz: readonly number[];
  /** Oscillator against signal circuits. */
  readonly curve: TrackingCurve;
}

const SETTINGS = 41;

/**
 * Designs the coils, trimmers and padder of a band.
 *
 * The circuit with the smaller range ratio gets the padder: the oscillator above the signal, the
 * signal circuit when the oscillator runs below. With `fixedPadderF` the padder stays, as after a
 * change of IF, and coil and trimmer are refitted to be exact at the two frequencies `alignHz` (left
 * out: the outer two of the points).
 *
 * @param input The band, the IF, the gang and the points.
 * @returns The parts and the error over the band, or the reason why there is no such circuit.
 * @throws {RangeError} If the band, the IF, the gang or the points cannot be.
 *
 * @example
 *   designTracking({ lowHz: 550e3, highHz: 1600e3, ifHz: 455e3, oscillator: 'above',
 *     gangMinF: 40e-12, gangMaxF: 400e-12, strayF: 0, trimmer: 'gang',
 *     points: [600e3, 1000e3, 1400e3] }).padderF; // 436.837e-12
 */
export function designTracking(input: TrackingInput): Tracking {
  const design = trackedDesign(input);
  const { plain, padded, pointsHz, curve } = design;
  if (design.refused !== null) {
    return { ...NOTHING, refused: { reason: design.refused }, pointsHz: pointsHz.map(Math.round) };
  }
  const band = bandOf(input);
  const above = input.oscillator === 'above';
  const [signal, oscillator] = above ? [plain, padded] : [padded, plain];
  return {
    refused: null,
    signalCoilH: signal.coilH,
    signalTrimmerF: signal.trimmerF,
    oscillatorCoilH: oscillator.coilH,
    padderF: padded.padderF,
    oscillatorTrimmerF: oscillator.trimmerF,
    pointsHz: pointsHz.map(Math.round),
    errors: errorsOver(band, curve, pointsHz),
    worstErrorHz: Math.abs(worstTrackingError(curve, band)),
  };
}

/**
 * The design behind `designTracking`, with its curve.
 *
 * @param input The band, the IF, the gang and the points.
 * @returns The circuits and the curve; `refused` says why they cannot be built.
 * @throws {RangeError} If the band, the IF, the gang or the points cannot be.
 * @example
 *   trackedDesign({ ifHz: 455e3, lowHz: 550e3, highHz: 1600e3, oscillator: 'above', ...trackedGang })
 *     .padded.padderF; // 436.837e-12
 */
export function trackedDesign(input: TrackingInput): TrackedDesign {
  check(input);
  const band = bandOf(input);
  const above = input.oscillator === 'above';
  const points = input.points === 'best' ? bestTrackingPoints(band) : input.points;
  const shift = above ? 0 : -input.ifHz;
  const gang = { minF: input.gangMinF, maxF: input.gangMaxF };
  const plain = plainCircuit(input.lowHz + shift, input.highHz + shift, gang);
  const { padded, pointsHz } = paddedOf(input, plain, points, shift);
  // The curve follows from the points alone, whatever the parts; kept parts have their own.
  const curve =
    input.fixedPadderF === undefined
      ? curveOf(trackingConstants(points, band.signedIfHz))
      : signalCurve(curveOfParts(plain, padded), above);
  const refused = refusal(plain, padded, input) ?? unreached(band, curve);
  return { refused, plain, padded, pointsHz, curve };
}

function paddedOf(
  { fixedPadderF, alignHz, trimmer, strayF, ifHz }: TrackingInput,
  plain: PlainCircuit,
  points: TrackingPoints,
  shift: number,
): { padded: PaddedCircuit; pointsHz: readonly number[] } {
  const onPlain = points.map((hz) => hz + shift) as unknown as TrackingPoints;
  if (fixedPadderF === undefined) {
    const constants = trackingConstants(onPlain, ifHz);
    return { padded: paddedCircuit(plain, constants, trimmer, strayF), pointsHz: points };
  }
  const pair = alignHz ?? ([points[0], points[2]] as const);
  const k = resonanceConstant(plain.coilH);
  const [a, b] = pair.map((hz) => ({
    gangF: k / (hz + shift) ** 2 - plain.trimmerF,
    hz: hz + shift + ifHz,
  }));
  if (a === undefined || b === undefined || a.hz === b.hz) {
    throw new RangeError('alignHz must name two different frequencies');
  }
  return { padded: refitted(fixedPadderF, trimmer, strayF, [a, b]), pointsHz: pair };
}

/** The curve of plain and padded circuit, turned round when the padder is in the signal circuit. */
function signalCurve(curve: TrackingCurve, above: boolean): TrackingCurve {
  return above ? curve : { oscillatorHz: curve.signalHz, signalHz: curve.oscillatorHz };
}

function refusal(
  plain: PlainCircuit,
  padded: PaddedCircuit,
  { strayF }: TrackingInput,
): string | null {
  if (!(plain.trimmerF >= strayF)) {
    return 'The gang cannot tune the band: its largest capacitance is too small for its smallest and the stray.';
  }
  if (!(padded.padderF > 0)) {
    return 'No padder makes the circuits follow each other at these points.';
  }
  const least = padded.trimmer === 'gang' ? strayF : 0;
  if (!(padded.trimmerF >= least) || !(padded.coilH > 0)) {
    return 'The trimmer would have to be smaller than the stray capacitance.';
  }
  return null;
}

/** The oscillator rises with the signal circuits: where both ends are reached, so is all between. */
function unreached({ lowHz, highHz }: TrackedBand, { oscillatorHz }: TrackingCurve): string | null {
  if (Number.isFinite(oscillatorHz(lowHz)) && Number.isFinite(oscillatorHz(highHz))) return null;
  return 'With these points the oscillator does not reach both ends of the band.';
}

function errorsOver(
  band: TrackedBand,
  curve: TrackingCurve,
  pointsHz: readonly number[],
): TrackingErrorPoint[] {
  const step = (band.highHz - band.lowHz) / (SETTINGS - 1);
  const settings = Array.from({ length: SETTINGS }, (_, index) => band.lowHz + index * step);
  return [...new Set([...settings, ...pointsHz])]
    .sort((a, b) => a - b)
    .map((hz) => ({
      dialHz: Math.round(hz),
      errorHz: trackingError(curve, band.signedIfHz, hz),
    }));
}

function bandOf({ lowHz, highHz, ifHz, oscillator }: TrackingInput): TrackedBand {
  return { lowHz, highHz, signedIfHz: sideSign(oscillator) * ifHz };
}

const NOTHING = {
  signalCoilH: null,
  signalTrimmerF: null,
  oscillatorCoilH: null,
  padderF: null,
  oscillatorTrimmerF: null,
  errors: [],
  worstErrorHz: null,
} as const;

function check({ lowHz, highHz, ifHz, oscillator, fixedPadderF, ...gang }: TrackingInput): void {
  const { gangMinF, gangMaxF, strayF } = gang;
  if (!(lowHz > 0)) throw new RangeError(`lowHz must be above 0, got ${lowHz}`);
  if (!(highHz > lowHz)) throw new RangeError(`highHz must be above lowHz, got ${highHz}`);
  if (!(ifHz > 0)) throw new RangeError(`ifHz must be above 0, got ${ifHz}`);
  if (oscillator === 'below' && !(lowHz > ifHz)) {
    throw new RangeError('oscillator: below the signal it would reach zero on this band');
  }
  if (!(gangMinF > 0)) throw new RangeError(`gangMinF must be above 0, got ${gangMinF}`);
  if (!(gangMaxF > gangMinF)) {
    throw new RangeError(`gangMaxF must be above gangMinF, got ${gangMaxF}`);
  }
  if (!(strayF >= 0)) throw new RangeError(`strayF must be 0 or more, got ${strayF}`);
  if (fixedPadderF !== undefined && !(fixedPadderF > 0)) {
    throw new RangeError(`fixedPadderF must be above 0, got ${fixedPadderF}`);
  }
}
