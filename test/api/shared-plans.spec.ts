import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { IdempotencyKeyModel } from '../../server/http/idempotency-key-model.ts';
import { PlanShareModel } from '../../server/plans/plan-share-model.ts';
import { sharedPlan } from '../../shared/contracts/plan.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { club } from '../support/club.ts';
import { addRegion, cleanList, importList } from '../support/lists.ts';
import { sentReceiver } from '../support/receivers.ts';
import { sentSite } from '../support/sites.ts';

let server: ApiServer;
let person: ApiClient;
let visitor: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  person = await server.newcomer();
  visitor = await server.visitor();
});
afterAll(() => server.close());

async function keptBy(client: ApiClient): Promise<string> {
  const receiver = await client.post('/api/receivers', sentReceiver()).expect(201);
  const site = await client.post('/api/sites', sentSite({ latitude: 50.4321 })).expect(201);
  const editionId = await importList(client, await addRegion(client), cleanList(60));
  const draft = { name: 'For all', siteId: site.body.id, editionId, period: 'night' };
  const path = `/api/receivers/${receiver.body.id}/plans`;
  const { body } = await client.post(path, { ...draft, ifHz: 460_000 }).expect(201);
  return `${path}/${body.id}`;
}

const shareOf = async (client: ApiClient, plan: string): Promise<string> =>
  `/api/shared-plans/${(await client.post(`${plan}/share`).expect(200)).body.token}`;

describe('a link to a plan', () => {
  it('shows the plan without signing in, with its stations and responses', async () => {
    const plan = await keptBy(person);
    const { body: own } = await person.get(plan).expect(200);

    const { body, headers } = await visitor.get(await shareOf(person, plan)).expect(200);

    const shared = sharedPlan.parse(body);
    expect(shared.results).toEqual(own.results);
    expect(shared.stations).toEqual(own.stations);
    expect(shared.judged?.night.bands[0]?.responses.length).toBeGreaterThan(0);
    expect(shared.workshopName).not.toBe('');
    expect(headers['referrer-policy']).toBe('no-referrer');
    expect(headers['x-robots-tag']).toContain('noindex');
    expect(headers['cache-control']).toBe('no-store');
  });

  it('tells no e-mail, no person, no id, and the place to a tenth of a degree', async () => {
    const plan = await keptBy(person);
    const { body: who } = await person.get('/api/session').expect(200);

    const { body } = await visitor.get(await shareOf(person, plan)).expect(200);

    const text = JSON.stringify({ ...body, workshopName: '' });
    expect(text).not.toContain('@');
    expect(text).not.toContain(who.email);
    for (const key of ['id', 'receiverId', 'siteId', 'editionId', 'regionId', 'keptBy']) {
      expect(text).not.toContain(`"${key}"`);
    }
    expect(body.site.latitude).toBe(50.4);
  });

  it('holds 128 random bits, of which the database knows only a hash', async () => {
    const plan = await keptBy(person);

    const token = (await shareOf(person, plan)).split('/').at(-1) ?? '';

    expect(Buffer.from(token, 'base64url')).toHaveLength(16);
    const rows = [
      await PlanShareModel.findAll({ raw: true }),
      await IdempotencyKeyModel.findAll({ raw: true }),
    ];
    expect(rows[0]?.length).toBeGreaterThan(0);
    expect(JSON.stringify(rows)).not.toContain(token);
  });

  it('ends when it is revoked, renewed, or its plan deleted, with the answer of an unknown one', async () => {
    const plan = await keptBy(person);
    const unknown = await visitor.get('/api/shared-plans/AAAAAAAAAAAAAAAAAAAAAA').expect(404);
    const isUnknown = async (link: string) => {
      const { body } = await visitor.get(link).expect(404);
      expect({ ...body, instance: '' }).toEqual({ ...unknown.body, instance: '' });
    };

    const first = await shareOf(person, plan);
    const second = await shareOf(person, plan);
    await isUnknown(first);
    await visitor.get(second).expect(200);
    await person.delete(`${plan}/share`).expect(204);
    await isUnknown(second);
    const third = await shareOf(person, plan);
    await person.delete(plan).expect(204);
    await isUnknown(third);
  });

  it('keeps who made and who ended it, and when', async () => {
    const plan = await keptBy(person);
    const { body: who } = await person.get('/api/session').expect(200);
    await shareOf(person, plan);
    const { body } = await person.get(plan).expect(200);
    expect(body.sharing).toMatchObject({ sharedBy: who.name });

    await person.delete(plan).expect(204);

    const row = await PlanShareModel.findOne({ order: [['id', 'DESC']], raw: true });
    expect(row).toMatchObject({ planId: null, sharedBy: who.id, revokedBy: who.id });
    expect(row?.revokedAt).toBeInstanceOf(Date);
  });

  it('is made and ended by who kept the plan or an admin', async () => {
    const { admin, librarian, member } = await club(server);
    const plan = await keptBy(librarian);

    await member.post(`${plan}/share`).expect(403);
    const link = await shareOf(admin, plan);
    await member.delete(`${plan}/share`).expect(403);
    await visitor.get(link).expect(200);
    await librarian.delete(`${plan}/share`).expect(204);

    const stranger = await server.newcomer();
    await stranger.post(`${plan}/share`).expect(404);
    await stranger.delete(`${plan}/share`).expect(404);
    await visitor.post(`${plan}/share`).expect(401);
  });

  it.each(['1', 'x'.repeat(5000), '..%2f..%2freceivers', '%00', "' OR 1=1 --", '🎚'])(
    'that is nonsense (%.20s) is unknown',
    async (token) => {
      const { body } = await visitor.get(`/api/shared-plans/${encodeURI(token)}`).expect(404);
      expect(body.type).toBe('shared-plan-not-found');
    },
  );

  it('is not made for a plan kept without its working', async () => {
    const plan = await keptBy(person);
    await server.sql(`UPDATE plans SET working = NULL WHERE id = ${plan.split('/').at(-1)}`);

    const { body } = await person.post(`${plan}/share`).expect(409);

    expect(body.type).toBe('plan-without-working');
    await person.get(plan).expect(200);
  });
});

describe('reading by links', () => {
  it('is limited for an address', async () => {
    const strict = await startApiServer({ LIMIT_SHARED_PLANS: '2' });
    const reader = await strict.visitor();

    await reader.get('/api/shared-plans/AAAAAAAAAAAAAAAAAAAAAA').expect(404);
    await reader.get('/api/shared-plans/AAAAAAAAAAAAAAAAAAAAAB').expect(404);
    const { headers } = await reader.get('/api/shared-plans/AAAAAAAAAAAAAAAAAAAAAC').expect(429);

    expect(Number(headers['retry-after'])).toBeGreaterThan(0);
    await strict.close();
  });
});
