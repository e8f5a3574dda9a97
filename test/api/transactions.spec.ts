import { QueryTypes, type Sequelize } from 'sequelize';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';

import { connectDatabase } from '../../server/db/connection.ts';
import { inTransaction } from '../../server/db/transaction.ts';
import { createLogger } from '../../server/logger.ts';
import { type FreshDatabase, freshDatabase } from '../support/database.ts';

let fresh: FreshDatabase;
let database: Sequelize;
beforeAll(async () => {
  fresh = await freshDatabase();
  database = connectDatabase(fresh.url, 5, createLogger('silent'));
  await database.query('CREATE TABLE tally (name CHAR(1) PRIMARY KEY, total INT NOT NULL)');
});
beforeEach(() => database.query("REPLACE INTO tally VALUES ('a', 0), ('b', 0)"));
afterAll(async () => {
  await database.close();
  await fresh.drop();
});

const add = (name: string) =>
  database.query('UPDATE tally SET total = total + 1 WHERE name = ?', { replacements: [name] });

const totals = async () =>
  (
    await database.query<{ total: number }>('SELECT total FROM tally ORDER BY name', {
      type: QueryTypes.SELECT,
    })
  ).map(({ total }) => total);

describe('inTransaction', () => {
  it('stores nothing of what fails', async () => {
    const work = inTransaction(database, async () => {
      await add('a');
      throw new Error('second thoughts');
    });

    await expect(work).rejects.toThrow('second thoughts');
    expect(await totals()).toEqual([0, 0]);
  });

  it('inside another is part of it', async () => {
    const work = inTransaction(database, async () => {
      await inTransaction(database, () => add('a'));
      throw new Error('second thoughts');
    });

    await expect(work).rejects.toThrow();
    expect(await totals()).toEqual([0, 0]);
  });

  it('is left when it ends: what follows is stored at once', async () => {
    await inTransaction(database, () => add('a'));
    await add('b');

    expect(await totals()).toEqual([1, 1]);
  });

  it('of two that block each other runs one again, whole', async () => {
    let runs = 0;
    let meet: () => void = () => undefined;
    const bothHold = new Promise<void>((resolve) => {
      meet = resolve;
    });
    const crossing = (first: string, second: string) =>
      inTransaction(database, async () => {
        await add(first);
        runs += 1;
        if (runs === 2) meet();
        await bothHold;
        await add(second);
      });

    await Promise.all([crossing('a', 'b'), crossing('b', 'a')]);

    expect(runs).toBe(3);
    expect(await totals()).toEqual([2, 2]);
  });
});
