import { CAUTION } from '../../../../shared/radio/caution';
import { slopeWords, whistleCauses } from './whistle-words';

const answer = {
  wanted: { station: null, frequencyHz: 612_000, fieldDb: 60 },
  noiseDb: 16,
  skipped: [],
  causes: [
    {
      cause: 'image' as const,
      name: 'image',
      station: 3,
      frequencyHz: 1_521_000,
      pitchHz: 1000,
      slope: 2,
      levelDb: null,
      test: `Put a trap for 1521 kHz in the aerial lead. ${CAUTION}`,
    },
  ],
};

describe('causes of a whistle in words', () => {
  it('keep the test, and leave the caution to the page', () => {
    const [first] = whistleCauses(answer.causes, () => 'Alder');

    expect(first).toMatchObject({
      cause: 'image',
      origin: 'Alder on 1521\u00a0kHz',
      pitch: '1000 Hz',
      slope: 'moves 2 Hz a hertz of dial',
      strength: 'level not known',
      test: 'Put a trap for 1521 kHz in the aerial lead.',
    });
  });

  it('say that a pitch stays', () => {
    expect(slopeWords(0)).toBe('stays when the dial is moved');
  });
});
