import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { plainBand, plainReceiver } from '../../../test/support/plain-sets.ts';
import { FrontEnd, qAt } from './front-end.ts';
import { trapFrequency } from './trap.ts';

const band = plainBand({
  circuits: [
    { qLow: 55, qHigh: 60 },
    { qLow: 90, qHigh: 70 },
  ],
});
const trap = {
  kind: 'parallel',
  inductanceH: 50e-6,
  capacitanceF: 1.615e-9,
  q: 100,
  sourceOhms: 400,
  loadOhms: 1000,
} as const;
const hz = fc.integer({ min: 100_000, max: 10_000_000 });
const dial = fc.integer({ min: band.lowHz, max: band.highHz });

describe('FrontEnd', () => {
  const plain = new FrontEnd(plainReceiver(), band);
  const trapped = new FrontEnd(plainReceiver({ trap }), band);

  it('is 0 at the dial setting, and its lines add up everywhere', () => {
    fc.assert(
      fc.property(hz, dial, (f, fs) => {
        for (const frontEnd of [plain, trapped]) {
          const lines = frontEnd.lines(f, fs);

          expect(frontEnd.rejectionDb(fs, fs)).toBeCloseTo(0, 9);
          expect(lines.reduce((sum, { lossDb }) => sum + lossDb, 0)).toBeCloseTo(
            frontEnd.rejectionDb(f, fs),
            6,
          );
        }
      }),
    );
  });

  it('counts the trap less what it costs at the dial setting', () => {
    const at = trapFrequency(trap);

    expect(trapped.rejectionDb(at, 1_500_000)).toBeGreaterThan(plain.rejectionDb(at, 1_500_000));
    expect(trapped.lines(at, 1_500_000).map(({ term }) => term)).toEqual([
      'circuit-1',
      'circuit-2',
      'trap',
    ]);
  });

  it('knows bounds of its rejection', () => {
    fc.assert(
      fc.property(hz, dial, (f, fs) => {
        expect(10 * Math.log10(trapped.leastFactor(f, fs))).toBeLessThanOrEqual(
          trapped.circuitsDb(f, fs) + 1e-9,
        );
        expect(trapped.fixedDb(fs)).toBeLessThanOrEqual(trapped.greatestFixedDb + 1e-9);
      }),
    );
  });

  it('refuses a band upside down and a Q of 0', () => {
    const upsideDown = plainBand({ lowHz: 2, highHz: 1 });
    const dead = plainBand({ circuits: [{ qLow: 80, qHigh: 0 }] });

    expect(() => new FrontEnd(plainReceiver(), upsideDown)).toThrow(/highHz/);
    expect(() => new FrontEnd(plainReceiver(), dead)).toThrow(/Q must be above 0/);
  });
});

describe('qAt', () => {
  it('gives the value of its example', () => {
    const limits = { lowHz: 500_000, highHz: 1_500_000 };

    expect(qAt({ qLow: 50, qHigh: 70 }, limits, 1_000_000)).toBe(60);
  });
});
