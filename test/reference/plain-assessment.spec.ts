/**
 * The engine against a slow oracle that multiplies out every product at every dial setting
 * (`test/support/plain-assessment.ts`), over seeded random receivers and lists.
 */
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { assess, type Assessment } from '../../shared/radio/assessment/assessment.ts';
import type { Response } from '../../shared/radio/assessment/response.ts';
import { plainResponses, plainVerdict } from '../support/plain-assessment.ts';
import {
  crowdedLists,
  plainCase,
  receivers,
  sites,
  stationLists,
} from '../support/random-cases.ts';

const casesOf = (stations: typeof stationLists) =>
  fc.record({
    receiver: receivers,
    site: sites,
    stations,
    period: fc.constantFrom('day' as const, 'night' as const),
    maxM: fc.integer({ min: 0, max: 5 }),
    maxN: fc.integer({ min: 1, max: 3 }),
  });

/** What identifies a response. */
function key(
  band: number,
  { station, m, n, dialHz }: Pick<Response, 'station' | 'm' | 'n' | 'dialHz'>,
) {
  return `${band}/${station}/${m}/${n}/${Math.floor((dialHz ?? 0) + 0.5)}`;
}

function answered(all: Assessment): Map<string, Response> {
  return new Map(
    all.bands.flatMap(({ responses }, band) =>
      responses
        .filter(({ cause }) => cause !== 'intermodulation')
        .map((each) => [key(band, each), each] as const),
    ),
  );
}

describe.each([
  ['a list all over the bands', casesOf(stationLists)],
  ['several stations on each of a few frequencies', casesOf(crowdedLists)],
])('assess with %s', (_, cases) => {
  it('answers what multiplying out every product answers', () => {
    fc.assert(
      fc.property(cases, (drawn) => {
        const plain = plainCase(drawn);
        const expected = plainResponses(plain);
        const all = assess({ ...drawn, ...plain.input, leaveOutBetterThan: null, limit: 10_000 });
        const found = answered(all);

        expect(found.size).toBe(expected.length);
        for (const each of expected) {
          const response = found.get(key(each.band, each));
          expect(response).toMatchObject({
            wantedStation: each.wantedStation,
            grade: each.grade,
            hidden: each.hidden,
            borderline: each.borderline,
          });
          // A half is rounded up exactly; the oracle's own quotient may fall just short of it.
          expect(Math.abs((response?.beatHz ?? NaN) - each.beatHz)).toBeLessThan(0.5 + 1e-6);
          for (const level of ['interferenceDb', 'weightingDb', 'ratioDb', 'marginDb'] as const) {
            expect(response?.[level]).toBeCloseTo(each[level], 6);
          }
          expect(response?.noiseDb).toBeCloseTo(each.noiseDb, 9);
          if (each.bandDb === null) expect(response?.bandDb).toBeNull();
          else expect(response?.bandDb).toBeCloseTo(each.bandDb, 6);
        }
      }),
      { numRuns: 150, seed: 455 },
    );
  }, 60_000);

  it('sums up the verdict that the plain way sums up', () => {
    fc.assert(
      fc.property(cases, (drawn) => {
        const plain = plainCase(drawn);
        const expected = plainVerdict(plain, plainResponses(plain));
        const { verdict } = assess({
          ...drawn,
          ...plain.input,
          leaveOutBetterThan: 'very-annoying',
          limit: 1,
        });

        expect(verdict.usable).toBe(expected.usable);
        expect(verdict.harmed.map(({ station }) => station).sort((a, b) => a - b)).toEqual(
          expected.harmed,
        );
        expect(verdict.deficitDb).toBeCloseTo(expected.deficitDb, 6);
      }),
      { numRuns: 150, seed: 560 },
    );
  }, 60_000);
});
