import { formatFrequency } from './frequency-pipe';

describe('formatFrequency', () => {
  it.each([
    [455_000, '455\u00a0kHz'],
    [453_500, '453.5\u00a0kHz'],
    [1_605_000, '1605\u00a0kHz'],
    [5_900_000, '5.9\u00a0MHz'],
    [18_000_000, '18\u00a0MHz'],
  ])('writes %d Hz as %s', (hz, text) => {
    expect(formatFrequency(hz)).toBe(text);
  });
});
