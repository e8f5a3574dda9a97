import { describe, expect, it } from 'vitest';

import { dialSolution } from './dial-settings.ts';

describe('dialSolution', () => {
  it('gives the value of its example', () => {
    expect(dialSolution(1_900_000 - 455_000, 1, 1, 455_000)).toBe(990_000);
  });

  it('is a real number where the product moves faster than the dial', () => {
    expect(dialSolution(2_000_000, 3, 1, 455_000)).toBeCloseTo(211_666.667, 3);
    expect(dialSolution(1_000_000, 1, 2, -455_000)).toBe(2_455_000);
  });
});
