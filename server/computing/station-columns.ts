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
  /** Path and pattern of the few stations that have any, by their index, as JSON in UTF-8. */
  readonly details: Uint8Array;
}

type Details = Pick<Station, 'path' | 'patternDb'>;

const NAMES = [
  'id',
  'frequencyHz',
  'latitude',
  'longitude',
  'powerDayW',
  'powerNightW',
  'fieldDb',
] as const;

export function packStations(stations: readonly Station[]): StationColumns {
  const count = stations.length;
  const numbers = new Float64Array(new SharedArrayBuffer(NAMES.length * count * 8));
  NAMES.forEach((column, at) => {
    stations.forEach((station, index) => {
      numbers[at * count + index] = station[column] ?? NaN;
    });
  });
  const names = packJson(stations.map(({ name }) => name));
  return { count, numbers, names, details: packJson(Object.fromEntries(detailed(stations))) };
}

const detailed = (stations: readonly Station[]): [number, Details][] =>
  stations.flatMap(({ path = null, patternDb = null }, index): [number, Details][] =>
    (path ?? patternDb) ? [[index, { path, patternDb }]] : [],
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

/** The names alone, in the stations' order. */
export const unpackNames = ({ names }: StationColumns): string[] => unpackJson(names) as string[];

function packJson(value: unknown): Uint8Array {
  const text = new TextEncoder().encode(JSON.stringify(value));
  const shared = new Uint8Array(new SharedArrayBuffer(text.length));
  shared.set(text);
  return shared;
}

const unpackJson = (text: Uint8Array): unknown =>
  // A decoder refuses shared memory, hence the copy.
  JSON.parse(new TextDecoder().decode(text.slice()));
