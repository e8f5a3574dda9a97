/**
 * Circuits on one gang: a plain one, and one padded to follow it at a constant distance.
 *
 * Source: resonance; textbook theory of three-point tracking, from memory; checked with ngspice.
 *
 * @module radio/tracking/padded-circuit
 */
import type { TrackingConstants, TrackingCurve } from './tracking-curve.ts';

/** A gang: both sections alike. */
export interface Gang {
  readonly minF: number;
  readonly maxF: number;
}

/** A coil with the capacitance across its section of the gang. */
export interface PlainCircuit {
  readonly coilH: number;
  /** Trimmer and stray together. */
  readonly trimmerF: number;
}

/** Where the trimmer of a padded circuit sits: across the gang or across the coil. */
export type TrimmerPlace = 'gang' | 'coil';

/** A coil with a padder in series with the gang. */
export interface PaddedCircuit extends PlainCircuit {
  readonly padderF: number;
  readonly trimmer: TrimmerPlace;
  /** Stray across the gang, where the trimmer sits across the coil. */
  readonly strayF: number;
}

/**
 * `k = 1/(4 pi^2 L)`: the capacitance of a circuit is k over its frequency squared.
 *
 * @param coilH Inductance L, henries.
 * @returns k, farads times hertz squared.
 * @example
 *   resonanceConstant(205.1163e-6) / 550e3 ** 2; // 408.239e-12
 */
export function resonanceConstant(coilH: number): number {
  return 1 / (4 * Math.PI ** 2 * coilH);
}

/**
 * Coil and trimmer that let a gang tune a range.
 *
 *     R = (fmax/fmin)^2;  Ct = (Cmax - R Cmin)/(R - 1);  L = 1/[(2 pi fmin)^2 (Cmax + Ct)]
 *
 * Source: resonance at both ends, any handbook.
 *
 * @param lowHz Low end, hertz.
 * @param highHz High end, hertz, above the low end.
 * @param gang The gang.
 * @returns The circuit; a negative trimmer says that the gang cannot tune the range.
 *
 * @example
 *   plainCircuit(550e3, 1600e3, { minF: 40e-12, maxF: 400e-12 }).coilH; // 205.116e-6
 */
export function plainCircuit(lowHz: number, highHz: number, { minF, maxF }: Gang): PlainCircuit {
  const ratio = (highHz / lowHz) ** 2;
  const trimmerF = (maxF - ratio * minF) / (ratio - 1);
  return { coilH: 1 / ((2 * Math.PI * lowHz) ** 2 * (maxF + trimmerF)), trimmerF };
}

/**
 * The padded circuit that follows a plain one along a tracking curve.
 *
 * Trimmer across the gang:
 *
 *     P = k(1/n^2 - 1/l^2);  T = Ct + k/l^2;  Lo = l^2/(4 pi^2 P m^2 n^2)
 *
 * Trimmer across the coil, stray c0 across the gang:
 *
 *     x = Ct - c0;  P = k/n^2 + x;  s = k/l^2 + x;  T = P s/(P - s)
 *     Lo = l^2/[4 pi^2 (T + P) m^2 n^2]
 *
 * Source: the classical design of the handbooks, from memory, not re-read.
 *
 * @param plain The plain circuit.
 * @param constants Constants of the curve.
 * @param trimmer Where the trimmer sits.
 * @param strayF Stray capacitance, farads: c0.
 * @returns The circuit; parts that are not above 0 say that there is none.
 *
 * @example
 *   paddedCircuit(plain, constants, 'gang', 0).padderF; // 436.837e-12
 */
export function paddedCircuit(
  plain: PlainCircuit,
  { l2, m2, n2 }: TrackingConstants,
  trimmer: TrimmerPlace,
  strayF: number,
): PaddedCircuit {
  const k = resonanceConstant(plain.coilH);
  if (trimmer === 'gang') {
    const padderF = k * (1 / n2 - 1 / l2);
    const coilH = l2 / (4 * Math.PI ** 2 * padderF * m2 * n2);
    return { coilH, padderF, trimmerF: plain.trimmerF + k / l2, trimmer, strayF };
  }
  const x = plain.trimmerF - strayF;
  const padderF = k / n2 + x;
  const s = k / l2 + x;
  const trimmerF = (padderF * s) / (padderF - s);
  const coilH = l2 / (4 * Math.PI ** 2 * (trimmerF + padderF) * m2 * n2);
  return { coilH, padderF, trimmerF, trimmer, strayF };
}

/**
 * Refits coil and trimmer of a padded circuit, its padder kept, so that it is right at two
 * settings of the gang.
 *
 * The capacitances at the two settings must be in the inverse ratio of the squared frequencies:
 * a linear equation for a trimmer across the coil, a quadratic one across the gang.
 *
 * @param padderF The padder that stays.
 * @param trimmer Where the trimmer sits.
 * @param strayF Stray across the gang, where the trimmer sits across the coil.
 * @param at For both settings: the gang's capacitance, and the frequency wanted.
 * @returns The circuit; a trimmer that is not above 0, or NaN, says that there is none.
 * @example
 *   const low = { gangF: 334.795e-12, hz: 1050e3 };
 *   const high = { gangF: 54.768e-12, hz: 1850e3 };
 *   refitted(436.837e-12, 'gang', 0, [low, high]).trimmerF; // 18.8e-12 for an IF of 450 kHz
 */
export function refitted(
  padderF: number,
  trimmer: TrimmerPlace,
  strayF: number,
  at: readonly [{ gangF: number; hz: number }, { gangF: number; hz: number }],
): PaddedCircuit {
  const [a, b] = at;
  const ratio = (b.hz / a.hz) ** 2;
  const series = (gangF: number): number => (padderF * gangF) / (padderF + gangF);
  const trimmerF =
    trimmer === 'coil'
      ? (ratio * series(b.gangF + strayF) - series(a.gangF + strayF)) / (1 - ratio)
      : gangTrimmer(padderF, a.gangF, b.gangF, ratio);
  const circuit: PaddedCircuit = { coilH: 1, padderF, trimmerF, trimmer, strayF };
  const coilH = 1 / ((2 * Math.PI * a.hz) ** 2 * capacitance(circuit, a.gangF));
  return { ...circuit, coilH };
}

/**
 * Capacitance across the coil of a padded circuit at a setting of the gang.
 *
 * @param circuit The circuit.
 * @param gangF Capacitance of the gang, farads.
 * @returns Farads.
 * @example
 *   capacitance(padded, 400e-12); // 214e-12
 */
export function capacitance(circuit: PaddedCircuit, gangF: number): number {
  const { padderF, trimmerF, trimmer, strayF } = circuit;
  const across = gangF + (trimmer === 'gang' ? trimmerF : strayF);
  const series = (padderF * across) / (padderF + across);
  return trimmer === 'gang' ? series : series + trimmerF;
}

/**
 * The curve of a plain and a padded circuit on one gang, from the parts themselves.
 *
 * @param plain The plain circuit.
 * @param padded The padded circuit.
 * @returns Frequency of the padded circuit against that of the plain one, as if the plain one were
 *   the signal circuit.
 * @example
 *   curveOfParts(plain, padded).oscillatorHz(1000e3); // 1455000
 */
export function curveOfParts(plain: PlainCircuit, padded: PaddedCircuit): TrackingCurve {
  const k = resonanceConstant(plain.coilH);
  const kPadded = resonanceConstant(padded.coilH);
  return {
    oscillatorHz: (signalHz) =>
      Math.sqrt(kPadded / capacitance(padded, k / signalHz ** 2 - plain.trimmerF)),
    signalHz: (oscillatorHz) =>
      Math.sqrt(k / (gangAt(padded, kPadded / oscillatorHz ** 2) + plain.trimmerF)),
  };
}

/** Setting of the gang at which a padded circuit has a capacitance across its coil. */
function gangAt(
  { padderF, trimmerF, trimmer, strayF }: PaddedCircuit,
  acrossCoilF: number,
): number {
  const series = trimmer === 'gang' ? acrossCoilF : acrossCoilF - trimmerF;
  return (padderF * series) / (padderF - series) - (trimmer === 'gang' ? trimmerF : strayF);
}

/** Larger root of `T^2 + (Ca + Cb + P) T + [Ca(P + Cb) - r Cb(P + Ca)]/(1 - r) = 0`. */
function gangTrimmer(padderF: number, a: number, b: number, ratio: number): number {
  const half = (a + b + padderF) / 2;
  const q = (a * (padderF + b) - ratio * b * (padderF + a)) / (1 - ratio);
  // Written so that two nearly equal numbers are not subtracted.
  return -q / (half + Math.sqrt(half * half - q));
}
