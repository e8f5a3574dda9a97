import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import type { Trap } from '../receiver.ts';
import { trapFrequency, trapLoss } from './trap.ts';

const trap: Trap = {
  kind: 'parallel',
  inductanceH: 500e-6,
  capacitanceF: 244.7076e-12,
  q: 100,
  sourceOhms: 400,
  loadOhms: 1000,
};

describe('trapLoss', () => {
  it('gives the values of the examples', () => {
    expect(trapFrequency(trap)).toBeCloseTo(455_000, -1);
    expect(trapLoss(trap, 455_000)).toBeCloseTo(40.265, 3);
  });

  it('is greatest at resonance and never a gain', () => {
    const hz = fc.integer({ min: 10_000, max: 30_000_000 });
    fc.assert(
      fc.property(hz, fc.constantFrom('parallel' as const, 'series' as const), (f, kind) => {
        const loss = trapLoss({ ...trap, kind }, f);

        expect(loss).toBeGreaterThan(0);
        expect(loss).toBeLessThanOrEqual(trapLoss({ ...trap, kind }, trapFrequency(trap)) + 1e-9);
      }),
    );
  });

  it.each(['inductanceH', 'capacitanceF', 'q', 'sourceOhms', 'loadOhms'] as const)(
    'refuses %s of 0',
    (name) => {
      expect(() => trapLoss({ ...trap, [name]: 0 }, 455_000)).toThrow(name);
    },
  );

  it('refuses a frequency of 0', () => {
    expect(() => trapLoss(trap, 0)).toThrow(/frequencyHz/);
  });
});
