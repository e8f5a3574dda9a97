import { locatorCentre } from './locator';
import { formatPlace, parsePlace } from './place';

describe('locatorCentre', () => {
  // Worked by hand from the definition: fields of 20° by 10°, squares of 2° by 1°, subsquares of
  // 5′ by 2.5′, each counted from the south-west; the centre is half a square further.
  it.each([
    ['AA00', -179, -89.5],
    ['JJ00', 1, 0.5],
    ['JN58', 11, 48.5],
    ['JN58td', 11.625, 48.145833],
    ['jn58TD', 11.625, 48.145833],
    ['RR99xx', 179.958333, 89.979167],
    ['JN58td25', 11.604167, 48.147917],
  ])('puts the centre of %s at %s east, %s north', (text, longitude, latitude) => {
    expect(locatorCentre(text)).toEqual({ longitude, latitude });
  });

  it.each(['', 'JN', 'JN5', 'SA00', 'JN58yd', 'JN58t', '48.2'])('refuses "%s"', (text) => {
    expect(locatorCentre(text)).toBeNull();
  });
});

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

  it('reads a locator as the centre of its square', () => {
    expect(parsePlace('JN58')).toEqual({ place: { latitude: 48.5, longitude: 11 } });
  });

  it('takes an empty text for no place', () => {
    expect(parsePlace('')).toEqual({ place: null });
  });

  it.each(['somewhere', '48.2', '48.2 N', '1 2 3', '16.4 E, 48.2 N'])(
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
