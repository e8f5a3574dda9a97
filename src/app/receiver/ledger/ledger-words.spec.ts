import { ledgerLines } from './ledger-words';

describe('the ledger in words', () => {
  it('keeps the order and gives each line its unit', () => {
    const ledger = [
      { term: 'field', valueDb: 90 },
      { term: 'circuit-1', valueDb: -44.43 },
      { term: 'interference', valueDb: 45.565 },
      { term: 'ratio', valueDb: 0.353 },
      { term: 'band', valueDb: null },
    ];

    expect(ledgerLines({ ledger }).map(({ label, value }) => `${label}: ${value}`)).toEqual([
      'Field of the station at the aerial, E: 90.0 dB(µV/m)',
      'Signal circuit 1: −44.4 dB',
      'Interference, I: 45.6 dB(µV/m)',
      'Wanted to unwanted: 0.4 dB',
      'The band itself, in any set, B: –',
    ]);
  });

  it('shows a term it has no words for by its name', () => {
    const [line] = ledgerLines({ ledger: [{ term: 'ionosphere', valueDb: -3 }] });

    expect(line?.label).toBe('ionosphere');
  });
});
