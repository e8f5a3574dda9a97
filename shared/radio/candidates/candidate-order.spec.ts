import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  compareCandidates,
  decidingTerm,
  type Orderable,
  rankingSentence,
} from './candidate-order.ts';

function candidate(ifHz: number, over: Partial<Orderable> = {}): Orderable {
  return { ifHz, reachable: { ok: true }, deficitDb: 0, harmonics: [], ...over };
}

function whistling(beatHz: number): Partial<Orderable> {
  return { harmonics: [{ harmonic: 2, dialHz: 910_000, channelHz: 909_000, beatHz }] };
}

describe('compareCandidates', () => {
  it.each([
    ['reach', candidate(1, { deficitDb: 9 }), candidate(2, { reachable: { ok: false } })],
    ['deficit', candidate(1, { deficitDb: 1, ...whistling(0) }), candidate(2, { deficitDb: 2 })],
    ['harmonic-beat', candidate(400, whistling(3)), candidate(455, whistling(1))],
    ['shift', candidate(456), candidate(453)],
    ['lower', candidate(454), candidate(456)],
  ] as const)('decides by %s', (term, first, second) => {
    expect(compareCandidates(first, second, 455)).toBeLessThan(0);
    expect(compareCandidates(second, first, 455)).toBeGreaterThan(0);
    expect(decidingTerm(first, second, 455)).toBe(term);
  });

  it('takes deficits that differ by rounding alone as equal', () => {
    const [one, other] = [
      candidate(454, { deficitDb: 0.1 + 0.2 }),
      candidate(456, { deficitDb: 0.3 }),
    ];

    expect(decidingTerm(one, other, 455)).toBe('lower');
  });

  it('orders any candidates in one way only', () => {
    const drawn = fc
      .record({
        ifHz: fc.integer({ min: 450, max: 460 }),
        ok: fc.boolean(),
        deficitDb: fc.integer({ min: 0, max: 2 }),
        beatHz: fc.integer({ min: 0, max: 2 }),
      })
      .map(({ ifHz, ok, deficitDb, beatHz }) =>
        candidate(ifHz, { reachable: { ok }, deficitDb, ...whistling(beatHz) }),
      );
    fc.assert(
      fc.property(fc.uniqueArray(drawn, { selector: ({ ifHz }) => ifHz }), (candidates) => {
        const order = (all: Orderable[]): number[] =>
          all.toSorted((a, b) => compareCandidates(a, b, 455)).map(({ ifHz }) => ifHz);

        expect(order(candidates.toReversed())).toEqual(order(candidates));
      }),
    );
  });
});

describe('rankingSentence', () => {
  it('says what decided', () => {
    const best = candidate(555_000, { deficitDb: 3.21 });

    expect(rankingSentence([best, candidate(560_000, { deficitDb: 40 })], 560_000)).toMatch(
      /555 kHz comes before 560 kHz: .* 3\.2 against 40 dB\./,
    );
    expect(rankingSentence([best], 560_000)).toMatch(/only candidate/);
    expect(rankingSentence([], 560_000)).toMatch(/no candidate/);
    expect(rankingSentence([candidate(1, { reachable: { ok: false } })], 2)).toMatch(/reach/);
  });
});
