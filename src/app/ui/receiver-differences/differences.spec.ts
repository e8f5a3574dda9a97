import { differences } from './differences';

describe('the differences of two states', () => {
  it('are none between equal ones, whatever is left out', () => {
    expect(differences({ ifHz: 455_000, bfo: null }, { ifHz: 455_000 })).toEqual([]);
  });

  it('name the field in words and show both values with their units', () => {
    const mine = { ifHz: 455_000, bands: [{ highHz: 1_600_000 }], strayDb: { if: 60 } };
    const theirs = { ifHz: 460_500, bands: [{ highHz: 1_700_000 }], strayDb: { if: 70 } };

    expect(differences(mine, theirs)).toEqual([
      { field: 'IF', mine: '455\u00a0kHz', theirs: '460.5\u00a0kHz' },
      { field: 'band 1, to', mine: '1600\u00a0kHz', theirs: '1700\u00a0kHz' },
      { field: 'stray pick-up, at the IF', mine: '60 dB', theirs: '70 dB' },
    ]);
  });

  it('show what only one of them has', () => {
    expect(differences({}, { bands: [{ name: 'Long wave' }] })).toEqual([
      { field: 'band 1, name', mine: '–', theirs: 'Long wave' },
    ]);
  });
});
