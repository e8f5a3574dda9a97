import { apartFromPairs, pairsSummary } from './silent-pairs';

const beat = (cause: 'image' | 'intermodulation', pitchHz: number) => ({
  cause,
  name: cause,
  station: 1,
  secondStation: 2,
  frequencyHz: 900_000,
  pitchHz,
  slope: 0,
  levelDb: null,
  test: '',
});

describe('pairs of stations at zero beat', () => {
  it('are counted in one line, what can be heard is listed in its order', () => {
    const beats = [
      beat('intermodulation', 0),
      beat('image', 1000),
      beat('intermodulation', 400),
      beat('intermodulation', 0),
      beat('image', 0),
    ];
    const { heard, pairs } = apartFromPairs(beats);

    expect(heard).toEqual([beats[1], beats[2], beats[4]]);
    expect(pairs).toEqual([beats[0], beats[3]]);
  });

  it('are told by their number', () => {
    expect(pairsSummary(1)).toMatch(/^and 1 pair of stations that makes/);
    expect(pairsSummary(43)).toMatch(/^and 43 pairs of stations that make /);
  });
});
