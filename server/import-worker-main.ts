import { setPriority } from 'node:os';

import { readConfig } from './config.ts';
import { connectDatabase } from './db/connection.ts';
import { ImportJobs } from './imports/import-jobs.ts';
import type { WorkerMessage } from './imports/worker-process.ts';
import { createLogger } from './logger.ts';
import { createImportTools } from './services.ts';

const CONNECTIONS = 4;
const IDLE_MS = 10 * 60_000;
/** Requests come first: storing a list has time. */
const PRIORITY = 5;

/** The process that checks and stores lists, beside the API process that started it. */
function start([id]: readonly string[]): void {
  setPriority(PRIORITY);
  const config = readConfig(process.env);
  const log = createLogger(config.LOG_LEVEL);
  const database = connectDatabase(config.DATABASE_URL, CONNECTIONS, log);
  const tools = createImportTools(database, config);
  const tell = (changed: number) => process.send?.({ changed } satisfies WorkerMessage);
  const jobs = new ImportJobs(tools, log, tell, id);

  const stop = async () => {
    await jobs.stop();
    await database.close();
    process.exit(0);
  };
  const fail = (error: unknown) => {
    log.fatal({ error }, 'import worker failed');
    process.exit(1);
  };
  const end = () => void stop().catch(fail);
  const idle = setInterval(() => jobs.isIdle && end(), IDLE_MS);
  process
    .on('message', () => {
      idle.refresh();
      jobs.wake();
    })
    .on('uncaughtException', fail)
    .on('unhandledRejection', fail)
    // Ctrl-C reaches the whole group of processes; the parent says when it is time.
    .on('SIGINT', () => undefined)
    .on('SIGTERM', end)
    .on('disconnect', end);
}

start(process.argv.slice(2));
