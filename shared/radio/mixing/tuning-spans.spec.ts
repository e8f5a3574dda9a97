import { describe, expect, it } from 'vitest';

import { imageSpan, oscillatorSpan } from './tuning-spans.ts';

const band = {
  lowHz: 550_000,
  highHz: 1_600_000,
  oscillator: 'above',
  oscillatorHarmonic: 1,
} as const;

describe('oscillatorSpan', () => {
  it('gives the value of its example', () => {
    expect(oscillatorSpan(band, 455_000)).toEqual({ low: 1_005_000, high: 2_055_000 });
  });

  it('is that of the fundamental, in whole hertz, half up', () => {
    expect(oscillatorSpan({ ...band, oscillatorHarmonic: 2 }, 455_001)).toEqual({
      low: 502_501,
      high: 1_027_501,
    });
  });
});

describe('imageSpan', () => {
  it('gives the value of its example', () => {
    expect(imageSpan(band, 455_000)).toEqual({ low: 1_460_000, high: 2_510_000 });
  });

  it('turns back at zero with an oscillator below', () => {
    const below = { ...band, oscillator: 'below' } as const;

    expect(imageSpan(below, 455_000)).toEqual({ low: 0, high: 690_000 });
    expect(imageSpan({ ...below, lowHz: 1_000_000 }, 455_000)).toEqual({
      low: 90_000,
      high: 690_000,
    });
  });
});
