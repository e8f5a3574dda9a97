import { createHash } from 'node:crypto';

import { compare, hash } from 'bcryptjs';

const COST = 10;

/** bcrypt reads 72 bytes and stops at a zero byte: a digest in base64 keeps every character. */
const digest = (password: string): string =>
  createHash('sha256').update(password.normalize('NFC')).digest('base64');

export const hashPassword = (password: string): Promise<string> => hash(digest(password), COST);

export const verifyPassword = ({
  password,
  passwordHash,
}: {
  password: string;
  passwordHash: string;
}): Promise<boolean> => compare(digest(password), passwordHash);
