import { describe, expect, it } from 'vitest';

import { changeUncertainty, ratioUncertainty } from './uncertainty.ts';

describe('ratioUncertainty', () => {
  it('gives the value of its example', () => {
    expect(ratioUncertainty(1, 1, false, 'night', false)).toBeCloseTo(10.77, 2);
  });

  it('leaves out what was given or assumed', () => {
    expect(ratioUncertainty(2, 3, true, 'night', true)).toBe(24);
    expect(ratioUncertainty(1, 0, false, 'day', true)).toBe(6);
  });
});

describe('changeUncertainty', () => {
  it('gives the value of its example', () => {
    expect(changeUncertainty(1, 1, (hz) => -hz / 1000, 5000)).toBeCloseTo(4.03, 2);
  });

  it('takes a beat below zero as one above', () => {
    expect(changeUncertainty(1, 0, (hz) => hz, 100)).toBe((600 - 400) / 2);
  });
});
