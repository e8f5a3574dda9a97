/**
 * Modes of a wave that creeps round the spherical earth: the roots of its boundary condition.
 *
 * Source: ITU-R P.368, from memory, not re-read; the boundary condition w'(t) = q w(t).
 *
 * @module radio/propagation/earth-modes
 */
import { airy } from '../mathematics/airy.ts';
import {
  add,
  complex,
  type Complex,
  divide,
  inverseTangent,
  modulus,
  multiply,
  polar,
  scale,
  squareRoot,
  subtract,
} from '../mathematics/complex.ts';

/** Newton's method doubles the digits each time, so a last change of 1e-6 leaves 1e-12. */
const TOLERANCE = 1e-6;
/** Three or four are taken; the limit only makes an end certain. */
const MAX_NEWTON_STEPS = 20;

/**
 * Root of the boundary condition `Ai'(z) = p Ai(z)` of a given order.
 *
 * The roots of order s lie between the zero s of Ai' (p = 0: a perfect conductor) and the zero s
 * of Ai (p infinite). Where `2/3 (-z)^(3/2) = xi`, the leading terms of the Airy functions make the
 * condition `tan(xi + pi/4 - (s - 1/2) pi) = p / sqrt(-z)`; its solution starts Newton's method,
 * with the derivative `z Ai - p Ai'` that Airy's equation gives.
 *
 * @param order Order s, a whole number from 1.
 * @param p Boundary parameter, its argument between -90 and 90 degrees.
 * @returns The root, near the negative real axis.
 * @throws {RangeError} If the order is not a whole number from 1.
 * @example
 *   modeRoot(1, complex(0)); // -1.018793 + 0j, the first zero of Ai'
 */
export function modeRoot(order: number, p: Complex): Complex {
  if (!Number.isInteger(order) || order < 1) {
    throw new RangeError(`order must be a whole number from 1, got ${order}`);
  }
  let z = firstGuess(order, p);
  for (let step = 0; step < MAX_NEWTON_STEPS; step++) {
    const { value, derivative } = airy(z);
    const residue = subtract(derivative, multiply(p, value));
    const slope = subtract(multiply(z, value), multiply(p, derivative));
    const change = divide(residue, slope);
    z = subtract(z, change);
    if (modulus(change) < TOLERANCE * modulus(z)) break;
  }
  return z;
}

function firstGuess(order: number, p: Complex): Complex {
  let depth = complex(zeroDepth(order - 0.5));
  for (let pass = 0; pass < 3; pass++) {
    const turn = inverseTangent(divide(p, squareRoot(depth)));
    const xi = add(complex((order - 0.75) * Math.PI), turn);
    depth = twoThirdsPower(scale(xi, 1.5));
  }
  return scale(depth, -1);
}

/** `-z` where `2/3 (-z)^(3/2) = pi (halfTurns - 1/4)`. */
const zeroDepth = (halfTurns: number): number => (1.5 * Math.PI * (halfTurns - 0.25)) ** (2 / 3);

function twoThirdsPower(a: Complex): Complex {
  return polar(modulus(a) ** (2 / 3), (Math.atan2(a.im, a.re) * 2) / 3);
}
