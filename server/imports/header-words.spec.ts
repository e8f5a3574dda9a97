import { describe, expect, it } from 'vitest';

import { readHeader } from './header-words.ts';

describe('readHeader', () => {
  it.each([
    ['name', 'name', null],
    ['Station', 'name', null],
    ['frequency_khz', 'frequency', 'kHz'],
    ['Frequency (kHz)', 'frequency', 'kHz'],
    ['FREQ. [MHz]', 'frequency', 'MHz'],
    ['frequencyKHz', 'frequency', 'kHz'],
    ['kHz', 'frequency', 'kHz'],
    ['Frequency', 'frequency', null],
    ['power_day_kw', 'powerDay', 'kW'],
    ['Power night (kW)', 'powerNight', 'kW'],
    ['powerNightKw', 'powerNight', 'kW'],
    ['ERP (dBW)', 'power', 'dBW'],
    ['Latitude', 'latitude', null],
    ['Lat. (dms)', 'latitude', 'dms'],
    ['longitude_degrees', 'longitude', 'degrees'],
    ['Call sign', 'callSign', null],
    ['Fréquence (kHz)', 'frequency', 'kHz'],
    ['Länge', 'longitude', null],
    ['Leistung Tag kW', 'powerDay', 'kW'],
    ['Grid locator', 'locator', null],
    ['Remarks', 'note', null],
  ])('reads %s as %s in %s', (header, field, unit) => {
    expect(readHeader(header)).toEqual({ field, unit });
  });

  it.each(['', 'colour', 'line', 'fault', '12', 'arrow'])('knows nothing of "%s"', (header) => {
    expect(readHeader(header)).toEqual({ field: null, unit: null });
  });
});
