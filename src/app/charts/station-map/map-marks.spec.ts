import { marksInView, markPaths, MOST_SINGLE, type PlacedStation } from './map-marks';
import { markRadius } from './map-station';

const SIZE = { width: 800, height: 500 };
const VIEW = { x: 0, y: 0, acrossKm: 800 };
const SIZES = { lowDb: 20, highDb: 100, samples: [], title: 'Field' };

const placed = (id: number, x: number, y: number, level: number | null = 60): PlacedStation => ({
  station: { id: `${id}`, name: `S${id}`, latitude: 0, longitude: 0, level, look: 'plain' },
  point: { x, y },
});

describe('the marks of a map', () => {
  it('are one a station where there is room, and only those in view', () => {
    const marks = marksInView(
      [placed(1, 0, 0), placed(2, 0, 0), placed(3, 5000, 0)],
      VIEW,
      SIZE,
      SIZES,
    );

    expect(marks.map(({ id, x, y, others }) => [id, x, y, others])).toEqual([
      ['1', 400, 250, 0],
      ['2', 400, 250, 0],
    ]);
  });

  it('are shared by the stations of a square where they are too many, the strongest named', () => {
    const many = Array.from({ length: MOST_SINGLE + 1 }, (_, id) => placed(id, 0.1, 0.1));
    const marks = marksInView([...many, placed(9999, 300, 0)], VIEW, SIZE, SIZES);

    expect(marks.map(({ id, others }) => [id, others])).toEqual([
      ['0', MOST_SINGLE],
      ['9999', 0],
    ]);
  });

  it('stand for every station of the view, however it is moved', () => {
    const many = Array.from({ length: 5000 }, (_, id) => placed(id, (id % 71) * 5, (id % 53) * 4));

    for (const x of [0, 3, 17.5]) {
      const marks = marksInView(many, { ...VIEW, x, acrossKm: 1600 }, SIZE, SIZES);
      expect(marks.reduce((all, { others }) => all + 1 + others, 0)).toBe(5000);
      expect(marks.length).toBeLessThan(500);
    }
  });

  it('grow with the level within limits; an unknown one is the smallest', () => {
    expect([null, 0, 20, 60, 100, 130].map((level) => markRadius(level, SIZES))).toEqual([
      2.5, 2.5, 2.5, 5.5, 8.5, 8.5,
    ]);
  });

  it('are drawn by their look, those of several with a ring', () => {
    const [one] = marksInView([placed(1, 0, 0)], VIEW, SIZE, SIZES);
    if (!one) throw new Error('no mark');
    const off = { ...one, station: { ...one.station, look: 'off-raster' as const }, others: 3 };

    expect(markPaths([one]).plain).toMatch(/^M394.5,250a5.5,5.5/);
    expect(markPaths([one]).several).toBe('');
    expect(markPaths([off])).toMatchObject({ plain: '', offAir: '' });
    expect(markPaths([off]).several).not.toBe('');
  });
});
