import { readFileSync } from 'node:fs';

const FILE = new URL('../../datasets/common-passwords.txt', import.meta.url);
const common = new Set(readFileSync(FILE, 'utf8').trim().split('\n'));

/** Whether a password is among the first to be guessed, or is what the account is called. */
export function isCommonPassword(password: string, called: readonly string[]): boolean {
  const lower = password.toLowerCase();
  return common.has(lower) || called.some((each) => each.toLowerCase() === lower);
}
