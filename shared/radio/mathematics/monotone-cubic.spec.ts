import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { monotoneCubic } from './monotone-cubic.ts';

describe('monotoneCubic', () => {
  it('gives the value of its example and goes through every point', () => {
    const curve = monotoneCubic([0, 1, 2, 5], [0, 1, 4, 4]);

    expect(monotoneCubic([0, 1, 2], [0, 1, 4])(1)).toBe(1);
    expect([0, 1, 2, 5].map(curve)).toEqual([0, 1, 4, 4]);
  });

  it('matches scipy 1.17.1, interpolate.PchipInterpolator', () => {
    const curve = monotoneCubic([0, 3_000, 6_000, 10_000], [0, 6, 30, 60]);

    expect(curve(1_000)).toBeCloseTo(0.844444, 6);
    expect(curve(4_500)).toBeCloseTo(16.292308, 6);
    expect(curve(8_000)).toBeCloseTo(45.26978, 6);
  });

  it('is constant beyond both ends and never leaves the data', () => {
    const points = fc
      .uniqueArray(fc.tuple(fc.integer({ min: 0, max: 1e5 }), fc.integer({ min: 0, max: 90 })), {
        minLength: 1,
        maxLength: 8,
        selector: ([x]) => x,
      })
      .map((drawn) => drawn.toSorted(([a], [b]) => a - b));
    fc.assert(
      fc.property(points, fc.double({ min: -1e4, max: 2e5, noNaN: true }), (drawn, x) => {
        const ys = drawn.map(([, y]) => y);
        const value = monotoneCubic(
          drawn.map(([at]) => at),
          ys,
        )(x);

        expect(value).toBeGreaterThanOrEqual(Math.min(...ys) - 1e-9);
        expect(value).toBeLessThanOrEqual(Math.max(...ys) + 1e-9);
      }),
    );
  });

  it('refuses no points, unequal columns and points out of order', () => {
    expect(() => monotoneCubic([], [])).toThrow(/at least one/);
    expect(() => monotoneCubic([1], [1, 2])).toThrow(RangeError);
    expect(() => monotoneCubic([1, 1], [1, 2])).toThrow(/must ascend/);
  });
});
