import { describe, expect, it } from 'vitest';

import { detectDecimalMark, detectDelimiter } from './csv-detection.ts';

describe('detectDelimiter', () => {
  it.each([
    ['a,b,c\n1,2,3', ','],
    ['a;b;c\n1,5;2,5;3', ';'],
    ['a\tb\n1\t2', '\t'],
    ['a|b\n1|2', '|'],
    ['Station;kHz\nx, y;1\nz, w;2', ';'],
    ['"a;b";c,d\n"e;f",1', ','],
    ['kHz\n612', ','],
    ['List of 2026, all bands\nas of May\nName;kHz;W\na;1;2\nb;3;4', ';'],
    ['', ','],
  ])('of %j is %j', (sample, delimiter) => {
    expect(detectDelimiter(sample)).toBe(delimiter);
  });
});

describe('detectDecimalMark', () => {
  it.each([
    [['48.1234', '612'], ',', '.'],
    [['48,1234', '612'], ';', ','],
    [['612,5'], ',', ','],
    [['1,250'], ',', '.'],
    [['48,123'], ';', ','],
    [['612,5', '48.12', '11.34'], ';', '.'],
    [['0,25 kW'], ';', ','],
    [['Mill', '612'], ';', '.'],
    [['1.234,5'], ';', ','],
    [['1,234.5'], ';', '.'],
    [['1 234,5'], ';', ','],
    [["1'234.5"], ';', '.'],
    [['1.234.567'], ';', ','],
  ] as const)('of %j separated by %j is %j', (cells, delimiter, mark) => {
    expect(detectDecimalMark([cells], delimiter).mark).toBe(mark);
  });

  it.each([
    [['48.1234'], true],
    [['612', 'Mill'], true],
    [['1.359', '1.404'], false],
    [['0.359'], true],
  ])('knows of %j whether it is sure: %s', (cells, sure) => {
    expect(detectDecimalMark([cells], ';').sure).toBe(sure);
  });
});
