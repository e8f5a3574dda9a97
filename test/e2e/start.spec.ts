import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';

import { runningProcesses } from '../../server/dev/process-table.ts';
import { ApiClient } from '../support/api-client.ts';
import { Product } from '../support/product.ts';

const PATIENCE = { timeout: 30_000, interval: 250 };

describe('npm start', () => {
  const product = new Product();

  beforeAll(() => product.start());
  afterAll(() => product.remove());

  const isReady = () => supertest(product.url).get('/readyz').expect(200);

  const signIn = async () => {
    const [account] = product.signIns;
    const { email, password } = account ?? {};
    return (await ApiClient.open(product.url)).post('/api/session', { email, password });
  };

  it('serves client and API at one address', async () => {
    await supertest(product.url).get('/').expect(200).expect('Content-Type', /html/);
    await supertest(product.url)
      .get('/api/openapi.json')
      .expect(200)
      .expect('Content-Type', /json/);
  });

  it('lets a member, a librarian and an admin of the demo club sign in', async () => {
    expect(product.signIns.map(({ role }) => role)).toEqual(['member', 'librarian', 'admin']);
    expect((await signIn()).status).toBe(200);
  });

  it('starts an API server again that was killed', async () => {
    const [killed] = product.processes('node');
    process.kill(killed?.pid ?? 0, 'SIGKILL');

    await vi.waitFor(async () => {
      expect(product.processes('node').map(({ pid }) => pid)).not.toContain(killed?.pid);
      await isReady();
    }, PATIENCE);
  });

  it('starts a database again that was killed, with what it held', async () => {
    const [killed] = product.processes('mariadbd');
    process.kill(killed?.pid ?? 0, 'SIGKILL');

    await vi.waitFor(async () => {
      expect(product.processes('mariadbd').map(({ pid }) => pid)).not.toContain(killed?.pid);
      await isReady();
    }, PATIENCE);
    expect((await signIn()).status).toBe(200);
  });

  it('keeps accounts and passwords when it was killed itself', async () => {
    const before = product.signIns;

    await product.kill();
    await product.start();

    expect(product.signIns).toEqual(before);
    expect((await signIn()).status).toBe(200);
  });

  it('leaves nothing running when it is stopped', async () => {
    const parts = [...product.processes('node'), ...product.processes('mariadbd')];

    await product.stop();

    const running = runningProcesses().map(({ pid }) => pid);
    expect(parts.length).toBeGreaterThanOrEqual(2);
    expect(parts.filter(({ pid }) => running.includes(pid))).toEqual([]);
  });
});
