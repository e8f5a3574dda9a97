import { describe, expect, it } from 'vitest';

import { ifHarmonics, whistlePitch } from './harmonic-whistles.ts';

describe('ifHarmonics', () => {
  it('gives the value of its example', () => {
    expect(ifHarmonics(455_000, 520_000, 1_710_000)).toEqual([
      { harmonic: 2, dialHz: 910_000 },
      { harmonic: 3, dialHz: 1_365_000 },
    ]);
  });

  it('counts the limits of a band as inside', () => {
    expect(ifHarmonics(455_000, 910_000, 1_365_000)).toHaveLength(2);
    expect(() => ifHarmonics(0, 1, 2)).toThrow(/ifHz/);
  });
});

describe('whistlePitch', () => {
  it('gives the value of its example and moves k times as fast as the tuning', () => {
    expect(whistlePitch(2, 455_000, 909_000, 0)).toBe(1_000);
    expect(whistlePitch(2, 455_000, 911_000, 100)).toBe(800);
    expect(whistlePitch(3, 455_000, 1_366_000, 100)).toBe(700);
  });
});
