import type { Sequelize } from 'sequelize';

import { Accounts } from './accounts/accounts.ts';
import { Passwords } from './accounts/passwords.ts';
import type { Config } from './config.ts';
import { Idempotency } from './http/idempotency.ts';
import { Limits } from './http/limits.ts';
import type { Logger } from './logger.ts';
import { Receivers } from './receivers/receivers.ts';
import { SessionDoor } from './sessions/session-door.ts';
import { Sessions } from './sessions/sessions.ts';
import { Sites } from './sites/sites.ts';
import { Members } from './workshops/members.ts';
import { Workshops } from './workshops/workshops.ts';

/** What the application is made of; one set for each process. */
export type Services = ReturnType<typeof createServices>;

/** Builds every service and hands each the others it needs. */
export function createServices(database: Sequelize, config: Config, _log: Logger) {
  const passwords = new Passwords();
  const workshops = new Workshops(database);
  const accounts = new Accounts(database, passwords, workshops);
  const sessions = new Sessions(database, config, accounts, workshops);
  return {
    idempotency: new Idempotency(database),
    limits: new Limits(database, config),
    passwords,
    accounts,
    workshops,
    members: new Members(accounts),
    sessions,
    door: new SessionDoor(sessions, config),
    receivers: new Receivers(database, accounts),
    sites: new Sites(database),
  };
}
