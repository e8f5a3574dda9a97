import { describe, expect, it } from 'vitest';

import { mixerLevel, signalOrderLevel } from './product-levels.ts';

describe('mixerLevel', () => {
  it('gives the value of its example and 0 for the converting harmonic', () => {
    expect(mixerLevel(2, 1, 3)).toBe(-6);
    expect([1, 2, 3, 4, 5].map((h) => mixerLevel(h, h, 3))).toEqual([0, 0, 0, 0, 0]);
  });

  it('is relative to the converting harmonic, but for the feedthrough of the IF', () => {
    expect(mixerLevel(1, 2, 3)).toBe(6);
    expect(mixerLevel(0, 2, -20)).toBe(-20);
  });

  it('refuses orders beyond the model', () => {
    expect(() => mixerLevel(6, 1, 3)).toThrow(/m must be 0 to 5/);
    expect(() => mixerLevel(1, 0, 3)).toThrow(/oscillatorHarmonic/);
  });
});

describe('signalOrderLevel', () => {
  it('falls with the order', () => {
    expect([1, 2, 3].map(signalOrderLevel)).toEqual([0, -15, -30]);
    expect(() => signalOrderLevel(4)).toThrow(/n must be 1 to 3/);
  });
});
