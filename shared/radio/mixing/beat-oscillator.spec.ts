import { describe, expect, it } from 'vitest';

import { capacitanceChange } from './beat-oscillator.ts';

describe('capacitanceChange', () => {
  it('gives the value of its example, and nothing for no change', () => {
    expect(capacitanceChange(455_000, 470_000)).toBeCloseTo(-0.06281, 5);
    expect(capacitanceChange(455_000, 455_000)).toBe(0);
  });

  it('refuses frequencies that are not above 0', () => {
    expect(() => capacitanceChange(0, 1)).toThrow(/presentHz/);
    expect(() => capacitanceChange(1, NaN)).toThrow(/newHz/);
  });
});
