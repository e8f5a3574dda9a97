import { scaleLinear } from 'd3';

import { type Curve, curveLook } from './curve';
import { cutTo, drawnCurves, levelsAt, levelsOf, placesAlong } from './curve-layout';

const curves: Curve[] = [
  {
    id: 'a',
    name: 'as it is',
    points: [
      { at: 0, level: 10 },
      { at: 100, level: 30 },
      { at: 200, level: null },
      { at: 300, level: 50 },
    ],
  },
  { id: 'm', name: 'measured', isMeasured: true, points: [{ at: 50, level: 21 }] },
];

describe('curves', () => {
  it('are cut exactly where the window ends, and a gap stays one', () => {
    expect(cutTo(curves[0]?.points ?? [], [50, 250])).toEqual([
      { at: 50, level: 20 },
      { at: 100, level: 30 },
      { at: 200, level: null },
      { at: 250, level: null },
    ]);
  });

  it('have levels from under the lowest to over the highest', () => {
    const [low = 0, high = 0] = levelsOf(curves, 100).domain();

    expect(low).toBeLessThanOrEqual(10);
    expect(high).toBeGreaterThanOrEqual(50);
    expect(levelsOf([], 100).domain()).toEqual([0, 10]);
  });

  it('draw no line through measured points, and each of them', () => {
    const x = scaleLinear([0, 300], [0, 600]);
    const [line, measured] = drawnCurves(curves, x, levelsOf(curves, 100), [0, 300]);

    expect(line?.path).toMatch(/^M0,/);
    expect(measured?.path).toBe('');
    expect(measured?.marks).toHaveLength(1);
  });

  it('are read all at once, at every place where one has a point', () => {
    expect(placesAlong(curves)).toEqual([0, 50, 100, 200, 300]);
    expect(levelsAt(curves)(50)).toEqual([null, 21]);
    expect(levelsAt(curves)(100)).toEqual([30, null]);
  });

  it('differ by dash and by mark, not by hue alone', () => {
    const looks = [0, 1, 2, 3, 4].map(curveLook);

    expect(new Set(looks.map(({ dash }) => dash)).size).toBe(5);
    expect(new Set(looks.map(({ path }) => path)).size).toBe(5);
  });
});
