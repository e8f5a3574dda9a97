import type { ImportCheck, ImportFault } from '../../shared/contracts/list-import.ts';
import { type CsvRow, csvRows } from './csv-rows.ts';
import { fingerprintOf, identityOf } from './fingerprint.ts';
import type { ListReading } from './list-inspection.ts';
import type { KnownRow, RowTally } from './row-tally.ts';
import { RowReader, type StationRow } from './station-row.ts';

const FAULTS_ANSWERED = 1000;

/** A row of the file, judged. */
export type JudgedRow =
  | { readonly row: CsvRow; readonly station: (StationRow & KnownRow) | null }
  | { readonly row: CsvRow; readonly faults: readonly ImportFault[] };

/** The list, row by row: the station, null for a repetition of an earlier row, or what is wrong. */
export async function* judgedRows(
  path: string,
  reading: ListReading,
  tally: RowTally,
): AsyncGenerator<JudgedRow> {
  const reader = new RowReader(reading.columns, reading.decimalMark);
  let isHeader = true;
  for await (const row of csvRows(path, reading)) {
    if (isHeader) {
      isHeader = false;
      continue;
    }
    const { station, faults } = reader.read(row);
    if (station === null) {
      tally.reject();
      yield { row, faults };
      continue;
    }
    const known = { identity: identityOf(station), fingerprint: fingerprintOf(station) };
    yield { row, station: tally.add(known) ? { ...station, ...known } : null };
  }
}

/** Counts what storing the list would do beside the edition the tally knows, and names all faults. */
export async function checkList(
  path: string,
  reading: ListReading,
  tally: RowTally,
): Promise<ImportCheck> {
  const faults: ImportFault[] = [];
  for await (const judged of judgedRows(path, reading, tally)) {
    if (!('faults' in judged)) continue;
    faults.push(...judged.faults.slice(0, FAULTS_ANSWERED - faults.length));
  }
  return { rows: tally.rows, faults };
}
