import type { IRouter } from 'express';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { type ApiServer, startApiServer } from '../support/api-server.ts';

interface Operation {
  readonly operationId: string;
  readonly responses: Record<string, unknown>;
}

interface Description {
  readonly openapi: string;
  readonly paths: Record<string, Record<string, Operation>>;
}

let server: ApiServer;
let description: Description;
beforeAll(async () => {
  server = await startApiServer();
  const visitor = await server.visitor();
  description = (await visitor.get('/api/openapi.json').expect(200)).body;
});
afterAll(() => server.close());

describe('GET /api/openapi.json', () => {
  it('describes every operation that Express serves under /api, and no other', () => {
    const served = operationsOf(server.app.router).filter(
      (operation) => operation.includes(' /api/') && !/\/docs\/|^\*|^_all/.test(operation),
    );

    const described = Object.entries(description.paths).flatMap(([path, operations]) =>
      Object.keys(operations).map((method) => `${method} ${path.replace(/\{(\w+)\}/g, ':$1')}`),
    );

    expect(described.length).toBeGreaterThan(15);
    expect(served.sort()).toEqual(described.sort());
  });

  it('gives each operation a name of its own', () => {
    const names = Object.values(description.paths).flatMap((operations) =>
      Object.values(operations).map(({ operationId }) => operationId),
    );

    expect(new Set(names).size).toBe(names.length);
  });

  it('is OpenAPI 3.1 whose references lead somewhere', () => {
    expect(description.openapi).toBe('3.1.0');
    for (const [, reference = ''] of JSON.stringify(description).matchAll(/"\$ref":"([^"]+)"/g)) {
      expect(resolve(description, reference)).toBeDefined();
    }
  });

  it('tells what may be left out of a receiver, and what an answer always has', () => {
    const text = JSON.stringify(description.paths['/api/receivers']?.['post']);

    expect(text).toContain('"required":["ifHz","selectivity","bands"]');
    expect(text).toContain('"additionalProperties":false');
  });
});

describe('GET /api/docs', () => {
  it('is a page with no script of its own in it, under a policy that needs none', async () => {
    const visitor = await server.visitor();

    const { text, headers } = await visitor.get('/api/docs').expect(200);

    expect(headers['content-security-policy']).toContain("script-src 'self'");
    expect(text).not.toMatch(/<script(?! src=)/);
    for (const [, file = ''] of text.matchAll(/(?:src|href)="([^"]+)"/g)) {
      await visitor.get(file).expect(200);
    }
  });
});

/** Every `method path` in Express's own tables. */
function operationsOf(router: IRouter): string[] {
  return router.stack.flatMap(({ route, handle }) => {
    if (route) {
      const { path, stack } = route as unknown as { path: string; stack: { method?: string }[] };
      return [...new Set(stack.map(({ method }) => `${method ?? '*'} ${path}`))];
    }
    return 'stack' in handle ? operationsOf(handle as unknown as IRouter) : [];
  });
}

/** What a reference within the document points to. */
const resolve = (document: unknown, reference: string): unknown =>
  reference
    .slice(2)
    .split('/')
    .reduce<unknown>((at, key) => (at as Record<string, unknown> | undefined)?.[key], document);
