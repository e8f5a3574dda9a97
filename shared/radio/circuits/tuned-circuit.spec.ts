import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { circuitRejection, detuning } from './tuned-circuit.ts';

const hz = fc.integer({ min: 1_000, max: 30_000_000 });
const q = fc.double({ min: 1, max: 300, noNaN: true });

describe('detuning', () => {
  it('gives the value of its example', () => {
    expect(detuning(1_910_000, 1_000_000)).toBeCloseTo(1.38644, 5);
  });

  it('is the same, with the other sign, at the mirrored frequency', () => {
    fc.assert(
      fc.property(hz, hz, (f, f0) => {
        expect(detuning((f0 * f0) / f, f0)).toBeCloseTo(-detuning(f, f0), 6);
      }),
    );
  });
});

describe('circuitRejection', () => {
  it('gives the value of its example', () => {
    expect(circuitRejection(1_910_000, 1_000_000, 100, 1)).toBeCloseTo(42.838, 3);
  });

  it('is 0 at resonance, and grows with Q and with every circuit', () => {
    fc.assert(
      fc.property(hz, hz, q, fc.integer({ min: 0, max: 5 }), (f, f0, quality, circuits) => {
        const one = circuitRejection(f, f0, quality, circuits);

        expect(circuitRejection(f0, f0, quality, circuits)).toBe(0);
        expect(circuitRejection(f, f0, quality, circuits + 1)).toBeGreaterThanOrEqual(one);
        expect(circuitRejection(f, f0, quality + 1, circuits)).toBeGreaterThanOrEqual(one);
      }),
    );
  });

  it('refuses a Q or a frequency that is not above 0, and half a circuit', () => {
    expect(() => circuitRejection(1e6, 1e6, 0, 1)).toThrow(/q must be above 0/);
    expect(() => circuitRejection(0, 1e6, 80, 1)).toThrow(/frequencyHz/);
    expect(() => circuitRejection(1e6, -1, 80, 1)).toThrow(/resonanceHz/);
    expect(() => circuitRejection(1e6, 1e6, 80, 1.5)).toThrow(/circuits/);
    expect(() => circuitRejection(1e6, 1e6, NaN, 1)).toThrow(RangeError);
  });
});
