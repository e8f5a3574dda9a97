import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { coupledPairCrossing, coupledPairRejection, unequalPairRejection } from './coupled-pair.ts';

const x = fc.double({ min: -50, max: 50, noNaN: true });
const coupling = fc.double({ min: 0.1, max: 5, noNaN: true });

describe('coupledPairRejection', () => {
  it('gives the values of the examples', () => {
    expect(coupledPairRejection(Math.SQRT2, 1)).toBeCloseTo(3.0103, 4);
    expect(unequalPairRejection(2, 2, 1)).toBeCloseTo(6.9897, 4);
    expect(unequalPairRejection(2, 2, 1)).toBeCloseTo(coupledPairRejection(2, 1), 9);
    expect(coupledPairCrossing(10 * Math.log10(2), 1)).toBeCloseTo(Math.SQRT2, 5);
  });

  it('is 0 at the centre, the same on both sides, and for critical coupling 10 log(1 + x^4/4)', () => {
    fc.assert(
      fc.property(x, coupling, (offset, kappa) => {
        expect(coupledPairRejection(0, kappa)).toBeCloseTo(0, 9);
        expect(coupledPairRejection(-offset, kappa)).toBe(coupledPairRejection(offset, kappa));
        expect(coupledPairRejection(offset, 1)).toBeCloseTo(
          10 * Math.log10(1 + offset ** 4 / 4),
          6,
        );
      }),
    );
  });

  it('peaks at sqrt(kappa^2 - 1) when over-coupled', () => {
    const peak = Math.sqrt(2 ** 2 - 1);

    expect(coupledPairRejection(peak, 2)).toBeLessThan(0);
    expect(coupledPairRejection(peak, 2)).toBeLessThan(coupledPairRejection(peak + 0.01, 2));
    expect(coupledPairRejection(peak, 2)).toBeLessThan(coupledPairRejection(peak - 0.01, 2));
  });

  it('refuses a coupling or a rejection that is not above 0', () => {
    expect(() => coupledPairRejection(1, 0)).toThrow(/coupling must be above 0/);
    expect(() => coupledPairCrossing(0, 1)).toThrow(/rejectionDb must be above 0/);
  });
});

describe('coupledPairCrossing', () => {
  it('is where the rejection is reached for the last time', () => {
    const db = fc.double({ min: 0.5, max: 80, noNaN: true });
    fc.assert(
      fc.property(db, coupling, (rejection, kappa) => {
        const crossing = coupledPairCrossing(rejection, kappa);

        expect(coupledPairRejection(crossing, kappa)).toBeCloseTo(rejection, 6);
        expect(coupledPairRejection(crossing * 1.01, kappa)).toBeGreaterThan(rejection);
      }),
    );
  });
});
