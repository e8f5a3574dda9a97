import { describe, expect, it } from 'vitest';

import { causeOf, productName } from './product-names.ts';

describe('productName', () => {
  it.each([
    [1, 1, 1, 'plus', 'image'],
    [0, 1, 1, 'plus', 'IF breakthrough'],
    [0, 2, 1, 'plus', 'station at half the IF'],
    [0, 3, 1, 'plus', 'station at a third of the IF'],
    [2, 1, 1, 'less', "oscillator's 2nd harmonic less IF"],
    [1, 1, 2, 'plus', 'oscillator plus IF'],
    [3, 2, 1, 'plus', "signal's 2nd harmonic on oscillator's 3rd harmonic plus IF"],
    [1, 1, 3, 'below', 'IF less oscillator'],
  ] as const)('(%i, %i) with harmonic %i, %s: %s', (m, n, harmonic, relation, name) => {
    expect(productName(m, n, harmonic, relation)).toBe(name);
  });

  it('names a half-IF response as such', () => {
    expect(productName(2, 2, 1, 'less')).toMatch(/^half-IF response, /);
  });
});

describe('causeOf', () => {
  it('tells the causes apart, by the converting harmonic', () => {
    expect(causeOf(0, 3, 1)).toBe('breakthrough');
    expect(causeOf(2, 1, 2)).toBe('image');
    expect(causeOf(1, 1, 2)).toBe('oscillator-harmonic');
    expect(causeOf(2, 2, 1)).toBe('half-if');
    expect(causeOf(2, 2, 2)).toBe('product');
    expect(causeOf(4, 2, 2)).toBe('half-if');
  });
});
