import compression from 'compression';
import express, { type Express } from 'express';
import type { Sequelize } from 'sequelize';

import { accountRoutes } from './accounts/account-routes.ts';
import { assessmentRoutes } from './assessments/assessment-routes.ts';
import type { Config } from './config.ts';
import { cureRoutes } from './cures/cure-routes.ts';
import { correctionRoutes } from './editions/correction-routes.ts';
import { editionRoutes } from './editions/edition-routes.ts';
import { fieldStrengthRoutes } from './field-strengths/field-strength-routes.ts';
import { authentication } from './http/authentication.ts';
import { client } from './http/client.ts';
import { UnknownPathError } from './http/errors.ts';
import { health } from './http/health.ts';
import { problemHandler } from './http/problem-handler.ts';
import { requestLog } from './http/request-log.ts';
import type { Route } from './http/route.ts';
import { routerOf } from './http/router.ts';
import { secretAddress, securityHeaders } from './http/security-headers.ts';
import { xsrf } from './http/xsrf.ts';
import { importRoutes } from './imports/import-routes.ts';
import type { Logger } from './logger.ts';
import { docsFiles } from './openapi/docs-files.ts';
import { withDescription } from './openapi/openapi-routes.ts';
import { planRoutes } from './plans/plan-routes.ts';
import { sharedPlanRoutes } from './plans/shared-plan-routes.ts';
import { receiverRoutes } from './receivers/receiver-routes.ts';
import { regionRoutes } from './regions/region-routes.ts';
import type { Services } from './services.ts';
import { sessionCookie } from './sessions/session-door.ts';
import { sessionRoutes } from './sessions/session-routes.ts';
import { siteRoutes } from './sites/site-routes.ts';
import { trackingRoutes } from './tracking/tracking-routes.ts';
import { trapRoutes } from './traps/trap-routes.ts';
import { whistleRoutes } from './whistles/whistle-routes.ts';
import { workshopRoutes } from './workshops/workshop-routes.ts';

/** Every operation of the API. A resource is mounted by adding its rows here. */
export function apiRoutes(services: Services): Route[] {
  const { accounts, door, limits, members, receivers, sessions, sites, workshops } = services;
  const { assessments, editions, engine, fieldStrengths, imports, regions, uploads } = services;
  return [
    ...accountRoutes(accounts, door, limits),
    ...sessionRoutes(sessions, door, accounts, limits),
    ...workshopRoutes(workshops, members),
    ...receiverRoutes(receivers),
    ...siteRoutes(sites),
    ...regionRoutes(regions),
    ...editionRoutes(editions, services),
    ...correctionRoutes(services.corrections),
    ...importRoutes(imports, uploads),
    ...fieldStrengthRoutes(fieldStrengths),
    ...assessmentRoutes(assessments),
    ...cureRoutes(services.cures),
    ...trackingRoutes(engine),
    ...trapRoutes(),
    ...whistleRoutes(services.whistles),
    ...planRoutes(services.plans),
    ...sharedPlanRoutes(services.plans, limits),
  ];
}

/** Assembles the application without opening a port, so tests can drive it in memory. */
export function createApp(
  services: Services,
  database: Pick<Sequelize, 'query'>,
  config: Config,
  log: Logger,
): Express {
  const app = express();
  app.disable('x-powered-by').disable('etag').set('trust proxy', config.TRUSTED_PROXIES);
  app.use(requestLog(log), securityHeaders(config), health(database), compression());
  app.use(['/shared', '/api/shared-plans'], secretAddress);

  app.use('/api', noStore, xsrf(config), authentication(sessionCookie(config), services.sessions));
  const routes = withDescription(apiRoutes(services), sessionCookie(config));
  app.use(routerOf(routes, services), docsFiles());
  app.use('/api', unknownPath);

  app.use(client(config), unknownPath, problemHandler(log));
  return app;
}

const noStore: express.RequestHandler = (_request, response, next) => {
  response.set('Cache-Control', 'no-store');
  next();
};

const unknownPath: express.RequestHandler = () => {
  throw new UnknownPathError();
};
