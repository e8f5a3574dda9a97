import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { type ApiServer, startApiServer } from '../support/api-server.ts';

const folder = mkdtempSync(join(tmpdir(), 'fallow-client-'));
let server: ApiServer;
beforeAll(async () => {
  writeFileSync(join(folder, 'index.html'), '<html><body><app-root></app-root></body></html>');
  writeFileSync(join(folder, 'main-ABCD1234.js'), 'export {}');
  server = await startApiServer({ CLIENT_DIR: folder });
});
afterAll(async () => {
  await server.close();
  rmSync(folder, { recursive: true });
});

const get = (path: string) => supertest(server.url).get(path);

describe('a page', () => {
  it.each(['/', '/receivers/7', '/index.html'])(
    'at %s is the client, its styles allowed by a nonce made for this answer',
    async (path) => {
      const { text, headers } = await get(path).expect(200);

      const [, nonce = ''] = /<app-root ngCspNonce="([^"]{20,})"/.exec(text) ?? [];
      expect(headers['content-security-policy']).toContain(`style-src 'self' 'nonce-${nonce}'`);
      expect(headers['cache-control']).toBe('no-store');
      expect((await get(path)).text).not.toContain(nonce);
    },
  );

  it('may run our scripts only, and turn no text into code', async () => {
    const { headers } = await get('/').expect(200);
    const policy = String(headers['content-security-policy']).split(';');

    expect(policy).toContain("script-src 'self'");
    expect(policy).toContain("require-trusted-types-for 'script'");
    expect(policy).toContain("frame-ancestors 'none'");
  });

  it('over plain http sends nobody to https', async () => {
    const { headers } = await get('/').expect(200);

    expect(headers['strict-transport-security']).toBeUndefined();
    expect(headers['content-security-policy']).not.toContain('upgrade-insecure-requests');
  });
});

describe('a file', () => {
  it('whose name is made from its content, is kept for ever', async () => {
    const { headers } = await get('/main-ABCD1234.js').expect(200);

    expect(headers['cache-control']).toContain('immutable');
    expect(headers['content-type']).toContain('javascript');
    expect(headers['x-content-type-options']).toBe('nosniff');
  });

  it('that is not there, is not answered with a page', async () => {
    await get('/main-00000000.js').expect(404);
  });
});

describe('behind TLS', () => {
  it('cookies are Secure and bound to the host, and browsers stay on https', async () => {
    const behindTls = await startApiServer({ BEHIND_TLS: 'true', CLIENT_DIR: folder });
    const agent = supertest(behindTls.url);

    const { headers } = await agent.get('/api/session').expect(401);
    const token = /XSRF-TOKEN=([^;]+)/.exec(String(headers['set-cookie']))?.[1] ?? '';
    const { headers: registered } = await agent
      .post('/api/accounts')
      .set({ Cookie: `XSRF-TOKEN=${token}`, 'X-XSRF-TOKEN': token })
      .send({ email: 'tls@example.org', name: 'Tess', password: 'a soldering iron' })
      .expect(201);

    expect(String(headers['set-cookie'])).toContain('Secure');
    expect(String(registered['set-cookie'])).toMatch(/^__Host-fallow-session=.+Path=\/.*Secure/);
    expect(headers['strict-transport-security']).toMatch(/max-age=/);
    await behindTls.close();
  });
});
