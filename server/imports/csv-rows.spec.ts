import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterAll, describe, expect, it } from 'vitest';

import { BadListError } from './bad-list-error.ts';
import { csvRows } from './csv-rows.ts';

const folder = mkdtempSync(join(tmpdir(), 'fallow-rows-'));
afterAll(() => rmSync(folder, { recursive: true }));

async function rowsOf(text: string): Promise<[number, readonly string[]][]> {
  const path = join(folder, 'list.csv');
  writeFileSync(path, text);
  const rows: [number, readonly string[]][] = [];
  for await (const part of csvRows(path, { encoding: 'UTF-8', delimiter: ',' })) {
    for (const { line, cells } of part.rows) rows.push([line, cells]);
  }
  return rows;
}

describe('csvRows', () => {
  it.each(['\n', '\r\n', '\r'])(
    'finds the line on which each row begins, ended by %j',
    async (end) => {
      const lines = ['a,b', '', 'c,"d', 'd2', '"', ' , ', 'e,f', '"g', '",h', 'i,j', ''];

      const found = await rowsOf(lines.join(end));

      expect(found.map(([line, cells]) => [line, cells[0]?.trim()])).toEqual([
        [1, 'a'],
        [3, 'c'],
        [7, 'e'],
        [8, 'g'],
        [10, 'i'],
      ]);
    },
  );

  it('keeps stray quotation marks as they are', async () => {
    expect(await rowsOf('a,b\nRadio "North",1\n"x"y,2')).toEqual([
      [1, ['a', 'b']],
      [2, ['Radio "North"', '1']],
      [3, ['"x"y', '2']],
    ]);
  });

  it('names the line after which a quotation mark stays open', async () => {
    const reading = rowsOf('a,b\nc,d\n"e,f\ng,h');

    await expect(reading).rejects.toThrow(BadListError);
    await expect(reading).rejects.toThrow('A quotation mark opened on or after line 3');
  });

  it('tells when the file is no longer there', async () => {
    const missing = csvRows(join(folder, 'none.csv'), { encoding: 'UTF-8', delimiter: ',' });

    await expect(missing.next()).rejects.toThrow('The uploaded file is no longer there.');
  });
});
