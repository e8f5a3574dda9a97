import type { Period } from '../../shared/radio/site.ts';
import type { ListAtSite } from './engine-tasks.ts';
import type { StationOrder } from './station-orders.ts';
import { columnOf, unpackNames } from './station-columns.ts';

/** Which stations of a list are asked for, by what they are at the site. */
export interface StationPick {
  readonly list: ListAtSite;
  readonly period: Period;
  readonly order: StationOrder;
  readonly sort: 'frequency' | 'name' | 'power' | 'distance' | 'field';
  readonly descending: boolean;
  /** Ids that may be picked; null: all. */
  readonly among: Uint32Array | null;
  readonly fromHz: number;
  readonly toHz: number;
  readonly maxDistanceM: number;
  readonly minFieldDb: number;
  readonly offset: number;
  readonly limit: number;
}

export interface PickedStations {
  readonly ids: number[];
  readonly total: number;
  /** Of each of them; null: not known. */
  readonly distanceM: (number | null)[];
  readonly fieldDb: (number | null)[];
}

/** Distance and field of the list's stations, in its order; NaN: none. */
interface Measured {
  readonly distanceM: Float64Array;
  readonly fieldDb: Float64Array;
}

type Pick = StationPick & Measured;

/** Orders the list where no thread has yet, and picks one page. */
export function pickAmong(asked: StationPick, measured: Measured): PickedStations {
  const pick = { ...asked, ...measured };
  if (Atomics.load(pick.order.ready, 0) === 0) arrange(pick);
  const passes = passing(pick);
  const ids = columnOf(pick.list.columns, 'id');
  const picked: number[] = [];
  let total = 0;
  for (const index of inOrder(pick)) {
    if (!passes(index)) continue;
    if (total >= pick.offset && picked.length < pick.limit) picked.push(index);
    total += 1;
  }
  const known = (values: Float64Array) => picked.map((index) => knownOrNull(values[index]));
  return {
    ids: picked.map((index) => ids[index] ?? 0),
    total,
    distanceM: known(measured.distanceM),
    fieldDb: known(measured.fieldDb),
  };
}

const knownOrNull = (value = NaN): number | null => (Number.isNaN(value) ? null : value);

function arrange(pick: Pick): void {
  const { indices, ready } = pick.order;
  const { count } = pick.list.columns;
  const isKnown = knownBy(pick);
  let known = 0;
  let unknown = count;
  for (let index = 0; index < count; index++) {
    if (isKnown(index)) indices[known++] = index;
    else indices[--unknown] = index;
  }
  indices.subarray(0, known).sort(comparison(pick));
  Atomics.store(ready, 1, known);
  Atomics.store(ready, 0, 1);
}

function knownBy(pick: Pick): (index: number) => boolean {
  if (pick.sort === 'name') return () => true;
  const values = quantity(pick);
  return (index) => !Number.isNaN(values[index] ?? NaN);
}

/** By the quantity, then by the place in the list. */
function comparison(pick: Pick): (one: number, other: number) => number {
  if (pick.sort === 'name') {
    const names = unpackNames(pick.list.columns).map((name) => name.toLowerCase());
    return (one, other) => compareText(names[one] ?? '', names[other] ?? '') || one - other;
  }
  const values = quantity(pick);
  return (one, other) => (values[one] ?? 0) - (values[other] ?? 0) || one - other;
}

const compareText = (one: string, other: string): number =>
  one < other ? -1 : Number(one > other);

function quantity({ sort, list, distanceM, fieldDb }: Pick): Float64Array {
  if (sort === 'distance') return distanceM;
  if (sort === 'field') return fieldDb;
  if (sort === 'frequency') return columnOf(list.columns, 'frequencyHz');
  const night = columnOf(list.columns, 'powerNightW');
  return columnOf(list.columns, 'powerDayW').map((day, index) => greater(day, night[index] ?? NaN));
}

/** The greater of two, either of which may be unknown. */
const greater = (one: number, other: number): number =>
  Number.isNaN(one) || other > one ? other : one;

/** Indices in the order asked for; what has no such quantity comes last either way. */
function* inOrder({ order, descending }: Pick): Generator<number> {
  const { indices } = order;
  const known = Atomics.load(order.ready, 1);
  for (let at = 0; at < indices.length; at++) {
    const from = descending && at < known ? known - 1 - at : at;
    yield indices[from] ?? 0;
  }
}

function passing(pick: Pick): (index: number) => boolean {
  const { list, distanceM, fieldDb, among, fromHz, toHz, maxDistanceM, minFieldDb } = pick;
  const ids = columnOf(list.columns, 'id');
  const frequencies = columnOf(list.columns, 'frequencyHz');
  const wanted = among && new Set(among);
  const isNear = (index: number) =>
    maxDistanceM === Infinity || (distanceM[index] ?? NaN) <= maxDistanceM;
  const isHeard = (index: number) =>
    minFieldDb === -Infinity || (fieldDb[index] ?? NaN) >= minFieldDb;
  return (index) => {
    const hz = frequencies[index] ?? 0;
    if (hz < fromHz || hz > toHz || !isNear(index) || !isHeard(index)) return false;
    return !wanted || wanted.has(ids[index] ?? 0);
  };
}
