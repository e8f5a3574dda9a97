import { periodRows } from './period-rows';

const none = { deficitDb: 0, worstRatioDb: null, grade: null, dialHz: null, station: null };
const night = {
  breakthrough: {
    deficitDb: 23,
    worstRatioDb: 2.868,
    grade: 'very-annoying',
    dialHz: 612_000,
    station: 1,
  },
  image: none,
  products: none,
  breakthroughChangeDb: -16.24,
  changeSigmaDb: 4.1,
} as const;
const rows = (nameOf: (() => string) | null) => periodRows({ night }, nameOf);

describe('day beside night', () => {
  it('gives each term with what is worst, where and by whom', () => {
    const [changed, through] = rows(() => 'Alder');

    expect(changed?.night).toEqual({ figure: '−16.2 dB', about: '±4 dB' });
    expect(through?.night).toEqual({
      figure: '2.9 dB',
      about: 'very annoying, Alder at 612\u00a0kHz',
    });
  });

  it('says where nothing is heard', () => {
    expect(rows(null).map(({ day }) => day.figure)).toEqual(Array(4).fill('none heard'));
  });

  it('leaves out names that are of another site', () => {
    expect(rows(null)[1]?.night.about).toBe('very annoying, at 612\u00a0kHz');
  });
});
