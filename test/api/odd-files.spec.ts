import { readdirSync, type ReadStream } from 'node:fs';
import { join } from 'node:path';
import { Readable } from 'node:stream';
import { gzipSync } from 'node:zlib';

import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { problem } from '../../shared/contracts/problem.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, HEADER, sendList } from '../support/lists.ts';

let server: ApiServer;
let librarian: ApiClient;
let regionId: number;
beforeAll(async () => {
  server = await startApiServer();
  librarian = await server.newcomer();
  regionId = await addRegion(librarian);
});
afterAll(() => server.close());

const list = cleanList(20);
const wide = Array.from({ length: 10_000 }, (_, index) => `c${index}`).join(',');

describe('an odd file', () => {
  it.each<[string, string | Buffer, string]>([
    ['empty', '', 'The file is empty: give a list'],
    ['only blanks', ' \n\n \n', 'The file holds no text but blanks.'],
    ['a header alone', `${HEADER}\n`, 'The file has a header and no rows'],
    ['a PDF', '%PDF-1.7\n1 0 obj', 'This is a PDF document, not a CSV file.'],
    ['a workbook', 'PK\u0003\u0004xl/workbook.xml', 'This is a ZIP archive or a spreadsheet'],
    ['a gzip archive', gzipSync(list), 'This is a gzip archive'],
    ['a web page', '<!DOCTYPE html><html><table>', 'This is a web page'],
    ['with NUL bytes', `${list}\nx\0y,612,1,1,1,1`, 'The file holds a NUL byte'],
    ['10,000 columns wide', `${wide}\n${wide}`, 'Line 1 has 10000 columns'],
    ['with an open quote', `${list}\n"open,612,1,1,1,1\nx,1,1,1,1,1`, 'A quotation mark opened on'],
    ['one endless row', `${HEADER}\n${'x'.repeat(300_000)}`, 'or the row is far too long'],
  ])('%s, is refused with a sentence', async (_kind, content, sentence) => {
    const { body, status } = await sendList(librarian, regionId, content);

    expect(status).toBe(400);
    expect(problem.parse(body).title).toContain(sentence);
    expect(readdirSync(join(server.dataFolder, 'uploads'))).toEqual([]);
  });

  it.each<[string, string | Buffer, string]>([
    ['UTF-16 with a mark', Buffer.from(`\ufeff${list}`, 'utf16le'), 'UTF-16LE'],
    ['UTF-16 without a mark', Buffer.from(list, 'utf16le'), 'UTF-16LE'],
    ['UTF-16 the other way round', Buffer.from(`\ufeff${list}`, 'utf16le').swap16(), 'UTF-16BE'],
    ['UTF-8 with a mark', `\ufeff${list}`, 'UTF-8'],
    ['with lines ended by CR alone', list.replaceAll('\n', '\r'), 'UTF-8'],
    ['separated by tabs', list.replaceAll(',', '\t'), 'UTF-8'],
    ['separated by bars', list.replaceAll(',', '|'), 'UTF-8'],
  ])('%s, is read', async (_kind, content, encoding) => {
    const { body } = await sendList(librarian, regionId, content).expect(201);
    const { body: check } = await librarian
      .put(`/api/regions/${regionId}/imports/${body.id}`, { label: 'List' })
      .expect(200);

    expect(body).toMatchObject({ encoding, complete: true });
    expect(check.rows).toMatchObject({ total: 20, new: 20, rejected: 0 });
    await librarian.delete(`/api/regions/${regionId}/imports/${body.id}`).expect(204);
  });

  it('of another kind of body, or in another field, is refused by name', async () => {
    const path = `/api/regions/${regionId}/imports`;

    const json = await librarian.post(path, { file: 'x' });
    const field = await librarian.change('post', path).attach('list', Buffer.from(list), 'x.csv');
    const extra = await librarian
      .change('post', path)
      .field('label', 'x')
      .attach('file', Buffer.from(list), 'x.csv');
    const none = await librarian
      .change('post', path)
      .set('Content-Type', 'multipart/form-data; boundary=x')
      .send('--x--\r\n');
    const broken = await librarian
      .change('post', path)
      .set('Content-Type', 'multipart/form-data; boundary=x')
      .send('--x\r\nContent-Disposition: form-data; name="file"; filename="a.csv"\r\n\r\nname');

    expect(json.status).toBe(415);
    expect(field.body.issues[0].path).toBe('list');
    expect(extra.status).toBe(400);
    expect(none.body.issues[0].path).toBe('file');
    expect(broken.status).toBe(400);
    expect(readdirSync(join(server.dataFolder, 'uploads'))).toEqual([]);
  });
});

describe('a file of 200 MB', () => {
  const path = () => `/api/regions/${regionId}/imports`;
  const megabyte = Buffer.alloc(1024 * 1024, 'Radio Vale,612,50,8,1,1\n');

  it('that announces its size is refused, and nothing of it is kept', async () => {
    const content = Buffer.concat(Array<Buffer>(200).fill(megabyte));

    const { body } = await sendList(librarian, regionId, content).expect(413);

    expect(problem.parse(body).title).toMatch(/^The file is larger than 128 MB\./);
    expect(readdirSync(join(server.dataFolder, 'uploads'))).toEqual([]);
  });

  it('that does not is cut off at the limit, and nothing of it is kept', async () => {
    const content = Readable.from(Array<Buffer>(200).fill(megabyte)) as ReadStream;

    const { body } = await librarian
      .change('post', path())
      .attach('file', content, 'endless.csv')
      .expect(413);

    expect(problem.parse(body).title).toMatch(/^The file is larger than 128 MB\./);
    expect(readdirSync(join(server.dataFolder, 'uploads'))).toEqual([]);
  });
});
