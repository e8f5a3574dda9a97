import { afterAll, beforeAll, describe, it } from 'vitest';

import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, importList, sendList, upload } from '../support/lists.ts';

let server: ApiServer;
let librarian: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  librarian = await server.newcomer();
});
afterAll(() => server.close());

describe('who may import', () => {
  it('is decided by role and workshop', async () => {
    const regionId = await addRegion(librarian);
    const { path } = await upload(librarian, regionId, cleanList(1));
    const stranger = await server.newcomer();
    const visitor = await server.visitor();

    await stranger.get(path).expect(404);
    await stranger.put(path, { label: 'x' }).expect(404);
    await stranger.post(`${path}/commit`).expect(404);
    await stranger.delete(path).expect(404);
    await sendList(stranger, regionId, cleanList(1)).expect(404);
    await visitor.get(path).expect(401);
    const otherRegion = await addRegion(librarian);
    await librarian
      .get(`/api/regions/${otherRegion}/imports/${path.split('/').at(-1)}`)
      .expect(404);
  });

  it('lets a member read and nothing else', async () => {
    const member = await server.newcomer();
    const regionId = await addRegion(member);
    const editionId = await importList(member, regionId, cleanList(3));
    const { path } = await upload(member, regionId, cleanList(1));
    const { body: session } = await member.get('/api/session').expect(200);
    await server.sql(`UPDATE memberships SET role = 'member' WHERE account_id = ${session.id}`);

    await member.get(path).expect(200);
    await member.get(`/api/editions/${editionId}/stations`).expect(200);
    await sendList(member, regionId, cleanList(1)).expect(403);
    await member.put(path, { label: 'x' }).expect(403);
    await member.post(`${path}/commit`).expect(403);
    await member.delete(path).expect(403);
  });
});
