import type { Assessment } from '../../../../shared/contracts/assessment';
import type { WhistlesAnswer } from '../../../../shared/contracts/whistles';
import { FakeServer } from '../../core/fake-server';

const when = '2026-03-01T10:00:00.000Z';
const raster = [{ lowHz: 540_000, highHz: 1_700_000, stepHz: 10_000 }];
const receiver = {
  ...{ id: 1, version: 1, ownerName: 'Ottil Marrow', editable: true },
  ...{ createdAt: when, updatedAt: when },
  name: 'Bench set',
  ifHz: 560_000,
  selectivity: { kind: 'widths', b6Hz: 3000, b60Hz: 12_000 },
  bands: [{ name: 'Range 4', lowHz: 600_000, highHz: 1_600_000, oscillator: 'above' }],
};
const region = {
  ...{ id: 2, name: 'Coast', ituRegion: 2, editable: true, editions: 1 },
  raster,
  rasters: [{ from: null, ranges: raster }],
};
const edition = {
  ...{ id: 7, regionId: 2, regionName: 'Coast', label: 'Spring', date: '2026-03-01' },
  ...{ source: 'list.csv', note: '', stations: 3, raster, editable: true, createdAt: when },
};
const site = { id: 4, name: 'Shed', editable: true, noise: 'rural', ituRegion: 2 };

const field = (station: number, name: string, frequencyHz: number, fieldDb: number) => ({
  ...{ station, name, frequencyHz, fieldDb, groundDb: fieldDb, skyDb: null },
  ...{ latitude: null, longitude: null, distanceM: 12_000, notes: [] },
});
const fields = [
  field(1, 'Alder', 1_730_000, 78),
  field(2, 'Birch', 612_000, 60),
  field(3, 'Cedar', 560_000, 80),
];

const response = {
  station: 1,
  cause: 'image',
  name: 'image',
  m: 1,
  n: 1,
  dialHz: 610_000,
  beatHz: 1000,
  fieldDb: 78,
  distanceM: 12_000,
  interferenceDb: 38,
  weightingDb: -5,
  wantedDb: 60,
  wantedStation: 2,
  noiseDb: 20,
  bandDb: null,
  ratioDb: 22,
  marginDb: -8,
  grade: 'annoying',
  hidden: null,
  borderline: false,
  ledger: [
    { term: 'field', valueDb: 78 },
    { term: 'circuit-1', valueDb: -40 },
    { term: 'interference', valueDb: 38 },
    { term: 'ratio', valueDb: 22 },
  ],
} satisfies Assessment['bands'][number]['responses'][number];

export const judgedSample: Assessment = {
  verdict: {
    usable: 3,
    harmed: [{ station: 2, dialHz: 610_000, ratioDb: 22, grade: 'annoying' }],
    emptyDial: null,
    deficitDb: 8,
  },
  warnings: [],
  skipped: [],
  bands: [
    {
      name: 'Range 4',
      oscillatorHz: { low: 1_160_000, high: 2_160_000 },
      imageHz: { low: 1_720_000, high: 2_720_000 },
      rejection: [{ dialHz: 600_000, imageDb: 40, ifDb: 50 }],
      harmonics: [],
      secondOscillator: [],
      totals: [],
      total: 3,
      responses: [
        response,
        {
          ...response,
          ...{ station: 3, cause: 'breakthrough', name: 'IF breakthrough', dialHz: 900_000 },
          ...{ interferenceDb: 30, ratioDb: 30, grade: 'perceptible', wantedStation: null },
        },
        { ...response, station: 3, dialHz: 1_200_000, interferenceDb: 8, hidden: 'noise' },
      ],
    },
  ],
};

const beat = {
  ...{ cause: 'image', name: 'image', station: 1, frequencyHz: 1_730_000 },
  ...{ pitchHz: 1000, slope: 2, levelDb: -12 },
  test: 'Put a trap for 1730 kHz in the aerial lead.',
} satisfies WhistlesAnswer['causes'][number];
const pair = {
  ...{ cause: 'intermodulation', name: 'difference of two stations', station: 1 },
  ...{ secondStation: 2, frequencyHz: 1_730_000, pitchHz: 0, slope: 0, levelDb: null, test: '' },
} satisfies WhistlesAnswer['causes'][number];

export const beatsSample: WhistlesAnswer = {
  wanted: { station: 2, frequencyHz: 612_000, fieldDb: 60 },
  noiseDb: 20,
  skipped: [],
  causes: [beat, pair, pair],
};

const listed = (...items: unknown[]) => ({ items, total: items.length });

/** A server that knows one receiver, one site and one list. */
export const benchServer = () =>
  new FakeServer()
    .on('GET /api/receivers/1', () => receiver)
    .on('GET /api/sites?pageSize=500', () => listed(site))
    .on('GET /api/editions?pageSize=500', () => listed(edition))
    .on('GET /api/regions?pageSize=500', () => listed(region))
    .on('POST /api/field-strengths', () => ({ fields }))
    .on('POST /api/assessments', () => judgedSample)
    .on('POST /api/whistles', () => beatsSample);
