import { createReadStream } from 'node:fs';
import { pipeline } from 'node:stream';

import { CsvError, type Options, parse } from 'csv-parse';
import iconv from 'iconv-lite';

import { BadListError } from './bad-list-error.ts';

/** How the text of a file is to be taken apart. */
export interface CsvLayout {
  readonly encoding: string;
  readonly delimiter: string;
}

/** One row of a file. */
export interface CsvRow {
  /** Physical line on which the row begins; the header of a plain file is on line 1. */
  readonly line: number;
  readonly cells: readonly string[];
}

/** Rows that follow each other, and how many bytes of the file were read up to their end. */
export interface CsvPart {
  readonly rows: readonly CsvRow[];
  readonly bytes: number;
}

const ROWS_AT_ONCE = 500;
const BREAK = /\r\n|\n|\r/g;
const MAX_ROW_CHARACTERS = 131_072;
export const MAX_COLUMNS = 200;

/** The one set of options by which preview, check and commit read a file. */
export const csvOptions = (delimiter: string): Options => ({
  delimiter,
  bom: true,
  max_record_size: MAX_ROW_CHARACTERS,
  record_delimiter: ['\r\n', '\n', '\r'],
  relax_column_count: true,
  relax_quotes: true,
});

/**
 * Rows of a file, the header first, some hundred at a time; rows whose cells are all blank are passed
 * over.
 * @throws {BadListError} If a quotation mark is never closed or a row is far too long or wide.
 */
export async function* csvRows(path: string, layout: CsvLayout): AsyncGenerator<CsvPart> {
  const file = createReadStream(path);
  const parser = parse(csvOptions(layout.delimiter));
  // The parser reads UTF-8 by itself. Failures of the file reach the loop below through the parser,
  // which the pipeline destroys.
  const decoding = layout.encoding === 'UTF-8' ? [] : [iconv.decodeStream(layout.encoding)];
  pipeline([file, ...decoding, parser], () => undefined);
  let line = 1;
  let rows: CsvRow[] = [];
  try {
    for await (const cells of parser as AsyncIterable<string[]>) {
      checkWidth(cells, line);
      if (cells.some((cell) => cell !== '' && cell.trim() !== '')) rows.push({ line, cells });
      line += linesOf(cells);
      if (rows.length < ROWS_AT_ONCE) continue;
      yield { rows, bytes: file.bytesRead };
      rows = [];
    }
  } catch (error) {
    throw refusal(error, line);
  } finally {
    parser.destroy();
  }
  yield { rows, bytes: file.bytesRead };
}

/**
 * Lines a row takes up in the file: one, and one for each break inside quotation marks. Counting on
 * our own needs every row, also the empty ones, but the parser's count takes CR LF for two.
 */
function linesOf(cells: readonly string[]): number {
  let lines = 1;
  for (const cell of cells) {
    if (cell.includes('\n') || cell.includes('\r')) lines += cell.match(BREAK)?.length ?? 0;
  }
  return lines;
}

function checkWidth(record: readonly string[], line: number): void {
  if (record.length <= MAX_COLUMNS) return;
  throw new BadListError(
    `Line ${line} has ${record.length} columns; a list may have at most ${MAX_COLUMNS}.`,
  );
}

function refusal(error: unknown, line: number): unknown {
  if (error instanceof CsvError) return unreadable(error, line);
  if ((error as NodeJS.ErrnoException).code !== 'ENOENT') return error;
  return new BadListError('The uploaded file is no longer there. Upload it again.');
}

function unreadable(error: CsvError, line: number): BadListError {
  const reason =
    error.code === 'CSV_QUOTE_NOT_CLOSED' || error.code === 'CSV_MAX_RECORD_SIZE'
      ? `A quotation mark opened on or after line ${line} is never closed, or the row is far too long.`
      : `Line ${line} cannot be read as CSV.`;
  return new BadListError(`${reason} Mend the file and upload it again.`, { cause: error });
}
