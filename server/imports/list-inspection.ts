import { createReadStream } from 'node:fs';

import iconv from 'iconv-lite';

import type { ImportColumn, ImportLayout, LetterO } from '../../shared/contracts/list-import.ts';
import { BadListError } from './bad-list-error.ts';
import { meaningOfO } from './cell-hemisphere.ts';
import { proposeColumns } from './column-matching.ts';
import { detectDelimiter } from './csv-detection.ts';
import { type CsvLayout, type CsvRow, csvRows } from './csv-rows.ts';
import { findDecimalMark } from './decimal-mark.ts';
import { findHeader } from './header-place.ts';
import type { ListReading } from './list-reading.ts';
import { sayEastOrWest } from './place-columns.ts';
import { checkEncoding, detectEncoding } from './text-encoding.ts';

/** What a file seems to be. */
export interface Inspection {
  readonly reading: ListReading;
  /** First rows, as text. */
  readonly sample: string[][];
}

const HEAD_BYTES = 65_536;
const DETECTION_ROWS = 540;
const SAMPLE_ROWS = 10;

/**
 * Finds out how a file is to be read, as far as nobody has said so: its encoding by all of its bytes,
 * everything else by its first rows.
 * @throws {BadListError} If it is no list.
 * @throws {InvalidError} If it is not in the encoding that was asked for.
 */
export async function inspectList(path: string, asked: ImportLayout = {}): Promise<Inspection> {
  if (asked.encoding) await checkEncoding(path, asked.encoding);
  const encoding = asked.encoding ?? (await detectEncoding(path));
  const delimiter = asked.delimiter ?? detectDelimiter(await readText(path, encoding));
  const table = findHeader(await firstRows(path, { encoding, delimiter }));
  if (!table) throw new BadListError('The file holds no text but blanks.');
  const { headers, headerLine, dataLine } = table;
  if (table.rows.length === 0) {
    throw new BadListError('The file has a header and no rows, or rows and no line breaks.');
  }
  const cells = table.rows.map((row) => [...row.cells]);
  const found = findDecimalMark(headers, cells, delimiter);
  const { mark: decimalMark, sure } = asked.decimalMark
    ? { mark: asked.decimalMark, sure: true }
    : found;
  const columns = proposeColumns(headers, cells, decimalMark);
  const letterO = letterOOf(columns, cells);
  const layout = { encoding, delimiter, decimalMark, decimalMarkSure: sure };
  return {
    reading: { ...layout, headerLine, dataLine, letterO, columns, addsTo: null },
    sample: cells.slice(0, SAMPLE_ROWS).map((row) => row.map((cell) => cell.slice(0, 200))),
  };
}

function letterOOf(columns: readonly ImportColumn[], rows: readonly string[][]): LetterO {
  const places = columns.flatMap((column, index) => (sayEastOrWest(column) ? [index] : []));
  return meaningOfO(rows.flatMap((row) => places.map((index) => row[index] ?? '')));
}

async function firstRows(path: string, layout: CsvLayout): Promise<CsvRow[]> {
  const first: CsvRow[] = [];
  for await (const { rows } of csvRows(path, layout)) {
    first.push(...rows);
    if (first.length > DETECTION_ROWS) break;
  }
  return first.slice(0, DETECTION_ROWS + 1);
}

/** The file's first whole lines, as text. */
async function readText(path: string, encoding: string): Promise<string> {
  const chunks: Buffer[] = [];
  for await (const chunk of createReadStream(path, { end: HEAD_BYTES - 1 })) {
    chunks.push(chunk as Buffer);
  }
  const bytes = Buffer.concat(chunks);
  const text = iconv.decode(bytes, encoding);
  const lastBreak = Math.max(text.lastIndexOf('\n'), text.lastIndexOf('\r'));
  return bytes.length < HEAD_BYTES || lastBreak < 0 ? text : text.slice(0, lastBreak);
}
