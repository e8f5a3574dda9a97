import type { ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync, statSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { createConnection } from 'mariadb';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';

import { endProcess, exitOf } from './bound-process.ts';
import type { PrivateDatabase } from './database-folder.ts';
import { anyFreePort } from './free-port.ts';
import { databaseUrl, launchMariaDB, launchOnFreePort } from './private-mariadb.ts';

describe('a private MariaDB', () => {
  const servers: ChildProcess[] = [];
  let parent: string;
  let database: PrivateDatabase;
  let port: number;

  beforeEach(async () => {
    parent = mkdtempSync(join(tmpdir(), 'fallow-private-'));
    // Longer than the 107 bytes a socket's path may have.
    const folder = join(parent, 'a-checkout-far-down'.repeat(6), 'mariadb');
    database = { folder, password: 'only-for-this-test', rights: 'own database', durable: true };
    port = await anyFreePort('127.0.0.1');
  });

  afterEach(async () => {
    for (const server of servers.splice(0)) await endProcess(server, 10_000);
    rmSync(parent, { recursive: true, force: true });
  });

  const launch = async (settings = database) => {
    const server = await launchMariaDB(settings, port);
    servers.push(server);
    return server;
  };

  const query = async (sql: string): Promise<unknown> => {
    const connection = await createConnection(databaseUrl(database, port));
    try {
      return (await connection.query(sql)) as unknown;
    } finally {
      await connection.end();
    }
  };

  it('keeps what was committed when it is killed outright', async () => {
    const server = await launch();
    await query('CREATE TABLE kept (hertz INT UNSIGNED)');
    await query('INSERT INTO kept VALUES (455000)');

    server.kill('SIGKILL');
    await exitOf(server);
    await launch();

    expect(await query('SELECT hertz FROM kept')).toEqual([{ hertz: 455_000 }]);
  });

  it('is refused a folder on which a living start already works', async () => {
    await launch();

    await expect(launch()).rejects.toThrow(`in use: Fallow runs already (process ${process.pid})`);
  });

  it('says why it does not come up when its port is taken', async () => {
    const holder = createServer();
    await new Promise<void>((resolve) => holder.listen(port, '127.0.0.1', resolve));

    await expect(launch()).rejects.toThrow(/did not start on port \d+[^]*already in use/);

    holder.close();
  });

  it('is started on the next port when the one wanted is taken', async () => {
    const holder = createServer();
    await new Promise<void>((resolve) => holder.listen(port, '127.0.0.1', resolve));

    const { child, port: chosen } = await launchOnFreePort(database, port);
    servers.push(child);

    expect(chosen).toBeGreaterThan(port);
    holder.close();
  });

  it('lets its user touch no database but its own', async () => {
    await launch();

    await expect(query('CREATE DATABASE another')).rejects.toThrow('Access denied');
  });

  it('takes a new password at the next start', async () => {
    await endProcess(await launch(), 10_000);
    database = { ...database, password: 'another-for-this-test' };

    await launch();

    expect(await query('SELECT 1 AS one')).toEqual([{ one: 1 }]);
  });

  it('shows its password to nobody else on the machine', async () => {
    await launch();

    expect(statSync(join(database.folder, 'init.sql')).mode & 0o777).toBe(0o600);
  });
});
