import type { JudgedBand, JudgedResponse } from '../../charts/band-strip/strip-layout';
import { causesHeard, responseRows } from './response-rows';

const response = (changes: Partial<JudgedResponse>): JudgedResponse => ({
  station: 1,
  cause: 'image',
  name: 'image',
  m: 1,
  n: 1,
  dialHz: 612_000,
  beatHz: 1000,
  fieldDb: 90,
  distanceM: 50_000,
  interferenceDb: 45.565,
  weightingDb: 14.082,
  wantedDb: 60,
  wantedStation: null,
  noiseDb: 16.424,
  bandDb: null,
  ratioDb: 0.353,
  marginDb: -29.647,
  grade: 'very-annoying',
  hidden: null,
  borderline: false,
  ledger: [],
  ...changes,
});

const band = (name: string, responses: JudgedResponse[]): JudgedBand => ({
  name,
  oscillatorHz: { low: 0, high: 1 },
  imageHz: { low: 0, high: 1 },
  rejection: [],
  harmonics: [],
  secondOscillator: [],
  totals: [],
  total: responses.length,
  responses,
});

const everywhere = response({
  cause: 'intermodulation',
  secondStation: 2,
  m: null,
  n: null,
  dialHz: null,
  interferenceDb: null,
  weightingDb: null,
  noiseDb: null,
  ratioDb: null,
  grade: null,
});
const bands = [
  band('Long wave', [response({ ratioDb: 28, station: 5 }), everywhere]),
  band('Medium wave', [
    response({}),
    response({ cause: 'half-if', ratioDb: 50, hidden: 'noise', station: 7 }),
  ]),
];

describe('the rows of what is heard', () => {
  it('stand in one order for all bands, the worst first, what has no level last', () => {
    expect(responseRows(bands).map(({ band: name, ratio }) => [name, ratio])).toEqual([
      ['Medium wave', '0.4'],
      ['Long wave', '28.0'],
      ['Medium wave', '50.0'],
      ['Long wave', '–'],
    ]);
  });

  it('give level over the noise and grade as the answer has them', () => {
    // 45.565 + 14.082 - 16.424
    expect(responseRows(bands)[0]).toMatchObject({
      dial: '612',
      overNoise: '43.2',
      grade: 'very annoying',
    });
  });

  it('name both stations of a pair, and say that it is heard everywhere', () => {
    expect(responseRows(bands).at(-1)).toMatchObject({ dial: 'everywhere', stations: [1, 2] });
  });

  it('have an id of their own each', () => {
    const ids = responseRows(bands).map(({ id }) => id);

    expect(new Set(ids).size).toBe(ids.length);
  });

  it('count the causes that are heard', () => {
    expect(causesHeard(bands).map(({ look, count }) => [look.cause, count])).toEqual([
      ['image', 2],
      ['intermodulation', 1],
    ]);
  });
});
