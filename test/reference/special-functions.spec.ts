import { describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/special-functions.json' with { type: 'json' };
import { airy } from '../../shared/radio/mathematics/airy.ts';
import {
  complex,
  type Complex,
  modulus,
  subtract,
} from '../../shared/radio/mathematics/complex.ts';
import { faddeeva } from '../../shared/radio/mathematics/faddeeva.ts';

const number = ([re = NaN, im = NaN]: readonly number[]): Complex => complex(re, im);

function expectClose(found: Complex, expected: Complex, envelope: number, tolerance: number): void {
  expect(modulus(subtract(found, expected))).toBeLessThan(tolerance * envelope);
}

describe(`special functions: ${reference.source} [${reference.mark}]`, () => {
  it.each(reference.airy)('Ai at $z', ({ z, value, derivative }) => {
    const found = airy(number(z));
    // At a zero of the one the other tells the size.
    const envelope = modulus(number(value)) + modulus(number(derivative));

    expectClose(found.value, number(value), envelope, 1e-9);
    expectClose(found.derivative, number(derivative), envelope, 1e-9);
  });

  it.each(reference.faddeeva)('w at $z', ({ z, value }) => {
    expectClose(faddeeva(number(z)), number(value), modulus(number(value)), 1e-11);
  });
});
