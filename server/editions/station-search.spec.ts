import { describe, expect, it } from 'vitest';

import { searchedFrequency } from './station-search.ts';

describe('searchedFrequency', () => {
  it.each([
    ['612', 612_000],
    ['612,5', 612_500],
    [' 612 kHz ', 612_000],
    ['0.612 MHz', 612_000],
    ['612000 Hz', 612_000],
  ])('of "%s" is %d Hz', (text, hertz) => {
    expect(searchedFrequency(text)).toBe(hertz);
  });

  it.each(['Mill', '612 m', '', '-5', '99999999999 MHz'])('of "%s" is none', (text) => {
    expect(searchedFrequency(text)).toBeNull();
  });
});
