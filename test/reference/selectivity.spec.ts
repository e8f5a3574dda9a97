import { describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/selectivity.json' with { type: 'json' };
import { ifSelectivity, skirtExponent } from '../../shared/radio/circuits/selectivity.ts';

const { widths, shapeFactors } = reference;

describe(`two widths: ${widths.source} [${widths.mark}]`, () => {
  it.each(widths.exponents)('$b6Hz/$b60Hz: exponent $exponent', ({ b6Hz, b60Hz, exponent }) => {
    expect(skirtExponent(b6Hz, b60Hz)).toBeCloseTo(exponent, 5);
  });

  it.each(widths.checks)(
    '$b6Hz/$b60Hz, $offsetHz Hz off: $rejectionDb dB',
    ({ b6Hz, b60Hz, offsetHz, rejectionDb }) => {
      const set = ifSelectivity({ kind: 'widths', b6Hz, b60Hz }, 455_000);

      expect(set.rejectionDb(offsetHz)).toBeCloseTo(rejectionDb, 4);
      expect(set.rejectionDb(-offsetHz)).toBe(set.rejectionDb(offsetHz));
    },
  );
});

describe(`IF transformers: ${shapeFactors.source} [${shapeFactors.mark}]`, () => {
  it.each(shapeFactors.checks)(
    '$count critically coupled: shape factor $shapeFactor',
    ({ count, shapeFactor, digits = 4 }) => {
      const set = ifSelectivity({ kind: 'transformers', count, q: 60, coupling: 1 }, 455_000);

      expect(set.b60Hz / set.b6Hz).toBeCloseTo(shapeFactor, digits);
    },
  );
});
