import { isAscii } from 'node:buffer';
import { createReadStream } from 'node:fs';
import { open } from 'node:fs/promises';
import { TextDecoder } from 'node:util';

import { InvalidError } from '../http/errors.ts';
import { BadListError } from './bad-list-error.ts';
import { foreignKind } from './file-kind.ts';
import { guessEncoding } from './guessed-encoding.ts';

const HEAD_BYTES = 65_536;
/** How much text with other than ASCII letters a guess is made by. */
const EVIDENCE_BYTES = 65_536;
const EVIDENCE_OF_CHUNK = 8192;

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
  const { isUtf8, evidence } = await readAll(path);
  return isUtf8 ? 'UTF-8' : guessEncoding(evidence);
}

/**
 * Checks an encoding that people chose.
 * @throws {InvalidError} If it is UTF-8 and the file is not.
 */
export async function checkEncoding(path: string, encoding: string): Promise<void> {
  if (encoding !== 'UTF-8' || (await readAll(path)).isUtf8) return;
  throw new InvalidError({
    path: 'encoding',
    message:
      'The file is not UTF-8: some of its bytes mean nothing there. Choose another encoding.',
  });
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

/** Whether every byte obeys UTF-8, and the text around those that are not ASCII. */
async function readAll(path: string): Promise<{ isUtf8: boolean; evidence: Buffer }> {
  const decoder = new TextDecoder('utf-8', { fatal: true });
  const evidence: Buffer[] = [];
  let kept = 0;
  let valid = true;
  let offset = 0;
  for await (const chunk of createReadStream(path) as AsyncIterable<Buffer>) {
    const zero = chunk.indexOf(0);
    if (zero >= 0) throw nulByte(offset + zero + 1);
    offset += chunk.length;
    valid &&= decodes(decoder, chunk);
    if (kept >= EVIDENCE_BYTES) continue;
    const part = notAscii(chunk);
    kept += part.length;
    evidence.push(part);
  }
  return { isUtf8: valid && decodes(decoder), evidence: Buffer.concat(evidence) };
}

function notAscii(chunk: Buffer): Buffer {
  if (isAscii(chunk)) return chunk.subarray(0, 0);
  const at = chunk.findIndex((byte) => byte > 127);
  const from = Math.max(0, at - 100);
  // Copied: a part would keep the whole chunk in memory.
  return Buffer.from(chunk.subarray(from, from + EVIDENCE_OF_CHUNK));
}

const nulByte = (at: number): BadListError =>
  new BadListError(
    `The file holds a NUL byte (byte ${at}): it is not plain text. Export the list again as CSV.`,
  );

function decodes(decoder: TextDecoder, chunk?: Buffer): boolean {
  try {
    decoder.decode(chunk, { stream: chunk !== undefined });
    return true;
  } catch {
    return false;
  }
}
