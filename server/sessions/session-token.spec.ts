import jwt from 'jsonwebtoken';
import { describe, expect, it } from 'vitest';

import { readSession, signSession } from './session-token.ts';

const secret = 'Zr4uT1oP9kQ7sV2xW5yB8nM3cL6hJ0dG';

describe('a session token', () => {
  it('gives back the session it was signed for', () => {
    expect(readSession(signSession('one', secret), secret)).toBe('one');
  });

  it.each([
    ['signed with another secret', signSession('one', 'another secret')],
    ['signed by another algorithm', jwt.sign({}, secret, { algorithm: 'HS512', subject: 'one' })],
    ['not signed', jwt.sign({}, '', { algorithm: 'none', subject: 'one' })],
    ['without a session', jwt.sign({}, secret)],
    ['cut short', signSession('one', secret).slice(0, -2)],
    ['empty', ''],
  ])('%s, is nobody', (_what, token) => {
    expect(readSession(token, secret)).toBeUndefined();
  });
});
