import { createConnection } from 'mariadb';
import { afterAll, beforeAll, expect, it } from 'vitest';

import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, importList } from '../support/lists.ts';

let server: ApiServer;
beforeAll(async () => {
  server = await startApiServer();
});
afterAll(() => server.close());

interface Plan {
  readonly key: string;
  readonly Extra: string;
}

it('a page of an edition by frequency is read off the index, and nothing is sorted', async () => {
  const librarian = await server.newcomer();
  const editionId = await importList(librarian, await addRegion(librarian), cleanList(3000));
  const connection = await createConnection(server.databaseUrl);
  try {
    await connection.query('ANALYZE TABLE stations');
    const [plan] = await connection.query<Plan[]>(
      `EXPLAIN SELECT id FROM stations WHERE edition_id = ?
       ORDER BY frequency_hz, id LIMIT 100 OFFSET 2000`,
      [editionId],
    );
    expect(plan?.key).toBe('stations_frequency');
    expect(plan?.Extra).toContain('Using index');
    expect(plan?.Extra).not.toContain('filesort');
  } finally {
    await connection.end();
  }
});
