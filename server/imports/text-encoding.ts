import { createReadStream } from 'node:fs';
import { open } from 'node:fs/promises';
import { TextDecoder } from 'node:util';

import { analyse } from 'chardet';

import { BadListError } from './bad-list-error.ts';
import { foreignKind } from './file-kind.ts';

const HEAD_BYTES = 65_536;

/** Single-byte encodings that a guess may name, and by what name they are read. */
const GUESSES: Readonly<Record<string, string>> = {
  'ISO-8859-1': 'windows-1252',
  'windows-1252': 'windows-1252',
  'ISO-8859-2': 'windows-1250',
  'windows-1250': 'windows-1250',
};

const EMPTY =
  'The file is empty: give a list with a line of column headers and a line for each station.';

/**
 * Encoding of a text file: a byte order mark, else UTF-8 if every byte of the file obeys it, else a
 * guess. The guess is only offered: the sample shows people whether it is right.
 * @throws {BadListError} If the file is empty or is no text.
 */
export async function detectEncoding(path: string): Promise<string> {
  const head = await readHead(path);
  if (head.length === 0) throw new BadListError(EMPTY);
  const kind = foreignKind(head);
  if (kind !== null) {
    throw new BadListError(`This is ${kind}, not a CSV file. Export or unpack the list as CSV.`);
  }
  const wide = markedEncoding(head) ?? unmarkedUtf16(head);
  if (wide !== null) return wide;
  return (await isUtf8(path)) ? 'UTF-8' : guessEncoding(head);
}

async function readHead(path: string): Promise<Buffer> {
  const file = await open(path);
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(HEAD_BYTES), 0, HEAD_BYTES, 0);
    return buffer.subarray(0, bytesRead);
  } finally {
    await file.close();
  }
}

function markedEncoding(head: Buffer): string | null {
  if (head[0] === 0xff && head[1] === 0xfe) return 'UTF-16LE';
  if (head[0] === 0xfe && head[1] === 0xff) return 'UTF-16BE';
  return null;
}

/** UTF-16 without a mark shows as zeros in every other byte. */
function unmarkedUtf16(head: Buffer): string | null {
  const zeros = [0, 0];
  head.forEach((byte, at) => {
    if (byte === 0) zeros[at % 2] = (zeros[at % 2] ?? 0) + 1;
  });
  const [even = 0, odd = 0] = zeros;
  const many = head.length * 0.3;
  if (odd > many && even < odd / 10) return 'UTF-16LE';
  if (even > many && odd < even / 10) return 'UTF-16BE';
  return null;
}

async function isUtf8(path: string): Promise<boolean> {
  const decoder = new TextDecoder('utf-8', { fatal: true });
  let valid = true;
  let offset = 0;
  for await (const chunk of createReadStream(path) as AsyncIterable<Buffer>) {
    const zero = chunk.indexOf(0);
    if (zero >= 0) {
      throw new BadListError(
        `The file holds a NUL byte (byte ${offset + zero + 1}): it is not plain text. ` +
          'Export the list again as CSV.',
      );
    }
    offset += chunk.length;
    valid &&= decodes(decoder, chunk);
  }
  return valid && decodes(decoder);
}

function decodes(decoder: TextDecoder, chunk?: Buffer): boolean {
  try {
    decoder.decode(chunk, { stream: chunk !== undefined });
    return true;
  } catch {
    return false;
  }
}

function guessEncoding(head: Buffer): string {
  for (const { name } of analyse(head)) {
    const encoding = GUESSES[name];
    if (encoding !== undefined) return encoding;
  }
  return 'windows-1252';
}
