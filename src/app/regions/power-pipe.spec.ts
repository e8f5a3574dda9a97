import { formatPower } from './power-pipe';

describe('formatPower', () => {
  it.each([
    [50_000, '50\u00a0kW'],
    [1_500, '1.5\u00a0kW'],
    [1_000, '1\u00a0kW'],
    [999.96, '1000\u00a0W'],
    [250, '250\u00a0W'],
    [0.5, '0.5\u00a0W'],
    [0, 'silent'],
    [null, '–'],
  ])('writes %s W as "%s"', (watts, text) => {
    expect(formatPower(watts)).toBe(text);
  });
});
