import {
  type Beat,
  beatCause,
  beatOrigin,
  pitchWords,
  pointerSentence,
  strengthWords,
} from './beat-words';

const image: Beat = {
  cause: 'image',
  name: 'image',
  station: 3,
  frequencyHz: 1_521_000,
  pitchHz: 1000,
  slope: 2,
  levelDb: -14.32,
  test: 'Put a trap in the aerial lead.',
};
const own: Beat = {
  ...image,
  cause: 'if-harmonic',
  name: 'harmonic 2 of the IF',
  station: null,
  levelDb: null,
};
const nameOf = (id: number) => (id === 3 ? 'Alder' : 'Birch');

describe('beats in words', () => {
  it('name the cause and where it comes from', () => {
    expect(beatCause(image)).toBe('image');
    expect(beatOrigin(image, nameOf)).toBe('Alder on 1521\u00a0kHz');
    expect(beatCause(own)).toBe('harmonic of the IF');
    expect(beatOrigin(own, nameOf)).toBe('the set itself, on 1521\u00a0kHz');
    expect(beatOrigin({ ...image, secondStation: 5 }, nameOf)).toBe('Alder with Birch');
  });

  it('say how strong, or that it is not known', () => {
    expect(strengthWords(image)).toBe('plain, −14.3 dB to the programme');
    expect(strengthWords({ levelDb: -6 })).toContain('as loud as the programme');
    expect(strengthWords({ levelDb: -50 })).toContain('faint');
    expect(strengthWords(own)).toBe('level not known');
  });

  it('tell a zero beat and a flutter from a tone', () => {
    expect([0, 12, 1000].map((pitchHz) => pitchWords({ pitchHz }))).toEqual([
      'zero beat',
      'a flutter of 12 Hz',
      '1000 Hz',
    ]);
  });

  it('sum up a dial setting', () => {
    const wanted = { station: 5, frequencyHz: 612_000, fieldDb: 60 };
    const answer = { wanted, noiseDb: 16.4, skipped: [], causes: [own, image] };

    expect(pointerSentence(answer, 612_000, nameOf)).toBe(
      'At 612\u00a0kHz the set hears Birch, 44 dB over the noise. Strongest beside it: Alder on 1521\u00a0kHz (image), 1000 Hz, plain, −14.3 dB to the programme.',
    );
    expect(
      pointerSentence(
        { ...answer, wanted: { ...wanted, station: null }, causes: [] },
        612_000,
        nameOf,
      ),
    ).toContain('a wanted field of 60.0 dB(µV/m) is assumed. Nothing of known level');
  });
});
