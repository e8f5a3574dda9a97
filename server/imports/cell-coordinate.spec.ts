import { describe, expect, it } from 'vitest';

import { readCoordinate } from './cell-coordinate.ts';

describe('readCoordinate', () => {
  it.each([
    ['48.5', 'latitude', 48.5],
    ['-34.91', 'latitude', -34.91],
    ['48.5 N', 'latitude', 48.5],
    ['S34.91', 'latitude', -34.91],
    ['11.25w', 'longitude', -11.25],
    ['48\u00b030\u203200\u2033N', 'latitude', 48.5],
    ['48\u00b030\'36"', 'latitude', 48.51],
    ['48 30 36 S', 'latitude', -48.51],
    ['011-15-00 E', 'longitude', 11.25],
    ['11:15', 'longitude', 11.25],
    ['-11d15m', 'longitude', -11.25],
    ['48d30m36s', 'latitude', 48.51],
    ['48D30M36S', 'latitude', 48.51],
    ['48d30m36s S', 'latitude', -48.51],
    ['48d30m36S', 'latitude', -48.51],
    ['0', 'latitude', 0],
    ['180', 'longitude', 180],
  ] as const)('reads %s as a %s of %d', (cell, axis, degrees) => {
    expect(readCoordinate(cell, axis, 'degrees', '.')).toBeCloseTo(degrees, 9);
  });

  it.each([
    ['483036', 'latitude', 48.51],
    ['483036N', 'latitude', 48.51],
    ['0111500W', 'longitude', -11.25],
    ['48 30 36', 'latitude', 48.51],
  ] as const)('reads %s under dms as a %s of %d', (cell, axis, degrees) => {
    expect(readCoordinate(cell, axis, 'dms', '.')).toBeCloseTo(degrees, 9);
  });

  it('reads a decimal comma where the file has it', () => {
    expect(readCoordinate('48,5', 'latitude', 'degrees', ',')).toBe(48.5);
    expect(readCoordinate('48\u00b030\u203236,0\u2033 N', 'latitude', 'degrees', ',')).toBe(48.51);
  });

  it.each([
    ['95', 'latitude', 'degrees'],
    ['-181', 'longitude', 'degrees'],
    ['48.5 E', 'latitude', 'degrees'],
    ['-48.5 S', 'latitude', 'degrees'],
    ['N48.5N', 'latitude', 'degrees'],
    ['48 60 00', 'latitude', 'degrees'],
    ['48.5 30', 'latitude', 'degrees'],
    ['48 30 00 00', 'latitude', 'degrees'],
    ['483036', 'latitude', 'degrees'],
    ['48.5', 'latitude', 'dms'],
    ['north', 'latitude', 'degrees'],
    ['', 'latitude', 'degrees'],
  ] as const)('refuses %s as a %s in %s', (cell, axis, unit) => {
    expect(readCoordinate(cell, axis, unit, '.')).toBeNull();
  });
});
