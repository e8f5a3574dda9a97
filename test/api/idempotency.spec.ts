import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';

import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { sentReceiver } from '../support/receivers.ts';

let server: ApiServer;
let person: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
});
beforeEach(async () => {
  person = await server.newcomer();
});
afterAll(() => server.close());

const keep = (key: string, body: object = sentReceiver()) =>
  person.post('/api/receivers', body).set('Idempotency-Key', key);

const total = async () => (await person.get('/api/receivers')).body.total;

describe('a creation with an Idempotency-Key', () => {
  it('sent again, gets the first answer and creates once', async () => {
    const first = await keep('one').expect(201);

    const second = await keep('one').expect(201);

    expect(second.body).toEqual(first.body);
    expect(second.headers['location']).toBe(first.headers['location']);
    expect(await total()).toBe(1);
  });

  it('sent many times at the same moment, creates once', async () => {
    const answers = await Promise.all(Array.from({ length: 12 }, () => keep('burst')));

    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([201]));
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    expect(await total()).toBe(1);
  });

  it('sent with another body, answers 422', async () => {
    await keep('reused').expect(201);

    const { body } = await keep('reused', sentReceiver({ name: 'Another' })).expect(422);

    expect(body.type).toBe('idempotency-key-reused');
    expect(await total()).toBe(1);
  });

  it('that failed, can be mended and sent again under the same key', async () => {
    await keep('mended', sentReceiver({ ifHz: 0 })).expect(400);

    await keep('mended').expect(201);
  });

  it('of another account, is another key', async () => {
    const { body: mine } = await keep('shared').expect(201);
    person = await server.newcomer();

    const { body: theirs } = await keep('shared').expect(201);

    expect(theirs.id).not.toBe(mine.id);
  });

  it('after a day, is forgotten', async () => {
    await keep('old').expect(201);
    await server.sql('UPDATE idempotency_keys SET created_at = created_at - INTERVAL 25 HOUR');

    await server.services.idempotency.forgetOld();

    await keep('old').expect(201);
    expect(await total()).toBe(2);
  });

  it('that is too long, is refused by name', async () => {
    const { body } = await keep('k'.repeat(256)).expect(400);

    expect(body.issues[0].path).toBe('Idempotency-Key');
  });
});
