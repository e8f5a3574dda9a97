import { createReadStream } from 'node:fs';

import iconv from 'iconv-lite';

import type { ImportColumn } from '../../shared/contracts/list-import.ts';
import { BadListError } from './bad-list-error.ts';
import type { DecimalMark } from './cell-number.ts';
import { isComplete, proposeColumns } from './column-matching.ts';
import { detectDecimalMark, detectDelimiter } from './csv-detection.ts';
import { type CsvLayout, type CsvRow, csvRows } from './csv-rows.ts';
import { detectEncoding } from './text-encoding.ts';

/** Everything that decides how a file is read: the same for preview, check and commit. */
export interface ListReading extends CsvLayout {
  readonly decimalMark: DecimalMark;
  readonly columns: readonly ImportColumn[];
}

/** What a file seems to be. */
export interface Inspection {
  readonly reading: ListReading;
  /** First rows, as text. */
  readonly sample: string[][];
  readonly complete: boolean;
}

const HEAD_BYTES = 65_536;
const DETECTION_ROWS = 500;
const SAMPLE_ROWS = 10;

/**
 * Finds out how a file is to be read. The whole file is gone through once, so that one which cannot
 * be taken apart is refused here.
 * @throws {BadListError} If it is no list.
 */
export async function inspectList(path: string): Promise<Inspection> {
  const encoding = await detectEncoding(path);
  const delimiter = detectDelimiter(await readText(path, encoding));
  const [header, ...rows] = await firstRows(path, { encoding, delimiter });
  if (!header) throw new BadListError('The file holds no text but blanks.');
  if (rows.length === 0) {
    throw new BadListError('The file has a header and no rows, or rows and no line breaks.');
  }
  const cells = rows.map((row) => [...row.cells]);
  const decimalMark = detectDecimalMark(cells, delimiter);
  const columns = proposeColumns(headersOf(header), cells, decimalMark);
  return {
    reading: { encoding, delimiter, decimalMark, columns },
    sample: cells.slice(0, SAMPLE_ROWS).map((row) => row.map((cell) => cell.slice(0, 200))),
    complete: isComplete(columns),
  };
}

const headersOf = ({ cells }: CsvRow): string[] => cells.map((cell) => cell.trim().slice(0, 200));

async function firstRows(path: string, layout: CsvLayout): Promise<CsvRow[]> {
  const rows: CsvRow[] = [];
  for await (const row of csvRows(path, layout)) {
    if (rows.length <= DETECTION_ROWS) rows.push(row);
  }
  return rows;
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
