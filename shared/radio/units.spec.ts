import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { decibels, hertz, metres, powerSum } from './units.ts';

describe('hertz', () => {
  it('takes whole frequencies as they are', () => {
    expect(hertz(455_000)).toBe(455_000);
    expect(hertz(0)).toBe(0);
  });

  it.each([-1, 0.5, NaN, Infinity, 2 ** 53])('refuses %s', (value) => {
    expect(() => hertz(value)).toThrow(/whole number of hertz/);
  });
});

describe('metres', () => {
  it('takes any finite length', () => {
    expect(metres(50_000)).toBe(50_000);
    expect(metres(0.5)).toBe(0.5);
  });

  it.each([-1, NaN, Infinity])('refuses %s', (value) => {
    expect(() => metres(value)).toThrow(/finite number of metres/);
  });
});

describe('powerSum', () => {
  it('adds 3.01 dB for two equal powers', () => {
    expect(powerSum(decibels(60), decibels(60))).toBeCloseTo(63.0103, 4);
  });

  it('is unchanged by nothing', () => {
    expect(powerSum(decibels(60), decibels(-Infinity))).toBe(60);
    expect(powerSum(decibels(-Infinity), decibels(-Infinity))).toBe(-Infinity);
  });

  it('has no order, is at least the larger and at most 3.02 dB more', () => {
    const level = fc.double({ min: -3000, max: 300, noNaN: true }).map(decibels);
    fc.assert(
      fc.property(level, level, (a, b) => {
        const sum = powerSum(a, b);
        expect(sum).toBe(powerSum(b, a));
        expect(sum).toBeGreaterThanOrEqual(Math.max(a, b));
        expect(sum).toBeLessThan(Math.max(a, b) + 3.02);
      }),
    );
  });
});
