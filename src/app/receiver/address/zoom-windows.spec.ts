import { readZoom, withinBand, zoomText } from './zoom-windows';

describe('the zoom in an address', () => {
  it('is read as it is written', () => {
    const windows = new Map([
      [2, [9_500_000, 9_900_000.4]],
      [0, [600_000, 700_000]],
    ] as const);
    const text = zoomText(windows);

    expect(text).toBe('1:600000-700000,3:9500000-9900000');
    expect([...readZoom(text)]).toEqual([
      [0, [600_000, 700_000]],
      [2, [9_500_000, 9_900_000]],
    ]);
  });

  it('is not said where every band is shown whole', () => {
    expect(zoomText(new Map())).toBeNull();
    expect(readZoom(null).size).toBe(0);
  });

  it.each(['0:600000-700000', '1:700000-600000', '1:600000-600050', '1:6e5-7e5', 'x', '1:1-2:3'])(
    'reads %s as not said',
    (text) => {
      expect(readZoom(text).size).toBe(0);
    },
  );

  it('keeps to the band', () => {
    const band = { lowHz: 550_000, highHz: 1_600_000 };

    expect(withinBand([500_000, 700_000], band)).toEqual([550_000, 700_000]);
    expect(withinBand([500_000, 1_700_000], band)).toBeNull();
    expect(withinBand([1_700_000, 1_800_000], band)).toBeNull();
    expect(withinBand(undefined, band)).toBeNull();
  });
});
