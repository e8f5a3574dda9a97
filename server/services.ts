import { join } from 'node:path';

import type { Sequelize } from 'sequelize';

import { Accounts } from './accounts/accounts.ts';
import { Passwords } from './accounts/passwords.ts';
import { Assessments } from './assessments/assessments.ts';
import { BoundedCache } from './computing/bounded-cache.ts';
import { Engine } from './computing/engine.ts';
import { ListsAtSites } from './computing/lists-at-sites.ts';
import { StationOrders } from './computing/station-orders.ts';
import type { Config } from './config.ts';
import { Cures } from './cures/cures.ts';
import { EditionModel } from './editions/edition-model.ts';
import { EditionWriter } from './editions/edition-writer.ts';
import { Editions } from './editions/editions.ts';
import { StationModel } from './editions/station-model.ts';
import { FieldStrengths } from './field-strengths/field-strengths.ts';
import { Idempotency } from './http/idempotency.ts';
import { Limits } from './http/limits.ts';
import { failHopeless, hasWaitingJobs } from './imports/import-claims.ts';
import { ImportJobs } from './imports/import-jobs.ts';
import { ImportModel } from './imports/import-model.ts';
import { ImportWatch } from './imports/import-watch.ts';
import type { ImportWorker } from './imports/import-worker.ts';
import { Corrections } from './editions/corrections.ts';
import { EditionDifferences, type KeptDifferences } from './editions/edition-differences.ts';
import { EditionStations } from './editions/edition-stations.ts';
import { EditionVerdicts, type VerdictSources } from './editions/edition-verdicts.ts';
import { StationLists, type StationListSources } from './editions/station-lists.ts';
import { StationPages } from './editions/station-pages.ts';
import { identityOf } from './imports/fingerprint.ts';
import { Imports } from './imports/imports.ts';
import { Uploads } from './imports/uploads.ts';
import { WorkerProcess } from './imports/worker-process.ts';
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

/** What checking and storing lists needs, in whichever process that is done. */
export function createImportTools(database: Sequelize, config: Pick<Config, 'DATA_DIR'>) {
  ImportModel.register(database);
  EditionModel.register(database);
  StationModel.register(database);
  return {
    database,
    regions: new Regions(database),
    editions: new EditionWriter(database),
    uploads: new Uploads(join(config.DATA_DIR, 'uploads')),
  };
}

/** How lists come in, and who does the work: a process of its own, or this one. */
function createImports(database: Sequelize, config: Config, log: Logger, regions: Regions) {
  const tools = createImportTools(database, config);
  const { editions, uploads } = tools;
  const watch = new ImportWatch();
  const onChange = () => watch.look();
  const findWork = async () => {
    await failHopeless();
    return (await hasWaitingJobs()) || editions.hasHidden();
  };
  const importWorker: ImportWorker = config.WORKER_PROCESS
    ? new WorkerProcess(log, findWork, onChange)
    : new ImportJobs(tools, log, onChange);
  const imports = new Imports(database, regions, editions, uploads, importWorker, watch);
  return { uploads, imports, importWorker };
}
/** Listings whose length and stretches are remembered. */
const KEPT_WALKS = 1000;
/** Stations that differ between editions, remembered in all. */
const KEPT_DIFFERENCES = 400_000;

/** Builds every service and hands each the others it needs. */
export function createServices(database: Sequelize, config: Config, log: Logger) {
  const people = peopleOf(database, config);
  const { accounts, workshops } = people;
  const regions = new Regions(database);
  const { lists, ...edited } = editionsOf(database, {
    regions,
    people: accounts,
    writer: new EditionWriter(database),
  });
  const computing = computingOf(lists);
  const receivers = new Receivers(database, accounts);
  const kept = { receivers, sites: new Sites(database), people: accounts };
  const { editions, stations } = edited;
  return {
    idempotency: new Idempotency(database),
    limits: new Limits(database, config),
    ...people,
    receivers,
    sites: kept.sites,
    regions,
    ...edited,
    ...editionViews(database, { editions, stations, lists, engine: computing.engine, ...kept }),
    ...createImports(database, config, log, regions),
    ...computing,
    plans: new Plans(database, new PlanShares(database), {
      editions,
      stations,
      assessments: computing.assessments,
      workshops,
      ...kept,
    }),
  };
}

/** Who works here, and how they come in. */
function peopleOf(database: Sequelize, config: Config) {
  const passwords = new Passwords();
  const workshops = new Workshops(database);
  const accounts = new Accounts(database, passwords, workshops);
  const sessions = new Sessions(database, config, accounts, workshops);
  const door = new SessionDoor(sessions, config);
  return { passwords, workshops, accounts, members: new Members(accounts), sessions, door };
}

/** The engine, and what it computes over a list at a site. */
function computingOf(lists: ListsAtSites) {
  const engine = new Engine();
  return {
    engine,
    assessments: new Assessments(lists, engine),
    fieldStrengths: new FieldStrengths(lists, engine),
    cures: new Cures(lists, engine),
    whistles: new Whistles(lists, engine),
  };
}

/** The editions with what was corrected of them by hand, and the lists that computing takes. */
function editionsOf(
  database: Sequelize,
  { regions, people, writer }: { regions: Regions; people: Accounts; writer: EditionWriter },
) {
  const editions = new Editions(database, regions, writer);
  const corrections = new Corrections(database, { regions, people, identityOf });
  const stations = new EditionStations(editions, corrections);
  return { editions, corrections, stations, lists: new ListsAtSites(stations) };
}

/** What is made of editions: lists by pages, comparisons, verdicts. */
function editionViews(
  database: Sequelize,
  sources: Omit<StationListSources, 'pages' | 'orders'> &
    Omit<VerdictSources, 'differences' | 'stations'> & { readonly editions: Editions },
) {
  const { editions, stations } = sources;
  const kept = new BoundedCache<KeptDifferences>(KEPT_DIFFERENCES);
  const differences = new EditionDifferences(database, editions, stations, kept);
  const pages = new StationPages(database, new BoundedCache(KEPT_WALKS));
  return {
    stationLists: new StationLists({ ...sources, pages, orders: new StationOrders() }),
    differences,
    verdicts: new EditionVerdicts({ ...sources, differences }),
  };
}
