import { geoAzimuthalEquidistant } from 'd3';

import type { Place } from '../../../../shared/radio/propagation/path';

/** Mean radius of the earth, kilometres: IUGG mean R1. */
export const EARTH_KM = 6371.009;
/** Half way round the earth. */
const FARTHEST_KM = Math.PI * EARTH_KM;

const LEAST_ACROSS_KM = 20;
const LEAST_WHOLE_KM = 100;
/** Room between the outermost station and the edge. */
const AIR = 1.12;

/** A point of the plane, kilometres from the middle: x to the right, y down. */
export interface PlanePoint {
  readonly x: number;
  readonly y: number;
}

/**
 * The earth laid flat around a place: distances and bearings from there are true, whichever way one
 * goes, over the date line and a pole alike.
 */
export interface MapPlane {
  readonly middle: Place;
  project(place: Place): PlanePoint;
  invert(point: PlanePoint): Place;
}

/** What of the plane is shown. */
export interface MapView extends PlanePoint {
  /** From the left edge to the right. */
  readonly acrossKm: number;
}

interface Size {
  readonly width: number;
  readonly height: number;
}

/** The projection of a plane, to be drawn with; a pixel is a kilometre. */
export const planeProjection = ({ latitude, longitude }: Place) =>
  geoAzimuthalEquidistant()
    .rotate([-longitude, -latitude])
    .scale(EARTH_KM)
    .translate([0, 0])
    .precision(0);

export function planeAround(middle: Place): MapPlane {
  const projection = planeProjection(middle);
  return {
    middle,
    project: ({ latitude, longitude }) => {
      const [x, y] = projection([longitude, latitude]) ?? [0, 0];
      return { x, y };
    },
    invert: ({ x, y }) => {
      const [longitude, latitude] = projection.invert?.([x, y]) ?? [0, 0];
      return { latitude, longitude };
    },
  };
}

const DEGREE = Math.PI / 180;

/** The middle of some places on the globe; where they have none, such as two poles, the first. */
export function middleOf(places: readonly Place[]): Place {
  let [x, y, z] = [0, 0, 0];
  for (const { latitude, longitude } of places) {
    x += Math.cos(latitude * DEGREE) * Math.cos(longitude * DEGREE);
    y += Math.cos(latitude * DEGREE) * Math.sin(longitude * DEGREE);
    z += Math.sin(latitude * DEGREE);
  }
  if (Math.hypot(x, y, z) < 1e-9) return places[0] ?? { latitude: 0, longitude: 0 };
  return {
    latitude: Math.atan2(z, Math.hypot(x, y)) / DEGREE,
    longitude: Math.atan2(y, x) / DEGREE,
  };
}

/** How far a map can be zoomed out: the whole disc of the earth. */
export const mostAcross = ({ width, height }: Size): number =>
  2 * FARTHEST_KM * Math.max(1, width / height) * 1.02;

/** A view on all points. */
export function wholeView(points: readonly PlanePoint[], size: Size): MapView {
  if (points.length === 0) return { x: 0, y: 0, acrossKm: 10 * LEAST_WHOLE_KM };
  const [left, right] = extent(points, ({ x }) => x);
  const [top, bottom] = extent(points, ({ y }) => y);
  const span = Math.max(right - left, ((bottom - top) * size.width) / size.height, LEAST_WHOLE_KM);
  return {
    x: (left + right) / 2,
    y: (top + bottom) / 2,
    acrossKm: Math.min(AIR * span, mostAcross(size)),
  };
}

const extent = (points: readonly PlanePoint[], of: (point: PlanePoint) => number) =>
  points.reduce<[number, number]>(
    ([least, most], point) => [Math.min(least, of(point)), Math.max(most, of(point))],
    [Infinity, -Infinity],
  );

/** Keeps a view on the earth and within what can be zoomed. */
export function fittedView({ x, y, acrossKm }: MapView, size: Size): MapView {
  const out = Math.hypot(x, y);
  const back = out > FARTHEST_KM ? FARTHEST_KM / out : 1;
  return {
    x: x * back,
    y: y * back,
    acrossKm: Math.min(Math.max(acrossKm, LEAST_ACROSS_KM), mostAcross(size)),
  };
}

export const pixelsAKm = ({ acrossKm }: MapView, { width }: Size): number => width / acrossKm;

/** Where a point of the plane lies in the picture, CSS pixels. */
export function inPicture(point: PlanePoint, view: MapView, size: Size): PlanePoint {
  const scale = pixelsAKm(view, size);
  return {
    x: size.width / 2 + (point.x - view.x) * scale,
    y: size.height / 2 + (point.y - view.y) * scale,
  };
}

/** The view, moved so that the point is in it with some room around; the same where it is. */
export function showingPoint(view: MapView, point: PlanePoint, size: Size): MapView {
  const { x, y } = inPicture(point, view, size);
  const room = 24;
  const isShown = x > room && y > room && x < size.width - room && y < size.height - room;
  return isShown ? view : { ...view, x: point.x, y: point.y };
}

/** How far from the middle the farthest corner of a view lies, degrees on the globe. */
export function reachOf(view: MapView, size: Size): number {
  const km = Math.hypot(
    Math.abs(view.x) + view.acrossKm / 2,
    Math.abs(view.y) + (view.acrossKm * size.height) / size.width / 2,
  );
  return Math.min(180, km / EARTH_KM / DEGREE);
}
