/**
 * Rejection of tuned circuits away from resonance.
 *
 * Source: textbook theory of the parallel circuit; checked with ngspice.
 *
 * @module radio/circuits/tuned-circuit
 */
import { type Decibels, decibels } from '../units.ts';

/**
 * Detuning of a circuit.
 *
 *     rho = f/f0 - f0/f
 *
 * Near resonance about twice the fractional difference. Source: any radio engineering handbook.
 *
 * @param frequencyHz Frequency asked about, hertz, above 0.
 * @param resonanceHz Resonant frequency, hertz, above 0.
 * @returns The detuning; 0 at resonance, negative below.
 *
 * @example
 *   detuning(1_910_000, 1_000_000); // 1.38644
 */
export function detuning(frequencyHz: number, resonanceHz: number): number {
  return frequencyHz / resonanceHz - resonanceHz / frequencyHz;
}

/**
 * Rejection of a cascade of equal, isolated circuits relative to resonance.
 *
 *     rho = f/f0 - f0/f;   A = n 10 log10(1 + Q^2 rho^2)
 *
 * Holds for parallel circuits driven from a high impedance and isolated by valves; not for an
 * aerial primary that resonates near the frequency asked about.
 * Source: the universal resonance curve, any radio engineering handbook.
 *
 * @param frequencyHz Frequency asked about, hertz, above 0.
 * @param resonanceHz Resonant frequency, hertz, above 0.
 * @param q Loaded Q at resonance, above 0.
 * @param circuits Number of circuits, a whole number from 0.
 * @returns Rejection, decibels, 0 at resonance.
 * @throws {RangeError} If a frequency or q is not above 0 or circuits is not a whole number from 0.
 *
 * @example
 *   circuitRejection(1_910_000, 1_000_000, 100, 1); // 42.838 dB
 */
export function circuitRejection(
  frequencyHz: number,
  resonanceHz: number,
  q: number,
  circuits: number,
): Decibels {
  if (!(frequencyHz > 0)) throw new RangeError(`frequencyHz must be above 0, got ${frequencyHz}`);
  if (!(resonanceHz > 0)) throw new RangeError(`resonanceHz must be above 0, got ${resonanceHz}`);
  if (!(q > 0)) throw new RangeError(`q must be above 0, got ${q}`);
  if (!Number.isInteger(circuits) || circuits < 0) {
    throw new RangeError(`circuits must be a whole number from 0, got ${circuits}`);
  }
  const x = q * detuning(frequencyHz, resonanceHz);
  return decibels(circuits * 10 * Math.log10(1 + x * x));
}
