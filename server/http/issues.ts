import type * as z from 'zod';

import type { Issue } from './errors.ts';

type ZodIssue = z.core.$ZodIssue;

/** Rejected fields with their paths; a choice of shapes is explained by the nearest of them. */
export function issuesOf(error: z.ZodError): Issue[] {
  return error.issues.flatMap((each) => flatten(each, []));
}

function flatten(issue: ZodIssue, before: readonly PropertyKey[]): Issue[] {
  const path = [...before, ...issue.path];
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      path: join([...path, key]),
      message: 'This key is unknown here; leave it out.',
    }));
  }
  if (issue.code === 'invalid_union' && issue.errors.length > 0) {
    const nearest = [...issue.errors].sort((a, b) => depth(b) - depth(a) || a.length - b.length)[0];
    return (nearest ?? []).flatMap((each) => flatten(each, path));
  }
  return [{ path: join(path), message: issue.message }];
}

const depth = (issues: readonly ZodIssue[]): number =>
  Math.max(...issues.map(({ path }) => path.length));

const join = (path: readonly PropertyKey[]): string => path.map(String).join('.');
