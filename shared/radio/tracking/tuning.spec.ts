import { describe, expect, it } from 'vitest';

import {
  givenStations,
  plainBand,
  plainReceiver,
  siteIn,
} from '../../../test/support/plain-sets.ts';
import { assess } from '../assessment/assessment.ts';
import { judgeCandidates } from '../candidates/candidates.ts';
import { FrontEnd } from '../circuits/front-end.ts';
import { defaultRaster } from '../channels/raster.ts';
import type { Band, TrackingDesign } from '../receiver.ts';
import { trackingCost } from './tracking-cost.ts';
import { tuningOf } from './tuning.ts';

const tracking: TrackingDesign = {
  gangMinF: 40e-12,
  gangMaxF: 400e-12,
  strayF: 0,
  trimmer: 'gang',
  points: [600_000, 1_000_000, 1_400_000],
};
const band: Band = plainBand({ tracking });
const receiver = plainReceiver({ bands: [band] });

describe('tuningOf', () => {
  it('leaves the circuits on the dial at the tracking points, and beside it elsewhere', () => {
    const { tuning } = tuningOf(band, 455_000, 455_000);

    expect(tuning?.(1_000_000)).toBeCloseTo(1_000_000, 3);
    expect(tuning?.(800_000)).toBeGreaterThan(803_000);
  });

  it('puts them where fc + e(fc) is the dial frequency', () => {
    const tunedHz = tuningOf(band, 455_000, 455_000).tuning?.(1_603_657.34 - 1_050_000) ?? NaN;

    // The error at 550 kHz is +3657.34 Hz, so dial 553.65734 finds the circuits at 550.
    expect(tunedHz).toBeCloseTo(550_000, 1);
  });

  it('refits at another IF with the padder kept', () => {
    const { tuning } = tuningOf(band, 455_000, 450_000);

    expect(tuning?.(600_000)).toBeCloseTo(600_000, 2);
    expect(tuning?.(1_400_000)).toBeCloseTo(1_400_000, 2);
    expect(tuning?.(1_000_000)).toBeGreaterThan(1_000_600);
  });

  it('gives none without data, and says why where they are refused', () => {
    const hopeless = plainBand({ tracking: { ...tracking, gangMaxF: 100e-12 } });

    expect(tuningOf(plainBand(), 455_000, 455_000)).toEqual({ tuning: null, refused: null });
    expect(tuningOf(hopeless, 455_000, 455_000)).toMatchObject({ tuning: null });
    expect(tuningOf(hopeless, 455_000, 455_000).refused).toMatch(/gang/);
  });
});

describe('trackingCost', () => {
  it('is the loss where the circuits stand farthest beside the station', () => {
    const { tuning } = tuningOf(band, 455_000, 455_000);
    const atTheTop = new FrontEnd(receiver, band).circuitsDb(1_600_000, tuning?.(1_600_000) ?? NaN);

    expect(trackingCost(receiver, 455_000)).toBeCloseTo(atTheTop, 9);
    expect(trackingCost(plainReceiver(), 455_000)).toBeNull();
  });
});

describe('tracking in what is judged', () => {
  const { stations, fields } = givenStations([[1_521_000, 90]]);
  const input = {
    site: siteIn(1),
    stations,
    fields,
    raster: defaultRaster(1),
    period: 'night',
    maxM: 3,
    maxN: 2,
    leaveOutBetterThan: null,
    limit: 100,
  } as const;

  it('moves the rejection of a response to circuits tuned beside the dial', () => {
    const image = assess({ ...input, receiver }).bands[0]?.responses.find(
      ({ cause }) => cause === 'image',
    );
    const tunedHz = tuningOf(band, 455_000, 455_000).tuning?.(612_000) ?? NaN;
    const expected = 90 - new FrontEnd(receiver, band).rejectionDb(1_521_000, 612_000, tunedHz);

    expect(image?.interferenceDb).toBeCloseTo(expected, 9);
    expect(image?.interferenceDb).not.toBeCloseTo(45.565, 2);
    const parts = image?.ledger.filter(({ term }) => ['field', 'circuit-1'].includes(term)) ?? [];
    expect(parts.reduce((sum, { valueDb }) => sum + valueDb, 0)).toBeCloseTo(expected, 9);
  });

  it('warns where the tracking data are refused, and goes on without', () => {
    const hopeless = plainBand({ tracking: { ...tracking, gangMaxF: 100e-12 } });
    const { warnings, bands } = assess({
      ...input,
      receiver: plainReceiver({ bands: [hopeless] }),
    });

    expect(warnings.map(({ path }) => path)).toContain('bands.0.tracking');
    expect(bands[0]?.responses.length).toBeGreaterThan(0);
  });

  it('gives each candidate its cost, and judges it with the circuits refitted', () => {
    const { candidates, present } = judgeCandidates({
      receiver,
      cases: [{ ...input, fields: { night: fields } }],
      periods: ['night'],
      fromHz: 450_000,
      toHz: 460_000,
      stepHz: 5_000,
      maxM: 3,
      maxN: 2,
    });
    const judged = (ifHz: number): number | null | undefined =>
      candidates.find((each) => each.ifHz === ifHz)?.night?.image.worstRatioDb;

    expect(present.trackingCostDb).toBeCloseTo(trackingCost(receiver, 455_000) ?? NaN, 9);
    expect(judged(455_000)).toBeCloseTo(present.night?.image.worstRatioDb ?? NaN, 9);
    expect(candidates.every(({ trackingCostDb }) => (trackingCostDb ?? 0) > 0)).toBe(true);
  });
});
