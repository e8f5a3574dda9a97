import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';

import type { Sequelize } from 'sequelize';

import { createApp } from './app.ts';
import { type Config, readConfig } from './config.ts';
import { connectDatabase } from './db/connection.ts';
import { underDatabaseLock } from './db/database-lock.ts';
import { migrate } from './db/migrator.ts';
import { startHousekeeping } from './housekeeping.ts';
import { createLogger, type Logger } from './logger.ts';
import { createServices, type Services } from './services.ts';

const DRAIN_MS = 10_000;

/** Says why the process cannot go on, and ends it. */
function giveUp(reason: string): never {
  process.stderr.write(`${reason}\n`);
  process.exit(1);
}

async function main(config: Config, log: Logger): Promise<void> {
  const database = connectDatabase(config.DATABASE_URL, config.DATABASE_CONNECTIONS, log);
  const migrations = await migrate(database, config.DATABASE_URL).catch((error: unknown) => {
    if (!(error instanceof Error && 'code' in error)) throw error;
    return giveUp(`The database named by DATABASE_URL cannot be used: ${error.message}`);
  });
  log.info({ migrations }, 'database ready');

  const services = createServices(database, config, log);
  const demo = await openDemoClub(config, services, database);
  const stopHousekeeping = startHousekeeping(services, log);
  const server = createServer(createApp(services, database, config, log));
  const { port } = await listen(server, config);
  const url = `http://${config.HOST}:${port}`;
  log.info({ url }, 'listening');
  process.send?.({ type: 'listening', url, port, demo });

  stopOnSignal(log, async () => {
    stopHousekeeping();
    await Promise.all([drain(server), services.importWorker.stop()]);
    await services.engine.close();
    await services.passwords.close();
    await database.close();
  });
}

/** Fills an empty database on demand; answers how to enter what it was filled with. */
async function openDemoClub(config: Config, services: Services, database: Sequelize) {
  const { DEMO_CLUB, DEMO_PASSWORD, DATABASE_URL } = config;
  if (!DEMO_CLUB || DEMO_PASSWORD === undefined) return [];
  const { demoSignIns, loadDemoClub } = await import('./dev/demo-club.ts');
  await underDatabaseLock(DATABASE_URL, 'demo', () =>
    loadDemoClub(services, database, DEMO_PASSWORD),
  );
  return demoSignIns(services, DEMO_PASSWORD);
}

function listen(server: Server, { HOST, PORT }: Config): Promise<AddressInfo> {
  return new Promise((resolve) => {
    server.once('error', (error: NodeJS.ErrnoException) => {
      if (error.code === 'EADDRINUSE') {
        giveUp(`PORT ${PORT} of ${HOST} is taken by another program. Set PORT to a free one.`);
      }
      giveUp(`Cannot listen on ${HOST}, port ${PORT}: ${error.message}`);
    });
    server.listen(PORT, HOST, () => resolve(server.address() as AddressInfo));
  });
}

/** Takes no new request and lets those under way end. */
async function drain(server: Server): Promise<void> {
  const insist = setTimeout(() => server.closeAllConnections(), DRAIN_MS);
  await new Promise((resolve) => {
    server.close(resolve);
    server.closeIdleConnections();
  });
  clearTimeout(insist);
}

function stopOnSignal(log: Logger, stop: () => Promise<void>): void {
  let isStopping = false;
  const once = (signal: string) => {
    if (isStopping) return;
    isStopping = true;
    log.info({ signal }, 'stopping');
    stop().then(
      () => process.exit(0),
      (error: unknown) => {
        log.error({ error }, 'could not stop in good order');
        process.exit(1);
      },
    );
  };
  process
    .on('SIGTERM', once)
    .on('SIGINT', once)
    .on('disconnect', () => once('disconnect'));
}

function start(): void {
  let config: Config;
  try {
    config = readConfig(process.env);
  } catch (error) {
    giveUp(error instanceof Error ? error.message : String(error));
  }
  const log = createLogger(config.LOG_LEVEL);
  const fail = (error: unknown) => {
    log.fatal({ error }, 'unexpected failure, ending');
    process.exit(1);
  };
  process.on('uncaughtException', fail).on('unhandledRejection', fail);
  main(config, log).catch(fail);
}

start();
