import { describe, expect, it } from 'vitest';

import { assumedWantedField, protectionRatio, tuningTolerance } from './service-figures.ts';

const broadcast = { service: 'broadcast', assumedWantedDb: null } as const;

describe('assumedWantedField', () => {
  it.each([
    [1, 299_999, 66],
    [1, 300_000, 60],
    [3, 1_799_999, 60],
    [2, 1_000_000, 54],
    [2, 1_800_000, 40],
  ] as const)('in Region %i on %i Hz broadcast is %i dB', (region, hz, db) => {
    expect(assumedWantedField(broadcast, region, hz)).toBe(db);
  });

  it('is by service elsewhere, and what the user says before all', () => {
    const of = (service: 'beacon' | 'marine' | 'telegraphy'): number =>
      assumedWantedField({ service, assumedWantedDb: null }, 1, 500_000);

    expect([of('beacon'), of('marine'), of('telegraphy')]).toEqual([37, 28, 20]);
    expect(assumedWantedField({ service: 'marine', assumedWantedDb: 45 }, 1, 1e6)).toBe(45);
  });
});

describe('protectionRatio', () => {
  it('is by service, and for broadcast by Region', () => {
    expect(([1, 2, 3] as const).map((region) => protectionRatio('broadcast', region))).toEqual([
      30, 26, 30,
    ]);
    expect(protectionRatio('marine', 2)).toBe(17);
    expect(protectionRatio('beacon', 2)).toBe(15);
    expect(protectionRatio('telegraphy', 1)).toBe(15);
  });
});

describe('tuningTolerance', () => {
  it('widens with frequency unless the user sets it', () => {
    const free = { tuningToleranceHz: null };

    expect([1_999_999, 2_000_000, 10_000_000].map((hz) => tuningTolerance(free, hz))).toEqual([
      1_000, 2_000, 4_000,
    ]);
    expect(tuningTolerance({ tuningToleranceHz: 0 }, 7_000_000)).toBe(0);
  });
});
