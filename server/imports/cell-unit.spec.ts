import { describe, expect, it } from 'vitest';

import { readFrequency, readPower } from './cell-unit.ts';

describe('readFrequency', () => {
  it.each([
    ['612', 'kHz', '.', 612_000],
    ['612.0005', 'kHz', '.', 612_001],
    ['0,612', 'MHz', ',', 612_000],
    ['612000', 'Hz', '.', 612_000],
    ['612 kHz', 'Hz', '.', 612_000],
    ['1.359MHz', 'kHz', '.', 1_359_000],
  ] as const)('reads %s in %s', (cell, unit, mark, hertz) => {
    expect(readFrequency(cell, unit, mark)).toBe(hertz);
  });

  it.each(['0', '-612', '0.9', '1000001000', 'six', '612 W', '612 furlongs', ''])(
    'refuses %s kHz',
    (cell) => {
      expect(readFrequency(cell, 'kHz', '.')).toBeNull();
    },
  );
});

describe('readPower', () => {
  it.each([
    ['0', 'kW', 0],
    ['0.1', 'kW', 100],
    ['0.3', 'kW', 300],
    ['250 W', 'kW', 250],
    ['20', 'dBW', 100],
    ['-10', 'dBW', 0.1],
    ['10 dBW', 'W', 10],
  ] as const)('reads %s in %s as %d W', (cell, unit, watts) => {
    expect(readPower(cell, unit, '.')).toBe(watts);
  });

  it.each(['-1', '200000', 'much', '5 kHz'])('refuses %s kW', (cell) => {
    expect(readPower(cell, 'kW', '.')).toBeNull();
  });
});
