import { join } from 'node:path';

import type { Sequelize } from 'sequelize';

import { Accounts } from './accounts/accounts.ts';
import { Passwords } from './accounts/passwords.ts';
import { Assessments } from './assessments/assessments.ts';
import { Engine } from './computing/engine.ts';
import { ListsAtSites } from './computing/lists-at-sites.ts';
import type { Config } from './config.ts';
import { Cures } from './cures/cures.ts';
import { EditionWriter } from './editions/edition-writer.ts';
import { Editions } from './editions/editions.ts';
import { FieldStrengths } from './field-strengths/field-strengths.ts';
import { Idempotency } from './http/idempotency.ts';
import { Limits } from './http/limits.ts';
import { Commits } from './imports/commits.ts';
import { Imports } from './imports/imports.ts';
import { Uploads } from './imports/uploads.ts';
import type { Logger } from './logger.ts';
import { PlanShares } from './plans/plan-shares.ts';
import { Plans } from './plans/plans.ts';
import { Receivers } from './receivers/receivers.ts';
import { Regions } from './regions/regions.ts';
import { SessionDoor } from './sessions/session-door.ts';
import { Sessions } from './sessions/sessions.ts';
import { Sites } from './sites/sites.ts';
import { Whistles } from './whistles/whistles.ts';
import { Members } from './workshops/members.ts';
import { Workshops } from './workshops/workshops.ts';

/** What the application is made of; one set for each process. */
export type Services = ReturnType<typeof createServices>;

/** Builds every service and hands each the others it needs. */
export function createServices(database: Sequelize, config: Config, log: Logger) {
  const passwords = new Passwords();
  const workshops = new Workshops(database);
  const accounts = new Accounts(database, passwords, workshops);
  const sessions = new Sessions(database, config, accounts, workshops);
  const regions = new Regions(database);
  const editions = new Editions(database, regions);
  const lists = new ListsAtSites(editions);
  const uploads = new Uploads(join(config.DATA_DIR, 'uploads'));
  const editionWriter = new EditionWriter(database);
  const commits = new Commits(database, editionWriter, uploads, log);
  const engine = new Engine();
  const assessments = new Assessments(lists, engine);
  const receivers = new Receivers(database, accounts);
  const sites = new Sites(database);
  return {
    idempotency: new Idempotency(database),
    limits: new Limits(database, config),
    passwords,
    accounts,
    workshops,
    members: new Members(accounts),
    sessions,
    door: new SessionDoor(sessions, config),
    receivers,
    sites,
    regions,
    editions,
    uploads,
    imports: new Imports(database, regions, editionWriter, uploads, commits),
    commits,
    fieldStrengths: new FieldStrengths(lists, engine),
    cures: new Cures(lists, engine),
    whistles: new Whistles(lists, engine),
    engine,
    assessments,
    plans: new Plans(database, new PlanShares(database), {
      receivers,
      sites,
      editions,
      assessments,
      workshops,
      people: accounts,
    }),
  };
}
