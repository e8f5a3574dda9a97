/**
 * Complex numbers, as few operations as the wave propagation formulas need.
 *
 * Source: arithmetic of complex numbers.
 *
 * @module radio/mathematics/complex
 */

/** A complex number, `re + j im`. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

/**
 * A complex number.
 *
 * @returns The number.
 * @example
 *   complex(1, 2); // 1 + 2j
 */
export const complex = (re: number, im = 0): Complex => ({ re, im });

/**
 * A complex number by modulus and argument in radians.
 *
 * @returns The number.
 * @example
 *   polar(2, Math.PI / 2); // 0 + 2j
 */
export const polar = (modulus: number, argument: number): Complex =>
  complex(modulus * Math.cos(argument), modulus * Math.sin(argument));

/**
 * Sum.
 *
 * @returns The sum.
 * @example
 *   add(complex(1, 2), complex(3)); // 4 + 2j
 */
export const add = (a: Complex, b: Complex): Complex => complex(a.re + b.re, a.im + b.im);

/**
 * Difference.
 *
 * @returns The difference.
 * @example
 *   subtract(complex(1, 2), complex(3)); // -2 + 2j
 */
export const subtract = (a: Complex, b: Complex): Complex => complex(a.re - b.re, a.im - b.im);

/**
 * Product.
 *
 * @returns The product.
 * @example
 *   multiply(complex(0, 1), complex(0, 1)); // -1 + 0j
 */
export const multiply = (a: Complex, b: Complex): Complex =>
  complex(a.re * b.re - a.im * b.im, a.re * b.im + a.im * b.re);

/**
 * Product with a real number.
 *
 * @returns The product.
 * @example
 *   scale(complex(1, 2), 3); // 3 + 6j
 */
export const scale = (a: Complex, factor: number): Complex => complex(a.re * factor, a.im * factor);

/**
 * Quotient; not finite when the divisor is 0.
 *
 * @returns The quotient.
 * @example
 *   divide(complex(1), complex(0, 1)); // 0 - 1j
 */
export function divide(a: Complex, b: Complex): Complex {
  const square = b.re * b.re + b.im * b.im;
  return complex((a.re * b.re + a.im * b.im) / square, (a.im * b.re - a.re * b.im) / square);
}

/**
 * Modulus.
 *
 * @returns A real number, not negative.
 * @example
 *   modulus(complex(3, 4)); // 5
 */
export const modulus = (a: Complex): number => Math.hypot(a.re, a.im);

/**
 * Principal square root.
 *
 * @returns The root whose real part is not negative.
 * @example
 *   squareRoot(complex(-4)); // 0 + 2j
 */
export function squareRoot(a: Complex): Complex {
  const size = modulus(a);
  const re = Math.sqrt((size + Math.abs(a.re)) / 2);
  if (re === 0) return complex(0);
  const im = Math.abs(a.im) / (2 * re);
  const sign = a.im < 0 ? -1 : 1;
  return a.re >= 0 ? complex(re, sign * im) : complex(im, sign * re);
}

/**
 * Principal natural logarithm.
 *
 * @returns The logarithm, its imaginary part within pi.
 * @example
 *   logarithm(complex(-1)); // 0 + 3.14159j
 */
export const logarithm = (a: Complex): Complex =>
  complex(Math.log(modulus(a)), Math.atan2(a.im, a.re));

/**
 * Sine.
 *
 * @returns The sine.
 * @example
 *   sine(complex(0, 1)); // 0 + 1.1752j
 */
export const sine = (a: Complex): Complex =>
  complex(Math.sin(a.re) * Math.cosh(a.im), Math.cos(a.re) * Math.sinh(a.im));

/**
 * Cosine.
 *
 * @returns The cosine.
 * @example
 *   cosine(complex(0, 1)); // 1.54308 + 0j
 */
export const cosine = (a: Complex): Complex =>
  complex(Math.cos(a.re) * Math.cosh(a.im), -Math.sin(a.re) * Math.sinh(a.im));

/**
 * Principal inverse tangent, `ln[(1 + ja)/(1 - ja)] / 2j`; the branch points are +j and -j.
 *
 * @returns The inverse tangent.
 * @example
 *   inverseTangent(complex(1)); // 0.785398 + 0j
 */
export function inverseTangent(a: Complex): Complex {
  const quotient = divide(complex(1 - a.im, a.re), complex(1 + a.im, -a.re));
  const half = logarithm(quotient);
  return complex(half.im / 2, -half.re / 2);
}
