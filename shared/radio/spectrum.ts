/**
 * A list of stations as columns, sorted by frequency once and searched ever after.
 *
 * @module radio/spectrum
 */
import type { FieldStrength } from './field-strength.ts';
import { MAX_SIGNAL_ORDER } from './product-levels.ts';
import type { Station } from './station.ts';

/** A station with its field at the site. */
interface Heard {
  readonly id: number;
  readonly hz: number;
  readonly fieldDb: number;
  readonly groundDb: number;
  readonly given: boolean;
  readonly distanceM: number | null;
  /** Place in the list that was sent. */
  readonly order: number;
}

/**
 * The stations that are on the air, grouped by frequency, the strongest of each group first.
 *
 * Products depend on the frequency alone, so they are solved once a group; inside a group the
 * levels fall with the field, so those above a threshold are the first few, and their powers are
 * the running sums kept here.
 *
 * Positions count stations in the sorted order, groups count frequencies.
 */
export class Spectrum {
  /** Frequencies, hertz, ascending, each once. */
  readonly hz: Float64Array;
  /** Position of the first station of each group; one more entry closes the last. */
  readonly start: Int32Array;
  /** Position of the station a listener to the frequency wants: the strongest by ground wave. */
  readonly wanted: Int32Array;
  readonly fieldDb: Float64Array;
  readonly groundDb: Float64Array;
  readonly ids: readonly number[];
  readonly distanceM: readonly (number | null)[];
  /** 1 where the field was given instead of computed. */
  readonly given: Uint8Array;
  /** For each signal order n from 1: sum of 10^(n E/10) from the start of the group. */
  readonly powers: readonly Float64Array[];

  constructor(stations: readonly Station[], fields: readonly FieldStrength[]) {
    const sorted = heardStations(stations, fields).sort(
      (a, b) => a.hz - b.hz || b.fieldDb - a.fieldDb || a.id - b.id,
    );
    this.hz = Float64Array.from(new Set(sorted.map(({ hz }) => hz)));
    this.start = groupStarts(sorted);
    this.fieldDb = Float64Array.from(sorted, ({ fieldDb }) => fieldDb);
    this.groundDb = Float64Array.from(sorted, ({ groundDb }) => groundDb);
    this.given = Uint8Array.from(sorted, ({ given }) => Number(given));
    this.ids = sorted.map(({ id }) => id);
    this.distanceM = sorted.map(({ distanceM }) => distanceM);
    this.wanted = Int32Array.from(this.hz, (_, group) =>
      strongestByGround(sorted, this.startOf(group), this.startOf(group + 1)),
    );
    this.powers = Array.from({ length: MAX_SIGNAL_ORDER }, (_, index) =>
      runningPowers(this.fieldDb, this.start, index + 1),
    );
  }

  /** Position of the first station of a group. */
  startOf(group: number): number {
    return this.start[group] ?? this.start[this.start.length - 1] ?? 0;
  }

  /** First group at or above a frequency. */
  firstFrom(hz: number): number {
    return lowerBound(this.hz, hz);
  }

  /** The group on exactly a frequency, or -1. */
  groupAt(hz: number): number {
    const group = this.firstFrom(hz);
    return this.hz[group] === hz ? group : -1;
  }

  /** The group that a position belongs to. */
  groupOf(position: number): number {
    return lowerBound(this.start, position + 1) - 1;
  }

  /** Sum of the powers of a group, less one of its stations; -1: less none. */
  powerOf(group: number, without = -1): number {
    const end = this.startOf(group + 1);
    const start = this.startOf(group);
    if (without < start || without >= end) return this.powers[0]?.[end - 1] ?? 0;
    let sum = 0;
    for (let position = start; position < end; position++) {
      if (position !== without) sum += 10 ** ((this.fieldDb[position] ?? -Infinity) / 10);
    }
    return sum;
  }
}

/**
 * Index of the first value at or above a limit.
 *
 * @param sorted Values, ascending.
 * @param limit The limit.
 * @returns The index; the length when all are below.
 *
 * @example
 *   lowerBound([1, 3, 5], 3); // 1
 */
export function lowerBound(sorted: ArrayLike<number>, limit: number): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((sorted[middle] as number) < limit) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** Stations that have a field; a given one counts as received by ground wave. */
function heardStations(stations: readonly Station[], fields: readonly FieldStrength[]): Heard[] {
  const byId = new Map(fields.map((field) => [field.station, field]));
  return stations.flatMap(({ id, frequencyHz: hz, fieldDb: given }, order) => {
    const field = byId.get(id);
    const fieldDb = given ?? field?.fieldDb ?? null;
    if (fieldDb === null) return [];
    const groundDb = given ?? field?.groundDb ?? -Infinity;
    const distanceM = field?.distanceM ?? null;
    return [{ id, hz, fieldDb, groundDb, given: given !== null, distanceM, order }];
  });
}

function groupStarts(sorted: readonly Heard[]): Int32Array {
  const starts = sorted.flatMap(({ hz }, position) =>
    position === 0 || sorted[position - 1]?.hz !== hz ? [position] : [],
  );
  return Int32Array.from([...starts, sorted.length]);
}

/** Of equals the first in the list. */
function strongestByGround(sorted: readonly Heard[], start: number, end: number): number {
  let best = start;
  for (let position = start + 1; position < end; position++) {
    const [one, other] = [sorted[position], sorted[best]];
    if (one === undefined || other === undefined) continue;
    const difference = one.groundDb - other.groundDb;
    if (difference > 0 || (difference === 0 && one.order < other.order)) best = position;
  }
  return best;
}

function runningPowers(fieldDb: Float64Array, start: Int32Array, order: number): Float64Array {
  const sums = new Float64Array(fieldDb.length);
  for (let group = 0; group + 1 < start.length; group++) {
    let sum = 0;
    for (let position = start[group] ?? 0; position < (start[group + 1] ?? 0); position++) {
      sum += 10 ** ((order * (fieldDb[position] ?? -Infinity)) / 10);
      sums[position] = sum;
    }
  }
  return sums;
}
