import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  givenStations,
  oneBandReceiver,
  plainBand,
  plainReceiver,
  siteIn,
} from '../../../test/support/plain-sets.ts';
import { plainCase, receivers, sites, stationLists } from '../../../test/support/random-cases.ts';
import { assess } from '../assessment/assessment.ts';
import type { CuresInput } from './cure-bench.ts';
import type { CureKind } from './cure-plans.ts';
import { type Cure, findCures } from './cures.ts';
import { defaultRaster } from '../channels/raster.ts';
import type { Receiver } from '../receiver.ts';
import { trapLoss } from '../circuits/trap.ts';

const ORDERS = { maxM: 3, maxN: 2 } as const;

/** Two circuits of Q 80, 3/12 kHz, from 600 kHz: the set of the published example. */
const narrowOn = (ifHz: number): Receiver =>
  oneBandReceiver({
    ifHz,
    lowHz: 600_000,
    highHz: 1_600_000,
    circuits: 2,
    q: 80,
    widths: [3_000, 12_000],
  });

function inputFor(
  receiver: Receiver,
  list: readonly (readonly [number, number])[],
  over: Partial<CuresInput> = {},
): CuresInput {
  const { stations, fields } = givenStations(list);
  const everywhere = { day: fields, night: fields };
  return {
    receiver,
    site: siteIn(2),
    stations,
    fields: everywhere,
    raster: defaultRaster(2),
    periods: ['night'],
    ...ORDERS,
    ...over,
  };
}

const curesOf = (receiver: Receiver, list: readonly (readonly [number, number])[]) =>
  findCures(inputFor(receiver, list)).cures;
const only = (cures: readonly Cure[], kind: CureKind): Cure =>
  cures.find((each) => each.kind === kind) ?? expect.fail(`no ${kind}`);

describe('findCures', () => {
  it('puts the trap on the offender, not on the IF that was moved off it', () => {
    const trap = only(curesOf(narrowOn(555_000), [[560_000, 90]]), 'trap');

    expect(Math.abs((trap.trap?.frequencyHz ?? NaN) - 560_000)).toBeLessThan(1_500);
  });

  it('moves an IF of 560 off the station there, by the 26 dB of the published example', () => {
    const move = only(
      curesOf({ ...narrowOn(560_000), ifRange: 0.012 }, [
        [550_000, 90],
        [560_000, 90],
        [570_000, 90],
      ]),
      'move-if',
    );
    const [worst] = move.gainDb;

    expect(Math.abs((move.ifHz ?? NaN) - 555_000)).toBeLessThan(1_000);
    // IF 560: -9.399 dB; 555: 16.292 dB (second implementation).
    expect(worst).toMatchObject({ station: 1, dialHz: 600_000 });
    expect(worst?.beforeDb).toBeCloseTo(-9.399, 2);
    expect(worst?.gainDb).toBeGreaterThan(25);
    expect(move).toMatchObject({ reversible: true, costDb: 0 });
  });

  it('costs at the lowest channel what the trap loses there', () => {
    const { trap, costDb } = only(curesOf(narrowOn(560_000), [[560_000, 90]]), 'trap');

    expect(costDb).toBeCloseTo(trapLoss(trap?.trap ?? expect.fail(), 600_000), 9);
  });

  it('costs nothing where it is judged by what a wanted station loses, but for a trap', () => {
    const cures = curesOf(narrowOn(560_000), [
      [560_000, 90],
      [612_000, 80],
    ]);

    for (const { kind, costDb } of cures) {
      if (kind === 'trap' || kind === 'move-if-and-trap') expect(costDb).toBeGreaterThan(0);
      else expect(costDb).toBe(0);
    }
    // Felt at the lowest usable station, though channels lie below it.
    const { trap, costDb } = only(cures, 'trap');
    expect(costDb).toBeCloseTo(trapLoss(trap?.trap ?? expect.fail(), 612_000), 9);
  });

  it('gains in the three stations that an assessment finds worst, by the ratios it finds', () => {
    const list = [
      [560_000, 90],
      [561_000, 84],
      [563_000, 88],
      [1_730_000, 95],
    ] as const;
    const receiver = narrowOn(560_000);
    const { stations, fields } = givenStations(list);
    const ratiosOf = (set: Receiver): Map<number, number> => {
      const { bands } = assess({
        ...{ receiver: set, site: siteIn(2), stations, fields, raster: defaultRaster(2) },
        ...{ period: 'night', ...ORDERS, leaveOutBetterThan: null, limit: 10_000 },
      });
      const worst = new Map<number, number>();
      for (const { station, ratioDb, hidden } of bands.flatMap(({ responses }) => responses)) {
        if (ratioDb === null || hidden !== null) continue;
        worst.set(station, Math.min(ratioDb, worst.get(station) ?? Infinity));
      }
      return worst;
    };
    const before = [...ratiosOf(receiver)].sort((a, b) => a[1] - b[1]).slice(0, 3);

    for (const { kind, gainDb, trap, ifHz } of curesOf(receiver, list)) {
      expect(gainDb.map(({ station }) => station)).toEqual(before.map(([station]) => station));
      gainDb.forEach(({ beforeDb }, at) => expect(beforeDb).toBeCloseTo(before[at]?.[1] ?? NaN, 6));
      if (kind !== 'trap' && kind !== 'move-if') continue;
      const cured = { ...receiver, ifHz: ifHz ?? receiver.ifHz, trap: trap?.trap ?? null };
      const after = ratiosOf(cured);
      for (const { station, afterDb } of gainDb) {
        if (afterDb === null) expect(after.has(station)).toBe(false);
        else expect(after.get(station)).toBeCloseTo(afterDb, 6);
      }
    }
  });

  it('offers the other side on each band where the oscillator can run there', () => {
    const bands = [
      plainBand({ name: 'long wave', lowHz: 150_000, highHz: 285_000 }),
      plainBand({ name: 'medium wave' }),
      plainBand({ name: 'short wave', lowHz: 3_000_000, highHz: 9_000_000, oscillator: 'below' }),
    ];
    const cures = curesOf(plainReceiver({ bands }), [[900_000, 80]]);
    const names = cures.filter(({ kind }) => kind === 'other-side').map(({ name }) => name);

    expect(names).toEqual([
      'Oscillator below the signal on medium wave',
      'Oscillator above the signal on short wave',
    ]);
  });

  it('leaves out a move and a trap where nothing comes through on the IF', () => {
    const kinds = curesOf(plainReceiver(), [[900_000, 80]]).map(({ kind }) => kind);

    expect(kinds).toEqual(['other-side', 'one-more-circuit', 'screening']);
  });

  it('keeps the IF that a crystal filter fixes', () => {
    const fixedFilter = { kind: 'crystal', centreHz: 560_000, widthHz: 150 } as const;
    const cures = curesOf({ ...narrowOn(560_000), fixedFilter }, [[560_000, 90]]);

    expect(cures.map(({ kind }) => kind)).not.toContain('move-if');
  });

  it('gives the usual caution with everything, for everything touches the set', () => {
    const cures = curesOf(narrowOn(560_000), [[560_000, 90]]);

    expect(cures.map(({ kind }) => kind)).toEqual([
      'move-if',
      'trap',
      ...(cures.some(({ kind }) => kind === 'move-if-and-trap') ? ['move-if-and-trap'] : []),
      'other-side',
      'one-more-circuit',
      'screening',
    ]);
    for (const { caution } of cures) expect(caution).toMatch(/high tension.*licensed practice/);
  });

  it('names each station once, in the period in which it is worst', () => {
    const input = inputFor(narrowOn(560_000), [
      [560_000, 90],
      [561_000, 80],
    ]);
    const [quiet] = [givenStations([[560_000, 60]]).fields];
    const fields = { ...input.fields, day: quiet };
    const stations = input.stations.map((each) => ({ ...each, fieldDb: null }));
    const { gainDb } = only(
      findCures({ ...input, stations, fields, periods: ['day', 'night'] }).cures,
      'screening',
    );

    expect(gainDb.map(({ station, period }) => [station, period])).toEqual([
      [0, 'night'],
      [1, 'night'],
    ]);
  });
});

describe('the laws of cures', () => {
  const drawnCases = fc.record({ receiver: receivers, site: sites, stations: stationLists });
  const judged = (drawn: {
    readonly receiver: Receiver;
    readonly site: CuresInput['site'];
    readonly stations: CuresInput['stations'];
  }) => {
    const { input } = plainCase({ ...drawn, period: 'night', ...ORDERS });
    const { stations, fields, raster } = input;
    const { receiver, site } = drawn;
    const asked: CuresInput = {
      ...{ receiver, site, stations, raster, fields: { night: fields } },
      ...{ periods: ['night'], ...ORDERS },
    };
    const deficitOf = (changed: Receiver): number =>
      assess({
        ...{ ...asked, receiver: changed, fields, period: 'night', limit: 1 },
        leaveOutBetterThan: 'imperceptible',
      }).verdict.deficitDb;
    return { cures: findCures(asked).cures, deficitOf };
  };

  it('hold: what a cure leaves is what an assessment of the cured receiver finds', () => {
    fc.assert(
      fc.property(drawnCases, (drawn) => {
        const { cures, deficitOf } = judged(drawn);
        for (const { kind, ifHz, trap, deficitBeforeDb, deficitAfterDb } of cures) {
          expect(deficitBeforeDb).toBeCloseTo(deficitOf(drawn.receiver), 6);
          if (!['move-if', 'trap', 'move-if-and-trap'].includes(kind)) continue;
          const changed = {
            ...drawn.receiver,
            ifHz: ifHz ?? drawn.receiver.ifHz,
            trap: trap?.trap ?? drawn.receiver.trap,
          };
          expect(deficitAfterDb).toBeCloseTo(deficitOf(changed), 6);
          if (kind === 'move-if') expect(deficitAfterDb).toBeLessThan(deficitBeforeDb);
        }
      }),
      { numRuns: 12 },
    );
  }, 60_000);

  it('hold: screening without stray pick-up gains nothing, and never loses', () => {
    fc.assert(
      fc.property(drawnCases, (drawn) => {
        const cure = only(judged(drawn).cures, 'screening');

        expect(cure.deficitAfterDb).toBeLessThanOrEqual(cure.deficitBeforeDb + 1e-9);
        for (const { gainDb } of cure.gainDb) {
          if (drawn.receiver.strayDb === null) expect(gainDb).toBe(0);
          else expect(gainDb ?? 0).toBeGreaterThanOrEqual(-1e-9);
        }
      }),
      { numRuns: 12 },
    );
  }, 60_000);

  it('hold: one more circuit never lowers a ratio', () => {
    fc.assert(
      fc.property(drawnCases, (drawn) => {
        const cure = only(judged(drawn).cures, 'one-more-circuit');

        expect(cure.deficitAfterDb).toBeLessThanOrEqual(cure.deficitBeforeDb + 1e-9);
        for (const { gainDb } of cure.gainDb) expect(gainDb ?? 0).toBeGreaterThanOrEqual(-1e-9);
      }),
      { numRuns: 12 },
    );
  }, 60_000);
});
