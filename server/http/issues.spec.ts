import * as z from 'zod';
import { describe, expect, it } from 'vitest';

import { issuesOf } from './issues.ts';

const issues = (schema: z.ZodType, value: unknown) => {
  const { error } = schema.safeParse(value);
  return error ? issuesOf(error) : [];
};

describe('issuesOf', () => {
  it('names each unknown key by its whole path', () => {
    const schema = z.object({ bands: z.array(z.strictObject({ name: z.string() })) });

    expect(issues(schema, { bands: [{ name: 'L', a: 1, b: 2 }] }).map(({ path }) => path)).toEqual([
      'bands.0.a',
      'bands.0.b',
    ]);
  });

  it('explains a choice of shapes by the one that fits best', () => {
    const point = z.strictObject({ x: z.int('Give a whole number.') });
    const schema = z.object({ at: z.union([z.literal('best'), point]) });

    expect(issues(schema, { at: { x: 1.5 } })).toEqual([
      { path: 'at.x', message: 'Give a whole number.' },
    ]);
  });

  it('of a value where an object belongs has an empty path', () => {
    expect(issues(z.object({}), null)).toEqual([{ path: '', message: expect.any(String) }]);
  });
});
