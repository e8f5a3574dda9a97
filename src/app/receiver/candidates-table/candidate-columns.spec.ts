import type { Candidate } from '../../../../shared/contracts/candidates';
import { candidateColumns, sortedCandidates } from './candidate-columns';

const worst = (worstRatioDb: number | null) => ({
  deficitDb: 0,
  worstRatioDb,
  grade: null,
  dialHz: null,
  station: null,
});
const candidate: Candidate = {
  ifHz: 555_000,
  reachable: { ok: true, reason: null },
  deficitDb: 4.04,
  rasterDistanceHz: { if: 5000, twice: 0, thrice: 5000 },
  night: {
    breakthrough: worst(2.868),
    image: worst(44.8),
    products: worst(null),
    breakthroughChangeDb: -16.24,
    changeSigmaDb: 4.1,
  },
  windowHz: { low: 554_300, high: 555_700 },
  harmonics: [
    { harmonic: 2, dialHz: 1_110_000, channelHz: 1_110_000, beatHz: 0 },
    { harmonic: 3, dialHz: 1_665_000, channelHz: 1_670_000, beatHz: 5000 },
  ],
  intermodulation: { count: 3, nearestBeatHz: 400 },
  bfoShiftHz: -5000,
  capacitanceChange: 0.0181,
  trackingCostDb: null,
};
const withBfo = { bfo: { centreHz: 560_000, rangeHz: 6000, pitchHz: 1000 } };
const columns = candidateColumns('night', withBfo);

describe('the columns of the candidates', () => {
  it('show every term apart, as the answer gives it', () => {
    expect(Object.fromEntries(columns.map(({ key, text }) => [key, text(candidate)]))).toEqual({
      deficit: '4.0',
      change: '−16.2 dB ±4.1',
      breakthrough: '2.9',
      image: '44.8',
      products: '–',
      harmonic: '0 (2 × IF)',
      raster: '5 / 0 / 5',
      intermodulation: '3',
      window: '554.3 – 555.7',
      bfo: '−5',
      capacitance: '+1.81 %',
      tracking: '–',
      reach: 'yes',
    });
  });

  it('speak of the BFO only where there is one', () => {
    expect(candidateColumns('night', { bfo: null }).map(({ key }) => key)).not.toContain('bfo');
  });

  it('leave out what the period was not asked for', () => {
    const day = candidateColumns('day', withBfo).find(({ key }) => key === 'change');

    expect(day?.text(candidate)).toBe('–');
  });
});

describe('sortedCandidates', () => {
  const low = { ...candidate, ifHz: 550_000, trackingCostDb: 2, deficitDb: 9 };
  const high = { ...candidate, ifHz: 560_000, trackingCostDb: 1, deficitDb: 1 };
  const ifs = (active?: string, direction: 'asc' | 'desc' = 'asc') =>
    sortedCandidates([candidate, low, high], columns, active ? { active, direction } : null).map(
      ({ ifHz }) => ifHz,
    );

  it('keeps the ranking until a column is chosen', () => {
    expect(ifs()).toEqual([555_000, 550_000, 560_000]);
  });

  it('sorts by any column, what is missing last either way', () => {
    expect(ifs('if', 'desc')).toEqual([560_000, 555_000, 550_000]);
    expect(ifs('deficit', 'asc')).toEqual([560_000, 555_000, 550_000]);
    expect(ifs('tracking', 'asc')).toEqual([560_000, 550_000, 555_000]);
    expect(ifs('tracking', 'desc')).toEqual([550_000, 560_000, 555_000]);
  });
});
