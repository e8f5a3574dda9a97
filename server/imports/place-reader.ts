import type { ImportFault, ImportField, ImportUnit } from '../../shared/contracts/list-import.ts';
import { readCoordinate } from './cell-coordinate.ts';
import type { Axis } from './cell-hemisphere.ts';
import { readLocator } from './cell-locator.ts';
import { isBlank } from './cell-number.ts';
import { readPlace, type ReadPlace } from './cell-place.ts';
import type { CsvRow } from './csv-rows.ts';
import type { ListReading } from './list-reading.ts';

/** Where one coordinate stands in a row: its columns by their index, -1 where there is none. */
interface AxisColumns {
  readonly axis: Axis;
  readonly unit: ImportUnit | null;
  /** Of the whole coordinate, or of its degrees alone. */
  readonly main: number;
  readonly minutes: number;
  readonly seconds: number;
  readonly hemisphere: number;
  readonly isSingle: boolean;
}

const NOWHERE = { latitude: null, longitude: null } as const;
const RANGES = { latitude: '-90 (south) to 90', longitude: '-180 (west) to 180' } as const;
const DECIMAL_WORDS = { '.': 'a decimal point', ',': 'a decimal comma' } as const;
const EXPECTED_PLACE =
  'latitude and longitude, such as 48.1467, 11.6083 or 48\u00b008\'48"N 11\u00b036\'30"E';
const EXPECTED_LOCATOR = 'a locator of 4, 6 or 8 characters, such as JN58td';

/**
 * Reads where the stations of one list are: each coordinate in a column or split over several, both
 * in one cell, or a locator; the first of these that a row fills. Built once a file.
 */
export class PlaceReader {
  readonly #reading: ListReading;
  readonly #latitude: AxisColumns;
  readonly #longitude: AxisColumns;
  readonly #place: number;
  readonly #locator: number;

  constructor(reading: ListReading) {
    this.#reading = reading;
    this.#latitude = columnsOf('latitude', reading);
    this.#longitude = columnsOf('longitude', reading);
    this.#place = indexOf('place', reading);
    this.#locator = indexOf('locator', reading);
  }

  /** The row's place; nowhere where it tells none. What cannot be read joins the faults. */
  read(row: CsvRow, faults: ImportFault[]): ReadPlace | typeof NOWHERE {
    const faultsBefore = faults.length;
    const latitude = this.#degrees(this.#latitude, row, faults);
    const longitude = this.#degrees(this.#longitude, row, faults);
    if (latitude !== null && longitude !== null) return { latitude, longitude };
    if (faults.length > faultsBefore) return NOWHERE;
    this.#checkPair(row, latitude, longitude, faults);
    return this.#fromOneCell(row, faults) ?? NOWHERE;
  }

  #degrees(columns: AxisColumns, row: CsvRow, faults: ImportFault[]): number | null {
    const cell = columns.isSingle
      ? (row.cells[columns.main] ?? '')
      : writtenTogether(columns, row.cells);
    if (isBlank(cell)) return null;
    const { decimalMark: mark, letterO } = this.#reading;
    const value = readCoordinate(cell, columns.axis, { unit: columns.unit, mark, letterO });
    if (value === null) {
      const isSplit = columns.unit === 'dms' || columns.minutes >= 0;
      const form = isSplit ? 'degrees, minutes and seconds' : 'degrees';
      const expected = `${form} from ${RANGES[columns.axis]}, with ${DECIMAL_WORDS[mark]}`;
      faults.push(this.#fault(row, columns.main, cell, expected));
    }
    return value;
  }

  /** Half a place is a slip of the pen, not a station without place. */
  #checkPair(
    row: CsvRow,
    latitude: number | null,
    longitude: number | null,
    faults: ImportFault[],
  ): void {
    const lacks = ({ main }: AxisColumns) => isBlank(row.cells[main] ?? '');
    if (latitude !== null && lacks(this.#longitude)) {
      const expected = 'a longitude, as there is a latitude';
      faults.push(this.#fault(row, this.#longitude.main, '', expected));
    }
    if (longitude !== null && lacks(this.#latitude)) {
      const expected = 'a latitude, as there is a longitude';
      faults.push(this.#fault(row, this.#latitude.main, '', expected));
    }
  }

  #fromOneCell(row: CsvRow, faults: ImportFault[]): ReadPlace | null {
    const { decimalMark, letterO } = this.#reading;
    const both = row.cells[this.#place] ?? '';
    if (!isBlank(both)) {
      const place = readPlace(both, decimalMark, letterO);
      if (!place) faults.push(this.#fault(row, this.#place, both, EXPECTED_PLACE));
      return place;
    }
    const locator = row.cells[this.#locator] ?? '';
    if (isBlank(locator)) return null;
    const place = readLocator(locator);
    if (!place) faults.push(this.#fault(row, this.#locator, locator, EXPECTED_LOCATOR));
    return place;
  }

  #fault({ line }: CsvRow, index: number, value: string, expected: string): ImportFault {
    const column = this.#reading.columns[index]?.header ?? '';
    return { line, column, value: value.slice(0, 200), expected };
  }
}

const indexOf = (field: ImportField, { columns }: ListReading): number =>
  columns.findIndex((column) => column.field === field);

function columnsOf(axis: Axis, reading: ListReading): AxisColumns {
  const whole = indexOf(axis, reading);
  const main = whole < 0 ? indexOf(`${axis}Degrees`, reading) : whole;
  const parts = {
    minutes: indexOf(`${axis}Minutes`, reading),
    seconds: indexOf(`${axis}Seconds`, reading),
    hemisphere: indexOf(`${axis}Hemisphere`, reading),
  };
  const isSingle = Object.values(parts).every((index) => index < 0);
  return { axis, main, unit: reading.columns[main]?.unit ?? null, ...parts, isSingle };
}

/** A split coordinate as one would write it in a cell; empty where only its letter is told. */
function writtenTogether(columns: AxisColumns, cells: readonly string[]): string {
  const at = (index: number) => (isBlank(cells[index] ?? '') ? '' : (cells[index] ?? '').trim());
  const [degrees, minutes, seconds] = [at(columns.main), at(columns.minutes), at(columns.seconds)];
  if (degrees === '' && minutes === '' && seconds === '') return '';
  const letter = at(columns.hemisphere);
  if (minutes === '' && seconds === '') return `${degrees} ${letter}`.trim();
  // A part that is left out must not have the next one take its place.
  return `${degrees || '?'}\u00b0${minutes || '?'}'${seconds === '' ? '' : `${seconds}"`}${letter}`;
}
