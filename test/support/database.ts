import { randomBytes } from 'node:crypto';

import { createConnection } from 'mariadb';
import { inject } from 'vitest';

export interface FreshDatabase {
  readonly url: string;
  readonly drop: () => Promise<void>;
}

/** An empty database that nobody else uses. Drop it in `afterAll`. */
export async function freshDatabase(): Promise<FreshDatabase> {
  const server = inject('databaseServer');
  const name = `test_${randomBytes(6).toString('hex')}`;
  await execute(server, `CREATE DATABASE ${name}`);
  const url = new URL(server);
  url.pathname = `/${name}`;
  return { url: url.href, drop: () => execute(server, `DROP DATABASE IF EXISTS ${name}`) };
}

async function execute(server: string, statement: string): Promise<void> {
  const connection = await createConnection(server);
  try {
    await connection.query(statement);
  } finally {
    await connection.end();
  }
}
