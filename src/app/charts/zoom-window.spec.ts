import { scaleLinear, scaleLog } from 'd3';

import { MOST_ZOOM, showing, windowBetween, zoomed } from './zoom-window';

const scale = scaleLinear([0, 1000], [0, 500]);

describe('a zoom window', () => {
  it('halves around its middle, or around a value that stays where it is', () => {
    expect(zoomed(scale, [0, 1000], 2)).toEqual([250, 750]);
    expect(zoomed(scale, [0, 1000], 2, 0)).toEqual([0, 500]);
    expect(zoomed(scale, [0, 500], 2, 400)).toEqual([200, 450]);
  });

  it('never leaves the whole range, and never shows more than it', () => {
    expect(zoomed(scale, [250, 750], 0.1)).toEqual([0, 1000]);
    expect(zoomed(scale, [900, 1000], 0.5)).toEqual([800, 1000]);
    expect(zoomed(scale, [0, 100], 0.5)).toEqual([0, 200]);
  });

  it('goes no closer than the limit', () => {
    const [low, high] = zoomed(scale, [499, 501], 1000);

    expect(high - low).toBeCloseTo(1000 / MOST_ZOOM, 9);
  });

  it('is the same typed as zoomed', () => {
    expect(windowBetween(scale, 750, 250)).toEqual(zoomed(scale, [0, 1000], 2));
    expect(windowBetween(scale, -50, 5000)).toEqual([0, 1000]);
  });

  it('moves just as far as a value outside needs to be seen', () => {
    expect(showing(scale, [0, 200], 100)).toEqual([0, 200]);
    expect(showing(scale, [0, 200], 500)).toEqual([400, 600]);
  });

  it('halves by pixels on a logarithmic scale', () => {
    const [low, high] = zoomed(scaleLog([100, 10_000], [0, 400]), [100, 10_000], 2);

    expect(low).toBeCloseTo(10 ** 2.5, 6);
    expect(high).toBeCloseTo(10 ** 3.5, 6);
  });
});
