/**
 * Ground wave over the spherical earth: the residue series.
 *
 * Source: ITU-R P.368, from memory, not re-read; checked with data published with NTIA's LFMF.
 *
 * @module radio/propagation/spherical-earth
 */
import {
  complex,
  type Complex,
  divide,
  multiply,
  polar,
  subtract,
} from '../mathematics/complex.ts';
import { modeRoot } from './earth-modes.ts';
import { type GroundConstants, surfaceImpedance, wavelength } from './ground.ts';
import { type Decibels, decibels, type Hertz, metres, type Metres } from '../units.ts';

/** Effective earth radius, metres, at a surface refractivity of 315 N-units. */
export const EFFECTIVE_RADIUS_M = effectiveEarthRadius(315);

/** Terms beyond are below 1e-5 of the sum wherever the series is used. */
const MAX_TERMS = 400;
const NEGLIGIBLE = 1e-5;

/** One mode: how its field changes with x, and its share. */
interface Term {
  readonly growth: Complex;
  readonly coefficient: Complex;
}

/**
 * Effective radius of the earth: `6370 km / (1 - 0.04665 e^(0.005577 Ns))`.
 *
 * Source: NTIA, LFMF propagation model, source text (US government work).
 *
 * @param refractivity Surface refractivity Ns, N-units, 250 to 400.
 * @returns Radius, metres.
 * @example
 *   effectiveEarthRadius(315); // 8729.277e3
 */
export function effectiveEarthRadius(refractivity: number): Metres {
  return metres(6_370_000 / (1 - 0.04665 * Math.exp(0.005577 * refractivity)));
}

/**
 * Residue series at one frequency over one ground: the attenuation relative to a flat perfect
 * conductor at any distance. Roots are found as they are needed and kept.
 *
 *     F = sqrt(pi x) | sum over s of e^(x e^(j 30 deg) z_s) / (z_s - p^2) |
 *     nu = cbrt(k a / 2),  x = nu d / a,  p = nu delta e^(j 30 deg),  Ai'(z_s) = p Ai(z_s)
 *
 * with the time factor `e^(jwt)`, both ends on the ground, vertical polarisation. This is the
 * series of ITU-R P.368 and of NTIA's LFMF, with t_s turned by 120 degrees. Terms are added until
 * one falls below 1e-5 of the sum: a few hundred at 25 / cbrt(f MHz) km, a handful far away.
 *
 * Source: N. DeMinco, NTIA Report 99-368, 1999, equation 26.
 *
 * @example
 *   new ResidueSeries(hertz(1_000_000), GROUNDS.average).attenuation(metres(50_000)); // -18.54
 */
export class ResidueSeries {
  readonly #nu: number;
  readonly #p: Complex;
  readonly #pSquare: Complex;
  readonly #terms: Term[] = [];

  /**
   * @param frequency Frequency, hertz, above 0.
   * @param ground Constants of the ground.
   */
  constructor(frequency: Hertz, ground: GroundConstants) {
    const waveNumber = (2 * Math.PI) / wavelength(frequency);
    this.#nu = Math.cbrt((waveNumber * EFFECTIVE_RADIUS_M) / 2);
    this.#p = multiply(polar(this.#nu, Math.PI / 6), surfaceImpedance(frequency, ground));
    this.#pSquare = multiply(this.#p, this.#p);
  }

  /**
   * Attenuation at a distance.
   *
   * @param distance Distance, metres, above 0; meant for 25 / cbrt(f MHz) km and more.
   * @returns Attenuation relative to a flat perfect conductor, dB; always finite.
   */
  attenuation(distance: Metres): Decibels {
    const x = (this.#nu * distance) / EFFECTIVE_RADIUS_M;
    // The first term's decay is kept apart as a logarithm, so that nothing underflows far away.
    const decay = x * this.#term(0).growth.re;
    const sum = this.#sum(x, decay);
    return decibels(10 * Math.log10(Math.PI * x) + 20 * (decay * Math.LOG10E + Math.log10(sum)));
  }

  #sum(x: number, decay: number): number {
    let [re, im] = [0, 0];
    for (let index = 0; index < MAX_TERMS; index++) {
      const { growth, coefficient } = this.#term(index);
      const size = Math.exp(x * growth.re - decay);
      const cos = size * Math.cos(x * growth.im);
      const sin = size * Math.sin(x * growth.im);
      re += cos * coefficient.re - sin * coefficient.im;
      im += cos * coefficient.im + sin * coefficient.re;
      const bound = size * (Math.abs(coefficient.re) + Math.abs(coefficient.im));
      if (bound < NEGLIGIBLE * (Math.abs(re) + Math.abs(im))) break;
    }
    return Math.hypot(re, im);
  }

  #term(index: number): Term {
    return (this.#terms[index] ??= this.#newTerm(index + 1));
  }

  #newTerm(order: number): Term {
    const root = modeRoot(order, this.#p);
    return {
      growth: multiply(polar(1, Math.PI / 6), root),
      coefficient: divide(complex(1), subtract(root, this.#pSquare)),
    };
  }
}
