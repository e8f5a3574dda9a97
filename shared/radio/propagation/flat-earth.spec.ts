import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { flatEarthAttenuation } from './flat-earth.ts';
import { type GroundConstants, GROUNDS } from './ground.ts';
import { hertz, metres } from '../units.ts';

const anyGround = fc.constantFrom<GroundConstants>(...Object.values(GROUNDS));

describe('flatEarthAttenuation', () => {
  it('is -18.26 dB at 50 km over average ground on 1 MHz', () => {
    expect(flatEarthAttenuation(hertz(1_000_000), GROUNDS.average, metres(50_000))).toBeCloseTo(
      -18.26,
      2,
    );
  });

  it('is nothing at 1 km over sea', () => {
    expect(flatEarthAttenuation(hertz(500_000), GROUNDS.sea, metres(1000))).toBeCloseTo(0, 1);
  });

  it('ends in -1 / 2w: 20 dB a decade of distance over poor ground at high frequency', () => {
    const at = (m: number) => flatEarthAttenuation(hertz(30_000_000), GROUNDS.poor, metres(m));

    expect(at(10_000) - at(100_000)).toBeCloseTo(20, 1);
  });

  it('is finite, and never above 0.2 dB', () => {
    const frequency = fc.integer({ min: 1000, max: 1_000_000_000 });
    const distance = fc.double({ min: 1000, max: 250_000, noNaN: true });
    fc.assert(
      fc.property(frequency, anyGround, distance, (f, ground, d) => {
        const attenuation = flatEarthAttenuation(hertz(f), ground, metres(d));

        expect(Number.isFinite(attenuation)).toBe(true);
        expect(attenuation).toBeLessThan(0.2);
      }),
    );
  });
});
