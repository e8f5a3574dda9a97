import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { groundWave } from './ground-wave.ts';
import { GROUNDS } from './ground.ts';
import { millington, type PathSection, scaledTo, totalLength } from './mixed-path.ts';
import type { Ground } from '../site.ts';
import { hertz, type Metres, metres } from '../units.ts';

const waves = Object.fromEntries(
  Object.entries(GROUNDS).map(([ground, constants]) => [
    ground,
    groundWave(hertz(1_000_000), constants),
  ]),
);
const field = (ground: Ground, distance: Metres) => waves[ground]!(distance);
const ground = fc.constantFrom<Ground>('sea', 'wet', 'average', 'dry', 'poor');
const lengthM = fc.double({ min: 1, max: 500_000, noNaN: true });
const sections = fc.array(fc.record({ ground, lengthM }), { minLength: 1, maxLength: 6 });

describe('millington', () => {
  it('is the same forward and back', () => {
    fc.assert(
      fc.property(sections, (path) => {
        expect(millington(path, field)).toBeCloseTo(millington(path.toReversed(), field), 9);
      }),
    );
  });

  it('is the plain ground wave where the ground is the same throughout', () => {
    fc.assert(
      fc.property(ground, fc.array(lengthM, { minLength: 1, maxLength: 6 }), (kind, lengths) => {
        const path = lengths.map((each) => ({ ground: kind, lengthM: each }));

        expect(millington(path, field)).toBeCloseTo(field(kind, metres(totalLength(path))), 6);
      }),
    );
  });

  it('lies between the fields over the worst and the best of its grounds for two sections', () => {
    const two = fc.tuple(lengthM, lengthM);
    fc.assert(
      fc.property(two, ([land, sea]) => {
        fc.pre(land > 2000 && sea > 2000);
        const mixed = millington(
          [
            { ground: 'poor', lengthM: land },
            { ground: 'sea', lengthM: sea },
          ],
          field,
        );

        expect(mixed).toBeLessThan(field('sea', metres(land + sea)) + 0.01);
        expect(mixed).toBeGreaterThan(field('poor', metres(land + sea)) - 0.01);
      }),
    );
  });

  it('rises again behind the coast', () => {
    const at = (sea: number) =>
      millington(
        [
          { ground: 'poor', lengthM: 50_000 },
          { ground: 'sea', lengthM: sea },
        ],
        field,
      );

    expect(at(10_000)).toBeGreaterThan(field('poor', metres(50_000)) + 3);
  });

  it('is worked by hand for 40 km of land and 60 km of sea', () => {
    const [land, sea, all] = [metres(40_000), metres(60_000), metres(100_000)];
    const forward = field('dry', land) + field('sea', all) - field('sea', land);
    const backward = field('sea', sea) + field('dry', all) - field('dry', sea);
    const path: PathSection[] = [
      { ground: 'dry', lengthM: land },
      { ground: 'sea', lengthM: sea },
    ];

    expect(millington(path, field)).toBeCloseTo((forward + backward) / 2, 9);
  });

  it('refuses an empty path and lengths that are none', () => {
    expect(() => millington([], field)).toThrow(RangeError);
    for (const bad of [0, -1, NaN]) {
      expect(() => millington([{ ground: 'sea', lengthM: bad }], field)).toThrow(RangeError);
    }
  });
});

describe('scaledTo', () => {
  it('keeps the shares and meets the length', () => {
    fc.assert(
      fc.property(sections, lengthM, (path, length) => {
        const scaled = scaledTo(path, metres(length));

        expect(totalLength(scaled)).toBeCloseTo(length, 4);
        expect(scaled.map((each) => each.ground)).toEqual(path.map((each) => each.ground));
      }),
    );
  });

  it('refuses sections without length', () => {
    expect(() => scaledTo([], metres(5))).toThrow(RangeError);
  });
});
