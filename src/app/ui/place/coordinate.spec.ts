import { type Axis, formatCoordinate, parseCoordinate } from './coordinate';

const read = (text: string, axis: Axis = 'latitude'): number | null | string => {
  const reading = parseCoordinate(text, axis);
  return 'problem' in reading ? reading.problem : reading.value;
};

describe('parseCoordinate', () => {
  it.each([
    ['48.2', 48.2],
    ['48,2', 48.2],
    ['+48.2', 48.2],
    ['-33.9', -33.9],
    ['−33.9', -33.9],
    ['48.2 N', 48.2],
    ['48.2°N', 48.2],
    ['S 33.9', -33.9],
    ['33,9s', -33.9],
    ['48° 12′ 30″ N', 48.2083333],
    ['48°12\'30"N', 48.2083333],
    ['48 12 30', 48.2083333],
    ['48:12:30 S', -48.2083333],
    ['48-12-30 N', 48.2083333],
    ['48º12.5´ N', 48.2083333],
    ['-48 30', -48.5],
    ['48 12.5 N', 48.2083333],
    ['48d12m30s', 48.2083333],
    ['48d12m30s S', -48.2083333],
    ['-0', 0],
  ])('reads "%s" as %s degrees of latitude', (text, degrees) => {
    expect(read(text)).toBe(degrees);
  });

  it.each([
    ['16.4 E', 16.4],
    ['016° 24′ W', -16.4],
    ['w016.4', -16.4],
  ])('reads "%s" as %s degrees of longitude', (text, degrees) => {
    expect(read(text, 'longitude')).toBe(degrees);
  });

  it('takes an empty text for no value', () => {
    expect(read(' ')).toBeNull();
  });

  it('leaves a latitude of 95 to the schema, which names the limits', () => {
    expect(read('95')).toBe(95);
  });

  it.each(['north', '48.2.1', '48 60 N', '48.5 12 N', '48 12 61', '1 2 3 4', 'N 48 N', '12-'])(
    'refuses "%s" and shows what is right',
    (text) => {
      expect(read(text)).toContain('48.2');
    },
  );

  it('names the axis that a letter belongs to', () => {
    expect(read('16.4 E')).toContain('belongs to the longitude');
    expect(read('48 N', 'longitude')).toContain('belongs to the latitude');
  });

  it('refuses a sign beside a letter, which could mean either', () => {
    expect(read('-48.2 S')).toContain('not both');
  });
});

describe('formatCoordinate', () => {
  it('writes the hemisphere instead of a sign', () => {
    expect(formatCoordinate(48.20833, 'latitude')).toBe('48.2083°\u00a0N');
    expect(formatCoordinate(-16.4, 'longitude')).toBe('16.4°\u00a0W');
  });

  it('writes what is read back as the same value', () => {
    for (const degrees of [-89.9999, -12.5, 0, 0.0001, 48.2083]) {
      expect(read(formatCoordinate(degrees, 'latitude'))).toBe(degrees);
    }
  });
});
