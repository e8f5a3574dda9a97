import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { type ApiServer, startApiServer } from '../support/api-server.ts';

let server: ApiServer;
beforeAll(async () => {
  server = await startApiServer({
    LIMIT_SIGN_IN: '3',
    LIMIT_SIGN_IN_ADDRESS: '20',
    LIMIT_REGISTER: '4',
    LIMIT_COMPUTE_VISITOR: '2',
    LIMIT_COMPUTE_ACCOUNT: '3',
  });
});
afterAll(() => server.close());

const password = 'a soldering iron';

describe('sign-in', () => {
  it('is stopped after too many failures for one account, even with the right password', async () => {
    const visitor = await server.visitor();
    await visitor.post('/api/accounts', { email: 'eve@example.org', name: 'Eve', password });
    const attempt = (word: string) =>
      visitor.post('/api/session', { email: 'EVE@example.org', password: word });

    for (const word of ['one', 'two', 'three']) await attempt(word).expect(401);

    const { body, headers } = await attempt(password).expect(429);
    expect(body.type).toBe('too-many-requests');
    expect(Number(headers['retry-after'])).toBeGreaterThan(800);
    await server.sql('UPDATE request_counters SET ends_at = NOW(3)');
    await attempt(password).expect(200);
  });

  it('is stopped in the same way for an address nobody has', async () => {
    const visitor = await server.visitor();
    const attempt = () => visitor.post('/api/session', { email: 'no@example.org', password });

    for (let count = 0; count < 3; count += 1) await attempt().expect(401);

    await attempt().expect(429);
  });

  it('that succeeds, does not count', async () => {
    const visitor = await server.visitor();
    await visitor.post('/api/accounts', { email: 'fay@example.org', name: 'Fay', password });

    for (let count = 0; count < 30; count += 1) {
      await visitor.post('/api/session', { email: 'fay@example.org', password }).expect(200);
    }
  });

  it('counts attempts made side by side', async () => {
    const visitor = await server.visitor();

    const answers = await Promise.all(
      Array.from({ length: 8 }, () =>
        visitor.post('/api/session', { email: 'gus@example.org', password }),
      ),
    );

    expect(answers.filter(({ status }) => status === 401)).toHaveLength(3);
  });
});

describe('registering', () => {
  it('is stopped after too many accounts from one address', async () => {
    const visitor = await server.visitor();
    await server.sql('DELETE FROM request_counters');
    const attempt = (count: number) =>
      visitor.post('/api/accounts', { email: `h${count}@example.org`, name: 'Hal', password });

    for (let count = 0; count < 4; count += 1) await attempt(count).expect(201);

    await attempt(4).expect(429);
  });
});

describe('computing', () => {
  const request = {
    site: { noise: 'quiet', ituRegion: 1 },
    stations: [{ frequencyHz: 909_000, fieldDb: 60 }],
  };

  it('is limited by address for visitors and by account for the signed in', async () => {
    await server.sql('DELETE FROM request_counters');
    const visitor = await server.visitor();
    const person = await server.newcomer();
    const compute = (client: typeof visitor) => client.post('/api/field-strengths', request);

    for (let count = 0; count < 2; count += 1) await compute(visitor).expect(200);
    const { headers } = await compute(visitor).expect(429);
    expect(Number(headers['retry-after'])).toBeLessThanOrEqual(61);
    const another = await server.visitor();
    await compute(another).expect(429);

    for (let count = 0; count < 3; count += 1) await compute(person).expect(200);
    await compute(person).expect(429);
  });

  it('takes more than a megabyte of stations, but not everything', async () => {
    await server.sql('DELETE FROM request_counters');
    const person = await server.newcomer();
    const station = { name: 'x'.repeat(100), frequencyHz: 909_000, fieldDb: 60 };
    const send = (count: number) =>
      person.post('/api/field-strengths', { ...request, stations: Array(count).fill(station) });

    await send(15_000).expect(200);
    await send(70_000).expect(413);
  });
});
