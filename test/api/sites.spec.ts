import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { club } from '../support/club.ts';

let server: ApiServer;
let person: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  person = await server.newcomer();
});
afterAll(() => server.close());

const attic = {
  name: 'Attic',
  latitude: 48.25,
  longitude: -7.123456789,
  noise: 'quiet',
  ituRegion: 1,
};

describe('/api/sites', () => {
  it('keeps a site exactly, changes and removes it', async () => {
    const { body: kept, headers } = await person.post('/api/sites', attic).expect(201);
    expect(kept).toMatchObject({ ...attic, ground: null, indoors: false, noiseFloorDb: null });
    expect(headers['location']).toBe(`/api/sites/${kept.id}`);

    const change = { ...kept, indoors: true, noise: null, noiseFloorDb: 32.5 };
    const { body: changed } = await person.put(`/api/sites/${kept.id}`, change).expect(200);

    expect(changed).toEqual(change);
    await person.get(`/api/sites/${kept.id}`).expect(200, changed);
    await person.delete(`/api/sites/${kept.id}`).expect(204);
    await person.get(`/api/sites/${kept.id}`).expect(404);
  });

  it.each([
    ['latitude', { latitude: 95 }],
    ['longitude', { longitude: -180.1 }],
    ['ground', { ground: 'granite' }],
    ['noise', { noise: null }],
    ['ituRegion', { ituRegion: 4 }],
    ['ituRegion', { ituRegion: undefined }],
    ['name', { name: '' }],
  ])('with a bad %s, answers 400 and names it', async (path, change) => {
    const { body } = await person.post('/api/sites', { ...attic, ...change }).expect(400);

    expect(body.issues).toEqual([{ path, message: expect.stringMatching(/^Give /) }]);
  });

  it('a site of a club is changed by its owner and by admins, and unseen from elsewhere', async () => {
    const { member, librarian, admin } = await club(server);
    const { body: kept } = await member.post('/api/sites', attic).expect(201);
    const address = `/api/sites/${kept.id}`;

    await librarian.put(address, attic).expect(403);
    await librarian.delete(address).expect(403);
    await admin.put(address, { ...attic, name: 'Loft' }).expect(200);
    await person.get(address).expect(404);
    await person.put(address, attic).expect(404);
    await person.delete(address).expect(404);

    const { body } = await librarian.get('/api/sites?search=lof').expect(200);
    expect(body).toEqual({ items: [{ ...kept, name: 'Loft', editable: false }], total: 1 });
  });
});
