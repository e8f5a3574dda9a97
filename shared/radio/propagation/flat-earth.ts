/**
 * Ground wave over a flat earth, for distances where its curvature does not matter yet.
 *
 * Source: K. A. Norton, from memory, not re-read.
 *
 * @module radio/propagation/flat-earth
 */
import {
  add,
  complex,
  type Complex,
  modulus,
  multiply,
  scale,
  squareRoot,
} from '../mathematics/complex.ts';
import { faddeeva } from '../mathematics/faddeeva.ts';
import { type GroundConstants, surfaceImpedance, wavelength } from './ground.ts';
import { type Decibels, decibels, type Hertz, type Metres } from '../units.ts';

/**
 * Attenuation of the ground wave over flat ground relative to a perfect conductor, `20 log10 |F|`.
 *
 *     w = -j pi (d / lambda) (eta - 1) / eta^2,   F = 1 - j sqrt(pi w) e^(-w) erfc(j sqrt(w))
 *
 * Both ends on the ground, vertical polarisation. Good to 0.15 dB up to a distance of
 * 25 / cbrt(f MHz) km; beyond, the curvature of the earth matters and F is too large.
 * Source: K. A. Norton, The calculation of ground-wave field intensity over a finitely conducting
 * spherical earth, Proc. IRE 29 (1941), from memory, not re-read.
 *
 * @param frequency Frequency, hertz, above 0.
 * @param ground Constants of the ground.
 * @param distance Distance, metres.
 * @returns Attenuation, dB, 0 or less but for a rise of a fraction of a decibel over good ground.
 * @example
 *   flatEarthAttenuation(hertz(1_000_000), GROUNDS.average, metres(50_000)); // -18.26
 */
export function flatEarthAttenuation(
  frequency: Hertz,
  ground: GroundConstants,
  distance: Metres,
): Decibels {
  const delta = surfaceImpedance(frequency, ground);
  const turns = Math.PI * (distance / wavelength(frequency));
  const w = multiply(complex(0, -turns), multiply(delta, delta));
  return decibels(20 * Math.log10(modulus(attenuationFunction(w))));
}

/** `1 - j sqrt(pi w) e^(-w) erfc(j sqrt(w))`, with `e^(-w) erfc(j sqrt(w))` as Faddeeva's function. */
function attenuationFunction(w: Complex): Complex {
  const z = scale(squareRoot(w), -1);
  const product = multiply(multiply(complex(0, Math.sqrt(Math.PI)), z), faddeeva(z));
  return add(complex(1), product);
}
