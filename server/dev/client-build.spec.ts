import { mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterEach, beforeEach, describe, expect, it } from 'vitest';

import { fingerprint } from './client-build.ts';

describe("the fingerprint of the client's sources", () => {
  let root: string;

  beforeEach(() => {
    root = mkdtempSync(join(tmpdir(), 'fallow-client-'));
    mkdirSync(join(root, 'src'));
    writeFileSync(join(root, 'src/main.ts'), 'start();');
  });

  afterEach(() => {
    rmSync(root, { recursive: true });
  });

  it('stays while nothing changes', () => {
    expect(fingerprint(root)).toBe(fingerprint(root));
  });

  it('changes with the content of a file', () => {
    const before = fingerprint(root);

    writeFileSync(join(root, 'src/main.ts'), 'begin();');

    expect(fingerprint(root)).not.toBe(before);
  });

  it('changes with the name of a file', () => {
    const before = fingerprint(root);

    renameSync(join(root, 'src/main.ts'), join(root, 'src/first.ts'));

    expect(fingerprint(root)).not.toBe(before);
  });

  it('leaves specs out, for they are not built', () => {
    const before = fingerprint(root);

    writeFileSync(join(root, 'src/main.spec.ts'), 'it();');

    expect(fingerprint(root)).toBe(before);
  });
});
