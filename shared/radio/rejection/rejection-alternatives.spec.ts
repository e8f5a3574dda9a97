import { describe, expect, it } from 'vitest';

import { plainBand, plainReceiver } from '../../../test/support/plain-sets.ts';
import type { Receiver } from '../receiver.ts';
import { type RejectionChange, rejectionAlternatives } from './rejection-alternatives.ts';

const circuit = { qLow: 50, qHigh: 50 };
const broadcast = plainBand({ lowHz: 550_000, highHz: 1_400_000, circuits: [circuit] });
const set = plainReceiver({ ifHz: 455_000, strayDb: null, trap: null, bands: [broadcast] });

const pointsOf = (receiver: Receiver, change: RejectionChange) =>
  rejectionAlternatives(receiver, 0).find((each) => each.change === change)?.points ??
  expect.fail(`${change} is missing`);

describe('rejection of a band after a change', () => {
  it('is as in the published figures before any', () => {
    // C: IF 455, one circuit Q 50; dial 550 and 1400, computed independently with scipy.
    const points = pointsOf(set, 'as-it-is');

    expect(points[0]?.ifDb).toBeCloseTo(25.622, 3);
    expect(points.at(-1)?.ifDb).toBeCloseTo(42.772, 3);
  });

  it('doubles with a second circuit as good as the first', () => {
    const before = pointsOf(set, 'as-it-is');

    pointsOf(set, 'one-more-circuit').forEach(({ imageDb, ifDb }, index) => {
      expect(imageDb).toBeCloseTo(2 * (before[index]?.imageDb ?? NaN), 9);
      expect(ifDb).toBeCloseTo(2 * (before[index]?.ifDb ?? NaN), 9);
    });
  });

  it('rises by up to 3.52 dB with a Q half as high again, far from resonance', () => {
    const before = pointsOf(set, 'as-it-is').at(-1)?.imageDb ?? NaN;
    const after = pointsOf(set, 'higher-q').at(-1)?.imageDb ?? NaN;

    // 20 log10 1.5 is the limit for Q rho much above 1.
    expect(after - before).toBeLessThan(20 * Math.log10(1.5));
    expect(after - before).toBeGreaterThan(3.5);
  });

  it('changes the image alone with the oscillator on the other side', () => {
    const before = pointsOf(set, 'as-it-is');
    const after = pointsOf(set, 'other-side');

    expect(after.map(({ ifDb }) => ifDb)).toEqual(before.map(({ ifDb }) => ifDb));
    expect(after[0]?.imageDb).not.toBeCloseTo(before[0]?.imageDb ?? NaN, 1);
  });

  it('rises at the IF with a trap, all along the dial', () => {
    const before = pointsOf(set, 'as-it-is');

    pointsOf(set, 'trap').forEach(({ ifDb }, index) => {
      expect(ifDb).toBeGreaterThan((before[index]?.ifDb ?? NaN) + 5);
    });
  });

  it('is limited by stray pick-up, and shows what is behind it', () => {
    const leaky = { ...set, strayDb: { if: 20, image: 20 } };

    expect(pointsOf(leaky, 'one-more-circuit').every(({ ifDb }) => ifDb === 20)).toBe(true);
    expect(pointsOf(leaky, 'no-stray')).toEqual(pointsOf(set, 'as-it-is'));
  });

  it('leaves out what cannot be made', () => {
    const longWave = plainBand({ lowHz: 150_000, highHz: 285_000, circuits: [] });
    const bare = { ...set, bands: [longWave] };

    expect(rejectionAlternatives(bare, 0).map(({ change }) => change)).toEqual([
      'as-it-is',
      'one-more-circuit',
      'trap',
    ]);
  });

  it('refuses a band that is not there', () => {
    expect(() => rejectionAlternatives(set, 4)).toThrow('there is no band 4');
  });
});
