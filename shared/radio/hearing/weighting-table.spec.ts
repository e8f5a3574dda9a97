import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { weightingGrid, WeightingTable } from './weighting-table.ts';

/** A bumpy weighting. */
const bumpy = (hz: number): number => 20 * Math.sin(hz / 777) - hz / 1000;
const grid = weightingGrid(bumpy);

/** The definition, word for word. */
function plain(beatHz: number, toleranceHz: number): number {
  const within = Array.from({ length: 4001 }, (_, index) => (index - 2000) * 100).filter(
    (hz) => Math.abs(hz - beatHz) <= toleranceHz,
  );
  if (within.length === 0) return bumpy(Math.floor(beatHz / 100 + 0.5) * 100);
  return Math.max(...within.map((hz) => bumpy(Math.abs(hz))));
}

describe('WeightingTable', () => {
  it('gives the largest weighting over the grid within the tolerance', () => {
    const beats = fc.integer({ min: 0, max: 50_000 });
    const tolerances = fc.constantFrom(0, 30, 50, 100, 250, 1_000, 1_050, 4_000);
    fc.assert(
      fc.property(beats, tolerances, (beatHz, toleranceHz) => {
        const table = new WeightingTable(grid, toleranceHz, 50_000);

        expect(table.at(beatHz)).toBe(plain(beatHz, toleranceHz));
      }),
    );
  });

  it('is never less than at zero offset', () => {
    const table = new WeightingTable(grid, 1_000, 50_000);
    const exact = new WeightingTable(grid, 0, 50_000);
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 500 }), (step) => {
        expect(table.at(step * 100)).toBeGreaterThanOrEqual(exact.at(step * 100));
      }),
    );
  });

  it('takes the nearest grid point, half up, where none is within the tolerance', () => {
    const table = new WeightingTable(grid, 0, 1_000);

    expect(table.at(250)).toBe(bumpy(300));
    expect(table.at(249)).toBe(bumpy(200));
  });

  it('keeps a beat on the grid in spite of rounding', () => {
    const table = new WeightingTable(grid, 1_000, 50_000);

    expect(table.at(3_000 - 1e-8)).toBe(table.at(3_000));
    expect(table.at(3_000 + 1e-8)).toBe(table.at(3_000));
  });

  it('knows its largest value and refuses a negative tolerance', () => {
    const table = new WeightingTable(grid, 0, 50_000);
    const all = Array.from({ length: 501 }, (_, step) => table.at(step * 100));

    expect(table.greatestDb).toBeGreaterThanOrEqual(Math.max(...all));
    expect(() => new WeightingTable(grid, -1, 1_000)).toThrow(/toleranceHz/);
  });
});

describe('weightingGrid', () => {
  it('gives the value of its example and computes each value once', () => {
    let calls = 0;
    const counted = weightingGrid((hz) => (calls++, -hz));

    expect([counted(3), counted(3)]).toEqual([-300, -300]);
    expect(calls).toBe(1);
  });
});
