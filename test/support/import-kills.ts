import type { ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { createConnection } from 'mariadb';

import { endProcess } from '../../server/dev/bound-process.ts';
import { anyFreePort } from '../../server/dev/free-port.ts';
import { databaseUrl, launchMariaDB } from '../../server/dev/private-mariadb.ts';
import { runningProcesses } from '../../server/dev/process-table.ts';
import { ApiClient } from './api-client.ts';
import { launch, listening, type ServerProcess, stop } from './launch-server.ts';

const credentials = { email: 'ada@example.org', password: 'a soldering iron' };
const root = mkdtempSync(join(tmpdir(), 'fallow-kills-'));
const database = {
  folder: join(root, 'database'),
  password: 'kills',
  rights: 'own database',
  durable: true,
} as const;

/** A database, an API process and its worker, of which each can be killed and comes up again. */
export class Mortals {
  private readonly port: number;
  private mariadb: ChildProcess;
  private api: ServerProcess | undefined;
  person!: ApiClient;

  private constructor(port: number, mariadb: ChildProcess) {
    this.port = port;
    this.mariadb = mariadb;
  }

  static async start(): Promise<Mortals> {
    const port = await anyFreePort('127.0.0.1');
    const mortals = new Mortals(port, await launchMariaDB(database, port));
    await mortals.startApi();
    await mortals.person.post('/api/accounts', { ...credentials, name: 'Ada' }).expect(201);
    return mortals;
  }

  async kill(who: 'api' | 'worker' | 'database'): Promise<void> {
    if (who === 'worker') {
      const worker = runningProcesses().find(
        ({ parentPid, command }) =>
          parentPid === this.api?.child.pid &&
          command.some((word) => word.includes('import-worker')),
      );
      if (!worker) throw new Error('There is no worker to kill.');
      process.kill(worker.pid, 'SIGKILL');
      return;
    }
    const child = who === 'api' ? this.api?.child : this.mariadb;
    const gone = new Promise((resolve) => child?.once('exit', resolve));
    child?.kill('SIGKILL');
    await gone;
    if (who === 'database') this.mariadb = await launchMariaDB(database, this.port);
    else {
      await this.startApi();
      await this.person.post('/api/session', credentials).expect(200);
    }
  }

  /** What is stored, as anybody would see it. */
  async stored(): Promise<{ editions: number; stations: number }> {
    const connection = await createConnection(databaseUrl(database, this.port));
    try {
      const [row] = await connection.query<{ editions: bigint; stations: bigint }[]>(
        `SELECT (SELECT COUNT(*) FROM editions WHERE region_id IS NOT NULL) AS editions,
           (SELECT COUNT(*) FROM stations) AS stations`,
      );
      return { editions: Number(row?.editions), stations: Number(row?.stations) };
    } finally {
      await connection.end();
    }
  }

  async end(): Promise<void> {
    if (this.api) await stop(this.api.child);
    await endProcess(this.mariadb, 10_000);
    rmSync(root, { recursive: true, force: true });
  }

  private async startApi(): Promise<void> {
    this.api = launch({
      DATABASE_URL: databaseUrl(database, this.port),
      DATA_DIR: join(root, 'files'),
      LIMIT_SIGN_IN: '1000000',
    });
    this.person = await ApiClient.open((await listening(this.api)).url);
  }
}
