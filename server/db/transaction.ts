import { AsyncLocalStorage, AsyncResource } from 'node:async_hooks';
import { setTimeout as pause } from 'node:timers/promises';

import { Sequelize } from 'sequelize';

import { isDeadlock } from './database-faults.ts';

const ATTEMPTS = 4;
const scope = new AsyncLocalStorage<Map<string, unknown>>();

// Every query made while a transaction runs joins it, so that no service passes it along.
Sequelize.useCLS({
  bind: (callback: () => void) => AsyncResource.bind(callback),
  run: (callback: () => unknown) => scope.run(new Map(scope.getStore()), callback),
  get: (key: string) => scope.getStore()?.get(key),
  set: (key: string, value: unknown) => scope.getStore()?.set(key, value),
});

/**
 * Runs the work in one transaction, or in the one that runs already. Everything inside is stored
 * or nothing. When two writers block each other the work is run again, whole: it must do nothing
 * but read and write the database.
 */
export async function inTransaction<T>(database: Sequelize, work: () => Promise<T>): Promise<T> {
  if (scope.getStore()?.get('transaction')) return work();
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await database.transaction(work);
    } catch (error) {
      if (attempt === ATTEMPTS || !isDeadlock(error)) throw error;
      await pause(Math.random() * 20 * 2 ** attempt);
    }
  }
}
