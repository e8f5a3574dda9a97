import { describe, expect, it } from 'vitest';

import type { WhistleCause } from './whistle-cause.ts';
import { orderCauses } from './whistle-order.ts';

const cause = (name: string, over: Partial<WhistleCause>): WhistleCause => ({
  cause: 'product',
  name,
  station: 0,
  frequencyHz: 1_000_000,
  pitchHz: 1000,
  slope: 1,
  levelDb: -20,
  test: '',
  ...over,
});
const ordered = (
  causes: readonly WhistleCause[],
  pitchHz: number | null,
  pitchSlope: number | null,
): string =>
  orderCauses(causes, { pitchHz, pitchSlope }, 1000)
    .map(({ name }) => name)
    .join(' ');

describe('orderCauses', () => {
  it('puts what has no level behind what has one, where nothing was noted', () => {
    const causes = [
      cause('unknown', { levelDb: null }),
      cause('weak', { levelDb: -60 }),
      cause('strong', { levelDb: -10 }),
    ];

    expect(ordered(causes, null, null)).toBe('strong weak unknown');
  });

  it('takes a right pitch, then one that a misread dial makes right, then the others', () => {
    const causes = [
      cause('far', { pitchHz: 4000, levelDb: 0 }),
      // 2800 less 1000 heard is 1800: within twice 1 kHz of tolerance.
      cause('misread', { pitchHz: 2800, slope: 2, levelDb: -10 }),
      cause('right', { pitchHz: 1080, levelDb: -40 }),
    ];

    expect(ordered(causes, 1000, null)).toBe('right misread far');
  });

  it('never lets a misread dial move the pitch of a station next door', () => {
    const causes = [
      cause('next door', { pitchHz: 1900, slope: 0, levelDb: 0 }),
      cause('breakthrough', { pitchHz: 1900, slope: 1, levelDb: -40 }),
    ];

    expect(ordered(causes, 1000, null)).toBe('breakthrough next door');
  });

  it('tells slopes apart that lie half a hertz from each other, of either sign', () => {
    const causes = [
      cause('one', { slope: 1, levelDb: 0 }),
      cause('one and a half', { slope: 1.5, levelDb: -40 }),
    ];

    expect(ordered(causes, null, 1.45)).toBe('one and a half one');
    expect(ordered(causes, null, -1)).toBe('one one and a half');
  });
});
