import { describe, expect, it } from 'vitest';

import { programmeBands } from './programme.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import { programmeWeighting, toneWeighting } from './weighting.ts';

const narrow = ifSelectivity({ kind: 'widths', b6Hz: 6000, b60Hz: 22000 }, 455e3);

describe('programmeWeighting', () => {
  it('gives the value of its example', () => {
    expect(programmeWeighting(narrow, 3500, programmeBands(4500))(1000)).toBeCloseTo(9.33, 2);
  });

  it('is 0 for the same programme on the same frequency', () => {
    for (const corner of [null, 2000, 3500]) {
      expect(programmeWeighting(narrow, corner, programmeBands(10_000))(0)).toBeCloseTo(0, 9);
    }
  });

  it('falls far outside the passband', () => {
    const weighting = programmeWeighting(narrow, null, programmeBands(4500));

    expect(weighting(20_000)).toBeLessThan(weighting(9_000));
  });

  it('refuses a corner that is not above 0', () => {
    expect(() => programmeWeighting(narrow, 0, programmeBands(4500))).toThrow(/audioCornerHz/);
  });
});

describe('toneWeighting', () => {
  const weighting = toneWeighting(narrow, 1000);

  it('says that a beat of 3 kHz is heard more than one like the wanted', () => {
    expect(weighting(2000)).toBeGreaterThan(weighting(0));
  });

  it('is 0 on the same frequency and finite where one of the two beats vanishes', () => {
    expect(weighting(0)).toBeCloseTo(0, 9);
    expect(Number.isFinite(weighting(1000))).toBe(true);
  });

  it('refuses a pitch of 0', () => {
    expect(() => toneWeighting(narrow, 0)).toThrow(/pitchHz/);
  });
});
