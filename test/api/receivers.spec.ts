import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { club } from '../support/club.ts';
import { sentReceiver } from '../support/receivers.ts';

let server: ApiServer;
let person: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  person = await server.newcomer();
});
afterAll(() => server.close());

describe('POST /api/receivers', () => {
  it('keeps a receiver, fills what was left out, and says where it is', async () => {
    const { body, headers } = await person.post('/api/receivers', sentReceiver()).expect(201);

    expect(body).toMatchObject({
      name: 'Table set',
      ifHz: 455_000,
      version: 1,
      editable: true,
      strayDb: { if: 60, image: 60 },
      bands: [{ service: 'broadcast', circuits: [{ qLow: 80, qHigh: 80 }] }],
    });
    expect(headers['location']).toBe(`/api/receivers/${body.id}`);
    await person.get(`/api/receivers/${body.id}`).expect(200, body);
  });

  it('calls a receiver that comes without a name unnamed', async () => {
    const { name: _name, ...nameless } = sentReceiver();

    const { body } = await person.post('/api/receivers', nameless).expect(201);

    expect(body.name).toBe('Unnamed receiver');
  });

  it.each([
    ['ifHz', { ifHz: 0 }],
    ['ifHz', { ifHz: -455_000 }],
    ['ifHz', { ifHz: '455' }],
    ['ifHz', { ifHz: 455_000.5 }],
    ['name', { name: '' }],
    ['colour', { colour: 'walnut' }],
    ['bands', { bands: [] }],
    [
      'bands.0.highHz',
      { bands: [{ name: 'M', lowHz: 1_600_000, highHz: 550_000, oscillator: 'above' }] },
    ],
    [
      'bands.0.oscillator',
      { bands: [{ name: 'L', lowHz: 150_000, highHz: 300_000, oscillator: 'below' }] },
    ],
    ['selectivity.b60Hz', { selectivity: { kind: 'widths', b6Hz: 6000, b60Hz: 3000 } }],
    ['selectivity.kind', { selectivity: { kind: 'magic' } }],
  ])('with a bad %s, answers 400 and names it', async (path, change) => {
    const { body } = await person
      .post('/api/receivers', { ...sentReceiver(), ...change })
      .expect(400);

    expect(body.issues).toContainEqual({ path, message: expect.stringMatching(/\S{3}/) });
  });
});

describe('PUT /api/receivers/:id', () => {
  it('stores a change made from the stored version', async () => {
    const { body: kept } = await person.post('/api/receivers', sentReceiver());

    const { body } = await person
      .put(`/api/receivers/${kept.id}`, { ...kept, ifHz: 460_000 })
      .expect(200);

    expect(body).toMatchObject({ ifHz: 460_000, version: 2 });
    await person.get(`/api/receivers/${kept.id}`).expect(200, body);
  });

  it('from a stale version, answers 409 with the stored state and changes nothing', async () => {
    const { body: kept } = await person.post('/api/receivers', sentReceiver());
    const { body: second } = await person
      .put(`/api/receivers/${kept.id}`, { ...kept, name: 'Second' })
      .expect(200);

    const { body } = await person
      .put(`/api/receivers/${kept.id}`, { ...kept, name: 'Third' })
      .expect(409);

    expect(body).toMatchObject({ type: 'receiver-changed', current: second });
    await person.get(`/api/receivers/${kept.id}`).expect(200, second);
  });

  it('of two changes at the same moment stores one', async () => {
    const { body: kept } = await person.post('/api/receivers', sentReceiver());

    const answers = await Promise.all(
      ['A', 'B', 'C', 'D'].map((name) =>
        person.put(`/api/receivers/${kept.id}`, { ...kept, name }),
      ),
    );

    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
  });

  it('without a version, answers 400 and names it', async () => {
    const { body: kept } = await person.post('/api/receivers', sentReceiver());

    const { body } = await person.put(`/api/receivers/${kept.id}`, sentReceiver()).expect(400);

    expect(body.issues[0].path).toBe('version');
  });
});

describe('DELETE /api/receivers/:id', () => {
  it('removes the receiver', async () => {
    const { body: kept } = await person.post('/api/receivers', sentReceiver());

    await person.delete(`/api/receivers/${kept.id}`).expect(204);

    await person.get(`/api/receivers/${kept.id}`).expect(404);
  });
});

describe('GET /api/receivers', () => {
  it('pages, sorts and searches by name, taking % and _ as they are', async () => {
    const collector = await server.newcomer();
    for (const name of ['Console', 'Attic 100% set', 'attic_two', 'Bedside']) {
      await collector.post('/api/receivers', sentReceiver({ name })).expect(201);
    }
    const names = async (query: string) => {
      const { body } = await collector.get(`/api/receivers?${query}`).expect(200);
      return [body.total, ...body.items.map(({ name }: { name: string }) => name)];
    };

    expect(await names('')).toEqual([4, 'Attic 100% set', 'attic_two', 'Bedside', 'Console']);
    expect(await names('page=2&pageSize=3')).toEqual([4, 'Console']);
    expect(await names('search=ATTIC&sort=updated')).toEqual([2, 'attic_two', 'Attic 100% set']);
    expect(await names('search=%25')).toEqual([1, 'Attic 100% set']);
    expect(await names('search=_')).toEqual([1, 'attic_two']);
    expect(await names("search=' OR 1=1 --")).toEqual([0]);
  });

  it.each(['page=0', 'pageSize=501', 'page=x', 'sort=random', 'page=1&page=2', 'colour=red'])(
    'with %s, answers 400',
    async (query) => {
      await person.get(`/api/receivers?${query}`).expect(400);
    },
  );
});

describe('the receivers of a club', () => {
  it('are read by all, changed by their owner and by admins only', async () => {
    const { member, librarian, admin } = await club(server);
    const { body: kept } = await member.post('/api/receivers', sentReceiver()).expect(201);
    const address = `/api/receivers/${kept.id}`;

    const { body: asLibrarian } = await librarian.get(address).expect(200);
    expect(asLibrarian.editable).toBe(false);
    await librarian.put(address, { ...kept, name: 'Mine' }).expect(403);
    await librarian.delete(address).expect(403);

    const { body: changed } = await admin.put(address, { ...kept, name: 'Ours' }).expect(200);
    expect(changed).toMatchObject({ editable: true, ownerName: kept.ownerName });
    await admin.delete(address).expect(204);
  });

  it('are not there for another workshop', async () => {
    const { member } = await club(server);
    const { body: kept } = await member.post('/api/receivers', sentReceiver()).expect(201);
    const address = `/api/receivers/${kept.id}`;

    await person.get(address).expect(404);
    await person.put(address, kept).expect(404);
    await person.delete(address).expect(404);

    const { body } = await person.get('/api/receivers?pageSize=500');
    expect(body.items.map(({ id }: { id: number }) => id)).not.toContain(kept.id);
  });
});
