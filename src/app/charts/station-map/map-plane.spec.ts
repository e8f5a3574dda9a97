import fc from 'fast-check';

import { pathLength } from '../../../../shared/radio/propagation/path';
import {
  fittedView,
  inPicture,
  middleOf,
  mostAcross,
  planeAround,
  reachOf,
  showingPoint,
  wholeView,
} from './map-plane';

const SIZE = { width: 800, height: 500 };
const anyPlace = fc.record({
  latitude: fc.double({ min: -90, max: 90, noNaN: true }),
  longitude: fc.double({ min: -180, max: 180, noNaN: true }),
});

describe('the plane of a map', () => {
  it('keeps distances from its middle, within the 0.6 % by which the earth is no sphere', () => {
    fc.assert(
      fc.property(anyPlace, anyPlace, (middle, place) => {
        const km = pathLength(middle, place) / 1000;
        fc.pre(km < 19_500);
        const { x, y } = planeAround(middle).project(place);

        expect(Math.hypot(x, y)).toBeGreaterThan(km * 0.993 - 0.1);
        expect(Math.hypot(x, y)).toBeLessThan(km * 1.007 + 0.1);
      }),
    );
  });

  it('has neighbours over the date line and round a pole as neighbours', () => {
    const fiji = planeAround({ latitude: -17, longitude: 179.5 });
    const pole = planeAround({ latitude: 89, longitude: 0 });

    expect(fiji.project({ latitude: -17, longitude: -179.5 }).x).toBeCloseTo(106, 0);
    expect(pole.project({ latitude: 89, longitude: 180 }).y).toBeCloseTo(-222, 0);
  });

  it('leads back from a point to its place', () => {
    const plane = planeAround({ latitude: 47, longitude: 8 });
    const place = plane.invert(plane.project({ latitude: -33, longitude: 151 }));

    expect(place.latitude).toBeCloseTo(-33, 6);
    expect(place.longitude).toBeCloseTo(151, 6);
  });
});

describe('the middle of places', () => {
  it('lies on the date line between places on both sides of it', () => {
    const { longitude } = middleOf([
      { latitude: 10, longitude: 178 },
      { latitude: 10, longitude: -178 },
    ]);

    expect(Math.abs(longitude)).toBeCloseTo(180, 6);
  });

  it('is the first of places that have none', () => {
    const poles = [
      { latitude: 90, longitude: 0 },
      { latitude: -90, longitude: 0 },
    ];

    expect(middleOf(poles)).toEqual(poles[0]);
  });
});

describe('a view of a map', () => {
  it('shows every point at first, and never less than 100 km', () => {
    const points = [
      { x: 300, y: 0 },
      { x: 0, y: -400 },
    ];
    const view = wholeView(points, SIZE);

    for (const point of points) {
      const { x, y } = inPicture(point, view, SIZE);
      expect(x).toBeGreaterThan(0);
      expect(x).toBeLessThan(SIZE.width);
      expect(y).toBeGreaterThan(0);
      expect(y).toBeLessThan(SIZE.height);
    }
    expect(wholeView([], SIZE).acrossKm).toBeGreaterThan(100);
  });

  it('stays on the earth and within what can be zoomed', () => {
    expect(fittedView({ x: 1e6, y: 0, acrossKm: 1 }, SIZE)).toMatchObject({ acrossKm: 20 });
    expect(fittedView({ x: 1e6, y: 0, acrossKm: 1 }, SIZE).x).toBeCloseTo(20_015, 0);
    expect(fittedView({ x: 0, y: 0, acrossKm: 1e9 }, SIZE).acrossKm).toBe(mostAcross(SIZE));
    expect(reachOf({ x: 0, y: 0, acrossKm: mostAcross(SIZE) }, SIZE)).toBe(180);
  });

  it('moves only to a point that it does not show', () => {
    const view = { x: 0, y: 0, acrossKm: 800 };

    expect(showingPoint(view, { x: 100, y: 100 }, SIZE)).toBe(view);
    expect(showingPoint(view, { x: 900, y: 0 }, SIZE)).toEqual({ x: 900, y: 0, acrossKm: 800 });
  });
});
