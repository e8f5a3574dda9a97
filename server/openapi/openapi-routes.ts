import { fileURLToPath } from 'node:url';

import * as z from 'zod';

import { route, type Route } from '../http/route.ts';
import { describeApi } from './api-description.ts';
import { docsPolicy } from './docs-files.ts';

const PAGE = fileURLToPath(new URL('./page/docs.html', import.meta.url));

/** The description of all routes, these two included, and the page to read it. */
export function withDescription(routes: readonly Route[], sessionCookie: string): Route[] {
  const all: Route[] = [
    ...routes,
    route({
      method: 'get',
      path: '/api/openapi.json',
      summary: 'This description',
      access: 'visitor',
      answer: z.looseObject({}),
      handle: () => description,
    }),
    route({
      method: 'get',
      path: '/api/docs',
      summary: 'A page to read this description',
      access: 'visitor',
      produces: 'text/html',
      handle: ({ request, response }) => {
        docsPolicy(request, response, () => response.sendFile(PAGE));
      },
    }),
  ];
  const description = describeApi(all, sessionCookie);
  return all;
}
