/**
 * Geography: the path between two places, and the sun there.
 *
 * Source: geographiclib-geodesic and suncalc; the middle on a sphere is arithmetic.
 *
 * @module radio/propagation/path
 */
import geodesy from 'geographiclib-geodesic';
import { getPosition, getTimes, times as timesOfTheDay } from 'suncalc';

import { type Metres, metres } from '../units.ts';

/** A place on the earth, degrees: north and east positive. */
export interface Place {
  readonly latitude: number;
  readonly longitude: number;
}

/** When the sun rises and sets on a day; null where it does not, and then which of the two holds. */
export interface SunTimes {
  readonly sunrise: Date | null;
  readonly sunset: Date | null;
  readonly polar: 'day' | 'night' | null;
}

const DEGREE = Math.PI / 180;
const { WGS84, DISTANCE, AZIMUTH } = geodesy.Geodesic;

// suncalc works out every time of the day on its list. Sunrise and sunset are the first; dawns and
// golden hours would make a long list of stations near sunset three times as slow.
timesOfTheDay.splice(1);

/**
 * Length of the shortest path between two places on the WGS84 ellipsoid.
 *
 * Source: C. F. F. Karney, Algorithms for geodesics, Journal of Geodesy 87 (2013), as implemented
 * by GeographicLib; exact to nanometres, also for opposite places.
 *
 * @param from One end; latitude -90 to 90.
 * @param to The other end; latitude -90 to 90.
 * @returns Distance, metres.
 * @throws {RangeError} If a latitude is beyond a pole or a number is not finite.
 * @example
 *   pathLength(
 *     { latitude: 40.6413, longitude: -73.7781 },
 *     { latitude: 51.47, longitude: -0.4543 },
 *   ); // 5554908.8 m
 */
export function pathLength(from: Place, to: Place): Metres {
  const { s12 } = WGS84.Inverse(from.latitude, from.longitude, to.latitude, to.longitude, DISTANCE);
  // GeographicLib answers NaN for a latitude beyond a pole; metres() refuses it.
  return metres(s12 ?? NaN);
}

/**
 * Bearing of the shortest path where it begins, on the WGS84 ellipsoid.
 *
 * Source: as `pathLength`. From a pole it counts from the given meridian; where the places coincide
 * or are opposite, one of the many.
 *
 * @param from Where it begins; latitude -90 to 90.
 * @param to Where it ends; latitude -90 to 90.
 * @returns Degrees clockwise from true north, -180 to 180.
 * @throws {RangeError} If a latitude is beyond a pole or a number is not finite.
 * @example
 *   pathBearing({ latitude: 0, longitude: 0 }, { latitude: 0, longitude: 5 }); // 90
 */
export function pathBearing(from: Place, to: Place): number {
  const { azi1 } = WGS84.Inverse(from.latitude, from.longitude, to.latitude, to.longitude, AZIMUTH);
  if (azi1 === undefined || Number.isNaN(azi1)) throw new RangeError('place: not on the earth');
  return azi1;
}

/**
 * Middle of the shortest path between two places, on a sphere.
 *
 * The ellipsoid moves it by less than 0.1 degree, which the sky-wave formula does not feel.
 * For opposite places, where every direction is as short, one of the middles.
 *
 * @param from One end.
 * @param to The other end.
 * @returns The place midway.
 * @example
 *   pathMiddle({ latitude: 0, longitude: 0 }, { latitude: 0, longitude: 90 }); // { latitude: 0, longitude: 45 }
 */
export function pathMiddle(from: Place, to: Place): Place {
  const [a, b] = [direction(from), direction(to)];
  const [x, y, z] = [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
  return {
    latitude: Math.atan2(z, Math.hypot(x, y)) / DEGREE,
    longitude: Math.atan2(y, x) / DEGREE,
  };
}

/**
 * Sunrise and sunset at a place.
 *
 * @param place The place.
 * @param date Any moment of the day asked about.
 * @returns Both moments, or null with the polar day or night that reigns instead.
 * @example
 *   sunTimes({ latitude: 78, longitude: 15 }, new Date('2026-06-21T12:00:00Z')).polar; // 'day'
 */
export function sunTimes(place: Place, date: Date): SunTimes {
  const times = getTimes(date, place.latitude, place.longitude);
  const polar = times.alwaysUp ? 'day' : times.alwaysDown ? 'night' : null;
  return { sunrise: times.sunrise, sunset: times.sunset, polar };
}

/**
 * The place where the sun stands overhead.
 *
 * The sun's direction at a place on the equator from which it is up gives the place to a degree,
 * refraction being what is left; seen from there, the sun is so high that refraction is nothing.
 * Within 0.02 degree.
 *
 * @param at The moment.
 * @returns The place; its latitude is the sun's declination.
 * @throws {RangeError} If the moment is no valid date.
 * @example
 *   subsolarPoint(new Date('2026-06-21T12:00:00Z')).latitude; // 23.44
 */
export function subsolarPoint(at: Date): Place {
  if (Number.isNaN(at.getTime())) throw new RangeError('time: not a valid date');
  const isUp = getPosition(at, 0, 0).altitude > 0;
  return towardsSun(towardsSun({ latitude: 0, longitude: isUp ? 0 : 180 }, at), at);
}

/**
 * Height of the middle of the sun's disc above the horizon, without refraction. Cheap for many
 * places at one moment: the sun's own place is worked out but once.
 *
 *     sin h = sin a sin d + cos a cos d cos(b - s),  the sun overhead at latitude d, longitude s
 *
 * @param place The place.
 * @param at The moment.
 * @returns Height, degrees, within 0.02; negative below the horizon.
 * @throws {RangeError} If the moment is no valid date.
 * @example
 *   sunHeight({ latitude: 0, longitude: 0 }, new Date('2026-03-20T12:07:00Z')); // 89.9
 */
export function sunHeight({ latitude, longitude }: Place, at: Date): number {
  const time = at.getTime();
  if (overhead.time !== time) overhead = { time, ...subsolarPoint(at) };
  const [a, d] = [latitude * DEGREE, overhead.latitude * DEGREE];
  const turned = Math.cos((longitude - overhead.longitude) * DEGREE);
  const sine = Math.sin(a) * Math.sin(d) + Math.cos(a) * Math.cos(d) * turned;
  return Math.asin(Math.max(-1, Math.min(1, sine))) / DEGREE;
}

/** The sun's place at the moment last asked about. */
let overhead = { time: NaN, latitude: 0, longitude: 0 };

/** Where the sun is overhead, by its altitude and azimuth at a place, on a sphere. */
function towardsSun({ latitude, longitude }: Place, at: Date): Place {
  const { altitude, azimuth } = getPosition(at, latitude, longitude);
  const [up, level] = [Math.sin(altitude * DEGREE), Math.cos(altitude * DEGREE)];
  const north = level * Math.cos(azimuth * DEGREE);
  const east = level * Math.sin(azimuth * DEGREE);
  const [across, high] = [Math.cos(latitude * DEGREE), Math.sin(latitude * DEGREE)];
  const turned = longitude + Math.atan2(east, up * across - north * high) / DEGREE;
  return {
    latitude: Math.asin(up * high + north * across) / DEGREE,
    longitude: ((((turned + 180) % 360) + 360) % 360) - 180,
  };
}

function direction({ latitude, longitude }: Place): [number, number, number] {
  const across = Math.cos(latitude * DEGREE);
  return [
    across * Math.cos(longitude * DEGREE),
    across * Math.sin(longitude * DEGREE),
    Math.sin(latitude * DEGREE),
  ];
}
