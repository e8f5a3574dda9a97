import { request as openRequest } from 'node:http';

import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { problem } from '../../shared/contracts/problem.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { sentReceiver } from '../support/receivers.ts';

let server: ApiServer;
let person: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  person = await server.newcomer();
});
afterAll(() => server.close());

const sending = (text: string | Buffer, type = 'application/json') =>
  person.change('post', '/api/receivers').set('Content-Type', type).send(text);

describe('a body that cannot be read', () => {
  it.each([
    ['cut short', '{"name": "Table'],
    ['no JSON', 'name=Table set'],
    ['a bare value', '"receiver"'],
    ['empty', ''],
    ['an array', '[]'],
    ['null', 'null'],
    ['full of NUL bytes', '\0\0\0\0'],
    ['a number beyond all bounds', '{"ifHz": 1e999}'],
    ['very deep', '['.repeat(200_000)],
    ['a prototype', '{"__proto__": {"ifHz": 455000}, "constructor": {}}'],
  ])('%s, is answered with 400 and a problem', async (_what, text) => {
    const { body, headers } = await sending(text).expect(400);

    expect(headers['content-type']).toMatch('application/problem+json');
    expect(problem.parse(body)).toMatchObject({ status: 400 });
    expect(body.instance).toBe(headers['x-request-id']);
  });

  it('larger than 1 MB, is answered with 413', async () => {
    await sending(JSON.stringify({ name: 'x'.repeat(1_100_000) })).expect(413);
  });

  it('that unpacks to more than 1 MB, is answered with 413', async () => {
    const { gzipSync } = await import('node:zlib');
    const packed = gzipSync(JSON.stringify({ name: 'x'.repeat(5_000_000) }));

    const { status } = await sending(packed).set('Content-Encoding', 'gzip').serialize(asIs);

    expect(status).toBe(413);
  });

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'application/xml', 'nonsense'])(
    'sent as %s, is answered with 415',
    async (type) => {
      await sending('{}', type).expect(415);
    },
  );

  it('in an unknown character set or encoding, is answered with 415', async () => {
    await sending('{}', 'application/json; charset=ebcdic').expect(415);
    await sending('{}').set('Content-Encoding', 'lzma').expect(415);
  });

  it('that holds an unknown key, is answered with 400 naming it', async () => {
    const { body } = await person.post('/api/receivers', {
      ...sentReceiver(),
      bands: [{ ...sentReceiver().bands[0], knob: 1 }],
    });

    expect(body.issues).toEqual([{ path: 'bands.0.knob', message: expect.any(String) }]);
  });
});

describe('text that databases stumble over', () => {
  it.each(["Robert'); DROP TABLE receivers;--", '🎚 λ/4 Ω', '\u202Eright to left', '\\%_"'])(
    'is kept as it is: %s',
    async (name) => {
      const { body } = await person.post('/api/receivers', sentReceiver({ name })).expect(201);

      const { body: kept } = await person.get(`/api/receivers/${body.id}`).expect(200);
      expect(kept.name).toBe(name);
    },
  );

  it.each(['\0', 'a\0b', '\uD800'])('that no name can have, is refused: %j', async (name) => {
    const { body } = await person.post('/api/receivers', sentReceiver({ name })).expect(400);

    expect(body.issues[0].path).toBe('name');
  });
});

describe('an address', () => {
  it.each([
    '/api/nothing',
    '/api',
    '/api/receivers/abc',
    '/api/receivers/0',
    '/api/receivers/-1',
    '/api/receivers/1.5',
    '/api/receivers/4294967296',
    '/api/receivers/99999999999999999999',
    '/api/receivers/1%00',
    '/api/receivers/1/nothing',
  ])('%s names nothing: 404 and a problem', async (path) => {
    const { body } = await person.get(path).expect(404);

    expect(problem.parse(body).title).toMatch(/\.$/);
  });

  it('that cannot be decoded, is answered with 400', async () => {
    expect(await rawStatus('/api/receivers/%E0%A4%A')).toBe(400);
    expect(await rawStatus('/%')).toBe(400);
  });

  it('is not left by dots', async () => {
    expect(await rawStatus('/../package.json')).toBe(404);
    expect(await rawStatus('/..%2f..%2fpackage.json')).toBe(404);
    expect(await rawStatus('/.env')).toBe(404);
  });

  it('used by a method it does not have, is answered with 405 and those it has', async () => {
    const { headers } = await person.put('/api/receivers', {}).expect(405);

    expect(headers['allow']).toBe('GET, POST');
  });
});

describe('cookies', () => {
  it.each([
    'fallow-session',
    'fallow-session=%E0%A4%A',
    '=;=;;',
    'XSRF-TOKEN=%',
    `a=${'x'.repeat(8000)}`,
  ])('that are broken leave a visitor: %s', async (cookie) => {
    const visitor = await server.visitor();

    await visitor.get('/api/session').set('Cookie', cookie).expect(401);
  });
});

const asIs = (body: unknown) => body as string;

/** Asks for a path exactly as written: clients tidy it up. */
const rawStatus = (path: string): Promise<number | undefined> =>
  new Promise((resolve, reject) => {
    openRequest(server.url, { path }, (response) => {
      response.resume();
      resolve(response.statusCode);
    })
      .on('error', reject)
      .end();
  });
