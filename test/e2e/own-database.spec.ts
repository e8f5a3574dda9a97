import type { ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { endProcess } from '../../server/dev/bound-process.ts';
import { databaseUrl, launchOnFreePort } from '../../server/dev/private-mariadb.ts';
import { anyFreePort } from '../../server/dev/free-port.ts';
import { Product } from '../support/product.ts';

describe('npm start with a DATABASE_URL', () => {
  const folder = mkdtempSync(join(tmpdir(), 'fallow-theirs-'));
  const product = new Product();
  let theirs: ChildProcess;

  beforeAll(async () => {
    const database = {
      folder: join(folder, 'mariadb'),
      password: 'only-for-this-test',
      rights: 'own database',
      durable: false,
    } as const;
    const { child, port } = await launchOnFreePort(database, await anyFreePort('127.0.0.1'));
    theirs = child;
    await product.start({ DATABASE_URL: databaseUrl(database, port) });
  });

  afterAll(async () => {
    await product.remove();
    await endProcess(theirs, 10_000);
    rmSync(folder, { recursive: true });
  });

  it('keeps everything in the server it names and starts none of its own', async () => {
    await supertest(product.url).get('/readyz').expect(200);

    expect(product.signIns).toHaveLength(3);
    expect(product.processes('mariadbd')).toEqual([]);
  });
});
