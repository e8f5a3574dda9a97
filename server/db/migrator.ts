import { readdir } from 'node:fs/promises';

import type { Sequelize } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';

import { underDatabaseLock } from './database-lock.ts';

const FOLDER = new URL('./migrations/', import.meta.url);

/** Runs one SQL statement. */
export type Run = (sql: string) => Promise<unknown>;

/** What every file in `migrations/` exports. */
export interface Migration {
  readonly up: (run: Run) => Promise<void>;
  readonly down: (run: Run) => Promise<void>;
}

async function createMigrator(database: Sequelize): Promise<Umzug<Run>> {
  const names = (await readdir(FOLDER)).filter((name) => /^\d{12}-.+\.(ts|js)$/.test(name)).sort();
  const load = (name: string) => import(new URL(name, FOLDER).href) as Promise<Migration>;
  return new Umzug<Run>({
    migrations: names.map((name) => ({
      name: name.replace(/\.(ts|js)$/, ''),
      up: async ({ context }) => (await load(name)).up(context),
      down: async ({ context }) => (await load(name)).down(context),
    })),
    // Umzug calls a function to get the context, and the context here is a function itself.
    context: () => (sql: string) => database.query(sql),
    storage: new SequelizeStorage({ sequelize: database, tableName: 'migrations' }),
    logger: undefined,
  });
}

/** Brings the tables up to date; two processes starting at once take turns. */
export async function migrate(database: Sequelize, url: string): Promise<string[]> {
  return underDatabaseLock(url, 'migrate', async () => {
    const done = await (await createMigrator(database)).up();
    return done.map(({ name }) => name);
  });
}

/** Takes back every migration after the named one, or all of them. */
export async function migrateDown(database: Sequelize, url: string, to?: string): Promise<void> {
  await underDatabaseLock(url, 'migrate', async () => {
    await (await createMigrator(database)).down({ to: to ?? 0 });
  });
}
