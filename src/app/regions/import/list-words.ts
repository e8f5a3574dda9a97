import type {
  ImportColumn,
  ImportField,
  ImportUnit,
} from '../../../../shared/contracts/list-import';
import { importUnitsOf } from '../../../../shared/contracts/list-import';

/** What a column can hold, in the order in which it is offered. */
export const FIELDS: readonly { readonly value: ImportField; readonly words: string }[] = [
  { value: 'frequency', words: $localize`Frequency` },
  { value: 'name', words: $localize`Name of the station` },
  { value: 'callSign', words: $localize`Call sign` },
  { value: 'latitude', words: $localize`Latitude` },
  { value: 'longitude', words: $localize`Longitude` },
  { value: 'place', words: $localize`Both coordinates in one cell` },
  { value: 'latitudeDegrees', words: $localize`Latitude: its degrees` },
  { value: 'latitudeMinutes', words: $localize`Latitude: its minutes` },
  { value: 'latitudeSeconds', words: $localize`Latitude: its seconds` },
  { value: 'latitudeHemisphere', words: $localize`Latitude: north or south` },
  { value: 'longitudeDegrees', words: $localize`Longitude: its degrees` },
  { value: 'longitudeMinutes', words: $localize`Longitude: its minutes` },
  { value: 'longitudeSeconds', words: $localize`Longitude: its seconds` },
  { value: 'longitudeHemisphere', words: $localize`Longitude: east or west` },
  { value: 'locator', words: $localize`Locator` },
  { value: 'power', words: $localize`Power, day and night alike` },
  { value: 'powerDay', words: $localize`Power by day` },
  { value: 'powerNight', words: $localize`Power by night` },
  { value: 'hours', words: $localize`Hours of service` },
  { value: 'note', words: $localize`Note` },
  { value: 'pattern', words: $localize`Pattern of the aerial, by bearing` },
];

/** A unit as people read it. */
export const unitWords = (unit: ImportUnit): string => UNITS[unit] ?? unit;

const UNITS: Readonly<Partial<Record<ImportUnit, string>>> = {
  degrees: $localize`degrees`,
  dms: $localize`degrees, minutes, seconds`,
  dB: $localize`dB over the power`,
  relative: $localize`field relative to the strongest, 0 to 1`,
};

/** What parts the cells of a row, in words. */
export function delimiterWords(delimiter: string): string {
  switch (delimiter) {
    case ',':
      return $localize`commas`;
    case ';':
      return $localize`semicolons`;
    case '\t':
      return $localize`tabs`;
    case '|':
      return $localize`vertical bars`;
    default:
      return `“${delimiter}”`;
  }
}

/** The decimal mark, in words. */
export const markWords = (mark: string): string =>
  mark === ',' ? $localize`comma: 1,5` : $localize`point: 1.5`;

/** Headers of the columns whose unit has to be asked for; of a pattern only the first. */
export const openUnits = (columns: readonly ImportColumn[]): string[] =>
  columns
    .filter(({ field, unit }) => field !== null && unit === null && importUnitsOf[field].length > 0)
    .filter(
      (column, index, open) => index === open.findIndex((each) => isSameQuestion(each, column)),
    )
    .map(({ header }) => header);

const isSameQuestion = (a: ImportColumn, b: ImportColumn): boolean =>
  a === b || (a.field === 'pattern' && b.field === 'pattern');
