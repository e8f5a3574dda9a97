import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { trackingAnswer, trackingRequest } from '../../shared/contracts/tracking.ts';
import { designTracking } from '../../shared/radio/tracking/tracking.ts';

const hz = fc.oneof(
  fc.integer({ min: 100_000, max: 2_000_000 }),
  fc.integer({ min: 1000, max: 1_000_000_000 }),
);
const farads = fc
  .oneof(
    fc.double({ min: -11, max: -9, noNaN: true }),
    fc.double({ min: -14, max: -3, noNaN: true }),
  )
  .map((exponent) => 10 ** exponent);

/** Anything the contract takes: points and alignment are drawn as places within the band. */
const requests = fc
  .record(
    {
      ends: fc.tuple(hz, hz),
      ifHz: hz,
      oscillator: fc.constantFrom('above', 'below'),
      gang: fc.tuple(farads, farads),
      strayF: fc.oneof(fc.constant(0), farads),
      trimmer: fc.constantFrom('gang', 'coil'),
      places: fc.tuple(
        ...Array.from({ length: 5 }, () => fc.double({ min: 0, max: 1, noNaN: true })),
      ),
      best: fc.boolean(),
      fixedPadderF: farads,
    },
    { requiredKeys: ['ends', 'ifHz', 'oscillator', 'gang', 'strayF', 'trimmer', 'places', 'best'] },
  )
  .map(({ ends, gang, places, best, ...rest }) => {
    const [lowHz = 0, highHz = 0] = ends.toSorted((a, b) => a - b);
    const [gangMinF, gangMaxF] = gang.toSorted((a, b) => a - b);
    const inside = places.map((place) => Math.round(lowHz + place * (highHz - lowHz)));
    const points = best ? 'best' : inside.slice(0, 3).sort((a, b) => a - b);
    return { lowHz, highHz, gangMinF, gangMaxF, points, alignHz: inside.slice(3), ...rest };
  });

describe('designTracking', () => {
  it('answers whatever the contract lets through in finite numbers, or refuses it', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const { data, success } = trackingRequest.safeParse(request);
        fc.pre(success);

        expect(trackingAnswer.safeParse(designTracking(data)).error).toBeUndefined();
      }),
      { seed: 20_261_201, numRuns: 600 },
    );
  });
});
