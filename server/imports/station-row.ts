import type {
  ImportColumn,
  ImportFault,
  ImportField,
  ImportUnit,
} from '../../shared/contracts/list-import.ts';
import { isBlank } from './cell-number.ts';
import { type Period, readPeriod } from './cell-period.ts';
import { readFrequency, readPower } from './cell-unit.ts';
import type { CsvRow } from './csv-rows.ts';
import type { ListReading } from './list-reading.ts';
import { PatternReader } from './pattern-reader.ts';
import { PlaceReader } from './place-reader.ts';

/** A row that can be stored. */
export interface StationRow {
  readonly name: string;
  readonly callSign: string;
  readonly frequencyHz: number;
  readonly latitude: number | null;
  readonly longitude: number | null;
  readonly powerDayW: number | null;
  readonly powerNightW: number | null;
  /** Gains of the aerial, dB, every 10 degrees from north; null where the list tells none. */
  readonly patternDb: readonly number[] | null;
  readonly hours: string;
  readonly note: string;
}

/** A row read: the station and the period its power is for, or everything that is wrong with it. */
export type RowResult =
  | { readonly station: StationRow; readonly period: Period | null; readonly faults: readonly [] }
  | { readonly station: null; readonly faults: readonly ImportFault[] };

const LENGTHS = { name: 200, callSign: 40, hours: 200, note: 1000 } as const;
/** Breaks, tabs, other control characters and repeated spaces. */
const UNTIDY = /[\p{Cc}\s]{2}|[\p{Cc}\u00a0]/u;
/** As our own exports keep a spreadsheet from running a cell. */
const DEFUSED = /^'(?='*[=+\-@])/;
const DECIMAL_WORDS = { '.': 'a decimal point', ',': 'a decimal comma' } as const;

/** Reads the rows of one list by its matching; built once a file, called once a row. */
export class RowReader {
  readonly #at = new Map<ImportField, number>();
  readonly #columns: readonly ImportColumn[];
  readonly #reading: ListReading;
  readonly #place: PlaceReader;
  readonly #pattern: PatternReader | null;
  readonly #hasPeriods: boolean;

  constructor(reading: ListReading) {
    this.#reading = reading;
    this.#columns = reading.columns;
    reading.columns.forEach(({ field }, index) => {
      if (field !== null && field !== 'pattern') this.#at.set(field, index);
    });
    this.#place = new PlaceReader(reading);
    this.#pattern = PatternReader.of(reading);
    this.#hasPeriods =
      this.#at.has('hours') &&
      this.#at.has('power') &&
      !this.#at.has('powerDay') &&
      !this.#at.has('powerNight');
  }

  /** Cell of the column that holds a field, tidied at its ends; empty where there is none. */
  cell(field: ImportField, { cells }: CsvRow): string {
    const index = this.#at.get(field);
    return index === undefined ? '' : (cells[index] ?? '');
  }

  read(row: CsvRow): RowResult {
    const faults: ImportFault[] = [];
    if (row.cells.length > this.#columns.length) this.#checkWidth(row, faults);
    const name = this.#text('name', row, faults);
    const callSign = this.#text('callSign', row, faults);
    const hours = this.#text('hours', row, faults);
    const note = this.#text('note', row, faults);
    const frequencyHz = this.#frequency(row, faults);
    const { latitude, longitude } = this.#place.read(row, faults);
    const always = this.#power('power', row, faults);
    const day = this.#power('powerDay', row, faults) ?? always;
    const night = this.#power('powerNight', row, faults) ?? always;
    const pattern = this.#pattern?.read(row, day ?? night, faults) ?? null;
    if (name === '' && callSign === '') this.#checkNamed(row, faults);
    if (faults.length > 0 || frequencyHz === null) return { station: null, faults };
    const period = this.#hasPeriods ? readPeriod(hours) : null;
    const station: StationRow = {
      name,
      callSign,
      frequencyHz,
      latitude,
      longitude,
      powerDayW: day ?? pattern?.powerW ?? null,
      powerNightW: night ?? pattern?.powerW ?? null,
      patternDb: pattern?.patternDb ?? null,
      hours,
      note,
    };
    return { station, period, faults: [] };
  }

  /** A fault of the column that holds a field. */
  faultOf(row: CsvRow, field: ImportField, expected: string): ImportFault {
    const column = this.#columns[this.#at.get(field) ?? -1]?.header ?? field;
    return { line: row.line, column, value: this.cell(field, row).slice(0, 200), expected };
  }

  #checkWidth({ line, cells }: CsvRow, faults: ImportFault[]): void {
    const width = this.#columns.length;
    const surplus = cells.slice(width).filter((cell) => cell.trim() !== '');
    if (surplus.length === 0) return;
    faults.push({
      line,
      column: this.#columns.at(-1)?.header ?? '',
      value: surplus.join(' ').slice(0, 200),
      expected: `${width} cells, as in the header, not more`,
    });
  }

  /** A station needs something to be called by, unless the list has no such column at all. */
  #checkNamed(row: CsvRow, faults: ImportFault[]): void {
    const field = this.#at.has('name') ? 'name' : 'callSign';
    if (!this.#at.has(field)) return;
    if (this.cell('name', row).trim() !== '' || this.cell('callSign', row).trim() !== '') return;
    faults.push(this.faultOf(row, field, 'a name or a call sign'));
  }

  #text(field: keyof typeof LENGTHS, row: CsvRow, faults: ImportFault[]): string {
    const cell = this.cell(field, row).trim();
    if (cell === '') return '';
    const text = (UNTIDY.test(cell) ? cell.replace(/[\s\p{Cc}]+/gu, ' ') : cell).replace(
      DEFUSED,
      '',
    );
    if (text.length <= LENGTHS[field]) return text;
    faults.push(this.faultOf(row, field, `at most ${LENGTHS[field]} characters`));
    return '';
  }

  #frequency(row: CsvRow, faults: ImportFault[]): number | null {
    const unit = this.#unit('frequency') ?? 'Hz';
    const value = readFrequency(this.cell('frequency', row), unit, this.#reading.decimalMark);
    if (value === null) {
      const expected = `a frequency in ${unit} with ${this.#markWords()}, 1 kHz to 1 GHz`;
      faults.push(this.faultOf(row, 'frequency', expected));
    }
    return value;
  }

  #power(
    field: 'power' | 'powerDay' | 'powerNight',
    row: CsvRow,
    faults: ImportFault[],
  ): number | null {
    const cell = this.cell(field, row);
    if (isBlank(cell)) return null;
    const unit = this.#unit(field) ?? 'W';
    const value = readPower(cell, unit, this.#reading.decimalMark);
    if (value === null) {
      const expected = `a power in ${unit} with ${this.#markWords()}, 0 W to 100 MW`;
      faults.push(this.faultOf(row, field, expected));
    }
    return value;
  }

  #unit(field: ImportField): ImportUnit | null {
    return this.#columns[this.#at.get(field) ?? -1]?.unit ?? null;
  }

  #markWords(): string {
    return DECIMAL_WORDS[this.#reading.decimalMark];
  }
}
