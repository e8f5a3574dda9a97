import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { earWeighting, earWeightingPower } from './ear-weighting.ts';

describe('earWeighting', () => {
  it('gives the values of the examples', () => {
    expect(earWeighting(6300)).toBeCloseTo(12.2, 1);
    expect(earWeightingPower(0)).toBe(0);
    expect(earWeighting(0)).toBe(-Infinity);
  });

  it('is the same as a level and as a power', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 30_000, noNaN: true }), (hz) => {
        expect(10 * Math.log10(earWeightingPower(hz))).toBeCloseTo(earWeighting(hz), 9);
      }),
    );
  });
});
