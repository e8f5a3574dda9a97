import { describe, expect, it } from 'vitest';

import { readCoordinate } from './cell-coordinate.ts';

const COMMA = { unit: 'degrees', mark: ',' } as const;

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
    ['48\u00b008\u203248\u2033N', 'latitude', 48.1466667],
    ['48 08 48 N', 'latitude', 48.1466667],
    ['48-08-48N', 'latitude', 48.1466667],
    ['48:08:48', 'latitude', 48.1466667],
    ['48.08.48', 'latitude', 48.1466667],
    ['N48 08 48', 'latitude', 48.1466667],
    ['N 48\u00b0 08\u2019 48\u201d', 'latitude', 48.1466667],
    ["48\u00ba 8' 48'' N", 'latitude', 48.1466667],
    ['48\u00b008.8\u2032N', 'latitude', 48.1466667],
    ['48 deg 08 min 48 sec S', 'latitude', -48.1466667],
    ['480848N', 'latitude', 48.1466667],
    ['0113430E', 'longitude', 11.575],
    ['4808N', 'latitude', 48.1333333],
    ['01134W', 'longitude', -11.5666667],
    ['011E3430', 'longitude', 11.575],
    ['48N08', 'latitude', 48.1333333],
    ['48.5 Nord', 'latitude', 48.5],
    ['11.25 Ost', 'longitude', 11.25],
    ['11.25 \u00f6. L.', 'longitude', 11.25],
    ['3.5 Oeste', 'longitude', -3.5],
    ['Ouest 3.5', 'longitude', -3.5],
    ['48.5 s. \u0161.', 'latitude', 48.5],
    ['15.5 v\u00fdchod', 'longitude', 15.5],
    ['0', 'latitude', 0],
    ['180', 'longitude', 180],
  ] as const)('reads %s as a %s of %d', (cell, axis, degrees) => {
    expect(readCoordinate(cell, axis, { unit: 'degrees', mark: '.' })).toBeCloseTo(degrees, 9);
  });

  it.each([
    ['483036', 'latitude', 48.51],
    ['483036N', 'latitude', 48.51],
    ['0111500W', 'longitude', -11.25],
    ['48 30 36', 'latitude', 48.51],
  ] as const)('reads %s under dms as a %s of %d', (cell, axis, degrees) => {
    expect(readCoordinate(cell, axis, { unit: 'dms', mark: '.' })).toBeCloseTo(degrees, 9);
  });

  it('reads a decimal comma where the file has it', () => {
    expect(readCoordinate('48,5', 'latitude', COMMA)).toBe(48.5);
    expect(readCoordinate('48\u00b030\u203236,0\u2033 N', 'latitude', COMMA)).toBe(48.51);
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
    ['11.25 O', 'longitude', 'degrees'],
    ['48.5 Ost', 'latitude', 'degrees'],
    ['15.5 V', 'longitude', 'degrees'],
    ['480848E', 'latitude', 'degrees'],
    ['', 'latitude', 'degrees'],
  ] as const)('refuses %s as a %s in %s', (cell, axis, unit) => {
    expect(readCoordinate(cell, axis, { unit, mark: '.' })).toBeNull();
  });

  it('reads the letter O as it was said to mean', () => {
    const spelling = { unit: 'degrees', mark: '.' } as const;

    expect(readCoordinate('11.25 O', 'longitude', { ...spelling, letterO: 'east' })).toBe(11.25);
    expect(readCoordinate('3.5 O', 'longitude', { ...spelling, letterO: 'west' })).toBe(-3.5);
    expect(readCoordinate('3.5 O', 'longitude', { ...spelling, letterO: 'open' })).toBeNull();
  });
});
