import { type GeoPermissibleObjects, geoCircle, geoGraticule, geoPath } from 'd3';

import { type Place, subsolarPoint } from '../../../../shared/radio/propagation/path';
import { planeProjection } from './map-plane';

/** How far around the middle the earth is drawn, degrees; the more, the coarser. */
const REACHES = [6, 15, 45, 90, 180];
/** The sun's upper edge is on the horizon, refraction allowed for, when its middle is so far below. */
const SUNSET_DEG = 0.833;

/** The reach that covers one. */
export const drawnReach = (reach: number): number => REACHES.find((each) => each >= reach) ?? 180;

function drawing(middle: Place, reach: number) {
  const projection = planeProjection(middle)
    .clipAngle(Math.min(reach, 179.99))
    .precision(reach > 45 ? 4 : 0.5);
  return geoPath(projection).digits(reach > 45 ? 0 : 1);
}

/** Land and lines of a stretch of the earth, in kilometres around the middle of the plane. */
export function earthPaths(land: GeoPermissibleObjects | null, middle: Place, reach: number) {
  const draw = drawing(middle, reach);
  const step: [number, number] = reach > 45 ? [30, 30] : reach > 6 ? [10, 10] : [2, 2];
  return {
    land: (land && draw(land)) ?? '',
    lines: draw(geoGraticule().step(step)()) ?? '',
    edge: reach === 180 ? (draw({ type: 'Sphere' }) ?? '') : '',
  };
}

/** Where it is night at a moment, its edge the line between day and night. */
export function nightPath(at: Date, middle: Place, reach: number): string {
  const { latitude, longitude } = subsolarPoint(at);
  const night = geoCircle()
    .center([longitude + 180, -latitude])
    .radius(90 - SUNSET_DEG)
    .precision(2)();
  return drawing(middle, reach)(night) ?? '';
}

/** A round distance that makes a good ring in a view. */
export function ringKm(acrossKm: number): number {
  const wanted = acrossKm / 4;
  const power = 10 ** Math.floor(Math.log10(wanted));
  return ([5, 2, 1].find((each) => each * power <= wanted) ?? 1) * power;
}
