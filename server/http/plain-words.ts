import type * as z from 'zod';

const KINDS: Readonly<Record<string, string>> = {
  array: 'a list',
  boolean: 'true or false',
  int: 'a whole number',
  number: 'a number',
  object: 'an object',
  string: 'a text',
};

/** What would be right, where a schema has no words of its own; undefined: the library's words. */
export const plainWords: z.core.$ZodErrorMap = (issue) => {
  switch (issue.code) {
    case 'invalid_type': {
      const kind = KINDS[issue.expected];
      if (kind === undefined) return undefined;
      return issue.input === undefined ? `This is missing: give ${kind}.` : `Give ${kind}.`;
    }
    case 'invalid_value':
      return `Give ${issue.values.map((value) => JSON.stringify(value)).join(' or ')}.`;
    case 'too_small':
      return limit(issue.origin, issue.minimum, issue.inclusive === false ? 'above' : 'least');
    case 'too_big':
      return limit(issue.origin, issue.maximum, issue.inclusive === false ? 'below' : 'most');
    default:
      return undefined;
  }
};

function limit(origin: string, bound: number | bigint, side: string): string | undefined {
  const words = side === 'least' || side === 'most' ? `at ${side} ${bound}` : `${side} ${bound}`;
  if (origin === 'number' || origin === 'int') return `Give a number, ${words}.`;
  if (origin === 'array') return `Give a list of ${words}.`;
  return origin === 'string' ? `Give ${words} characters.` : undefined;
}
