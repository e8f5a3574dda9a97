import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { curveOfParts } from './padded-circuit.ts';
import { designTracking, trackedDesign, type TrackingInput } from './tracking.ts';
import { curveOf, trackingConstants, trackingError } from './tracking-curve.ts';
import { bestTrackingPoints, worstTrackingError } from './tracking-points.ts';

const MEDIUM_WAVE: TrackingInput = {
  lowHz: 550e3,
  highHz: 1600e3,
  ifHz: 455e3,
  oscillator: 'above',
  gangMinF: 40e-12,
  gangMaxF: 400e-12,
  strayF: 0,
  trimmer: 'gang',
  points: [600e3, 1000e3, 1400e3],
};

/** Bands with an IF, and three points in them. */
const bands = fc
  .record({
    lowHz: fc.integer({ min: 500_000, max: 6_000_000 }),
    ratio: fc.double({ min: 1.3, max: 3, noNaN: true }),
    ifHz: fc.integer({ min: 100_000, max: 480_000 }),
    oscillator: fc.constantFrom('above' as const, 'below' as const),
    places: fc.tuple(
      fc.double({ min: 0.02, max: 0.3, noNaN: true }),
      fc.double({ min: 0.35, max: 0.65, noNaN: true }),
      fc.double({ min: 0.7, max: 0.98, noNaN: true }),
    ),
  })
  .map(({ lowHz, ratio, ifHz, oscillator, places }) => {
    const highHz = Math.round(lowHz * ratio);
    const [a, b, c] = places.map((place) => lowHz + place * (highHz - lowHz));
    return { lowHz, highHz, ifHz, oscillator, points: [a ?? 0, b ?? 0, c ?? 0] as const };
  });

describe('trackingConstants', () => {
  it('gives the values of the examples', () => {
    const constants = trackingConstants([600e3, 1000e3, 1400e3], 455e3);

    expect(Math.sqrt(constants.m2)).toBeCloseTo(4514043.1, 1);
    expect(curveOf(constants).oscillatorHz(600e3)).toBeCloseTo(1055e3, 6);
    expect(trackingError(curveOf(constants), 455e3, 550e3)).toBeCloseTo(3657.3, 1);
  });

  it('make a curve that is right at the three points and can be read backwards', () => {
    fc.assert(
      fc.property(bands, ({ points, ifHz, oscillator, lowHz, highHz }) => {
        const signedIfHz = oscillator === 'above' ? ifHz : -ifHz;
        const curve = curveOf(trackingConstants(points, signedIfHz));

        for (const hz of points) expect(trackingError(curve, signedIfHz, hz)).toBeCloseTo(0, 2);
        const middle = (lowHz + highHz) / 2;
        expect(curve.signalHz(curve.oscillatorHz(middle))).toBeCloseTo(middle, 1);
      }),
    );
  });

  it('refuses points out of order and no IF', () => {
    expect(() => trackingConstants([2, 1, 3], 455e3)).toThrow(/points/);
    expect(() => trackingConstants([1, 2, 3], 0)).toThrow(/IF/);
  });
});

describe('designTracking', () => {
  it('gives the value of its example', () => {
    expect(Number(designTracking(MEDIUM_WAVE).padderF) * 1e12).toBeCloseTo(436.837, 3);
  });

  it('gives parts that make the curve: neither gang nor trimmer changes the error', () => {
    const gangs = fc.constantFrom([12e-12, 500e-12] as const, [40e-12, 600e-12] as const);
    const trimmers = fc.constantFrom('gang' as const, 'coil' as const);
    fc.assert(
      fc.property(bands, gangs, trimmers, (band, [gangMinF, gangMaxF], trimmer) => {
        const input: TrackingInput = { ...band, gangMinF, gangMaxF, strayF: 0, trimmer };
        fc.pre(input.oscillator === 'above' || input.lowHz > 1.3 * input.ifHz);
        const { refused, plain, padded, curve } = trackedDesign(input);
        fc.pre(refused === null);
        const parts = curveOfParts(plain, padded);
        const middle = (band.lowHz + band.highHz) / 2;

        const oscillator =
          band.oscillator === 'above' ? parts.oscillatorHz(middle) : parts.signalHz(middle);
        expect(Math.abs(oscillator - curve.oscillatorHz(middle))).toBeLessThan(1);
      }),
    );
  });

  it('refits to be exact at both alignment points, whichever side the oscillator is on', () => {
    fc.assert(
      fc.property(bands, fc.constantFrom('gang' as const, 'coil' as const), (band, trimmer) => {
        fc.pre(band.oscillator === 'above' || band.lowHz > 1.3 * band.ifHz);
        const base: TrackingInput = {
          ...band,
          gangMinF: 12e-12,
          gangMaxF: 500e-12,
          strayF: 0,
          trimmer,
        };
        const padderF = designTracking(base).padderF;
        fc.pre(padderF !== null);
        const { curve } = trackedDesign({
          ...base,
          ifHz: base.ifHz * 1.01,
          fixedPadderF: padderF,
        });
        const signedIfHz = (band.oscillator === 'above' ? 1.01 : -1.01) * band.ifHz;

        expect(Math.abs(trackingError(curve, signedIfHz, band.points[0]))).toBeLessThan(1);
        expect(Math.abs(trackingError(curve, signedIfHz, band.points[2]))).toBeLessThan(1);
      }),
    );
  });

  it('answers 41 settings and the points, and the worst error of the whole band', () => {
    const { errors, worstErrorHz } = designTracking(MEDIUM_WAVE);

    expect(errors).toHaveLength(44);
    expect(errors.find(({ dialHz }) => dialHz === 600e3)?.errorHz).toBeCloseTo(0, 6);
    expect(worstErrorHz).toBeCloseTo(11_657.42, 1);
  });

  it('refuses a gang that cannot tune the band, with the reason', () => {
    const design = designTracking({ ...MEDIUM_WAVE, gangMaxF: 200e-12 });

    expect(design.refused?.reason).toMatch(/gang cannot tune/);
    expect(design).toMatchObject({ padderF: null, errors: [], worstErrorHz: null });
  });

  it('refuses a trimmer below the stray, with the reason', () => {
    const design = designTracking({ ...MEDIUM_WAVE, trimmer: 'gang', strayF: 8.3e-12 });

    expect(design.refused?.reason).toMatch(/stray/);
  });

  it('refuses points from which the oscillator does not reach the end of the band', () => {
    const gang = { gangMinF: 1e-14, gangMaxF: 1e-9 };
    const band = { lowHz: 460e3, highHz: 1600e3, oscillator: 'below' as const, ...gang };
    const design = designTracking({ ...MEDIUM_WAVE, ...band });

    expect(design.refused?.reason).toMatch(/both ends/);
    expect(design.errors).toEqual([]);
  });

  it.each([
    [{ lowHz: 0 }, /lowHz/],
    [{ highHz: 1 }, /highHz/],
    [{ ifHz: 0 }, /ifHz/],
    [{ gangMinF: 0 }, /gangMinF/],
    [{ gangMaxF: 1e-12 }, /gangMaxF/],
    [{ strayF: -1 }, /strayF/],
    [{ fixedPadderF: 0 }, /fixedPadderF/],
    [{ fixedPadderF: 4e-10, alignHz: [1e6, 1e6] as const }, /alignHz/],
    [{ oscillator: 'below', ifHz: 550e3 } as const, /oscillator/],
  ])('refuses %j', (over, message) => {
    expect(() => designTracking({ ...MEDIUM_WAVE, ...over })).toThrow(message);
  });
});

describe('bestTrackingPoints', () => {
  it('gives the value of its example', () => {
    const best = bestTrackingPoints({ lowHz: 550e3, highHz: 1600e3, signedIfHz: 455e3 });

    expect(best.map(Math.round)).toEqual([606386, 1016923, 1514599]);
  });

  it('is never worse than any other points', () => {
    fc.assert(
      fc.property(bands, ({ lowHz, highHz, ifHz, oscillator, points }) => {
        fc.pre(oscillator === 'above' || lowHz > 1.3 * ifHz);
        const band = { lowHz, highHz, signedIfHz: oscillator === 'above' ? ifHz : -ifHz };
        const worst = (at: readonly [number, number, number]): number =>
          Math.abs(worstTrackingError(curveOf(trackingConstants(at, band.signedIfHz)), band));

        expect(worst(bestTrackingPoints(band))).toBeLessThanOrEqual(worst(points) + 0.01);
      }),
    );
  });

  it('stand in order inside any band, however small the error, and leave it finite', () => {
    const narrow = fc.record({
      lowHz: fc.integer({ min: 1_001, max: 5_000_000 }),
      width: fc.double({ min: 1e-5, max: 3, noNaN: true }),
      ifShare: fc.double({ min: 1e-6, max: 0.999, noNaN: true }),
      below: fc.boolean(),
    });
    fc.assert(
      fc.property(narrow, ({ lowHz, width, ifShare, below }) => {
        const highHz = lowHz + Math.max(1, Math.round(lowHz * width));
        const ifHz = Math.max(1, Math.floor((lowHz - 1) * ifShare));
        const band = { lowHz, highHz, signedIfHz: below ? -ifHz : ifHz };
        const points = bestTrackingPoints(band);
        const curve = curveOf(trackingConstants(points, band.signedIfHz));

        const edges = [lowHz, ...points, highHz];
        expect(edges).toEqual(edges.toSorted((a, b) => a - b));
        expect(new Set(points).size).toBe(3);
        for (const hz of [...edges, (lowHz + highHz) / 2]) {
          expect(trackingError(curve, band.signedIfHz, hz)).toSatisfy(Number.isFinite);
        }
      }),
      { numRuns: 300 },
    );
  });
});
