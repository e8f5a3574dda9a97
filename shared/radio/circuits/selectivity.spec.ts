import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import type { Selectivity } from '../receiver.ts';
import { ifSelectivity, shapeFactorWarning, skirtExponent } from './selectivity.ts';

const b6 = fc.integer({ min: 1_000, max: 20_000 });
const shape = fc.double({ min: 1.2, max: 30, noNaN: true });

describe('ifSelectivity', () => {
  it('gives the value of its example', () => {
    const set = ifSelectivity({ kind: 'widths', b6Hz: 6000, b60Hz: 20000 }, 455000);

    expect(set.rejectionDb(4500)).toBeCloseTo(23.3725, 4);
    expect(skirtExponent(6000, 20000)).toBeCloseTo(5.28385, 5);
  });

  it('goes through both widths, never falls outwards and never passes 90 dB', () => {
    fc.assert(
      fc.property(
        b6,
        shape,
        fc.double({ min: 0, max: 1e6, noNaN: true }),
        (b6Hz, ratio, offset) => {
          const b60Hz = b6Hz * ratio;
          const { rejectionDb } = ifSelectivity({ kind: 'widths', b6Hz, b60Hz }, 455_000);

          expect(rejectionDb(0)).toBe(0);
          expect(rejectionDb(b6Hz / 2)).toBeCloseTo(6, 6);
          expect(rejectionDb(-b60Hz / 2)).toBeCloseTo(60, 6);
          expect(rejectionDb(offset + 10)).toBeGreaterThanOrEqual(rejectionDb(offset));
          expect(rejectionDb(offset)).toBeLessThanOrEqual(90);
        },
      ),
    );
  });

  it('adds IF transformers and finds their widths', () => {
    const transformers = { kind: 'transformers', count: 3, q: 60, coupling: 1.4 } as const;
    const set = ifSelectivity(transformers, 455_000);

    expect(set.rejectionDb(0)).toBeCloseTo(0, 9);
    expect(set.rejectionDb(set.b6Hz / 2)).toBeCloseTo(6, 6);
    expect(set.rejectionDb(set.b60Hz / 2)).toBeCloseTo(60, 6);
    expect(set.rejectionDb(2_000)).toBeCloseTo(
      3 * ifSelectivity({ ...transformers, count: 1 }, 455_000).rejectionDb(2_000),
      9,
    );
  });

  it('follows a measured table and takes its widths from it', () => {
    const set = ifSelectivity(
      {
        kind: 'table',
        points: [
          { offsetHz: 0, rejectionDb: 0 },
          { offsetHz: 3_000, rejectionDb: 6 },
          { offsetHz: 10_000, rejectionDb: 60 },
          { offsetHz: 15_000, rejectionDb: 70 },
        ],
      },
      455_000,
    );

    expect(set.b6Hz).toBeCloseTo(6_000, 3);
    expect(set.b60Hz).toBeCloseTo(20_000, 3);
    expect(set.rejectionDb(-40_000)).toBe(70);
  });

  it('takes twice the last offset where a table does not reach 60 dB', () => {
    const points = [
      { offsetHz: 0, rejectionDb: 0 },
      { offsetHz: 9_000, rejectionDb: 40 },
    ];

    expect(ifSelectivity({ kind: 'table', points }, 455_000).b60Hz).toBe(18_000);
  });

  it.each<[Selectivity, RegExp]>([
    [{ kind: 'widths', b6Hz: 0, b60Hz: 20_000 }, /b6Hz/],
    [{ kind: 'widths', b6Hz: 6_000, b60Hz: 6_000 }, /b60Hz/],
    [{ kind: 'transformers', count: 0, q: 60, coupling: 1 }, /count/],
    [{ kind: 'transformers', count: 2, q: 0, coupling: 1 }, /q must/],
    [{ kind: 'transformers', count: 2, q: 60, coupling: 0 }, /coupling/],
    [{ kind: 'table', points: [] }, /points/],
    [{ kind: 'table', points: [{ offsetHz: 0, rejectionDb: 0 }] }, /points/],
  ])('refuses %j', (selectivity, message) => {
    expect(() => ifSelectivity(selectivity, 455_000)).toThrow(message);
  });
});

describe('shapeFactorWarning', () => {
  it('warns of a shape that IF transformers do not give, unless a filter is fitted', () => {
    const filter = { kind: 'mechanical', centreHz: 455_000, widthHz: 6_000 } as const;

    expect(shapeFactorWarning({ b6Hz: 6_000, b60Hz: 22_000 }, null)).toBeNull();
    expect(shapeFactorWarning({ b6Hz: 6_000, b60Hz: 15_000 }, null)).toMatch(/2\.5/);
    expect(shapeFactorWarning({ b6Hz: 6_000, b60Hz: 15_000 }, filter)).toBeNull();
  });
});
