import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { airy } from '../mathematics/airy.ts';
import {
  add,
  complex,
  type Complex,
  divide,
  modulus,
  multiply,
  polar,
  scale,
  subtract,
} from '../mathematics/complex.ts';
import { modeRoot } from './earth-modes.ts';

/** What grounds make of p: its argument lies between 30 degrees (dielectric) and 75 (conductor). */
const anyP = fc
  .record({
    size: fc.double({ min: 0, max: 200, noNaN: true }),
    angle: fc.double({ min: Math.PI / 6, max: (5 * Math.PI) / 12, noNaN: true }),
  })
  .map(({ size, angle }) => polar(size, angle));

/** Oracle: the root followed from p = 0 along dz/dp = 1 / (z - p^2), the plain way. */
function followedRoot(order: number, p: Complex, steps: number): Complex {
  const step = scale(p, 1 / steps);
  const slope = (z: Complex, at: Complex) => divide(step, subtract(z, multiply(at, at)));
  let z = modeRoot(order, complex(0));
  for (let index = 0; index < steps; index++) {
    const from = scale(p, index / steps);
    const middle = scale(p, (index + 0.5) / steps);
    const k1 = slope(z, from);
    const k2 = slope(add(z, scale(k1, 0.5)), middle);
    const k3 = slope(add(z, scale(k2, 0.5)), middle);
    const k4 = slope(add(z, k3), scale(p, (index + 1) / steps));
    z = add(z, scale(add(add(k1, k4), scale(add(k2, k3), 2)), 1 / 6));
  }
  return z;
}

describe('modeRoot', () => {
  // Source [M]: Abramowitz and Stegun, Handbook of Mathematical Functions, 1964, table 10.13.
  it.each([
    [1, -1.01879297],
    [2, -3.2481976],
    [3, -4.8200992],
    [10, -12.3847884],
  ])("of order %i is the zero %f of Ai' over a perfect conductor", (order, zero) => {
    expect(modeRoot(order, complex(0)).re).toBeCloseTo(zero, 5);
  });

  it.each([
    [1, -2.33810741],
    [2, -4.08794944],
    [10, -12.8287767],
  ])('of order %i goes to the zero %f of Ai where p is large', (order, zero) => {
    expect(modeRoot(order, polar(1e7, 1)).re).toBeCloseTo(zero, 5);
  });

  it('fulfils the boundary condition', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 400 }), anyP, (order, p) => {
        const { value, derivative } = airy(modeRoot(order, p));
        const size = modulus(derivative) + (1 + modulus(p)) * modulus(value);

        expect(modulus(subtract(derivative, multiply(p, value))) / size).toBeLessThan(1e-7);
      }),
    );
  });

  it('is the root that follows from the perfect conductor, none skipped', () => {
    const order = fc.integer({ min: 1, max: 60 });
    fc.assert(
      fc.property(order, anyP, (s, p) => {
        const followed = followedRoot(s, p, 40 + Math.ceil(40 * modulus(p)));

        expect(modulus(subtract(modeRoot(s, p), followed))).toBeLessThan(0.01);
      }),
      { numRuns: 60 },
    );
  });

  it('refuses an order that is none', () => {
    expect(() => modeRoot(0, complex(0))).toThrow(RangeError);
    expect(() => modeRoot(1.5, complex(0))).toThrow(RangeError);
  });
});
