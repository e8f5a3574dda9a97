import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';

let server: ApiServer;
let visitor: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  visitor = await server.visitor();
});
afterAll(() => server.close());

const signOut = () => visitor.delete('/api/session');

describe('the request token', () => {
  it.each(['/api/session', '/api/nothing', '/api/receivers', '/api/openapi.json'])(
    'is handed out by GET %s, readable by our scripts',
    async (path) => {
      const { headers } = await supertest(server.url).get(path);

      const cookie = String(headers['set-cookie']);
      expect(cookie).toMatch(/^XSRF-TOKEN=\S+; Path=\/; SameSite=Lax$/);
    },
  );

  it('stays the same while it is valid', async () => {
    const { headers } = await visitor.get('/api/session');

    expect(headers['set-cookie']).toBeUndefined();
  });

  it('sent back lets a call pass that tells nothing of where it comes from', async () => {
    await signOut().expect(204);
  });

  it.each([
    ['missing', {}],
    ['of somebody else', { 'X-XSRF-TOKEN': 'abc.def' }],
  ])('%s, stops the call', async (_what, headers) => {
    const { body } = await supertest(server.url).delete('/api/session').set(headers).expect(403);

    expect(body.type).toBe('xsrf-token-invalid');
  });

  it('made up, stops the call though cookie and header are the same', async () => {
    await supertest(server.url)
      .delete('/api/session')
      .set({ Cookie: 'XSRF-TOKEN=abc.def', 'X-XSRF-TOKEN': 'abc.def' })
      .expect(403);
  });
});

describe('a changing call from a page', () => {
  it('of our own passes', async () => {
    const own = { Origin: server.url, 'Sec-Fetch-Site': 'same-origin' };

    await signOut().set(own).expect(204);
  });

  it.each([
    ['Origin', 'https://elsewhere.example'],
    ['Origin', 'null'],
    ['Sec-Fetch-Site', 'cross-site'],
    ['Sec-Fetch-Site', 'same-site'],
  ])('of another site is stopped by %s: %s', async (name, value) => {
    const { body } = await signOut().set(name, value).expect(403);

    expect(body.type).toBe('cross-site');
  });
});
