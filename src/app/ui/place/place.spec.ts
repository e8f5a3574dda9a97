import { formatPlace, parsePlace } from './place';

describe('parsePlace', () => {
  it.each([
    '48.2 16.4',
    '48.2, 16.4',
    '48.2,16.4',
    '48,2; 16,4',
    '48,2 16,4',
    '48.2 N, 16.4 E',
    '48.2N 16.4E',
    'N 48.2 E 16.4',
    'N48°12′ E16°24′',
    '48° 12′ N 16° 24′ E',
    '48 12 N / 16 24 E',
  ])('reads "%s" as a pair', (text) => {
    expect(parsePlace(text)).toEqual({ place: { latitude: 48.2, longitude: 16.4 } });
  });

  // Worked by hand from the definition: squares of 2° by 1°, subsquares of 5′ by 2.5′.
  it.each([
    ['JN58', 48.5, 11],
    [' jn58TD ', 48.14583, 11.625],
    ['JN58td25', 48.14792, 11.60417],
  ])('reads the locator "%s" as the centre of its square', (text, latitude, longitude) => {
    expect(parsePlace(text)).toEqual({ place: { latitude, longitude } });
  });

  it('takes an empty text for no place', () => {
    expect(parsePlace('')).toEqual({ place: null });
  });

  it.each(['somewhere', 'JN', 'SA00', '48.2', '48.2 N', '1 2 3', '16.4 E, 48.2 N'])(
    'refuses "%s" with an example',
    (text) => {
      expect(parsePlace(text)).toHaveProperty('problem');
    },
  );
});

describe('formatPlace', () => {
  it('writes both coordinates, or a dash where there is no place', () => {
    expect(formatPlace(48.2, -16.4)).toBe('48.2°\u00a0N, 16.4°\u00a0W');
    expect(formatPlace(null, null)).toBe('–');
  });
});
