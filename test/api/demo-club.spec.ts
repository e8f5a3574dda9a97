import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { connectDatabase } from '../../server/db/connection.ts';
import { demoSignIns, loadDemoClub } from '../../server/dev/demo-club.ts';
import { createLogger } from '../../server/logger.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';

const password = 'loudspeaker cloth';
let server: ApiServer;
const load = async () => {
  const database = connectDatabase(server.databaseUrl, 3, createLogger('silent'));
  await loadDemoClub(server.services, database, password);
  await database.close();
};

beforeAll(async () => {
  server = await startApiServer();
  await load();
});
afterAll(() => server.close());

describe('the demo club', () => {
  it('has one member, one librarian and one admin, whose sessions begin in it', async () => {
    const signIns = await demoSignIns(server.services, password);

    expect(signIns.map(({ role }) => role)).toEqual(['member', 'librarian', 'admin']);
    for (const { role, email } of signIns) {
      const person = await server.visitor();
      const { body } = await person.post('/api/session', { email, password }).expect(200);
      expect(body.workshop.role).toBe(role);
      expect(body.workshops).toHaveLength(2);
    }
  });

  it('shows everybody its receivers, sites, and regions with their stations', async () => {
    const person = await server.visitor();
    await person.post('/api/session', { email: 'admin@saltpan.example', password }).expect(200);
    const items = async (path: string) => (await person.get(path).expect(200)).body.items;

    expect(await items('/api/receivers')).toHaveLength(3);
    expect((await items('/api/sites')).length).toBeGreaterThan(1);
    const regions = await items('/api/regions');
    expect(regions).toHaveLength(2);
    for (const { id } of regions) {
      const [edition] = await items(`/api/regions/${id}/editions`);
      expect(edition.stations).toBeGreaterThan(150);
    }
  });

  it('is loaded once', async () => {
    await load();

    const { body } = await (await server.newcomer()).get('/api/workshop').expect(200);
    expect(body.id).toBe(5); // The club, three of its people's own, and the newcomer's.
  });

  it('is entered by nobody with another password', async () => {
    expect(await demoSignIns(server.services, 'another password')).toEqual([]);
  });
});
