import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { complex, modulus, subtract } from './complex.ts';
import { faddeeva } from './faddeeva.ts';

describe('faddeeva', () => {
  it('is 0.304744 + 0.208219j at 1 + j', () => {
    const { re, im } = faddeeva(complex(1, 1));

    expect(re).toBeCloseTo(0.304744, 6);
    expect(im).toBeCloseTo(0.208219, 6);
  });

  it('is 1 at 0 and e^(-x^2) in its real part on the real axis', () => {
    expect(modulus(subtract(faddeeva(complex(0)), complex(1)))).toBeLessThan(1e-12);
    expect(faddeeva(complex(1.5)).re).toBeCloseTo(Math.exp(-2.25), 12);
  });

  it('is mirrored in the imaginary axis: w(-z*) = w(z)*', () => {
    const [x, y] = [
      fc.double({ min: 0, max: 60, noNaN: true }),
      fc.double({ min: 0, max: 60, noNaN: true }),
    ];
    fc.assert(
      fc.property(x, y, (re, im) => {
        const [right, left] = [faddeeva(complex(re, im)), faddeeva(complex(-re, im))];

        expect(left.re).toBeCloseTo(right.re, 12);
        expect(left.im).toBeCloseTo(-right.im, 12);
      }),
    );
  });

  it('refuses the lower half plane, where it would overflow', () => {
    expect(() => faddeeva(complex(1, -0.1))).toThrow(RangeError);
  });
});
