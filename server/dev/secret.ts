import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** A secret of this installation: made at the first start, kept where only its owner can read. */
export function keepSecret(folder: string, name: string, bytes = 32): string {
  const path = join(folder, name);
  try {
    const kept = readFileSync(path, 'utf8').trim();
    if (kept !== '') return kept;
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'ENOENT')) throw error;
  }
  const secret = randomBytes(bytes).toString('base64url');
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  writeFileSync(path, `${secret}\n`, { mode: 0o600 });
  return secret;
}
