/**
 * The Airy function near the negative real axis, where the modes of the spherical earth lie.
 *
 * @module radio/mathematics/airy
 */
import {
  add,
  complex,
  type Complex,
  cosine,
  divide,
  modulus,
  multiply,
  scale,
  sine,
  squareRoot,
  subtract,
} from './complex.ts';

/** The Airy function and its derivative at one point. */
export interface Airy {
  readonly value: Complex;
  readonly derivative: Complex;
}

/** Ai(0) and -Ai'(0). */
const AI_0 = 0.355028053887817239;
const MINUS_AI_PRIME_0 = 0.258819403792806798;

/** Modulus from which the asymptotic series is the better of the two. */
const ASYMPTOTIC_FROM = 7.5;

/** Terms of the Taylor series below this no longer change the sum: Ai is of the order of 0.1. */
const NEGLIGIBLE = 1e-18;

/** Coefficients c and d of the asymptotic series, an even and an odd order together. */
const ASYMPTOTIC = asymptoticPairs(7);

/**
 * Airy function Ai and its derivative.
 *
 * Taylor series about 0 below a modulus of 7.5, asymptotic series for negative argument above.
 * Source: Abramowitz and Stegun, Handbook of Mathematical Functions, 1964, equations 10.4.2 and
 * 10.4.60, 10.4.62, from memory, not re-read; checked against scipy.special.airy.
 *
 * @param z Argument; above a modulus of 7.5 within 90 degrees of the negative real axis.
 * @returns Ai(z) and Ai'(z), within 1e-9 of their envelope.
 * @throws {RangeError} If z is large and on the positive side.
 * @example
 *   airy(complex(-1)).value; // 0.535561 + 0j
 */
export function airy(z: Complex): Airy {
  if (modulus(z) < ASYMPTOTIC_FROM) return taylorSeries(z);
  if (!(z.re <= 0)) throw new RangeError('a large argument must lie on the negative side');
  return asymptoticSeries(scale(z, -1));
}

function taylorSeries(z: Complex): Airy {
  const square = multiply(z, z);
  let even = complex(AI_0);
  let odd = scale(z, -MINUS_AI_PRIME_0);
  let value = add(even, odd);
  let derivative = complex(-MINUS_AI_PRIME_0);
  for (let power = 3; modulus(even) + modulus(odd) > NEGLIGIBLE; power += 3) {
    const evenSlope = scale(multiply(even, square), 1 / (power - 1));
    const oddSlope = scale(multiply(odd, square), 1 / power);
    even = scale(multiply(evenSlope, z), 1 / power);
    odd = scale(multiply(oddSlope, z), 1 / (power + 1));
    value = add(value, add(even, odd));
    derivative = add(derivative, add(evenSlope, oddSlope));
  }
  return { value, derivative };
}

/** Ai(-zeta) and Ai'(-zeta) for zeta large and on the positive side. */
function asymptoticSeries(zeta: Complex): Airy {
  const root = squareRoot(zeta);
  const fourthRoot = squareRoot(root);
  const xi = scale(multiply(zeta, root), 2 / 3);
  const phase = add(xi, complex(Math.PI / 4));
  const [sin, cos] = [sine(phase), cosine(phase)];
  const [cEven, cOdd, dEven, dOdd] = asymptoticSums(divide(complex(1), xi));
  const value = subtract(multiply(sin, cEven), multiply(cos, cOdd));
  const derivative = add(multiply(cos, dEven), multiply(sin, dOdd));
  const factor = 1 / Math.sqrt(Math.PI);
  return {
    value: scale(divide(value, fourthRoot), factor),
    derivative: scale(multiply(derivative, fourthRoot), -factor),
  };
}

interface AsymptoticPair {
  readonly cEven: number;
  readonly cOdd: number;
  readonly dEven: number;
  readonly dOdd: number;
}

function asymptoticSums(inverse: Complex): [Complex, Complex, Complex, Complex] {
  let [cEven, cOdd, dEven, dOdd] = [complex(0), complex(0), complex(0), complex(0)];
  let power = complex(1);
  for (const pair of ASYMPTOTIC) {
    cEven = add(cEven, scale(power, pair.cEven));
    dEven = add(dEven, scale(power, pair.dEven));
    power = multiply(power, inverse);
    cOdd = add(cOdd, scale(power, pair.cOdd));
    dOdd = add(dOdd, scale(power, pair.dOdd));
    power = multiply(power, inverse);
  }
  return [cEven, cOdd, dEven, dOdd];
}

function asymptoticPairs(count: number): AsymptoticPair[] {
  let c = 1;
  const next = (order: number): number =>
    (c *= ((6 * order - 5) * (6 * order - 3) * (6 * order - 1)) / (216 * order * (2 * order - 1)));
  const d = (order: number, of: number): number => (-(6 * order + 1) / (6 * order - 1)) * of;
  return Array.from({ length: count }, (_, pair) => {
    const sign = pair % 2 === 0 ? 1 : -1;
    const cEven = sign * (pair === 0 ? 1 : next(2 * pair));
    const cOdd = sign * next(2 * pair + 1);
    return { cEven, cOdd, dEven: d(2 * pair, cEven), dOdd: d(2 * pair + 1, cOdd) };
  });
}
