import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { type ApiServer, startApiServer } from '../support/api-server.ts';

let server: ApiServer;
beforeAll(async () => {
  server = await startApiServer();
});
afterAll(() => server.close());

const account = { email: 'Ada@Example.org', name: 'Ada', password: 'a soldering iron' };
const credentials = { email: 'ada@example.org', password: 'a soldering iron' };

describe('POST /api/accounts', () => {
  it('makes an account that is signed in and admin of its own workshop', async () => {
    const visitor = await server.visitor();

    const { body } = await visitor.post('/api/accounts', account).expect(201);

    expect(body).toMatchObject({
      email: 'ada@example.org',
      name: 'Ada',
      workshop: { name: 'Workshop of Ada', role: 'admin' },
    });
    expect(body.workshops).toEqual([body.workshop]);
    expect(JSON.stringify(body)).not.toContain('password');
    await visitor.get('/api/session').expect(200, body);
  });

  it('with an address that is taken, answers 409 and makes nothing', async () => {
    const visitor = await server.visitor();

    const { body } = await visitor.post('/api/accounts', account).expect(409);

    expect(body.type).toBe('account-not-made');
    await visitor.get('/api/session').expect(401);
  });

  it.each([
    ['password', { password: 'short' }],
    ['password', { password: 'Password123' }],
    ['password', { password: 'x'.repeat(257) }],
    ['password', { password: '🎙🎙🎙🎙' }],
    ['email', { email: 'not an address' }],
    ['name', { name: '  ' }],
    ['role', { role: 'admin' }],
  ])('with a bad %s, answers 400 and names it', async (path, change) => {
    const visitor = await server.visitor();

    const draft = { email: 'bad@example.org', name: 'Bad', password: 'a soldering iron' };
    const { body } = await visitor.post('/api/accounts', { ...draft, ...change }).expect(400);

    expect(body.issues).toContainEqual({ path, message: expect.any(String) });
  });
});

describe('POST /api/session', () => {
  it('signs in with a cookie that scripts cannot read', async () => {
    const visitor = await server.visitor();

    const { headers } = await visitor.post('/api/session', credentials).expect(200);

    const cookie = String(headers['set-cookie']);
    expect(cookie).toMatch(/^fallow-session=.+HttpOnly/);
    expect(cookie).toContain('SameSite=Lax');
  });

  it('answers the same to a wrong password and to an unknown address', async () => {
    const visitor = await server.visitor();

    const wrong = await visitor
      .post('/api/session', { ...credentials, password: 'a cold iron' })
      .expect(401);
    const unknown = await visitor
      .post('/api/session', { email: 'nobody@example.org', password: 'a cold iron' })
      .expect(401);

    const { instance: _wrong, ...wrongBody } = wrong.body;
    const { instance: _unknown, ...unknownBody } = unknown.body;
    expect(unknownBody).toEqual(wrongBody);
  });

  it('every character of a long password counts', async () => {
    const visitor = await server.visitor();
    const password = 'ferrite rod aerial '.repeat(6);
    await visitor.post('/api/accounts', { ...account, email: 'long@example.org', password });

    const almost = { email: 'long@example.org', password: password.replace(/ $/, '') };

    await visitor.post('/api/session', almost).expect(401);
    await visitor.post('/api/session', { ...almost, password }).expect(200);
  });

  it('begins a new session each time and ends the one before', async () => {
    const person = await server.visitor();
    const first = await person.post('/api/session', credentials).expect(200);
    const old = String(first.headers['set-cookie']).split(';')[0] ?? '';

    await person.post('/api/session', credentials).expect(200);

    const visitor = await server.visitor();
    await visitor.get('/api/session').set('Cookie', old).expect(401);
  });
});

describe('DELETE /api/session', () => {
  it('ends the session for whoever holds its cookie, at once', async () => {
    const person = await server.visitor();
    const { headers } = await person.post('/api/session', credentials);
    const cookie = String(headers['set-cookie']).split(';')[0] ?? '';

    await person.delete('/api/session').expect(204);

    await person.get('/api/session').expect(401);
    const thief = await server.visitor();
    await thief.get('/api/session').set('Cookie', cookie).expect(401);
  });
});

describe('a session', () => {
  it('ends when it was idle too long', async () => {
    const person = await server.newcomer();
    const { body } = await person.get('/api/session').expect(200);

    await server.sql(
      `UPDATE sessions SET seen_at = NOW() - INTERVAL 8 DAY WHERE account_id = ${body.id}`,
    );

    await person.get('/api/session').expect(401);
  });

  it('ends when it is old, however often it was used', async () => {
    const person = await server.newcomer();
    const { body } = await person.get('/api/session').expect(200);

    await server.sql(
      `UPDATE sessions SET created_at = NOW() - INTERVAL 31 DAY WHERE account_id = ${body.id}`,
    );

    await person.get('/api/session').expect(401);
  });

  it('is written as seen again after a minute', async () => {
    const person = await server.newcomer();
    const { body } = await person.get('/api/session').expect(200);
    await server.sql(
      `UPDATE sessions SET seen_at = NOW() - INTERVAL 6 DAY WHERE account_id = ${body.id}`,
    );
    await person.get('/api/session').expect(200);

    await server.sql(
      `UPDATE sessions SET seen_at = seen_at - INTERVAL 6 DAY WHERE account_id = ${body.id}`,
    );

    await person.get('/api/session').expect(200);
  });

  it('is not accepted with an altered or unsigned token', async () => {
    const visitor = await server.visitor();
    const payload = Buffer.from('{"sub":"1"}').toString('base64url');
    const unsigned = `${Buffer.from('{"alg":"none"}').toString('base64url')}.${payload}.`;

    for (const token of [unsigned, 'x', '..', `eyJhbGciOiJIUzI1NiJ9.${payload}.AAAA`]) {
      await visitor.get('/api/session').set('Cookie', `fallow-session=${token}`).expect(401);
    }
  });

  it('goes to another workshop of the account, never to a foreign one', async () => {
    const person = await server.newcomer();
    const stranger = await server.newcomer();
    const { body: user } = await person.get('/api/session');
    const { body: foreign } = await stranger.get('/api/session');
    const clubId = await server.services.workshops.found('Club');
    await server.services.workshops.admit(user.id, clubId, 'librarian');

    const { body } = await person.put('/api/session', { workshopId: clubId }).expect(200);

    expect(body.workshop).toEqual({ id: clubId, name: 'Club', role: 'librarian' });
    await person.get('/api/workshop').expect(200);
    await person.put('/api/session', { workshopId: foreign.workshop.id }).expect(404);
  });
});
