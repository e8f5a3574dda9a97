import { describe, expect, it } from 'vitest';

import { readPlace } from './cell-place.ts';

const NORTH_EAST = { latitude: 48.1466667, longitude: 11.6083333 };

describe('readPlace', () => {
  it.each([
    '48°08\'48"N 011°36\'30"E',
    '48°08′48″N, 11°36′30″E',
    '48° 08\' 48" N 11° 36\' 30" E',
    '48°08\'48"N011°36\'30"E',
    'N 48 08 48 E 011 36 30',
    'N480848E0113630',
    '480848N 0113630E',
    '480848N0113630E',
    '48 08 48 11 36 30',
    '48:08:48/11:36:30',
    '11°36\'30"E 48°08\'48"N',
    '(48.1466667, 11.6083333)',
    '48.1466667N 11.6083333E',
    '48.1466667 11.6083333',
    '48.1466667,11.6083333',
  ])('reads %s', (cell) => {
    expect(readPlace(cell, '.', null)).toEqual(NORTH_EAST);
  });

  it('reads the letter of the hemisphere between degrees and minutes', () => {
    expect(readPlace('48N08 11E36', '.', null)).toEqual({ latitude: 48.1333333, longitude: 11.6 });
    expect(readPlace('33S52 070W40', '.', null)).toEqual({
      latitude: -33.8666667,
      longitude: -70.6666667,
    });
  });

  it('reads south and west by letter or sign', () => {
    const place = { latitude: -12.5, longitude: -45.25 };

    for (const cell of ['-12.5, -45.25', '12.5 S, 45.25 W', 'S 12 30 W 45 15', "12°30'S 45°15'W"]) {
      expect(readPlace(cell, '.', null)).toEqual(place);
    }
  });

  it('takes the decimal mark that makes sense, the first of the file', () => {
    const place = { latitude: 48.1467, longitude: 11.6083 };

    for (const mark of ['.', ','] as const) {
      for (const cell of ['48.1467, 11.6083', '48,1467; 11,6083', '48,1467 11,6083']) {
        expect(readPlace(cell, mark, null)).toEqual(place);
      }
    }
  });

  it('takes the letter O as it was answered', () => {
    expect(readPlace('48 08 N 11 36 O', '.', 'east')?.longitude).toBe(11.6);
    expect(readPlace('48 08 N 11 36 O', '.', 'west')?.longitude).toBe(-11.6);
    expect(readPlace('48 08 N 11 36 O', '.', 'open')).toBeNull();
  });

  it.each([
    'Ferry Point',
    '48.1467',
    '48 08 11',
    '95.1, 11.6',
    '48.1, 190',
    "48°75'N 11°36'E",
    '48N 08N',
    '48.1467, 11.6083, 520',
    '',
  ])('does not read "%s"', (cell) => {
    expect(readPlace(cell, '.', null)).toBeNull();
  });
});
