import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { patternGain } from './directional-pattern.ts';

const pattern = fc.array(fc.double({ min: -60, max: 20, noNaN: true }), {
  minLength: 36,
  maxLength: 36,
});
const bearing = fc.double({ min: -720, max: 720, noNaN: true });

describe('patternGain', () => {
  it('is the table at its own bearings, and closes the circle', () => {
    const table = Array.from({ length: 36 }, (_, index) => -index);

    expect([0, 10, 350, 360, -10].map((each) => patternGain(table, each))).toEqual([
      -0, -1, -35, -0, -35,
    ]);
    expect(patternGain(table, 355)).toBeCloseTo(-17.5, 12);
  });

  it('turns with the aerial', () => {
    fc.assert(
      fc.property(pattern, bearing, (table, towards) => {
        const turned = [...table.slice(-1), ...table.slice(0, -1)];

        expect(patternGain(turned, towards + 10)).toBeCloseTo(patternGain(table, towards), 6);
      }),
    );
  });

  it('never leaves the span of the two neighbours, nor jumps', () => {
    fc.assert(
      fc.property(pattern, bearing, (table, towards) => {
        const gain = patternGain(table, towards);

        expect(gain).toBeGreaterThanOrEqual(Math.min(...table) - 1e-9);
        expect(gain).toBeLessThanOrEqual(Math.max(...table) + 1e-9);
        expect(Math.abs(patternGain(table, towards + 0.001) - gain)).toBeLessThan(0.0081);
      }),
    );
  });

  it('refuses a table of another length and what is no number', () => {
    expect(() => patternGain([0, 0], 0)).toThrow(RangeError);
    expect(() => patternGain(Array<number>(36).fill(NaN), 0)).toThrow(RangeError);
    expect(() => patternGain(Array<number>(36).fill(0), NaN)).toThrow(RangeError);
  });
});
