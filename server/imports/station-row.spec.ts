import { describe, expect, it } from 'vitest';

import type { ImportColumn } from '../../shared/contracts/list-import.ts';
import { RowReader } from './station-row.ts';

const column = (
  header: string,
  field: ImportColumn['field'],
  unit: ImportColumn['unit'] = null,
): ImportColumn => ({ header, field, unit });

const COLUMNS = [
  column('Station', 'name'),
  column('Call', 'callSign'),
  column('Colour', null),
  column('kHz', 'frequency', 'kHz'),
  column('Lat', 'latitude', 'degrees'),
  column('Lon', 'longitude', 'degrees'),
  column('Locator', 'locator'),
  column('Power', 'power', 'kW'),
  column('Night', 'powerNight', 'kW'),
];
const READING = {
  encoding: 'UTF-8',
  delimiter: ',',
  decimalMark: '.',
  headerLine: 1,
  dataLine: 2,
  letterO: null,
  addsTo: null,
} as const;
const reader = new RowReader({ ...READING, columns: COLUMNS });
const read = (text: string) => reader.read({ line: 7, cells: text.split('|') });

describe('RowReader', () => {
  it('reads a whole row', () => {
    expect(read('  Mill \t Hill |XQA|red|612.5|50|8||10|2').station).toEqual({
      name: 'Mill Hill',
      callSign: 'XQA',
      frequencyHz: 612_500,
      latitude: 50,
      longitude: 8,
      powerDayW: 10_000,
      powerNightW: 2000,
      patternDb: null,
      hours: '',
      note: '',
    });
  });

  it('keeps a row without place or power, and a row cut short', () => {
    const bare = { latitude: null, longitude: null, powerDayW: null, powerNightW: null };

    expect(read('Mill|XQA|red|612|||||').station).toMatchObject(bare);
    expect(read('Mill|XQA|red|612').station).toMatchObject(bare);
    expect(read('Mill|XQA|red|612|-|n/a').station).toMatchObject(bare);
  });

  it('takes one power for day and night, and the place from a locator', () => {
    expect(read('Mill|||612|||JN58td|5').station).toMatchObject({
      latitude: 48.1458333,
      longitude: 11.625,
      powerDayW: 5000,
      powerNightW: 5000,
    });
  });

  it('takes a call sign for a name that is missing', () => {
    expect(read('|XQA||612').station).toMatchObject({ name: '', callSign: 'XQA' });
  });

  it.each([
    ['|||612', 'Station', ''],
    ['Mill||||', 'kHz', ''],
    ['Mill|||six', 'kHz', 'six'],
    ['Mill|||612|95|8', 'Lat', '95'],
    ['Mill|||612|50', 'Lon', ''],
    ['Mill|||612||8', 'Lat', ''],
    ['Mill|||612|||here', 'Locator', 'here'],
    ['Mill|||612||||-5', 'Power', '-5'],
    ['Mill|||612||||5|lots', 'Night', 'lots'],
    [`${'x'.repeat(201)}|||612`, 'Station', 'x'.repeat(200)],
    ['Mill|||612||||5|5|surplus', 'Night', 'surplus'],
  ])('faults %s in its column', (text, header, value) => {
    const { station, faults } = read(text);

    expect(station).toBeNull();
    expect(faults).toMatchObject([{ line: 7, column: header, value }]);
  });

  it('names every fault of a row', () => {
    expect(read('|||x|y|z').faults.map((fault) => fault.column)).toEqual([
      'kHz',
      'Lat',
      'Lon',
      'Station',
    ]);
  });
});
