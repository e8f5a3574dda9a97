import type { ImportColumn, ImportFault, ImportField } from '../../shared/contracts/list-import.ts';
import { readCoordinate } from './cell-coordinate.ts';
import { type DecimalMark, isBlank } from './cell-number.ts';
import { readFrequency, readPower } from './cell-unit.ts';
import type { CsvRow } from './csv-rows.ts';
import { readLocator } from './cell-locator.ts';

/** A row that can be stored. */
export interface StationRow {
  readonly name: string;
  readonly callSign: string;
  readonly frequencyHz: number;
  readonly latitude: number | null;
  readonly longitude: number | null;
  readonly powerDayW: number | null;
  readonly powerNightW: number | null;
  readonly hours: string;
  readonly note: string;
}

/** A row read: the station, or everything that is wrong with it. */
export type RowResult =
  | { readonly station: StationRow; readonly faults: readonly [] }
  | { readonly station: null; readonly faults: readonly ImportFault[] };

const LENGTHS = { name: 200, callSign: 40, hours: 200, note: 1000 } as const;
/** Breaks, tabs, other control characters and repeated spaces. */
const UNTIDY = /\p{Cc}|\s{2}/u;
const DECIMAL_WORDS = { '.': 'a decimal point', ',': 'a decimal comma' } as const;

/** Reads the rows of one list by its matching; built once a file, called once a row. */
export class RowReader {
  readonly #columns: ReadonlyMap<ImportField, { index: number; column: ImportColumn }>;
  readonly #headers: readonly string[];
  readonly #mark: DecimalMark;

  constructor(columns: readonly ImportColumn[], mark: DecimalMark) {
    this.#headers = columns.map(({ header }) => header);
    this.#mark = mark;
    this.#columns = new Map(
      columns.flatMap((column, index) =>
        column.field === null ? [] : [[column.field, { index, column }]],
      ),
    );
  }

  read(row: CsvRow): RowResult {
    const faults: ImportFault[] = [];
    this.#checkWidth(row, faults);
    const texts = {
      name: this.#text('name', row, faults),
      callSign: this.#text('callSign', row, faults),
      hours: this.#text('hours', row, faults),
      note: this.#text('note', row, faults),
    };
    const frequencyHz = this.#frequency(row, faults);
    const place = this.#place(row, faults);
    const powers = this.#powers(row, faults);
    this.#checkNamed(row, faults);
    if (faults.length > 0 || frequencyHz === null) return { station: null, faults };
    return { station: { ...texts, frequencyHz, ...place, ...powers }, faults: [] };
  }

  #checkWidth({ line, cells }: CsvRow, faults: ImportFault[]): void {
    const surplus = cells.slice(this.#headers.length).filter((cell) => cell.trim() !== '');
    if (surplus.length === 0) return;
    faults.push({
      line,
      column: this.#headers.at(-1) ?? '',
      value: surplus.join(' ').slice(0, 200),
      expected: `${this.#headers.length} cells, as in the header; this row has ${cells.length}`,
    });
  }

  /** A station needs something to be called by, unless the list has no such column at all. */
  #checkNamed(row: CsvRow, faults: ImportFault[]): void {
    const field = this.#columns.has('name') ? 'name' : 'callSign';
    if (!this.#columns.has(field)) return;
    if (this.#cell('name', row).trim() !== '' || this.#cell('callSign', row).trim() !== '') return;
    this.#fault(row, field, 'a name or a call sign', faults);
  }

  #text(field: keyof typeof LENGTHS, row: CsvRow, faults: ImportFault[]): string {
    const cell = this.#cell(field, row).trim();
    const text = UNTIDY.test(cell) ? cell.replace(/[\s\p{Cc}]+/gu, ' ') : cell;
    if (text.length <= LENGTHS[field]) return text;
    this.#fault(row, field, `at most ${LENGTHS[field]} characters`, faults);
    return '';
  }

  #frequency(row: CsvRow, faults: ImportFault[]): number | null {
    const unit = this.#columns.get('frequency')?.column.unit ?? 'Hz';
    const value = readFrequency(this.#cell('frequency', row), unit, this.#mark);
    if (value === null) {
      const expected = `a frequency in ${unit} with ${DECIMAL_WORDS[this.#mark]}, 1 kHz to 1 GHz`;
      this.#fault(row, 'frequency', expected, faults);
    }
    return value;
  }

  #place(row: CsvRow, faults: ImportFault[]): Pick<StationRow, 'latitude' | 'longitude'> {
    const latitude = this.#degrees('latitude', row, faults);
    const longitude = this.#degrees('longitude', row, faults);
    if (latitude !== null && longitude !== null) return { latitude, longitude };
    this.#checkPair(row, latitude, longitude, faults);
    const cell = this.#cell('locator', row);
    if (isBlank(cell)) return { latitude: null, longitude: null };
    const place = readLocator(cell);
    if (place) return place;
    this.#fault(row, 'locator', 'a locator of 4, 6 or 8 characters, such as JN58td', faults);
    return { latitude: null, longitude: null };
  }

  /** Half a place is a slip of the pen, not a station without place. */
  #checkPair(
    row: CsvRow,
    latitude: number | null,
    longitude: number | null,
    faults: ImportFault[],
  ) {
    if (latitude !== null && isBlank(this.#cell('longitude', row))) {
      this.#fault(row, 'longitude', 'a longitude, as there is a latitude', faults);
    }
    if (longitude !== null && isBlank(this.#cell('latitude', row))) {
      this.#fault(row, 'latitude', 'a latitude, as there is a longitude', faults);
    }
  }

  #degrees(axis: 'latitude' | 'longitude', row: CsvRow, faults: ImportFault[]): number | null {
    const cell = this.#cell(axis, row);
    if (isBlank(cell)) return null;
    const unit = this.#columns.get(axis)?.column.unit ?? null;
    const value = readCoordinate(cell, axis, unit, this.#mark);
    if (value === null) {
      const range = axis === 'latitude' ? '-90 (south) to 90' : '-180 (west) to 180';
      const form = unit === 'dms' ? 'degrees, minutes and seconds' : 'degrees';
      this.#fault(row, axis, `${form} from ${range}, with ${DECIMAL_WORDS[this.#mark]}`, faults);
    }
    return value;
  }

  #powers(row: CsvRow, faults: ImportFault[]): Pick<StationRow, 'powerDayW' | 'powerNightW'> {
    const always = this.#power('power', row, faults);
    return {
      powerDayW: this.#power('powerDay', row, faults) ?? always,
      powerNightW: this.#power('powerNight', row, faults) ?? always,
    };
  }

  #power(field: 'power' | 'powerDay' | 'powerNight', row: CsvRow, faults: ImportFault[]) {
    const cell = this.#cell(field, row);
    if (isBlank(cell)) return null;
    const unit = this.#columns.get(field)?.column.unit ?? 'W';
    const value = readPower(cell, unit, this.#mark);
    if (value === null) {
      const expected = `a power in ${unit} with ${DECIMAL_WORDS[this.#mark]}, 0 W to 100 MW`;
      this.#fault(row, field, expected, faults);
    }
    return value;
  }

  #cell(field: ImportField, { cells }: CsvRow): string {
    const index = this.#columns.get(field)?.index;
    return index === undefined ? '' : (cells[index] ?? '');
  }

  #fault(row: CsvRow, field: ImportField, expected: string, faults: ImportFault[]): void {
    const column = this.#columns.get(field)?.column.header ?? field;
    faults.push({ line: row.line, column, value: this.#cell(field, row).slice(0, 200), expected });
  }
}
