import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { GRADES, grade, ratioBelow } from './grades.ts';

const ratio = fc.double({ min: -60, max: 100, noNaN: true });
const services = fc.constantFrom('broadcast', 'beacon', 'marine', 'telegraphy');

describe('grade', () => {
  it('gives the value of its example', () => {
    expect(grade('broadcast', 28, 30)).toBe('slightly-annoying');
  });

  it.each([
    [40, 'imperceptible'],
    [30, 'perceptible'],
    [26, 'slightly-annoying'],
    [17, 'annoying'],
    [16.999, 'very-annoying'],
  ] as const)('puts a limit with the better grade: broadcast, %d dB: %s', (db, word) => {
    expect(grade('broadcast', db, 26)).toBe(word);
  });

  it('goes by the margin in other services', () => {
    expect([29, 19, 15, 6, 5.9].map((db) => grade('beacon', db, 15))).toEqual(GRADES.slice(1));
  });

  it('never gets worse as the ratio grows', () => {
    fc.assert(
      fc.property(services, ratio, ratio, (service, a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];

        expect(GRADES.indexOf(grade(service, high, 15))).toBeLessThanOrEqual(
          GRADES.indexOf(grade(service, low, 15)),
        );
      }),
    );
  });

  it('refuses what is not a number', () => {
    expect(() => grade('broadcast', NaN, 30)).toThrow(RangeError);
  });
});

describe('ratioBelow', () => {
  it('is the limit below which a ratio is at least as bad as a grade', () => {
    expect(ratioBelow('broadcast', 'slightly-annoying', 30)).toBe(30);
    fc.assert(
      fc.property(services, ratio, fc.constantFrom(...GRADES.slice(1)), (service, db, worst) => {
        const bad = GRADES.indexOf(grade(service, db, 17)) >= GRADES.indexOf(worst);

        expect(db < ratioBelow(service, worst, 17)).toBe(bad);
      }),
    );
  });
});
