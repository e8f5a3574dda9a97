import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { flatEarthAttenuation } from './flat-earth.ts';
import { flatEarthReach, groundWave } from './ground-wave.ts';
import { GROUNDS } from './ground.ts';
import { ResidueSeries } from './spherical-earth.ts';
import { hertz, metres } from '../units.ts';

const anyGround = fc.constantFrom(...Object.values(GROUNDS));
const anyFrequency = fc.integer({ min: 10_000, max: 30_000_000 }).map(hertz);

describe('groundWave', () => {
  it('is 57.03 dB(uV/m) at 50 km over average ground on 1 MHz', () => {
    expect(groundWave(hertz(1_000_000), GROUNDS.average)(metres(50_000))).toBeCloseTo(57.03, 2);
  });

  it('is 300 mV/m at 1 km over sea, and no more nearer by', () => {
    const wave = groundWave(hertz(500_000), GROUNDS.sea);

    expect(wave(metres(1000))).toBeCloseTo(109.54, 2);
    expect(wave(metres(0))).toBe(wave(metres(1000)));
  });

  it('has no step at the joint, where the two formulas are 0.25 dB apart at most', () => {
    fc.assert(
      fc.property(anyFrequency, anyGround, (frequency, ground) => {
        const wave = groundWave(frequency, ground);
        const joint = flatEarthReach(frequency);
        const flat = flatEarthAttenuation(frequency, ground, joint);
        const spherical = new ResidueSeries(frequency, ground).attenuation(joint);

        expect(Math.abs(flat - spherical)).toBeLessThan(0.25);
        expect(wave(metres(joint - 1e-3)) - wave(joint)).toBeCloseTo(0, 4);
      }),
    );
  });

  it('falls with distance', () => {
    const distance = fc.double({ min: 1000, max: 19_000_000, noNaN: true });
    fc.assert(
      fc.property(anyFrequency, anyGround, distance, (frequency, ground, d) => {
        const wave = groundWave(frequency, ground);

        expect(wave(metres(d * 1.02))).toBeLessThan(wave(metres(d)));
      }),
    );
  });

  it('reaches farther over better ground and on lower frequencies', () => {
    const at = (f: number, ground: keyof typeof GROUNDS) =>
      groundWave(hertz(f), GROUNDS[ground])(metres(150_000));

    expect(at(1_000_000, 'sea')).toBeGreaterThan(at(1_000_000, 'wet'));
    expect(at(1_000_000, 'wet')).toBeGreaterThan(at(1_000_000, 'average'));
    expect(at(1_000_000, 'average')).toBeGreaterThan(at(1_000_000, 'dry'));
    expect(at(200_000, 'average')).toBeGreaterThan(at(1_000_000, 'average'));
  });
});

describe('flatEarthReach', () => {
  it('is 12.5 km on 8 MHz', () => {
    expect(flatEarthReach(hertz(8_000_000))).toBeCloseTo(12_500, 6);
  });
});
