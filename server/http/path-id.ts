import type { Request } from 'express';

import { UnknownPathError } from './errors.ts';

const MAX_ID = 4_294_967_295;

/** A whole-number part of the path; what cannot be an id names nothing. */
export function pathId(request: Request, name: string): number {
  const text = request.params[name];
  const id = typeof text === 'string' && /^[1-9]\d{0,9}$/.test(text) ? Number(text) : Infinity;
  if (id > MAX_ID) throw new UnknownPathError();
  return id;
}
