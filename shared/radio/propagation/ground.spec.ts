import { describe, expect, it } from 'vitest';

import { modulus } from '../mathematics/complex.ts';
import { complexPermittivity, GROUNDS, surfaceImpedance, wavelength } from './ground.ts';

describe('wavelength', () => {
  it('is 299.792 m on 1 MHz', () => {
    expect(wavelength(1_000_000)).toBeCloseTo(299.792, 3);
  });
});

describe('complexPermittivity', () => {
  it('is 15 - 89.88j over average ground on 1 MHz', () => {
    const { re, im } = complexPermittivity(1_000_000, GROUNDS.average);

    expect(re).toBe(15);
    expect(im).toBeCloseTo(-89.8755, 3);
  });
});

describe('surfaceImpedance', () => {
  it('is nearly 1 / sqrt(eta) over sea, at 45 degrees as of a conductor', () => {
    const { re, im } = surfaceImpedance(1_000_000, GROUNDS.sea);

    expect(re).toBeCloseTo(0.0023642, 5);
    expect(im / re).toBeCloseTo(1, 2);
  });

  it('is the smaller, the better the ground', () => {
    const sizes = (['sea', 'wet', 'average', 'dry', 'poor'] as const).map((name) =>
      modulus(surfaceImpedance(1_000_000, GROUNDS[name])),
    );

    expect(sizes).toEqual(sizes.toSorted((a, b) => a - b));
  });
});
