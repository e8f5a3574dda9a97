import { type JudgedRow, judgedRows } from './list-check.ts';
import type { ListReading } from './list-reading.ts';
import { RowTally } from './row-tally.ts';

/** The columns that a file of rejects has before those of the list. */
export const REJECT_HEADERS = ['line', 'fault'] as const;

/** Whether the headers are those of a file of rejects. */
export const isRejects = (headers: readonly string[]): boolean =>
  REJECT_HEADERS.every((header, index) => headers[index] === header);

/** What the rejects of an import are called as a file. */
export const rejectsName = (importId: number): string => `rejects-${importId}.csv`;

/** The import whose rejects a file holds, by its name; a spreadsheet may have added to it. */
export const rejectedImport = (fileName: string): number | null => {
  const digits = /^rejects-(\d{1,9})\b/.exec(fileName)?.[1];
  return digits === undefined ? null : Number(digits);
};

/** What stands above rejected rows. */
const headersOf = ({ columns }: ListReading): string[] => [
  ...REJECT_HEADERS,
  ...columns.map(({ header }) => header),
];

/** The rejects of a list without any; its file need not be there. */
export async function* noRejects(reading: ListReading): AsyncGenerator<string[]> {
  yield await Promise.resolve(headersOf(reading));
}

/**
 * The rejected rows as CSV in UTF-8: `line` and `fault`, then the file's own columns, so
 * that the mended file can be imported again. Text that a spreadsheet would run as a formula is defused by
 * an apostrophe; numbers stay numbers.
 */
export async function* rejectedRows(path: string, reading: ListReading): AsyncGenerator<string[]> {
  yield headersOf(reading);
  for await (const { judged } of judgedRows(path, reading, new RowTally())) {
    for (const row of judged) if ('faults' in row) yield rejected(row);
  }
}

const rejected = ({ row, faults }: Extract<JudgedRow, { faults: unknown }>): string[] => [
  String(row.line),
  faults
    .map(({ column, value, expected }) => `${column}: "${value}" is not ${expected}`)
    .join('; '),
  ...row.cells,
];
