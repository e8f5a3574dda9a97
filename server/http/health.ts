import { Router } from 'express';
import { QueryTypes, type Sequelize } from 'sequelize';

/** `/livez`: the process answers. `/readyz`: it can do its work, which needs the database. */
export function health(database: Pick<Sequelize, 'query'>): Router {
  const router = Router();
  router.get('/livez', (_request, response) => {
    response.json({ status: 'live' });
  });
  router.get('/readyz', async (_request, response) => {
    await database.query('SELECT 1', { type: QueryTypes.SELECT });
    response.json({ status: 'ready' });
  });
  return router;
}
