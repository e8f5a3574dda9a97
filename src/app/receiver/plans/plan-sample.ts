import { type WholePlan, wholePlan } from '../../../../shared/contracts/plan';

const none = { deficitDb: 0, worstRatioDb: null, grade: null, dialHz: null, station: null };
const judged = {
  breakthrough: none,
  image: none,
  products: none,
  breakthroughChangeDb: -20,
  changeSigmaDb: 4,
};
const candidate = (ifHz: number, deficitDb: number) => ({
  ifHz,
  deficitDb,
  reachable: { ok: true, reason: null },
  rasterDistanceHz: { if: 0, twice: 0, thrice: 0 },
  day: judged,
  night: judged,
  windowHz: { low: ifHz - 500, high: ifHz + 500 },
  harmonics: [],
  intermodulation: { count: 0, nearestBeatHz: null },
  bfoShiftHz: null,
  capacitanceChange: 0,
  trackingCostDb: null,
});
const verdict = (harmed: readonly number[], deficitDb: number) => ({
  usable: 12,
  harmed: harmed.map((station) => ({
    station,
    dialHz: 612_000,
    ratioDb: 20,
    grade: 'annoying',
  })),
  emptyDial: null,
  deficitDb,
});
const response = {
  station: 0,
  cause: 'image',
  name: 'Image',
  m: 1,
  n: 1,
  dialHz: 612_000,
  beatHz: 1000,
  fieldDb: 70,
  distanceM: 20_000,
  interferenceDb: 30,
  weightingDb: -5,
  wantedDb: 60,
  wantedStation: 1,
  noiseDb: 20,
  bandDb: null,
  ratioDb: 20,
  marginDb: -6,
  grade: 'annoying',
  hidden: null,
  borderline: false,
  ledger: [{ term: 'ratio', valueDb: 20 }],
};
const judgement = {
  warnings: [],
  leftOut: [],
  bands: [
    {
      name: 'Range 4',
      oscillatorHz: { low: 1_160_000, high: 2_160_000 },
      imageHz: { low: 1_720_000, high: 2_720_000 },
      rejection: [
        { dialHz: 600_000, imageDb: 40, ifDb: 50 },
        { dialHz: 1_600_000, imageDb: 20, ifDb: 60 },
      ],
      harmonics: [],
      secondOscillator: [],
      total: 90,
      responses: [response],
    },
  ],
};

const byWhat = {
  period: 'night',
  siteId: 4,
  siteName: 'Shed',
  site: { noise: 'rural', ituRegion: 2 },
  editionId: 7,
  editionLabel: 'Spring',
  edition: {
    label: 'Spring',
    date: '2026-03-01',
    source: 'list.csv',
    regionName: 'Coast',
    stations: 40,
  },
  everyChannelDb: null,
  receiver: {
    name: 'Bench set',
    ifHz: 560_000,
    selectivity: { kind: 'widths', b6Hz: 3000, b60Hz: 12_000 },
    bands: [{ name: 'Range 4', lowHz: 600_000, highHz: 1_600_000, oscillator: 'above' }],
  },
  savedReceiver: null,
};

/** What a plan of the specs was found to be: stations harmed by their places, and the deficit. */
export interface Found {
  readonly harmed?: readonly number[];
  readonly deficitDb?: number;
}

/** A plan as the server answers it, for specs. */
export function keptPlan(
  change: Partial<WholePlan> = {},
  { harmed = [], deficitDb = 4 }: Found = {},
): WholePlan {
  const found = verdict(harmed, deficitDb);
  return wholePlan.parse({
    id: 3,
    receiverId: 1,
    name: 'Into the guard band',
    note: 'Retune the BFO.',
    ifHz: 555_000,
    ...byWhat,
    results: {
      present: candidate(560_000, 40),
      chosen: candidate(555_000, deficitDb),
      day: found,
      night: found,
      before: { day: verdict([0, 1], 40), night: verdict([0, 1], 40) },
    },
    keptAt: '2026-03-02T10:00:00.000Z',
    keptBy: 'Ottil Marrow',
    editable: true,
    standing: {
      newerEdition: null,
      isEditionCorrected: false,
      isReceiverChanged: false,
      isSiteChanged: false,
    },
    sharing: null,
    stations: [
      { name: 'Alder', callSign: 'QAA', frequencyHz: 1_730_000 },
      { name: 'Birch', callSign: '', frequencyHz: 612_000 },
    ],
    judged: { day: judgement, night: judgement },
    ...change,
  });
}
