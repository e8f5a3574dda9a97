import { Sequelize } from 'sequelize';

import type { Logger } from '../logger.ts';

/** Opens no connection yet: the pool does, when first asked. */
export function connectDatabase(url: string, connections: number, log: Logger): Sequelize {
  return new Sequelize(url, {
    dialect: 'mariadb',
    timezone: '+00:00',
    logging: (sql, timing) => log.debug({ sql, timing }, 'query'),
    define: { underscored: true },
    dialectOptions: {
      connectTimeout: 1000,
      charset: 'utf8mb4',
      // Whatever the server is set to: a value that does not fit is refused, never cut.
      sessionVariables: { sql_mode: 'TRADITIONAL', innodb_lock_wait_timeout: 10 },
    },
    pool: { max: connections, min: 0, acquire: 5000, idle: 30_000, evict: 5000 },
    retry: { max: 0 },
  });
}
