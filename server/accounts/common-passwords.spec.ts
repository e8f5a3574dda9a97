import { describe, expect, it } from 'vitest';

import { isCommonPassword } from './common-passwords.ts';

describe('isCommonPassword', () => {
  it.each(['password', 'Password1', '12345678', 'QWERTYUIOP'])('finds %s', (password) => {
    expect(isCommonPassword(password, [])).toBe(true);
  });

  it("finds what the account is called, whatever the case, and nobody else's name", () => {
    expect(isCommonPassword('Ada@Example.org', ['ada@example.org', 'Ada'])).toBe(true);
    expect(isCommonPassword('eve@example.org', ['ada@example.org', 'Ada'])).toBe(false);
  });

  it('lets pass what nobody guesses first', () => {
    expect(isCommonPassword('amber dial glass', [])).toBe(false);
  });
});
