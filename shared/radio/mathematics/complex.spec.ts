import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  add,
  complex,
  type Complex,
  cosine,
  divide,
  inverseTangent,
  logarithm,
  modulus,
  multiply,
  polar,
  scale,
  sine,
  squareRoot,
  subtract,
} from './complex.ts';

const part = fc.double({ min: -20, max: 20, noNaN: true });
const anyNumber = fc.record({ re: part, im: part }).filter((z) => modulus(z) > 1e-3);

function expectClose(found: Complex, expected: Complex): void {
  const size = Math.max(1, modulus(expected));
  expect(modulus(subtract(found, expected)) / size).toBeLessThan(1e-9);
}

describe('complex arithmetic', () => {
  it('does what its examples say', () => {
    expectClose(polar(2, Math.PI / 2), complex(0, 2));
    expectClose(add(complex(1, 2), complex(3)), complex(4, 2));
    expectClose(subtract(complex(1, 2), complex(3)), complex(-2, 2));
    expectClose(multiply(complex(0, 1), complex(0, 1)), complex(-1));
    expectClose(scale(complex(1, 2), 3), complex(3, 6));
    expectClose(divide(complex(1), complex(0, 1)), complex(0, -1));
    expect(modulus(complex(3, 4))).toBe(5);
    expectClose(squareRoot(complex(-4)), complex(0, 2));
    expectClose(logarithm(complex(-1)), complex(0, Math.PI));
    expectClose(sine(complex(0, 1)), complex(0, Math.sinh(1)));
    expectClose(cosine(complex(0, 1)), complex(Math.cosh(1)));
    expectClose(inverseTangent(complex(1)), complex(Math.PI / 4));
  });

  it('undoes what it did', () => {
    fc.assert(
      fc.property(anyNumber, anyNumber, (a, b) => {
        expectClose(divide(multiply(a, b), b), a);
        expectClose(multiply(squareRoot(a), squareRoot(a)), a);
        expect(squareRoot(a).re).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it('keeps sine and cosine on the unit circle', () => {
    const near = fc.record({ re: part, im: fc.double({ min: -3, max: 3, noNaN: true }) });
    fc.assert(
      fc.property(near, (z) => {
        const [s, c] = [sine(z), cosine(z)];
        expectClose(add(multiply(s, s), multiply(c, c)), complex(1));
      }),
    );
  });

  it('turns a tangent back', () => {
    const near = fc.record({
      re: fc.double({ min: -1.4, max: 1.4, noNaN: true }),
      im: fc.double({ min: -3, max: 3, noNaN: true }),
    });
    fc.assert(
      fc.property(near, (z) => {
        const back = inverseTangent(divide(sine(z), cosine(z)));
        // tanh saturates: at 3 a digit of the argument takes 400 of the tangent.
        expect(modulus(subtract(back, z))).toBeLessThan(1e-9);
      }),
    );
  });

  it('takes the root of 0', () => {
    expect(squareRoot(complex(0))).toEqual(complex(0));
  });
});
