/**
 * The Faddeeva function, which the attenuation over a flat earth is made of.
 *
 * @module radio/mathematics/faddeeva
 */
import { add, complex, type Complex, divide, multiply, scale } from './complex.ts';

/** Terms of the rational series; 40 leave an error near 1e-13 in the upper half plane. */
const TERMS = 40;
const WIDTH = Math.sqrt(TERMS / Math.SQRT2);

/** Coefficients of the series, highest power first: a cosine transform of `e^(-t^2)(L^2 + t^2)`. */
const COEFFICIENTS = Array.from({ length: TERMS }, (_, index) => coefficient(TERMS - index));

/**
 * Faddeeva function `w(z) = e^(-z^2) erfc(-jz)` for Im z >= 0.
 *
 * Source: J. A. C. Weideman, Computation of the complex error function, SIAM Journal on Numerical
 * Analysis 31 (1994), from memory, not re-read; checked against scipy.special.wofz.
 *
 * @param z Argument with imaginary part from 0.
 * @returns w(z), within 1e-11 of its modulus.
 * @throws {RangeError} If the imaginary part is negative.
 * @example
 *   faddeeva(complex(1, 1)); // 0.304744 + 0.208219j
 */
export function faddeeva(z: Complex): Complex {
  if (!(z.im >= 0)) throw new RangeError(`the imaginary part must be 0 or more, got ${z.im}`);
  const denominator = complex(WIDTH + z.im, -z.re);
  const ratio = divide(complex(WIDTH - z.im, z.re), denominator);
  let sum = complex(0);
  for (const each of COEFFICIENTS) sum = add(multiply(sum, ratio), complex(each));
  const first = divide(scale(sum, 2), multiply(denominator, denominator));
  return add(first, divide(complex(1 / Math.sqrt(Math.PI)), denominator));
}

function coefficient(order: number): number {
  const samples = 4 * TERMS;
  let sum = 0;
  for (let index = 1 - samples / 2; index < samples / 2; index++) {
    const angle = (2 * Math.PI * index) / samples;
    const t = WIDTH * Math.tan(angle / 2);
    sum += Math.exp(-t * t) * (WIDTH * WIDTH + t * t) * Math.cos(order * angle);
  }
  return sum / samples;
}
