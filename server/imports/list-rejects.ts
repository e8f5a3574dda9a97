import { stringify } from 'csv-stringify';

import { judgedRows } from './list-check.ts';
import type { ListReading } from './list-inspection.ts';
import { RowTally } from './row-tally.ts';

/**
 * The rejected rows as CSV in UTF-8: `line` and `fault`, then the file's own columns, so
 * that the mended file can be imported again. Text that a spreadsheet would run as a formula is defused by
 * an apostrophe; numbers stay numbers.
 */
export async function* rejectedRows(path: string, reading: ListReading): AsyncGenerator<string[]> {
  yield ['line', 'fault', ...reading.columns.map(({ header }) => header)];
  for await (const judged of judgedRows(path, reading, new RowTally())) {
    if (!('faults' in judged)) continue;
    const { line, cells } = judged.row;
    const faults = judged.faults.map(
      ({ column, value, expected }) => `${column}: "${value}" is not ${expected}`,
    );
    yield [String(line), faults.join('; '), ...cells];
  }
}

/** Turns rows into the text of a CSV file. */
export const csvWriter = (delimiter: string) =>
  stringify({
    bom: true,
    delimiter,
    record_delimiter: 'windows',
    quoted_match: /[\r\n]/,
    cast: { string: defuse },
  });

const PLAIN_NUMBER = /^[-+]?[\d\s.,]*\d[\d\s.,]*(?:e[-+]?\d+)?$/i;

/** Keeps a spreadsheet from running a cell. */
export function defuse(cell: string): string {
  return /^[=+\-@\t\r]/.test(cell) && !PLAIN_NUMBER.test(cell) ? `'${cell}` : cell;
}
