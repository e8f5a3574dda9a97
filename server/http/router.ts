import { type Request, type RequestHandler, type Response, Router } from 'express';

import { type Actor, actorOf, requireActor, requireRole } from './actor.ts';
import { MethodNotAllowedError } from './errors.ts';
import type { Idempotency } from './idempotency.ts';
import { jsonBody } from './json-body.ts';
import { pathId } from './path-id.ts';
import { plainWords } from './plain-words.ts';
import { type Access, type Call, isRepeatable, type Route } from './route.ts';

/** What every route is guarded by, beside its own row. */
export interface Guards {
  readonly limits: { computing(actor: Actor | undefined, address: string): Promise<void> };
  readonly idempotency: Pick<Idempotency, 'once'>;
}

/** Serves the rows: who may and how often is asked first, then the request is read, then handled. */
export function routerOf(routes: readonly Route[], guards: Guards): Router {
  const router = Router({ caseSensitive: true, strict: false });
  for (const row of routes) {
    router[row.method](row.path, permit(row, guards), ...readers(row), (request, response) =>
      answer(row, routes, guards, request, response),
    );
  }
  for (const path of new Set(routes.map((row) => row.path))) router.all(path, refuse(path, routes));
  return router;
}

function permit(row: Route, guards: Guards): RequestHandler {
  return async (request, _response, next) => {
    if (row.access !== 'visitor') requireRole(requireActor(request), row.access);
    if (row.computing) await guards.limits.computing(actorOf(request), request.ip ?? '');
    next();
  };
}

const readers = (row: Route): RequestHandler[] =>
  row.body ? jsonBody(row.computing ? '8mb' : '1mb') : [];

async function answer(
  row: Route,
  routes: readonly Route[],
  guards: Guards,
  request: Request,
  response: Response,
): Promise<void> {
  const call: Call<Access, unknown, unknown> = {
    actor: actorOf(request),
    body: row.body?.parse(request.body, { error: plainWords }),
    query: row.query?.parse(request.query, { error: plainWords }),
    id: (name = 'id') => pathId(request, name),
    request,
    response,
  };
  const body = isRepeatable(row)
    ? await guards.idempotency.once(call, row)
    : await row.handle(call);
  if (response.headersSent || row.produces) return;
  const status = row.status ?? 200;
  if (status === 201) locate(row, routes, request, response, body);
  response.status(status);
  if (status === 204) response.end();
  else response.json(body);
}

function locate(
  row: Route,
  routes: readonly Route[],
  request: Request,
  response: Response,
  body: unknown,
): void {
  const isKept = routes.some(
    ({ method, path }) => method === 'get' && new RegExp(`^${row.path}/:[^/]+$`).test(path),
  );
  const { id } = (body ?? {}) as { id?: number };
  if (isKept && id !== undefined) response.location(`${request.path}/${id}`);
}

function refuse(path: string, routes: readonly Route[]): RequestHandler {
  const methods = routes.filter((row) => row.path === path).map((row) => row.method.toUpperCase());
  return () => {
    throw new MethodNotAllowedError(methods);
  };
}
