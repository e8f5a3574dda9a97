import { describe, expect, it } from 'vitest';

import type { ImportFault, ImportField } from '../../shared/contracts/list-import.ts';
import { PlaceReader } from './place-reader.ts';

const SPLIT: readonly ImportField[] = [
  'latitudeDegrees',
  'latitudeMinutes',
  'latitudeSeconds',
  'latitudeHemisphere',
  'longitudeDegrees',
  'longitudeMinutes',
  'longitudeSeconds',
  'longitudeHemisphere',
];

function read(fields: readonly ImportField[], text: string, mark: '.' | ',' = '.') {
  const reader = new PlaceReader({
    encoding: 'UTF-8',
    delimiter: ';',
    decimalMark: mark,
    headerLine: 1,
    dataLine: 2,
    letterO: null,
    columns: fields.map((field) => ({ header: `the ${field}`, field, unit: null })),
    addsTo: null,
  });
  const faults: ImportFault[] = [];
  const place = reader.read({ line: 2, cells: text.split(';') }, faults);
  return faults.length > 0 ? faults.map(({ column, value }) => [column, value]) : place;
}

const NOWHERE = { latitude: null, longitude: null };

describe('a place split over columns', () => {
  it('is put together', () => {
    const place = { latitude: -48.5125, longitude: 11.25 };

    expect(read(SPLIT, '48;30;45;S;11;15;00;E')).toEqual(place);
    expect(read(SPLIT, '-48;30;45;;011;15;;')).toEqual(place);
    expect(read(SPLIT, '48°;30\';45";south;11°;15\';0";east')).toEqual(place);
    expect(read(SPLIT, '48;30,75;;S;11;15;-;E', ',')).toEqual(place);
    expect(read(SPLIT, '48.5125;;;S;11.25;;;E')).toEqual(place);
  });

  it('keeps the sign of minus nought degrees', () => {
    expect(read(SPLIT, '-0;30;0;;0;15;0;W')).toEqual({ latitude: -0.5, longitude: -0.25 });
  });

  it('is nowhere where only letters are told', () => {
    expect(read(SPLIT, ';;;N;;;;E')).toEqual(NOWHERE);
  });

  it.each([
    [';30;45;N;11;15;0;E', '?°30\'45"N'],
    ['48;;45;N;11;15;0;E', '48°?\'45"N'],
    ['48;60;45;N;11;15;0;E', '48°60\'45"N'],
    ['48.5;30;45;N;11;15;0;E', '48.5°30\'45"N'],
    ['-48;30;45;S;11;15;0;E', '-48°30\'45"S'],
    ['48;30;45;E;11;15;0;E', '48°30\'45"E'],
    ['91;0;0;N;11;15;0;E', '91°0\'0"N'],
  ])('is refused as %s', (text, seen) => {
    expect(read(SPLIT, text)).toEqual([['the latitudeDegrees', seen]]);
  });

  it('is refused when half of it is lacking', () => {
    expect(read(SPLIT, '48;30;45;N;;;;E')).toEqual([['the longitudeDegrees', '']]);
  });
});

describe('a place', () => {
  it('takes the letter of its hemisphere from a column beside', () => {
    const fields = ['latitude', 'latitudeHemisphere', 'longitude', 'longitudeHemisphere'] as const;

    expect(read(fields, '48.5;S;11 15;W')).toEqual({ latitude: -48.5, longitude: -11.25 });
    expect(read(fields, '48.5;W;11.25;W')).toEqual([['the latitude', '48.5 W']]);
  });

  it('is the first that a row fills: two columns, one cell, a locator', () => {
    const fields = ['latitude', 'longitude', 'place', 'locator'] as const;

    expect(read(fields, '48.5;11.25;1 N 2 E;AA00')).toEqual({ latitude: 48.5, longitude: 11.25 });
    expect(read(fields, ';;1 N 2 E;AA00')).toEqual({ latitude: 1, longitude: 2 });
    expect(read(fields, ';;;JN58')).toEqual({ latitude: 48.5, longitude: 11 });
    expect(read(fields, ';;;')).toEqual(NOWHERE);
    expect(read(fields, ';;here;')).toEqual([['the place', 'here']]);
  });
});
