/**
 * The best points for three-point tracking.
 *
 * Source: own search for the least largest error (minimax).
 *
 * @module radio/tracking/tracking-points
 */
import { curveOf, trackingConstants, type TrackingCurve, trackingError } from './tracking-curve.ts';

/** Three frequencies at which tracking is exact, hertz, ascending. */
export type TrackingPoints = readonly [number, number, number];

const EXCHANGES = 40;
const TURNS = 8;
const SECTIONS = 200;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** A band with its IF, negative for an oscillator below the signal. */
export interface TrackedBand {
  readonly lowHz: number;
  readonly highHz: number;
  readonly signedIfHz: number;
}

/**
 * Points that make the largest tracking error of a band least: the error is then equally large,
 * with changing sign, at both ends and at two places between (the exchange algorithm of Remez,
 * with the points themselves as unknowns).
 *
 * @param band The band.
 * @returns The three points, hertz.
 * @throws {RangeError} If the band is upside down.
 *
 * @example
 *   bestTrackingPoints(tracked); // [606386, 1016923, 1514599]
 */
export function bestTrackingPoints(band: TrackedBand): TrackingPoints {
  const { lowHz, highHz } = band;
  if (!(highHz > lowHz)) throw new RangeError(`highHz must be above lowHz, got ${highHz}`);
  // The zeros of a polynomial of Chebyshev, on a scale where the error is nearly even.
  let points = [5, 3, 1].map((k) => {
    const place = (1 + Math.cos((k * Math.PI) / 6)) / 2;
    return lowHz * (highHz / lowHz) ** place;
  }) as unknown as TrackingPoints;
  // Where the oscillator runs near zero the exchange may swing past what it can reach.
  let [best, leastHz] = [points, Infinity];
  for (let exchange = 0; exchange < EXCHANGES; exchange++) {
    const errors = extremeErrors(band, points);
    const worstHz = Math.max(...errors);
    if (worstHz < leastHz) [best, leastHz] = [points, worstHz];
    const next = shifted(points, errors, lowHz, highHz);
    const moved = Math.max(...next.map((hz, index) => Math.abs(hz - (points[index] ?? NaN))));
    points = next;
    if (moved < 1e-4) break;
  }
  // The exchange approaches; the last digits come from Newton's method on equal errors.
  return polished(best, band);
}

/**
 * Largest tracking error over a band.
 *
 * @param curve The curve.
 * @param band The band.
 * @returns Hertz, with its sign.
 * @example
 *   const points = trackingConstants([600e3, 1000e3, 1400e3], 455e3);
 *   worstTrackingError(curveOf(points), tracked); // -11657
 */
export function worstTrackingError(curve: TrackingCurve, band: TrackedBand): number {
  const error = (hz: number): number => trackingError(curve, band.signedIfHz, hz);
  const step = (band.highHz - band.lowHz) / SECTIONS;
  let worst = 0;
  for (let index = 0; index <= SECTIONS; index++) {
    const hz = band.lowHz + index * step;
    const peak = peakOf(
      (at) => Math.abs(error(at)),
      Math.max(band.lowHz, hz - step),
      Math.min(band.highHz, hz + step),
    );
    for (const value of [error(hz), error(peak)]) {
      if (Math.abs(value) > Math.abs(worst)) worst = value;
    }
  }
  return worst;
}

/**
 * Sizes of the error at the low end, between the points, and at the high end; infinite where the
 * oscillator would have to run below zero.
 */
function extremeErrors(band: TrackedBand, points: TrackingPoints): number[] {
  const curve = curveOf(trackingConstants(points, band.signedIfHz));
  const size = (hz: number): number => {
    const error = Math.abs(trackingError(curve, band.signedIfHz, hz));
    return Number.isFinite(error) ? error : Infinity;
  };
  const [f1, f2, f3] = points;
  return [band.lowHz, peakOf(size, f1, f2), peakOf(size, f2, f3), band.highHz].map(size);
}

/** Moves each point towards the larger of the errors on its two sides. */
function shifted(
  points: TrackingPoints,
  errors: readonly number[],
  lowHz: number,
  highHz: number,
): TrackingPoints {
  const [f1, f2, f3] = points;
  const edges = [lowHz, f1, f2, f3, highHz];
  const moved = points.map((hz, index) => {
    const below = errors[index] ?? NaN;
    const above = errors[index + 1] ?? NaN;
    const room = Math.min(hz - (edges[index] ?? NaN), (edges[index + 2] ?? NaN) - hz);
    return hz + 0.4 * room * imbalance(below, above);
  });
  return [moved[0] ?? NaN, moved[1] ?? NaN, moved[2] ?? NaN];
}

/** From -1, all of the error below, to 1, all of it above. */
function imbalance(below: number, above: number): number {
  if (below === above) return 0;
  if (below === Infinity) return -1;
  if (above === Infinity) return 1;
  return (above - below) / (above + below);
}

/**
 * Newton's method on the three differences of neighbouring errors. Where the error is next to
 * nothing they are rounding alone and lead anywhere: the best points met are kept.
 */
function polished(start: TrackingPoints, band: TrackedBand): TrackingPoints {
  const stepHz = (band.highHz - band.lowHz) * 5e-6;
  let [points, best] = [start, start];
  let leastHz = Math.max(...extremeErrors(band, start));
  for (let turn = 0; turn < TURNS; turn++) {
    points = newtonStep(points, band, stepHz);
    if (!ascendWithin(points, band)) break;
    const worstHz = Math.max(...extremeErrors(band, points));
    if (worstHz < leastHz) [best, leastHz] = [points, worstHz];
  }
  return best;
}

function newtonStep(points: TrackingPoints, band: TrackedBand, stepHz: number): TrackingPoints {
  const gaps = (at: TrackingPoints): number[] => {
    const errors = extremeErrors(band, at);
    return [0, 1, 2].map((index) => (errors[index + 1] ?? NaN) - (errors[index] ?? NaN));
  };
  const now = gaps(points);
  const columns = points.map((_, nudged) => {
    // Towards the inside of its gap, so that the points stay in order.
    const room = (points[nudged + 1] ?? band.highHz) - (points[nudged] ?? NaN);
    const nudgeHz = Math.min(stepHz, room / 2);
    const then = gaps(
      points.map((hz, at) => (at === nudged ? hz + nudgeHz : hz)) as unknown as TrackingPoints,
    );
    return then.map((value, row) => (value - (now[row] ?? NaN)) / nudgeHz);
  });
  const change = solve3(columns, now);
  const [f1, f2, f3] = points;
  return [f1 - (change[0] ?? NaN), f2 - (change[1] ?? NaN), f3 - (change[2] ?? NaN)];
}

/** Whether three frequencies stand in order inside a band; NaN never does. */
function ascendWithin([f1, f2, f3]: TrackingPoints, { lowHz, highHz }: TrackedBand): boolean {
  return lowHz <= f1 && f1 < f2 && f2 < f3 && f3 <= highHz;
}

/** Solves three linear equations given by columns (Cramer's rule). */
function solve3(columns: readonly (readonly number[])[], right: readonly number[]): number[] {
  const determinant = (of: readonly (readonly number[])[]): number => {
    const at = (column: number, row: number): number => of[column]?.[row] ?? NaN;
    return (
      at(0, 0) * (at(1, 1) * at(2, 2) - at(2, 1) * at(1, 2)) -
      at(1, 0) * (at(0, 1) * at(2, 2) - at(2, 1) * at(0, 2)) +
      at(2, 0) * (at(0, 1) * at(1, 2) - at(1, 1) * at(0, 2))
    );
  };
  const whole = determinant(columns);
  return [0, 1, 2].map(
    (index) => determinant(columns.map((column, at) => (at === index ? right : column))) / whole,
  );
}

/** Where a function with one peak is largest (golden section). */
function peakOf(of: (hz: number) => number, low: number, high: number): number {
  let [a, b] = [low, high];
  for (let turn = 0; turn < 60; turn++) {
    const [left, right] = [b - GOLDEN * (b - a), a + GOLDEN * (b - a)];
    if (of(left) < of(right)) a = left;
    else b = right;
  }
  return (a + b) / 2;
}
