import { describe, expect, it } from 'vitest';

import { isBlank, readNumber } from './cell-number.ts';

describe('readNumber', () => {
  it.each([
    ['612', '.', 612],
    [' 612.50 ', '.', 612.5],
    ['-0.5', '.', -0.5],
    ['\u22125', '.', -5],
    ['1,250.5', '.', 1250.5],
    ['1 250', '.', 1250],
    ["1'250", '.', 1250],
    ['.5', '.', 0.5],
    ['1e3', '.', 1000],
    ['612,5', ',', 612.5],
    ['1.250,5', ',', 1250.5],
    ['1\u202f250,5', ',', 1250.5],
    ['612', ',', 612],
  ] as const)('reads %s with the mark %s as %d', (cell, mark, value) => {
    expect(readNumber(cell, mark)).toBe(value);
  });

  it.each([
    ['612,5', '.'],
    ['612.5', ','],
    ['1,25.0', '.'],
    ['12 34', '.'],
    ['six', '.'],
    ['', '.'],
    ['-', '.'],
    ['1e999', '.'],
    ['0x10', '.'],
    ['NaN', '.'],
    ['Infinity', '.'],
  ] as const)('takes %s with the mark %s for no number', (cell, mark) => {
    expect(readNumber(cell, mark)).toBeNull();
  });
});

describe('isBlank', () => {
  it.each(['', '  ', '-', ' \u2013 ', 'N/A'])('takes "%s" for nothing said', (cell) => {
    expect(isBlank(cell)).toBe(true);
  });

  it.each(['0', '-1', 'none'])('takes "%s" for something said', (cell) => {
    expect(isBlank(cell)).toBe(false);
  });
});
