import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { bestTrap, type Offender } from './cure-trap.ts';
import { trapFrequency, trapLoss } from '../circuits/trap.ts';
import type { Trap } from '../receiver.ts';

const ENDS = { q: 100, sourceOhms: 400, loadOhms: 1000 };
const offender = (hz: number, levelDb: number, leastDb = -Infinity): Offender => ({
  hz,
  levelDb,
  leastDb,
});

describe('bestTrap', () => {
  it('stands on the only offender, as its example says', () => {
    const found = bestTrap([offender(560e3, 50)], 600e3, ENDS);

    expect(Math.abs((found?.frequencyHz ?? NaN) - 560e3)).toBeLessThan(1_000);
  });

  it('stands between two equal offenders, nearer to the worse of two unequal ones', () => {
    const between = bestTrap([offender(550e3, 50), offender(560e3, 50)], 700e3, ENDS);
    const leaning = bestTrap([offender(550e3, 50), offender(560e3, 56)], 700e3, ENDS);

    expect(between?.frequencyHz).toBeGreaterThan(550e3);
    expect(between?.frequencyHz).toBeLessThan(560e3);
    expect(leaning?.frequencyHz).toBeGreaterThan(between?.frequencyHz ?? NaN);
  });

  it('takes a coil that spares the lowest wanted channel', () => {
    const found = bestTrap([offender(560e3, 50)], 600e3, ENDS);

    // In the aerial lead 500 uH would take about 19 dB there, 50 uH 3 dB.
    expect(trapLoss(found?.trap ?? expect.fail(), 600e3)).toBeLessThan(4);
  });

  it('spends nothing on what stray pick-up brings in anyhow', () => {
    const free = bestTrap([offender(560e3, 50)], 600e3, ENDS);
    const limited = bestTrap([offender(560e3, 50, 49)], 600e3, ENDS);
    const cost = (found: typeof free): number => trapLoss(found?.trap ?? expect.fail(), 600e3);

    expect(cost(limited)).toBeLessThanOrEqual(cost(free) + 0.05);
  });

  it('tunes each preferred capacitor by the core of the coil', () => {
    const found = bestTrap([offender(455e3, 50)], 550e3, ENDS) ?? expect.fail();

    for (const pair of [found.pairs.E12, found.pairs.E24, found.trap]) {
      expect(Math.round(trapFrequency(pair))).toBe(found.frequencyHz);
      expect(Math.abs(pair.inductanceH / found.coilH - 1)).toBeLessThan(0.11);
    }
  });

  const offenders = fc.array(
    fc.record({
      hz: fc.integer({ min: 545_000, max: 565_000 }),
      levelDb: fc.double({ min: 20, max: 70, noNaN: true }),
      leastDb: fc.constantFrom(-Infinity, 10, 30),
    }),
    { minLength: 1, maxLength: 5 },
  );
  const worst = (trap: Trap, all: readonly Offender[]): number =>
    Math.max(
      ...all.map(({ hz, levelDb, leastDb }) =>
        Math.max(levelDb - trapLoss(trap, hz) + trapLoss(trap, 600e3), leastDb),
      ),
    );
  const tuned = (trap: Trap, hz: number): Trap => ({
    ...trap,
    capacitanceF: 1 / ((2 * Math.PI * hz) ** 2 * trap.inductanceH),
  });

  it('is never beaten by a trap of the same coil on any other frequency', () => {
    fc.assert(
      fc.property(offenders, fc.integer({ min: 545_000, max: 565_000 }), (all, hz) => {
        const { trap } = bestTrap(all, 600e3, ENDS) ?? expect.fail();

        expect(worst(trap, all)).toBeLessThanOrEqual(worst(tuned(trap, hz), all) + 0.2);
      }),
      { numRuns: 60 },
    );
  });

  it('is never beaten by any trap of a fine grid of kinds, coils and frequencies', () => {
    const net = (trap: Trap, all: readonly Offender[]): number =>
      -worst(trap, all) - trapLoss(trap, 600e3);
    const coils = Array.from({ length: 25 }, (_, index) => 1e-5 * 10 ** (index / 12));
    const steps = Array.from({ length: 101 }, (_, index) => 540e3 + 300 * index);
    const grid = (['parallel', 'series'] as const).flatMap((kind) =>
      coils.flatMap((inductanceH) =>
        steps.map((hz) => tuned({ kind, inductanceH, capacitanceF: 0, ...ENDS }, hz)),
      ),
    );
    fc.assert(
      fc.property(offenders, (all) => {
        const { trap } = bestTrap(all, 600e3, ENDS) ?? expect.fail();
        const best = grid.reduce((most, each) => Math.max(most, net(each, all)), -Infinity);

        // Coils come by E6, and E12 capacitors move them once more: half a decibel at the most.
        expect(net(trap, all)).toBeGreaterThanOrEqual(best - 0.5);
      }),
      { numRuns: 12 },
    );
  }, 30_000);

  it('is none where no station comes through', () => {
    expect(bestTrap([], 600e3, ENDS)).toBeNull();
  });
});
