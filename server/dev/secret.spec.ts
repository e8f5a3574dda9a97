import { mkdtempSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterEach, beforeEach, describe, expect, it } from 'vitest';

import { keepSecret } from './secret.ts';

describe('a secret of the installation', () => {
  let folder: string;

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'fallow-secret-'));
  });

  afterEach(() => {
    rmSync(folder, { recursive: true });
  });

  it('is the same at every start', () => {
    expect(keepSecret(folder, 'key')).toBe(keepSecret(folder, 'key'));
  });

  it('differs from every other', () => {
    expect(keepSecret(folder, 'key')).not.toBe(keepSecret(folder, 'password'));
  });

  it('is readable by its owner alone', () => {
    keepSecret(folder, 'key');

    expect(statSync(join(folder, 'key')).mode & 0o777).toBe(0o600);
  });
});
