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
}

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
  const text = new TextEncoder().encode(JSON.stringify(stations.map(({ name }) => name)));
  const names = new Uint8Array(new SharedArrayBuffer(text.length));
  names.set(text);
  return { count, numbers, names };
}

/** The stations, with their names left out. */
export function unpackStations({ count, numbers }: StationColumns): Station[] {
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
  }));
}

/** The names alone, in the stations' order. */
export const unpackNames = ({ names }: StationColumns): string[] =>
  // A decoder refuses shared memory, hence the copy.
  JSON.parse(new TextDecoder().decode(names.slice())) as string[];
