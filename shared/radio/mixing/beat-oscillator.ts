/**
 * What a change of IF asks of the beat-frequency oscillator and of the IF capacitances.
 *
 * Source: resonance; what is met in practice is common practice.
 *
 * @module radio/mixing/beat-oscillator
 */

/**
 * Change of every capacitance that resonates at the IF: `(IFold/IFnew)^2 - 1`.
 *
 * The same fraction holds for each IF trimmer, coil unchanged, and for the beat oscillator.
 * Source: resonance of a coil and a capacitor, any handbook.
 *
 * @param presentHz Present IF, hertz, above 0.
 * @param newHz New IF, hertz, above 0.
 * @returns The change as a fraction of the present capacitance.
 * @throws {RangeError} If a frequency is not above 0.
 *
 * @example
 *   capacitanceChange(455_000, 470_000); // -0.06281
 */
export function capacitanceChange(presentHz: number, newHz: number): number {
  if (!(presentHz > 0)) throw new RangeError(`presentHz must be above 0, got ${presentHz}`);
  if (!(newHz > 0)) throw new RangeError(`newHz must be above 0, got ${newHz}`);
  return (presentHz / newHz) ** 2 - 1;
}
