import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import iconv from 'iconv-lite';
import { afterAll, describe, expect, it } from 'vitest';

import { detectEncoding } from './text-encoding.ts';

const folder = mkdtempSync(join(tmpdir(), 'fallow-encoding-'));
afterAll(() => rmSync(folder, { recursive: true }));

function detected(content: Buffer): Promise<string> {
  const path = join(folder, 'list.csv');
  writeFileSync(path, content);
  return detectEncoding(path);
}

const GERMAN = 'Name;kHz\nMühlenbach Süd;612\nGrößenfeld;621\nÜberlingen;630\n'.repeat(5);
const POLISH = 'Nazwa;kHz\nŁódź Południe;612\nŻółta Góra;621\nŚwięty Dąb;630\n'.repeat(5);

describe('detectEncoding', () => {
  it('tells UTF-8 by its bytes, across the ends of chunks', async () => {
    expect(await detected(Buffer.from(GERMAN))).toBe('UTF-8');
    expect(await detected(Buffer.from(`${'x'.repeat(65_535)}ü\n`))).toBe('UTF-8');
    expect(await detected(Buffer.from('plain'))).toBe('UTF-8');
  });

  it('guesses western and central European single bytes', async () => {
    expect(await detected(iconv.encode(GERMAN, 'windows-1252'))).toBe('windows-1252');
    expect(await detected(iconv.encode(POLISH, 'windows-1250'))).toBe('windows-1250');
  });

  it('finds one wrong byte at the very end', async () => {
    const content = Buffer.concat([Buffer.from('a'.repeat(100_000)), Buffer.from([0xe4])]);

    expect(await detected(content)).toBe('windows-1252');
  });
});
