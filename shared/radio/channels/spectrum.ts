/**
 * A list of stations as columns, sorted by frequency once and searched ever after.
 *
 * Source: arithmetic.
 *
 * @module radio/channels/spectrum
 */
import type { FieldStrength } from '../propagation/field-strength.ts';
import { MAX_SIGNAL_ORDER } from '../mixing/product-levels.ts';
import type { Station } from '../station.ts';

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

  /**
   * @param stations The list.
   * @param fields Their fields; a station without one is left out.
   */
  constructor(stations: readonly Station[], fields: readonly FieldStrength[]) {
    const heard = heardStations(stations, fields);
    const places = sortedPlaces(heard);
    this.fieldDb = gathered(heard.fieldDb, places);
    this.groundDb = gathered(heard.groundDb, places);
    this.given = Uint8Array.from(gathered(heard.given, places));
    this.ids = Array.from(gathered(heard.ids, places));
    this.distanceM = Array.from(places, (place) => heard.distanceM[place] ?? null);
    const hz = gathered(heard.hz, places);
    this.start = groupStarts(hz);
    this.hz = Float64Array.from(this.start.subarray(0, -1), (position) => hz[position] ?? NaN);
    this.wanted = Int32Array.from(this.hz, (_, group) =>
      strongestByGround(this.groundDb, places, this.startOf(group), this.startOf(group + 1)),
    );
    this.powers = runningPowers(this.fieldDb, this.start);
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

/** Columns of the stations that have a field, in the order of the list. */
interface Heard {
  readonly ids: number[];
  readonly hz: number[];
  readonly fieldDb: number[];
  readonly groundDb: number[];
  readonly given: number[];
  readonly distanceM: (number | null)[];
}

/** A field that was given counts as received by ground wave. */
function heardStations(stations: readonly Station[], fields: readonly FieldStrength[]): Heard {
  const fieldOf = lookUp(fields);
  const heard: Heard = { ids: [], hz: [], fieldDb: [], groundDb: [], given: [], distanceM: [] };
  for (const [place, { id, frequencyHz, fieldDb: given }] of stations.entries()) {
    const field = fieldOf(id, place);
    const fieldDb = given ?? field?.fieldDb ?? null;
    if (fieldDb === null) continue;
    heard.ids.push(id);
    heard.hz.push(frequencyHz);
    heard.fieldDb.push(fieldDb);
    heard.groundDb.push(given ?? field?.groundDb ?? -Infinity);
    heard.given.push(given === null ? 0 : 1);
    heard.distanceM.push(field?.distanceM ?? null);
  }
  return heard;
}

/** Finds a station's field: as a rule at its own place, else by number. */
function lookUp(
  fields: readonly FieldStrength[],
): (id: number, place: number) => FieldStrength | undefined {
  let byId: Map<number, FieldStrength> | undefined;
  return (id, place) => {
    const here = fields[place];
    if (here?.station === id) return here;
    byId ??= new Map(fields.map((field) => [field.station, field]));
    return byId.get(id);
  };
}

/** Places in the list by frequency, then strongest first, then by number. */
function sortedPlaces({ hz, fieldDb, ids }: Heard): Uint32Array {
  const at = (column: readonly number[], place: number): number => column[place] ?? NaN;
  return Uint32Array.from(ids, (_, place) => place).sort(
    (a, b) => at(hz, a) - at(hz, b) || at(fieldDb, b) - at(fieldDb, a) || at(ids, a) - at(ids, b),
  );
}

function groupStarts(hz: Float64Array): Int32Array {
  const starts: number[] = [];
  for (let position = 0; position < hz.length; position++) {
    if (position === 0 || hz[position] !== hz[position - 1]) starts.push(position);
  }
  return Int32Array.from([...starts, hz.length]);
}

/** Position of the strongest; of equals the one that stands first in the list. */
function strongestByGround(
  groundDb: Float64Array,
  places: Uint32Array,
  start: number,
  end: number,
): number {
  let best = start;
  for (let position = start + 1; position < end; position++) {
    const difference = (groundDb[position] ?? NaN) - (groundDb[best] ?? NaN);
    const first = (places[position] ?? 0) < (places[best] ?? 0);
    if (difference > 0 || (difference === 0 && first)) best = position;
  }
  return best;
}

/** A column in the order of places. */
function gathered(column: readonly number[], places: Uint32Array): Float64Array {
  const values = new Float64Array(places.length);
  for (let position = 0; position < places.length; position++) {
    values[position] = column[places[position] ?? 0] ?? NaN;
  }
  return values;
}

/** For each signal order, sums of 10^(n E/10) that begin anew with each group. */
function runningPowers(fieldDb: Float64Array, start: Int32Array): Float64Array[] {
  const sums = Array.from({ length: MAX_SIGNAL_ORDER }, () => new Float64Array(fieldDb.length));
  for (let group = 0; group + 1 < start.length; group++) {
    const first = start[group] ?? 0;
    for (let position = first; position < (start[group + 1] ?? 0); position++) {
      const power = 10 ** ((fieldDb[position] ?? -Infinity) / 10);
      let raised = 1;
      for (const column of sums) {
        raised *= power;
        column[position] = raised + (position > first ? (column[position - 1] ?? 0) : 0);
      }
    }
  }
  return sums;
}
