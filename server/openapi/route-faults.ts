import { isRepeatable, type Route } from '../http/route.ts';

const MEANING: Readonly<Record<number, string>> = {
  400: 'Some values are not valid; `issues` names them',
  401: 'Not signed in',
  403: 'Not allowed to this role, or the request token is missing',
  404: 'Not there, or of another workshop',
  409: 'The stored state forbids it',
  413: 'Larger than this address takes',
  415: 'Not of a media type this address takes',
  422: 'The Idempotency-Key was used for another request',
  429: 'Too many requests; Retry-After says when to come back',
  503: 'Cannot answer at this moment; Retry-After says when to come back',
};

/** Statuses of failure a route may answer, with what they mean. */
export function faultsOf(row: Route): [status: number, meaning: string][] {
  const takesBody = Boolean(row.body) || Boolean(row.upload);
  const statuses = new Set([
    ...(takesBody ? [400, 413, 415] : []),
    ...(row.query ? [400] : []),
    ...(row.access === 'visitor' ? [] : [401]),
    ...(row.method === 'get' && !['librarian', 'admin'].includes(row.access) ? [] : [403]),
    ...(row.path.includes(':') ? [404] : []),
    ...(isRepeatable(row) ? [422] : []),
    ...(row.computing ? [429] : []),
    ...(row.faults ?? []),
    503,
  ]);
  return [...statuses]
    .sort((a, b) => a - b)
    .map((status) => [status, MEANING[status] ?? 'See the problem']);
}
