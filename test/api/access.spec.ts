import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { apiRoutes } from '../../server/app.ts';
import type { Route } from '../../server/http/route.ts';
import type { Role } from '../../shared/contracts/session.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { club } from '../support/club.ts';
import { sentReceiver } from '../support/receivers.ts';

let server: ApiServer;
let people: Record<Role | 'visitor' | 'stranger', ApiClient>;
let ids: Record<string, number>;
let routes: Route[];

beforeAll(async () => {
  server = await startApiServer();
  const ours = await club(server);
  people = { ...ours, visitor: await server.visitor(), stranger: await server.newcomer() };
  const keep = async (path: string, body: object) =>
    (await ours.admin.post(path, body).expect(201)).body.id;
  ids = {
    receivers: await keep('/api/receivers', sentReceiver()),
    sites: await keep('/api/sites', { name: 'Attic', noise: 'quiet', ituRegion: 1 }),
    regions: await keep('/api/regions', { name: 'Coast', ituRegion: 1 }),
  };
  routes = apiRoutes(server.services);
});
afterAll(() => server.close());

/** Sends the route with what our own objects are called, and a body that no schema takes. */
async function statusOf(row: Route, who: keyof typeof people): Promise<number> {
  const resource = row.path.split('/')[2] ?? '';
  const path = row.path.replace(':id', String(ids[resource] ?? 1)).replace(/:\w+/g, '1');
  const client = people[who];
  const { status } =
    row.method === 'get'
      ? await client.get(path)
      : await client.change(row.method, path, row.body ? { nonsense: true } : undefined);
  return status;
}

const rank = { visitor: -1, member: 0, librarian: 1, admin: 2 };

describe('every route', () => {
  it('of an object keeps the admin of another workshop out with 404', async () => {
    const wrong: string[] = [];
    for (const row of routes.filter(({ path }) => path.includes(':'))) {
      if (row.body) continue; // Its body is read first; each resource's own tests send a good one.
      const status = await statusOf(row, 'stranger');
      if (![404, 415].includes(status)) wrong.push(`${row.method} ${row.path}: ${status}`);
    }

    expect(wrong).toEqual([]);
  });

  it('that a visitor may use is one of these', () => {
    const open = routes.filter(({ access }) => access === 'visitor');

    expect(open.map(({ method, path }) => `${method} ${path}`).sort()).toEqual(
      expect.arrayContaining([
        'delete /api/session',
        'get /api/shared-plans/:token',
        'post /api/accounts',
        'post /api/session',
      ]),
    );
    const computing = open.filter((row) => row.computing).map(({ path }) => path);
    expect(open).toHaveLength(4 + computing.length);
  });

  it('answers a reader with what its row says', async () => {
    for (const row of routes.filter(({ method, answer }) => method === 'get' && answer)) {
      const resource = row.path.split('/')[2] ?? '';
      const path = row.path.replace(':id', String(ids[resource] ?? 1)).replace(/:\w+/g, '1');
      const { status, body } = await people.admin.get(path);
      if (status === 200) expect(row.answer?.safeParse(body)).toMatchObject({ success: true });
    }
  });

  // Last, because an admin may delete everything.
  it.each(['visitor', 'member', 'librarian', 'admin'] as const)(
    'lets a %s pass, or not, as its row says',
    async (who) => {
      const wrong: string[] = [];
      for (const row of routes.filter(({ path }) => path !== '/api/session')) {
        const status = await statusOf(row, who);
        const isStopped = status === 401 || (status === 403 && rank[who] < rank[row.access]);
        const isAllowed = rank[who] >= rank[row.access];
        const expected = isAllowed ? !isStopped : status === (who === 'visitor' ? 401 : 403);
        if (!expected) wrong.push(`${row.method} ${row.path}: ${status} for ${who}`);
        if (status >= 500) wrong.push(`${row.method} ${row.path}: ${status}`);
      }

      expect(wrong).toEqual([]);
    },
  );
});

describe('sessions of the club', () => {
  it('see each other by name and role only', async () => {
    const { body } = await people.member.get('/api/workshop/members').expect(200);

    expect(body.total).toBe(3);
    expect(body.items.map(({ role }: { role: Role }) => role)).toEqual([
      'member',
      'librarian',
      'admin',
    ]);
    expect(JSON.stringify(body)).not.toContain('@');
  });
});
