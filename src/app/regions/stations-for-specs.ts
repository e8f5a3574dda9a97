/** An edition and its stations, as the server would answer; for specs. */
export const EDITION = {
  id: 5,
  regionId: 1,
  regionName: 'Vale',
  label: 'Spring',
  date: '2026-03-01',
  source: 'vale.csv',
  note: '',
  stations: 120,
  raster: [],
  editable: true,
  createdAt: '2026-03-01T10:00:00.000Z',
};

export const FERRY_POINT = {
  id: 1,
  name: 'Ferry Point',
  callSign: '',
  frequencyHz: 613_500,
  latitude: 47.31,
  longitude: -8.05,
  powerDayW: 50_000,
  powerNightW: 0,
  hours: '04:00 to 22:00',
  note: '',
  patternDb: null,
  official: null,
  onRaster: false,
  offAir: false,
  corrections: [],
  distanceM: null,
  fieldDb: null,
};

const UNKNOWN = {
  ...FERRY_POINT,
  id: 2,
  name: '',
  callSign: 'QXB',
  latitude: null,
  longitude: null,
  powerDayW: null,
  powerNightW: 1000,
  hours: '',
  onRaster: true,
};

/** Changed by hand: the list says another power by night. */
export const NOWHERE = {
  ...UNKNOWN,
  powerNightW: 250,
  official: UNKNOWN,
  corrections: [
    {
      id: 7,
      kind: 'changed',
      date: '2026-03-02',
      note: 'By letter',
      authorName: 'Ada Quill',
      editable: true,
    },
  ],
};

export const PLACES = {
  items: [
    { ...FERRY_POINT, name: 'Ferry Point' },
    { ...FERRY_POINT, id: 3, name: 'Mill Hill', latitude: 47.5, powerDayW: 1000 },
  ],
  total: 3,
  withoutPlace: 1,
};

export const SITE = {
  id: 3,
  name: 'Attic',
  latitude: 47,
  longitude: -8,
  ground: 'average',
  noise: 'rural',
  indoors: false,
  noiseFloorDb: null,
  ituRegion: 1,
  editable: true,
};

/** A correction of Ferry Point as the server keeps it; for specs. */
export const correctionOf = (kind: 'heard' | 'off-air' | 'changed' | 'added') => ({
  id: 7,
  regionId: 1,
  kind,
  station: {
    name: 'Ferry Point',
    callSign: '',
    frequencyHz: 613_500,
    latitude: 47.31,
    longitude: -8.05,
  },
  stationId: 1,
  fields: kind === 'changed' ? { powerNightW: 250 } : null,
  note: 'Silent all week',
  date: '2026-03-02',
  authorName: 'Ada Quill',
  editable: true,
  createdAt: '2026-03-02T10:00:00.000Z',
  updatedAt: '2026-03-02T10:00:00.000Z',
});
