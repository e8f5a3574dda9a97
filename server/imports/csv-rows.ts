import { createReadStream } from 'node:fs';
import { pipeline } from 'node:stream';

import { CsvError, type InfoField, type Options, parse } from 'csv-parse';
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

const MAX_ROW_CHARACTERS = 131_072;
export const MAX_COLUMNS = 200;

/** The one set of options by which preview, check and commit read a file. */
export const csvOptions = (delimiter: string): Options => ({
  delimiter,
  bom: true,
  info: true,
  max_record_size: MAX_ROW_CHARACTERS,
  record_delimiter: ['\r\n', '\n', '\r'],
  relax_column_count: true,
  relax_quotes: true,
  skip_empty_lines: true,
});

interface ParsedRecord {
  readonly record: string[];
  readonly info: InfoField;
}

/**
 * Rows of a file, the header first; rows whose cells are all blank are passed over.
 * @throws {BadListError} If a quotation mark is never closed or a row is far too long or wide.
 */
export async function* csvRows(path: string, layout: CsvLayout): AsyncGenerator<CsvRow> {
  const parser = parse(csvOptions(layout.delimiter));
  // Failures of the file reach the loop below through the parser, which the pipeline destroys.
  pipeline(createReadStream(path), iconv.decodeStream(layout.encoding), parser, () => undefined);
  const lines = new LineCounter();
  try {
    for await (const { record, info } of parser as AsyncIterable<ParsedRecord>) {
      const line = lines.next(info.lines, record);
      checkWidth(record, line);
      if (record.some((cell) => cell.trim() !== '')) yield { line, cells: record };
    }
  } catch (error) {
    throw error instanceof CsvError ? unreadable(error, lines.last + 1) : error;
  } finally {
    parser.destroy();
  }
}

/**
 * Finds the line on which each record begins. The parser tells the line on which it ends, and counts
 * a CR LF inside quotation marks twice.
 */
export class LineCounter {
  last = 0;
  #surplus = 0;

  next(parserLine: number, record: readonly string[]): number {
    const breaks = record.flatMap((cell) => cell.match(/\r\n|\n|\r/g) ?? []);
    this.#surplus += breaks.filter((each) => each === '\r\n').length;
    this.last = parserLine - this.#surplus;
    return this.last - breaks.length;
  }
}

function checkWidth(record: readonly string[], line: number): void {
  if (record.length <= MAX_COLUMNS) return;
  throw new BadListError(
    `Line ${line} has ${record.length} columns; a list may have at most ${MAX_COLUMNS}.`,
  );
}

function unreadable(error: CsvError, line: number): BadListError {
  const reason =
    error.code === 'CSV_QUOTE_NOT_CLOSED' || error.code === 'CSV_MAX_RECORD_SIZE'
      ? `A quotation mark opened on or after line ${line} is never closed, or the row is far too long.`
      : `Line ${line} cannot be read as CSV.`;
  return new BadListError(`${reason} Mend the file and upload it again.`, { cause: error });
}
