import {
  type JudgedBand,
  breakthroughCurves,
  dialScale,
  loudness,
  overNoise,
} from './strip-layout';

const heard = {
  station: 1,
  cause: 'breakthrough',
  name: 'IF breakthrough',
  m: 0,
  n: 1,
  dialHz: 600_000,
  beatHz: 0,
  fieldDb: 90,
  distanceM: null,
  interferenceDb: 50,
  weightingDb: 10,
  wantedDb: 60,
  wantedStation: null,
  noiseDb: 20,
  bandDb: null,
  ratioDb: 0,
  marginDb: -30,
  grade: 'very-annoying',
  hidden: null,
  borderline: false,
  ledger: [],
} as const;

const band: JudgedBand = {
  name: 'Medium wave',
  oscillatorHz: { low: 0, high: 1 },
  imageHz: { low: 0, high: 1 },
  rejection: [
    { dialHz: 600_000, imageDb: 40, ifDb: 20 },
    { dialHz: 1_000_000, imageDb: 40, ifDb: 35 },
    { dialHz: 1_400_000, imageDb: 40, ifDb: 45 },
  ],
  harmonics: [],
  secondOscillator: [],
  totals: [],
  total: 1,
  responses: [{ ...heard, ledger: [] }],
};

/** Points of a path of straight lines. */
const points = (path: string): number[][] =>
  path
    .slice(1)
    .split('L')
    .map((each) => each.split(',').map(Number));

describe('the level over the noise', () => {
  it('is the interference as heard less the noise', () => {
    expect(overNoise({ ...heard, ledger: [] })).toBe(40);
    expect(overNoise({ ...heard, ledger: [], interferenceDb: null })).toBeNull();
  });
});

describe('the curve of a breakthrough along the dial', () => {
  const y = loudness([band]);

  it('falls by what the circuits reject more, from the mark itself', () => {
    const x = dialScale(600_000, 1_400_000, 800, false);
    const [curve] = breakthroughCurves(band, x, y, () => 20);

    expect(points(curve?.path ?? '')).toEqual(
      [
        [0, 40],
        [0, 40],
        [400, 25],
        [800, 15],
        [800, 15],
      ].map(([at = 0, level = 0]) => [at, Number((y(level) - 5).toFixed(3))]),
    );
  });

  it('is drawn only for what is heard', () => {
    const hidden = { ...band, responses: [{ ...heard, ledger: [], hidden: 'noise' as const }] };

    expect(
      breakthroughCurves(hidden, dialScale(600_000, 1_400_000, 800, true), y, () => 20),
    ).toEqual([]);
  });
});
