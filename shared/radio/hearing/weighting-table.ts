/**
 * Weighting over the tuning tolerance of a set that is not locked to the station.
 *
 * Source: own model: the worst that the tuning tolerance allows.
 *
 * @module radio/hearing/weighting-table
 */
import type { Weighting } from './weighting.ts';

/** Grid of the tolerance, hertz. */
const STEP_HZ = 100;
/** Rounding errors in a beat must not move it off the grid; steps. */
const SLACK = 1e-9;

/**
 * Remembers W0 on the grid, so that tables of different tolerance compute each value once.
 *
 * @param weighting W0 against the beat in hertz.
 * @returns W0 against the grid step, a whole number from 0.
 *
 * @example
 *   weightingGrid((hz) => -hz)(3); // -300
 */
export function weightingGrid(weighting: Weighting): (step: number) => number {
  const known: number[] = [];
  return (step) => {
    const value = known[step];
    if (value !== undefined) return value;
    return (known[step] = weighting(step * STEP_HZ));
  };
}

/**
 * W(b): the largest W0 over the multiples of 100 Hz within +-tolerance of b (none within: the
 * nearest, half up), a negative distance taken positive.
 *
 * The largest of every window that can occur is kept, so a
 * look-up costs the same however wide the tolerance is.
 */
export class WeightingTable {
  /** Grid step at which the first kept window begins. */
  private readonly first: number;
  /** Windows begin at every step; they hold `steps` values or one more. */
  private readonly steps: number;
  private readonly largest: Float64Array;
  private readonly largestOfOneMore: Float64Array;
  private readonly tolerance: number;
  /** The largest weighting of all, decibels. */
  readonly greatestDb: number;

  /**
   * @param grid W0 against the grid step.
   * @param toleranceHz How far a listener may sit off the centre, hertz, from 0.
   * @param maxBeatHz Largest beat that will be asked for, hertz.
   * @throws {RangeError} If the tolerance is negative.
   */
  constructor(grid: (step: number) => number, toleranceHz: number, maxBeatHz: number) {
    if (!(toleranceHz >= 0)) throw new RangeError(`toleranceHz must be 0 or more: ${toleranceHz}`);
    this.tolerance = toleranceHz / STEP_HZ;
    this.steps = Math.max(1, Math.floor(2 * this.tolerance + SLACK));
    this.first = -Math.ceil(this.tolerance) - 1;
    const last = Math.ceil(maxBeatHz / STEP_HZ) + 1;
    const values = Float64Array.from(
      { length: Math.max(-this.first, last + this.steps) + 1 },
      (_, step) => grid(step),
    );
    this.greatestDb = values.reduce((largest, value) => Math.max(largest, value), -Infinity);
    this.largest = slidingMaxima(values, this.first, last, this.steps);
    this.largestOfOneMore = slidingMaxima(values, this.first, last, this.steps + 1);
  }

  /**
   * The weighting at a beat.
   *
   * @param beatHz Distance from the centre, hertz, 0 to the largest asked for.
   * @returns W, decibels.
   */
  at(beatHz: number): number {
    const beat = beatHz / STEP_HZ;
    let low = Math.ceil(beat - this.tolerance - SLACK);
    let high = Math.floor(beat + this.tolerance + SLACK);
    if (low > high) low = high = Math.floor(beat + 0.5);
    const windows = high - low < this.steps ? this.largest : this.largestOfOneMore;
    return windows[low - this.first] ?? NaN;
  }
}

/** Largest of `count` values from every step on; steps below 0 mirror those above. */
function slidingMaxima(
  values: Float64Array,
  first: number,
  last: number,
  count: number,
): Float64Array {
  const maxima = new Float64Array(last - first + 1);
  for (let low = first; low <= last; low++) {
    let largest = -Infinity;
    for (let step = low; step < low + count; step++) {
      largest = Math.max(largest, values[Math.abs(step)] ?? -Infinity);
    }
    maxima[low - first] = largest;
  }
  return maxima;
}
