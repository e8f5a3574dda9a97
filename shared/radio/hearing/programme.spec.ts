import { describe, expect, it } from 'vitest';

import { emissionWidth, programmeBands } from './programme.ts';

describe('programmeBands', () => {
  it('ends with the emission and shares out the whole power', () => {
    expect(programmeBands(4500)).toHaveLength(17);
    expect(programmeBands(10_000)).toHaveLength(21);
    const sum = programmeBands(4500).reduce((total, { share }) => total + share, 0);
    expect(sum).toBeCloseTo(1, 12);
  });

  it('rises to the knee near 600 Hz and falls beyond', () => {
    const shares = programmeBands(10_000).map(({ share }) => share);

    expect(shares.indexOf(Math.max(...shares))).toBe(8);
  });

  it('refuses a width that leaves nothing', () => {
    expect(() => programmeBands(99)).toThrow(/widthHz/);
  });
});

describe('emissionWidth', () => {
  it('is wider in Region 2', () => {
    expect(([1, 2, 3] as const).map(emissionWidth)).toEqual([4_500, 10_000, 4_500]);
  });
});
