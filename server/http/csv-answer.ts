import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';

import { stringify } from 'csv-stringify';
import type { Response } from 'express';

/** Sends rows as a CSV file in UTF-8, as fast as the client takes them. */
export async function sendCsv(
  response: Response,
  name: string,
  rows: AsyncIterable<readonly (string | number | null)[]>,
  delimiter = ',',
): Promise<void> {
  response.attachment(name).type('text/csv; charset=utf-8');
  await pipeline(Readable.from(rows), csvWriter(delimiter), response);
}

/** Turns rows into the text of a CSV file that a spreadsheet opens without running a cell. */
export const csvWriter = (delimiter: string) =>
  stringify({
    bom: true,
    delimiter,
    record_delimiter: 'windows',
    quoted_match: /[\r\n]/,
    cast: { string: defuse },
  });

const PLAIN_NUMBER = /^[-+]?[\d\s.,]*\d[\d\s.,]*(?:e[-+]?\d+)?$/i;

/** Keeps a spreadsheet from running a cell, by an apostrophe before it; numbers stay numbers. */
export const defuse = (cell: string): string =>
  /^[=+\-@\t\r]/.test(cell) && !PLAIN_NUMBER.test(cell) ? `'${cell}` : cell;
