import { describe, expect, it } from 'vitest';

import { placeColumns } from './place-headers.ts';

const fieldsOf = (header: string) => {
  const headers = header.split(';');
  const found = placeColumns(headers);
  return headers.map((_, index) => found.get(index) ?? '');
};
const SPLIT = [
  'latitudeDegrees',
  'latitudeMinutes',
  'latitudeSeconds',
  'latitudeHemisphere',
  'longitudeDegrees',
  'longitudeMinutes',
  'longitudeSeconds',
  'longitudeHemisphere',
];

describe('placeColumns', () => {
  it.each([
    'lat_deg;lat_min;lat_sec;lat_dir;lon_deg;lon_min;lon_sec;lon_dir',
    'LatDeg;LatMin;LatSec;LatDir;LongDeg;LongMin;LongSec;LongDir',
    'Latitude (deg);Latitude (min);Latitude (sec);N/S;Longitude (deg);Longitude (min);Longitude (sec);E/W',
    'Latitude °;Latitude \';Latitude ";N/S;Longitude °;Longitude \';Longitude ";W/E',
    'Deg;Min;Sec;N/S;Deg;Min;Sec;E/W',
    'Lat;Min;Sec;Hemisphere;Long;Min;Sec;Hemisphere',
    'Breite Grad;Breite Min;Breite Sek;N/S;Länge Grad;Länge Min;Länge Sek;O/W',
    'degrees latitude;minutes latitude;seconds latitude;ns;degrees longitude;minutes longitude;seconds longitude;ew',
  ])('knows %s', (header) => {
    expect(fieldsOf(header)).toEqual(SPLIT);
  });

  it('takes a letter beside a whole coordinate', () => {
    expect(fieldsOf('name;Lat;N/S;Lon;E/W')).toEqual([
      '',
      '',
      'latitudeHemisphere',
      '',
      'longitudeHemisphere',
    ]);
  });

  it('knows degrees and minutes without seconds', () => {
    expect(fieldsOf('lat deg;lat min;lon deg;lon min')).toEqual([
      'latitudeDegrees',
      'latitudeMinutes',
      'longitudeDegrees',
      'longitudeMinutes',
    ]);
  });

  it('leaves whole coordinates, and minutes of something else, alone', () => {
    expect(fieldsOf('Lat (deg);Lon (deg);Min;Sec')).toEqual(['', '', '', '']);
    expect(fieldsOf('name;min;sec;direction')).toEqual(['', '', '', '']);
    expect(fieldsOf('latitude;longitude')).toEqual(['', '']);
  });
});
