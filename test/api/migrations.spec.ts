import { describe, expect, it } from 'vitest';
import { QueryTypes } from 'sequelize';

import { connectDatabase } from '../../server/db/connection.ts';
import { migrate, migrateDown } from '../../server/db/migrator.ts';
import { createLogger } from '../../server/logger.ts';
import { freshDatabase } from '../support/database.ts';

describe('the migrations', () => {
  it('go up, all the way down, and up again to the same tables', async () => {
    const { url, drop } = await freshDatabase();
    const database = connectDatabase(url, 3, createLogger('silent'));
    const shape = () =>
      database.query(
        `SELECT table_name, column_name, column_type, is_nullable FROM information_schema.columns
         WHERE table_schema = DATABASE() ORDER BY table_name, ordinal_position`,
        { type: QueryTypes.SELECT },
      );
    const empty = await shape();
    const names = await migrate(database, url);
    const first = await shape();

    await migrateDown(database, url);
    const between = await database.query('SHOW TABLES', { type: QueryTypes.SELECT });
    await migrate(database, url);

    expect(empty).toEqual([]);
    expect(names.length).toBeGreaterThan(3);
    expect(between).toHaveLength(1); // The record of migrations itself.
    expect(await shape()).toEqual(first);
    await database.close();
    await drop();
  });

  it('started by several processes at once, run once', async () => {
    const { url, drop } = await freshDatabase();
    const databases = [1, 2, 3].map(() => connectDatabase(url, 3, createLogger('silent')));

    const done = await Promise.all(databases.map((database) => migrate(database, url)));

    expect(done.filter((names) => names.length > 0)).toHaveLength(1);
    await Promise.all(databases.map((database) => database.close()));
    await drop();
  });
});

describe('the tables', () => {
  it('hold every script, and refuse what does not fit, whatever the server is set to', async () => {
    const { url, drop } = await freshDatabase();
    const database = connectDatabase(url, 3, createLogger('silent'));
    await database.query('ALTER DATABASE CHARACTER SET latin1');
    await migrate(database, url);
    const name = 'Ωmega 🎚 Станция';
    const insert = (text: string) =>
      database.query(
        'INSERT INTO workshops (name, created_at, updated_at) VALUES (?, NOW(), NOW())',
        {
          replacements: [text],
        },
      );

    await insert(name);

    const rows = await database.query('SELECT name FROM workshops', { type: QueryTypes.SELECT });
    expect(rows).toEqual([{ name }]);
    await expect(insert('x'.repeat(161))).rejects.toThrow(/too long/);
    await database.close();
    await drop();
  });
});

describe('the connector', () => {
  it('gives whole hertz, doubles, JSON, times and booleans back as they were', async () => {
    const { url, drop } = await freshDatabase();
    const database = connectDatabase(url, 3, createLogger('silent'));
    await database.query(`CREATE TABLE facts
      (hz INT UNSIGNED, db DOUBLE, shape JSON, at DATETIME(3), is_so BOOLEAN)`);
    await database.query('INSERT INTO facts VALUES (:hz, :db, :shape, :at, :isSo)', {
      replacements: {
        hz: 4_294_967_295,
        db: 0.1 + 0.2,
        shape: '{"a":[1,null]}',
        at: '2026-03-01 12:34:56.789',
        isSo: true,
      },
    });

    const [row] = await database.query('SELECT * FROM facts', { type: QueryTypes.SELECT });

    expect(row).toEqual({
      hz: 4_294_967_295,
      db: 0.1 + 0.2,
      shape: { a: [1, null] },
      at: new Date('2026-03-01T12:34:56.789Z'),
      is_so: 1,
    });
    await database.close();
    await drop();
  });
});
