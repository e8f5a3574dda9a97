import { formatRaster } from './raster-pipe';

describe('formatRaster', () => {
  it('writes each range with its step', () => {
    const raster = [
      { lowHz: 153_000, highHz: 279_000, stepHz: 9_000 },
      { lowHz: 531_000, highHz: 1_602_000, stepHz: 9_000 },
    ];

    expect(formatRaster(raster)).toBe(
      '153–279\u00a0kHz by 9\u00a0kHz, 531–1602\u00a0kHz by 9\u00a0kHz',
    );
  });

  it('writes a single channel as its frequency', () => {
    expect(formatRaster([{ lowHz: 1_611_000, highHz: 1_611_000, stepHz: 1 }])).toBe(
      '1611\u00a0kHz',
    );
  });

  it('says when there is none', () => {
    expect(formatRaster([])).toBe('no raster');
  });
});
