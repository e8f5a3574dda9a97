import { describe, expect, it } from 'vitest';

import { ensurePrograms, findProgram } from './programs.ts';

describe('programs of the machine', () => {
  it('are found where the path leads', () => {
    expect(findProgram('sh')).toMatch(/^\/.*\/sh$/);
  });

  it('are missing when no folder has them', () => {
    expect(findProgram('no-such-program-anywhere')).toBeUndefined();
  });

  it('are left alone when they are there', () => {
    const said: string[] = [];

    ensurePrograms([{ program: 'sh', package: 'dash' }], (line) => said.push(line));

    expect(said).toEqual([]);
  });
});
