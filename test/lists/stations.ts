/** A station that the files tell of, as it is read. */
export type StationTuple = readonly [
  name: string,
  frequencyHz: number,
  latitude: number | null,
  longitude: number | null,
  powerDayW: number | null,
  powerNightW: number | null,
];

export const ferry = (name = 'Ferry Point'): StationTuple => [
  name,
  612_000,
  47.31,
  8.05,
  50_000,
  10_000,
];
export const steady = (name = 'Ferry Point'): StationTuple => [
  name,
  612_000,
  47.31,
  8.05,
  50_000,
  50_000,
];
export const alder = (name = 'Alder Ridge'): StationTuple => [name, 621_000, 47.9, 8.4, 1500, 0];
export const ridge = (name = 'Alder Ridge'): StationTuple => [name, 621_000, 47.9, 8.4, 1500, 1500];
export const quay = (name = 'Northquay'): StationTuple => [
  name,
  747_000,
  46.98,
  7.45,
  100_000,
  100_000,
];
export const south = (name = 'Northquay'): StationTuple => [
  name,
  747_000,
  -46.98,
  -7.45,
  100_000,
  100_000,
];
export const thousands = (name: string, other: string, third: string): StationTuple[] => [
  [other, 621_000, 47.9, 8.4, 1500, 1500],
  [name, 1_359_000, 47.31, 8.05, 1234.5, 1234.5],
  [third, 1_404_000, 46.98, 7.45, 100_000, 100_000],
];
