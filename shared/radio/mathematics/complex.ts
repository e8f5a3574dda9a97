/**
 * Complex numbers, as few operations as the wave propagation formulas need.
 *
 * @module radio/mathematics/complex
 */

/** A complex number, `re + j im`. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

/** @example complex(1, 2); // 1 + 2j */
export const complex = (re: number, im = 0): Complex => ({ re, im });

/** @example polar(2, Math.PI / 2); // 2j */
export const polar = (modulus: number, argument: number): Complex =>
  complex(modulus * Math.cos(argument), modulus * Math.sin(argument));

/** @example add(complex(1, 2), complex(3)); // 4 + 2j */
export const add = (a: Complex, b: Complex): Complex => complex(a.re + b.re, a.im + b.im);

/** @example subtract(complex(1, 2), complex(3)); // -2 + 2j */
export const subtract = (a: Complex, b: Complex): Complex => complex(a.re - b.re, a.im - b.im);

/** @example multiply(complex(0, 1), complex(0, 1)); // -1 */
export const multiply = (a: Complex, b: Complex): Complex =>
  complex(a.re * b.re - a.im * b.im, a.re * b.im + a.im * b.re);

/** @example scale(complex(1, 2), 3); // 3 + 6j */
export const scale = (a: Complex, factor: number): Complex => complex(a.re * factor, a.im * factor);

/** @example divide(complex(1), complex(0, 1)); // -1j */
export function divide(a: Complex, b: Complex): Complex {
  const square = b.re * b.re + b.im * b.im;
  return complex((a.re * b.re + a.im * b.im) / square, (a.im * b.re - a.re * b.im) / square);
}

/** @example modulus(complex(3, 4)); // 5 */
export const modulus = (a: Complex): number => Math.hypot(a.re, a.im);

/** Principal square root, real part from 0. @example squareRoot(complex(-4)); // 2j */
export function squareRoot(a: Complex): Complex {
  const size = modulus(a);
  const re = Math.sqrt((size + Math.abs(a.re)) / 2);
  if (re === 0) return complex(0);
  const im = Math.abs(a.im) / (2 * re);
  const sign = a.im < 0 ? -1 : 1;
  return a.re >= 0 ? complex(re, sign * im) : complex(im, sign * re);
}

/** Principal logarithm. @example logarithm(complex(-1)); // 3.14159j */
export const logarithm = (a: Complex): Complex =>
  complex(Math.log(modulus(a)), Math.atan2(a.im, a.re));

/** @example sine(complex(0, 1)); // 1.1752j */
export const sine = (a: Complex): Complex =>
  complex(Math.sin(a.re) * Math.cosh(a.im), Math.cos(a.re) * Math.sinh(a.im));

/** @example cosine(complex(0, 1)); // 1.54308 */
export const cosine = (a: Complex): Complex =>
  complex(Math.cos(a.re) * Math.cosh(a.im), -Math.sin(a.re) * Math.sinh(a.im));

/**
 * Principal inverse tangent, `ln[(1 + ja)/(1 - ja)] / 2j`; the branch points are +j and -j.
 *
 * @example inverseTangent(complex(1)); // 0.785398
 */
export function inverseTangent(a: Complex): Complex {
  const quotient = divide(complex(1 - a.im, a.re), complex(1 + a.im, -a.re));
  const half = logarithm(quotient);
  return complex(half.im / 2, -half.re / 2);
}
