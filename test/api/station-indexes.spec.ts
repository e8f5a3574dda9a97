import { QueryTypes, Sequelize } from 'sequelize';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { type Ordering, type PagedList, pageSql } from '../../server/editions/station-pages.ts';
import { stationQuery } from '../../shared/contracts/station-list.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, importList } from '../support/lists.ts';

let server: ApiServer;
let database: Sequelize;
let list: PagedList;

beforeAll(async () => {
  server = await startApiServer();
  database = new Sequelize(server.databaseUrl, { dialect: 'mariadb', logging: false });
  const person = await server.newcomer();
  const regionId = await addRegion(person);
  await importList(person, regionId, cleanList(3000), 'Another');
  const editionId = await importList(person, regionId, cleanList(3000));
  list = { editionId, stations: 3000, raster: [], corrected: null };
  await database.query('ANALYZE TABLE stations', { type: QueryTypes.SELECT });
});
afterAll(async () => {
  await database.close();
  await server.close();
});

describe('a page of stations', () => {
  it.each<[Ordering['sort'], string, string | number]>([
    ['frequency', 'stations_frequency', 900_000],
    ['name', 'stations_name', 'Radio Vale 2'],
    ['power', 'stations_power', 5000],
  ])('by %s comes from the index alone, deep ones too', async (sort, index, k) => {
    for (const descending of [false, true]) {
      for (const after of [undefined, { k, id: 5 }]) {
        const part = { after, from: 0, count: 100 };
        const { sql, values } = pageSql(list, stationQuery.parse({}), { sort, descending }, part);
        const [plan] = await database.query<{ key: string; Extra: string }>(`EXPLAIN ${sql}`, {
          replacements: values,
          type: QueryTypes.SELECT,
        });

        expect(plan?.key).toBe(index);
        expect(plan?.Extra).toContain('Using index');
        expect(plan?.Extra).not.toContain('filesort');
      }
    }
  });
});
