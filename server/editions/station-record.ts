import type { StationRecord } from '../../shared/contracts/station-list.ts';
import type { Station } from '../../shared/radio/station.ts';
import type { StationModel } from './station-model.ts';

/** What lists, files and comparisons say of a station. */
export const RECORD_COLUMNS = [
  'id',
  'name',
  'callSign',
  'frequencyHz',
  'latitude',
  'longitude',
  'powerDayW',
  'powerNightW',
  'hours',
  'note',
  'patternDb',
] as const satisfies readonly (keyof StationModel)[];

type Row = Pick<StationModel, (typeof RECORD_COLUMNS)[number]>;

export const toRecord = (row: Row): StationRecord => ({
  id: row.id,
  name: row.name,
  callSign: row.callSign,
  frequencyHz: row.frequencyHz,
  latitude: row.latitude,
  longitude: row.longitude,
  powerDayW: row.powerDayW,
  powerNightW: row.powerNightW,
  hours: row.hours,
  note: row.note,
  patternDb: patternOf(row.patternDb),
});

/** Gains of a stored pattern. */
export const patternOf = (stored: string | null): number[] | null =>
  stored?.split(',').map(Number) ?? null;

/** What computing takes of a station; one that is off the air stays in the list and says so. */
export const toComputedWith = (record: StationRecord, offAir: boolean): Station => ({
  id: record.id,
  name: record.name,
  frequencyHz: record.frequencyHz,
  latitude: record.latitude,
  longitude: record.longitude,
  powerDayW: record.powerDayW,
  powerNightW: record.powerNightW,
  fieldDb: null,
  patternDb: record.patternDb,
  ...(offAir && { offAir }),
});
