import { describe, expect, it } from 'vitest';
import * as z from 'zod';

import { plainWords } from './plain-words.ts';

const messageFor = (schema: z.ZodType, input: unknown) =>
  schema.safeParse(input, { error: plainWords }).error?.issues[0]?.message;

describe('words for what a schema refuses without words of its own', () => {
  it.each([
    [z.object({ site: z.object({}) }), {}, 'This is missing: give an object.'],
    [z.object({}), [], 'Give an object.'],
    [z.array(z.string()), 'x', 'Give a list.'],
    [z.int(), 1.5, 'Give a whole number.'],
    [z.enum(['parallel', 'series']), 'both', 'Give "parallel" or "series".'],
    [z.number().min(1), 0, 'Give a number, at least 1.'],
    [z.number().positive(), 0, 'Give a number, above 0.'],
    [z.number().max(500), 501, 'Give a number, at most 500.'],
    [z.string().max(2), 'abc', 'Give at most 2 characters.'],
    [z.array(z.string()).max(1), ['a', 'b'], 'Give a list of at most 1.'],
  ])('say what would be right (%#)', (schema, input, expected) => {
    expect(messageFor(schema, input)).toBe(expected);
  });

  it('leave the words of a schema alone', () => {
    expect(messageFor(z.number('Give a Q.'), 'x')).toBe('Give a Q.');
  });

  it('reach into a choice of shapes', () => {
    const shape = z.union([z.object({ q: z.number() }), z.null()]);
    const issue = shape.safeParse({ q: 'x' }, { error: plainWords }).error?.issues[0];

    expect(JSON.stringify(issue)).toContain('Give a number.');
  });
});
