import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { airy } from './airy.ts';
import { complex, modulus, multiply, scale, subtract } from './complex.ts';

describe('airy', () => {
  it('is 0.535561 at -1', () => {
    expect(airy(complex(-1)).value.re).toBeCloseTo(0.535561, 6);
  });

  it("solves its equation: Ai'' = z Ai, on both sides of the change of series", () => {
    const z = fc
      .record({
        re: fc.double({ min: -40, max: -0.1, noNaN: true }),
        im: fc.double({ min: -4, max: 4, noNaN: true }),
      })
      .filter((each) => Math.abs(modulus(each) - 7.5) > 0.01);
    const step = 1e-3;
    fc.assert(
      fc.property(z, (at) => {
        const [after, before] = [step, -step].map(
          (by) => airy(complex(at.re + by, at.im)).derivative,
        ) as [typeof at, typeof at];
        const second = scale(subtract(after, before), 1 / (2 * step));
        const expected = multiply(at, airy(at).value);
        const envelope = modulus(expected) + modulus(airy(at).derivative) * Math.sqrt(modulus(at));

        expect(modulus(subtract(second, expected)) / envelope).toBeLessThan(1e-4);
      }),
    );
  });

  it('has no step where the series change', () => {
    fc.assert(
      fc.property(fc.double({ min: Math.PI * 0.7, max: Math.PI * 1.3, noNaN: true }), (angle) => {
        const at = (size: number) =>
          airy(complex(size * Math.cos(angle), size * Math.sin(angle))).value;
        const [below, above] = [at(7.5 - 1e-9), at(7.5 + 1e-9)];

        expect(modulus(subtract(above, below)) / modulus(above)).toBeLessThan(1e-6);
      }),
    );
  });

  it('refuses large arguments on the positive side', () => {
    expect(() => airy(complex(10))).toThrow(RangeError);
  });
});
