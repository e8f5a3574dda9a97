import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  halfIfFrequencies,
  imageFrequency,
  oscillatorFrequency,
  productFrequencies,
  rangeRatio,
  sideSign,
} from './superheterodyne.ts';

const dial = fc.integer({ min: 1_000_000, max: 30_000_000 });
const intermediate = fc.integer({ min: 50_000, max: 480_000 });

describe('frequencies of the superheterodyne', () => {
  it('are those of the examples', () => {
    expect(sideSign('below')).toBe(-1);
    expect(oscillatorFrequency(1_000_000, 455_000, 'above')).toBe(1_455_000);
    expect(imageFrequency(1_000_000, 455_000, 'above')).toBe(1_910_000);
    expect(halfIfFrequencies(1_000_000, 455_000, 'above')).toEqual([1_227_500, 1_682_500]);
    expect(productFrequencies(1_455_000, 455_000, 3, 2)).toEqual([1_955_000, 2_410_000]);
    expect(rangeRatio(550_000, 1_600_000)).toBeCloseTo(2.90909, 5);
  });

  it('mirror about the dial when the oscillator changes sides', () => {
    fc.assert(
      fc.property(dial, intermediate, (dialHz, ifHz) => {
        const above = imageFrequency(dialHz, ifHz, 'above') - dialHz;

        expect(dialHz - imageFrequency(dialHz, ifHz, 'below')).toBe(above);
      }),
    );
  });

  it('contain the wanted station, the image and the half-IF responses among the products', () => {
    fc.assert(
      fc.property(dial, intermediate, (dialHz, ifHz) => {
        const oscillator = oscillatorFrequency(dialHz, ifHz, 'above');

        expect(productFrequencies(oscillator, ifHz, 1, 1)).toEqual([
          dialHz,
          imageFrequency(dialHz, ifHz, 'above'),
        ]);
        expect(productFrequencies(oscillator, ifHz, 2, 2)).toEqual(
          halfIfFrequencies(dialHz, ifHz, 'above'),
        );
        expect(productFrequencies(oscillator, ifHz, 0, 1)).toEqual([ifHz, ifHz]);
      }),
    );
  });

  it('refuse orders and ends that cannot be', () => {
    expect(() => productFrequencies(1e6, 455e3, -1, 1)).toThrow(/m must/);
    expect(() => productFrequencies(1e6, 455e3, 1, 0)).toThrow(/n must/);
    expect(() => rangeRatio(0, 1e6)).toThrow(/lowHz/);
    expect(() => rangeRatio(1e6, NaN)).toThrow(/highHz/);
  });
});
