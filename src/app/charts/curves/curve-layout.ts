import { extent, line, type ScaleLinear, scaleLinear } from 'd3';

import { type PlacedLabel, placeLabels, textWidth } from '../place-labels';
import type { Position } from '../scale-marks';
import type { Window } from '../zoom-window';
import { type Curve, type CurveLook, curveLook, type CurvePoint } from './curve';

type Known = CurvePoint & { readonly level: number };

/** A curve as it is drawn. */
export interface DrawnCurve {
  readonly id: string;
  readonly look: CurveLook;
  /** Path of its line; empty for measured points. */
  readonly path: string;
  /** Where its mark stands, CSS pixels. */
  readonly marks: readonly { readonly x: number; readonly y: number }[];
}

const MARK_GAP = 72;
const LEAST_SPAN = 10;

const isKnown = (point: CurvePoint): point is Known => point.level !== null;

/** Levels from under the lowest to over the highest, on round numbers. */
export function levelsOf(curves: readonly Curve[], height: number): ScaleLinear<number, number> {
  const levels = curves.flatMap(({ points }) => points.filter(isKnown).map(({ level }) => level));
  const [low = 0, high = LEAST_SPAN] = extent(levels) as [number?, number?];
  const short = Math.max(0, LEAST_SPAN - (high - low)) / 2;
  return scaleLinear([low - short, high + short], [height, 0]).nice(6);
}

/** The part of a curve inside the window, cut exactly at its ends. */
export function cutTo(points: readonly CurvePoint[], [low, high]: Window): CurvePoint[] {
  const between = (from: CurvePoint, to: CurvePoint, at: number): CurvePoint => {
    if (from.level === null || to.level === null) return { at, level: null };
    const share = (at - from.at) / (to.at - from.at);
    return { at, level: from.level + share * (to.level - from.level) };
  };
  const cut: CurvePoint[] = [];
  points.forEach((point, index) => {
    const before = points[index - 1];
    for (const edge of [low, high]) {
      if (before && before.at < edge && edge < point.at) cut.push(between(before, point, edge));
    }
    if (point.at >= low && point.at <= high) cut.push(point);
  });
  return cut;
}

/** Curves in view: each a line with its mark here and there, or all its points when measured. */
export function drawnCurves(
  curves: readonly Curve[],
  x: Position,
  y: Position,
  window: Window,
): DrawnCurve[] {
  return curves.map(({ id, points, isMeasured = false }, index) => {
    const shown = cutTo(points, window);
    const path = line<CurvePoint>()
      .defined(isKnown)
      .x(({ at }) => x(at))
      .y(({ level }) => y(level ?? 0));
    const places = points
      .filter(isKnown)
      .filter(({ at }) => at >= window[0] && at <= window[1])
      .map(({ at, level }) => ({ x: x(at), y: y(level) }));
    return {
      id,
      look: curveLook(index),
      path: isMeasured ? '' : (path(shown) ?? ''),
      marks: isMeasured ? places : spaced(places, index),
    };
  });
}

/** Here and there along the line, each curve at places of its own. */
function spaced<P extends { readonly x: number }>(places: readonly P[], index: number): P[] {
  let next = (places[0]?.x ?? 0) + 18 + 14 * index;
  return places.filter(({ x }) => {
    if (x < next) return false;
    next = x + MARK_GAP;
    return true;
  });
}

/** The name of each curve beside it, where there is room; the right end first. */
export function curveLabels(
  curves: readonly Curve[],
  drawn: readonly DrawnCurve[],
  x: Position,
  y: Position,
  width: number,
): PlacedLabel[] {
  const requests = curves.map(({ id, name, points }, index) => {
    const known = points.filter(isKnown).filter(({ at }) => x(at) >= 0 && x(at) <= width);
    const spots = [0.98, 0.8, 0.6, 0.4, 0.2].flatMap((share) => {
      const point = known[Math.floor(share * known.length)];
      if (!point) return [];
      const left = Math.min(x(point.at), width - textWidth(name) / 2);
      return [-13, 13].map((above) => ({ x: left, y: y(point.level) + above }));
    });
    return { id, text: name, weight: -index, spots };
  });
  const taken = drawn.flatMap(({ marks }) =>
    marks.map((at) => ({ left: at.x - 5, right: at.x + 5, top: at.y - 5, bottom: at.y + 5 })),
  );
  return placeLabels(requests, [0, width], taken);
}

/** Every place along the chart where a curve has a point, from left to right. */
export const placesAlong = (curves: readonly Curve[]): number[] =>
  [...new Set(curves.flatMap(({ points }) => points.map(({ at }) => at)))].sort((a, b) => a - b);

/** The levels of every curve at a place; null where a curve has no point there. */
export function levelsAt(curves: readonly Curve[]): (at: number) => (number | null)[] {
  const maps = curves.map(
    ({ points }) => new Map(points.map(({ at, level }) => [at, level] as const)),
  );
  return (at) => maps.map((each) => each.get(at) ?? null);
}
