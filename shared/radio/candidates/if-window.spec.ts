import { describe, expect, it } from 'vitest';

import { breakthroughWindow } from './if-window.ts';

describe('breakthroughWindow', () => {
  it('gives the value of its example', () => {
    const ratio = (hz: number): number => Math.abs(hz - 560_000) / 100;

    expect(breakthroughWindow(555_000, [ratio], 11_000)).toEqual({ low: 544_000, high: 555_300 });
  });

  it('holds for all sites and periods at once', () => {
    const steep = (hz: number): number => Math.abs(hz - 560_000) / 100;
    const other = (hz: number): number => Math.abs(hz - 550_000) / 100;

    expect(breakthroughWindow(555_000, [steep, other], 11_000)).toEqual({
      low: 554_700,
      high: 555_300,
    });
  });

  it('ends before breakthrough is heard where none is', () => {
    const ratio = (hz: number): number => (hz < 556_000 ? Infinity : 20);

    expect(breakthroughWindow(555_000, [ratio], 11_000).high).toBe(555_900);
  });

  it('reaches no farther than it is followed, and never zero', () => {
    expect(breakthroughWindow(5_000, [], 11_000)).toEqual({ low: 100, high: 16_000 });
  });
});
