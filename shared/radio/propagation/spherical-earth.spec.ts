import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { GROUNDS } from './ground.ts';
import { EFFECTIVE_RADIUS_M, effectiveEarthRadius, ResidueSeries } from './spherical-earth.ts';
import { hertz, metres } from '../units.ts';

describe('effectiveEarthRadius', () => {
  it('is 8729.3 km at 315 N-units, four thirds of the real one nearly', () => {
    expect(EFFECTIVE_RADIUS_M / 1000).toBeCloseTo(8729.3, 1);
    expect(effectiveEarthRadius(250)).toBeLessThan(EFFECTIVE_RADIUS_M);
  });
});

describe('ResidueSeries', () => {
  it('gives -18.54 dB at 50 km over average ground on 1 MHz', () => {
    const series = new ResidueSeries(hertz(1_000_000), GROUNDS.average);

    expect(series.attenuation(metres(50_000))).toBeCloseTo(-18.54, 2);
  });

  it('does not depend on what was asked before', () => {
    const [fresh, used] = [1, 2].map(() => new ResidueSeries(hertz(702_000), GROUNDS.dry));
    used?.attenuation(metres(28_000));
    used?.attenuation(metres(5_000_000));

    expect(used?.attenuation(metres(90_000))).toBe(fresh?.attenuation(metres(90_000)));
  });

  it('falls with distance and is finite up to the other side of the earth', () => {
    const frequency = fc.integer({ min: 1000, max: 1_000_000_000 });
    const ground = fc.constantFrom(...Object.values(GROUNDS));
    const distance = fc.double({ min: 1, max: 1000, noNaN: true });
    fc.assert(
      fc.property(frequency, ground, distance, (f, constants, times) => {
        const series = new ResidueSeries(hertz(f), constants);
        const near = Math.min(20_000_000, (25_000 / Math.cbrt(f / 1e6)) * times);
        const attenuation = series.attenuation(metres(near));

        expect(Number.isFinite(attenuation)).toBe(true);
        expect(series.attenuation(metres(near * 1.05))).toBeLessThan(attenuation);
      }),
    );
  });
});
