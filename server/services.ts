import type { Sequelize } from 'sequelize';

import type { Config } from './config.ts';
import { Idempotency } from './http/idempotency.ts';
import { Limits } from './http/limits.ts';
import type { Logger } from './logger.ts';

/** What the application is made of; one set for each process. */
export interface Services {
  readonly idempotency: Idempotency;
  readonly limits: Limits;
}

/** Builds every service and hands each the others it needs. */
export function createServices(database: Sequelize, config: Config, _log: Logger): Services {
  return {
    idempotency: new Idempotency(database),
    limits: new Limits(database, config),
  };
}
