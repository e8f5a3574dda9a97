import { setImmediate } from 'node:timers/promises';

import type { Station } from '../../shared/radio/station.ts';

/**
 * A list of stations as columns in shared memory: threads read it where it lies, nothing is copied.
 * What is null is kept as NaN, which no column holds otherwise.
 */
export interface StationColumns {
  readonly count: number;
  /** The columns of `NAMES`, one behind the other. */
  readonly numbers: Float64Array;
  /** The stations' names as JSON in UTF-8: only some answers want them. */
  readonly names: Uint8Array;
  /** Path, pattern and silence of the few stations that have any, by their index, as JSON in UTF-8. */
  readonly details: Uint8Array;
}

const encoder = new TextEncoder();

type Details = Pick<Station, 'path' | 'patternDb' | 'offAir'>;

const NAMES = [
  'id',
  'frequencyHz',
  'latitude',
  'longitude',
  'powerDayW',
  'powerNightW',
  'fieldDb',
] as const;

/** Packed in one go: more would hold up other requests. */
const SLICE = 5000;

/** Packs a list slice by slice, with the event loop free between them. */
export async function packStations(stations: readonly Station[]): Promise<StationColumns> {
  const count = stations.length;
  const numbers = new Float64Array(new SharedArrayBuffer(NAMES.length * count * 8));
  const names: Uint8Array[] = [];
  const details: (readonly [number, Details])[] = [];
  for (let from = 0; from < count; from += SLICE) {
    if (from > 0) await setImmediate();
    const slice = stations.slice(from, from + SLICE);
    NAMES.forEach((column, at) => fillColumn(numbers, at * count + from, slice, column));
    names.push(encodeNames(slice, from > 0));
    details.push(...detailed(slice, from));
  }
  return {
    count,
    numbers,
    names: joined([encoder.encode('['), ...names, encoder.encode(']')]),
    details: joined([encoder.encode(JSON.stringify(Object.fromEntries(details)))]),
  };
}

function fillColumn(
  numbers: Float64Array,
  from: number,
  stations: readonly Station[],
  column: (typeof NAMES)[number],
): void {
  stations.forEach((station, index) => {
    numbers[from + index] = station[column] ?? NaN;
  });
}

/** Names as the inside of a JSON array. */
function encodeNames(stations: readonly Station[], hasOthersBefore: boolean): Uint8Array {
  const inside = JSON.stringify(stations.map(({ name }) => name)).slice(1, -1);
  return encoder.encode(hasOthersBefore ? `,${inside}` : inside);
}

const detailed = (stations: readonly Station[], from: number): [number, Details][] =>
  stations.flatMap(
    ({ path = null, patternDb = null, offAir = false }, index): [number, Details][] =>
      path || patternDb || offAir
        ? [[from + index, { path, patternDb, ...(offAir && { offAir }) }]]
        : [],
  );

/** The stations, with their names left out. */
export function unpackStations({ count, numbers, details }: StationColumns): Station[] {
  const detailOf = unpackJson(details) as Record<number, Details>;
  const columns = NAMES.map((_, at) => numbers.subarray(at * count, (at + 1) * count));
  const [id, frequency, latitude, longitude, day, night, field] = columns;
  const given = (column: Float64Array | undefined, index: number): number | null => {
    const value = column?.[index] ?? NaN;
    return Number.isNaN(value) ? null : value;
  };
  return Array.from({ length: count }, (_, index) => ({
    id: id?.[index] ?? 0,
    name: '',
    frequencyHz: frequency?.[index] ?? 0,
    latitude: given(latitude, index),
    longitude: given(longitude, index),
    powerDayW: given(day, index),
    powerNightW: given(night, index),
    fieldDb: given(field, index),
    ...detailOf[index],
  }));
}

/** One column as it lies there; NaN where a station has no such value. */
export const columnOf = (
  { count, numbers }: StationColumns,
  name: (typeof NAMES)[number],
): Float64Array => numbers.subarray(NAMES.indexOf(name) * count, (NAMES.indexOf(name) + 1) * count);

/** The frequencies alone, ascending, each once. */
export const frequenciesOf = (columns: StationColumns): number[] => [
  ...new Set(columnOf(columns, 'frequencyHz').slice().sort()),
];

/** The names alone, in the stations' order. */
export const unpackNames = ({ names }: StationColumns): string[] => unpackJson(names) as string[];

function joined(parts: readonly Uint8Array[]): Uint8Array {
  const length = parts.reduce((sum, part) => sum + part.length, 0);
  const shared = new Uint8Array(new SharedArrayBuffer(length));
  let at = 0;
  for (const part of parts) {
    shared.set(part, at);
    at += part.length;
  }
  return shared;
}

const unpackJson = (text: Uint8Array): unknown =>
  // A decoder refuses shared memory, hence the copy.
  JSON.parse(new TextDecoder().decode(text.slice()));
