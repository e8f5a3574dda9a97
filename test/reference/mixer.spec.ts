import { describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/mixer.json' with { type: 'json' };
import { mixerLevel } from '../../shared/radio/product-levels.ts';

const { oscillatorHarmonics } = reference;

describe(`${oscillatorHarmonics.source} [${oscillatorHarmonics.mark}]`, () => {
  it.each(oscillatorHarmonics.percentOfPeak.map((percent, index) => ({ percent, m: index + 1 })))(
    'harmonic $m: $percent %',
    ({ percent, m }) => {
      const fundamental = oscillatorHarmonics.percentOfPeak[0] ?? NaN;
      const expected = 20 * Math.log10(percent / fundamental);

      expect(Math.abs(mixerLevel(m, 1, 3) - expected)).toBeLessThan(
        oscillatorHarmonics.toleranceDb,
      );
    },
  );
});
