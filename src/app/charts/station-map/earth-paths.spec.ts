import { drawnReach, earthPaths, nightPath, ringKm } from './earth-paths';

const SQUARE: GeoJSON.Polygon = {
  type: 'Polygon',
  coordinates: [
    [
      [170, 0],
      [170, 10],
      [-170, 10],
      [-170, 0],
      [170, 0],
    ],
  ],
};

/** Coordinates of a path. */
const numbers = (path: string): number[] => (path.match(/-?\d+(\.\d+)?/g) ?? []).map(Number);

describe('the earth around a place', () => {
  it('is drawn whole over the date line', () => {
    const { land } = earthPaths(SQUARE, { latitude: 5, longitude: 180 }, 45);

    expect(land.match(/M/g)).toHaveLength(1);
    expect(Math.max(...numbers(land).map(Math.abs))).toBeLessThan(1300);
  });

  it('reaches no farther than is asked for, and has an edge where it is the whole', () => {
    const far = { latitude: 5, longitude: 0 };

    expect(earthPaths(SQUARE, far, 45).land).toBe('');
    expect(earthPaths(SQUARE, far, 180).land).not.toBe('');
    expect(earthPaths(null, far, 180).edge).not.toBe('');
    expect([3, 6, 7, 100, 180].map(drawnReach)).toEqual([6, 6, 15, 180, 180]);
  });

  it('has its night where the sun is down: around the pole in winter, none of it in summer', () => {
    const pole = { latitude: 90, longitude: 0 };

    expect(numbers(nightPath(new Date('2026-12-21T12:00:00Z'), pole, 6))).not.toHaveLength(0);
    expect(nightPath(new Date('2026-06-21T12:00:00Z'), pole, 6)).toBe('');
  });

  it.each([
    [1000, 200],
    [3000, 500],
    [40_000, 10_000],
    [150, 20],
  ])('across %d km has a ring of %d km', (across, ring) => {
    expect(ringKm(across)).toBe(ring);
  });
});
