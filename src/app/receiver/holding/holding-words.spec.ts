import { holdingSentence, toleranceOf } from './holding-words';

describe('the window in which a choice holds', () => {
  const windowHz = { low: 554_280, high: 555_740 };

  it('says what the generator and the counter must keep: the nearer end', () => {
    expect(holdingSentence({ ifHz: 555_000, windowHz })).toBe(
      'The choice holds from 554.28 to 555.74 kHz: there breakthrough stays within 3 dB. ' +
        'Generator, counter and drift together must keep within ±0.72 kHz, ' +
        '1.3 parts in a thousand.',
    );
  });

  it('warns where the choice stands on the edge', () => {
    expect(holdingSentence({ ifHz: 554_280, windowHz })).toContain('a little drift spoils it');
  });

  it('asks for nothing where no breakthrough is heard', () => {
    expect(toleranceOf({ ifHz: 555_000, windowHz: null })).toBeNull();
    expect(holdingSentence({ ifHz: 555_000, windowHz: null })).toContain(
      'need not be kept closely',
    );
  });
});
