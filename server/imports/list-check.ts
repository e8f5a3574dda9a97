import type { ImportCause, ImportCheck, ImportFault } from '../../shared/contracts/list-import.ts';
import { type CsvRow, csvRows } from './csv-rows.ts';
import { fingerprintOf, identityOf } from './fingerprint.ts';
import type { ListReading } from './list-reading.ts';
import { RowAsides } from './row-asides.ts';
import type { KnownRow, RowTally } from './row-tally.ts';
import { StationHalves } from './station-halves.ts';
import { RowReader, type StationRow } from './station-row.ts';

const FAULTS_ANSWERED = 1000;
const LINES_SHOWN = 5;

/** A row of the file, judged. */
export type JudgedRow =
  | { readonly row: CsvRow; readonly station: (StationRow & KnownRow) | null }
  | { readonly row: CsvRow; readonly faults: readonly ImportFault[] };

/** Rows that follow each other, judged, and how many bytes of the file were read for them. */
export interface JudgedPart {
  readonly judged: readonly JudgedRow[];
  readonly bytes: number;
}

/**
 * The list, row by row: the station, null where the row adds none (it says again what another row
 * has said, or belongs to a station told by another row), or what is wrong with the row.
 */
export async function* judgedRows(
  path: string,
  reading: ListReading,
  tally: RowTally,
): AsyncGenerator<JudgedPart> {
  const judge = new RowJudge(reading, tally);
  let read = 0;
  for await (const { rows, bytes } of csvRows(path, reading)) {
    const judged: JudgedRow[] = [];
    for (const row of rows) {
      const one = row.line < reading.dataLine ? judge.pass(row) : judge.judge(row);
      if (one) judged.push(one);
    }
    read = bytes;
    yield { judged, bytes };
  }
  yield { judged: [...judge.rest()], bytes: read };
}

/** Judges the rows of one list, one after the other. */
class RowJudge {
  readonly #reading: ListReading;
  readonly #tally: RowTally;
  readonly #reader: RowReader;
  readonly #asides: RowAsides;
  readonly #halves: StationHalves;

  constructor(reading: ListReading, tally: RowTally) {
    this.#reading = reading;
    this.#tally = tally;
    this.#reader = new RowReader(reading);
    this.#asides = new RowAsides(reading);
    this.#halves = new StationHalves(tally);
  }

  /** A line before the rows. */
  pass({ line }: CsvRow): null {
    if (line < this.#reading.headerLine) this.#tally.remark('title', line);
    return null;
  }

  judge(row: CsvRow): JudgedRow | null {
    const aside = this.#asides.kindOf(row.cells);
    if (aside !== null) {
      this.#tally.remark(aside, row.line);
      return null;
    }
    const { station, faults, ...read } = this.#reader.read(row);
    if (station === null) return this.#reject(row, faults);
    if (row.cells.length < this.#reading.columns.length) this.#tally.remark('short', row.line);
    const period = 'period' in read ? read.period : null;
    if (period === null) return this.#keep(row, station);
    const taken = this.#halves.take({ row, station }, period);
    if (taken === null) return { row, station: null };
    if ('whole' in taken) return this.#keep(taken.whole.row, taken.whole.station);
    if (taken.isSame) {
      this.#tally.repeat();
      return { row, station: null };
    }
    const expected = `another period than that of line ${taken.repeats}, which is the same station`;
    return this.#reject(row, [this.#reader.faultOf(row, 'hours', expected)]);
  }

  /** Stations of which only one row came. */
  *rest(): Generator<JudgedRow> {
    for (const { row, station } of this.#halves.rest()) yield this.#keep(row, station);
  }

  #keep(row: CsvRow, station: StationRow): JudgedRow {
    const known = Object.assign(station, {
      identity: identityOf(station),
      fingerprint: fingerprintOf(station),
    });
    if (!this.#tally.add(known)) return { row, station: null };
    this.#tally.note(known);
    return { row, station: known };
  }

  #reject(row: CsvRow, faults: readonly ImportFault[]): JudgedRow {
    this.#tally.reject();
    return { row, faults };
  }
}

/**
 * Counts what storing the list would do beside the edition the tally knows, and names all faults.
 * @param follow Is shown the rows as they were judged, and waited for.
 */
export async function checkList(
  path: string,
  reading: ListReading,
  tally: RowTally,
  follow: (part: JudgedPart) => Promise<void> = () => Promise.resolve(),
): Promise<ImportCheck> {
  const faults: ImportFault[] = [];
  const causes = new Map<string, ImportCause>();
  for await (const part of judgedRows(path, reading, tally)) {
    await follow(part);
    for (const fault of part.judged.flatMap(faultsOf)) {
      if (faults.length < FAULTS_ANSWERED) faults.push(fault);
      count(causes, fault);
    }
  }
  const commonest = [...causes.values()].sort((a, b) => b.count - a.count);
  return { rows: tally.rows, faults, causes: commonest, remarks: tally.remarks };
}

const faultsOf = (row: JudgedRow): readonly ImportFault[] => ('faults' in row ? row.faults : []);

function count(causes: Map<string, ImportCause>, { line, column, expected }: ImportFault): void {
  const key = `${column}\u001f${expected}`;
  const cause = causes.get(key);
  if (!cause) {
    causes.set(key, { column, expected, count: 1, lines: [line] });
    return;
  }
  cause.count += 1;
  if (cause.lines.length < LINES_SHOWN) cause.lines.push(line);
}
