import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { userInfo } from 'node:os';
import { dirname, join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

import { readProcess, type RunningProcess, runningProcesses } from './process-table.ts';
import { findProgram } from './programs.ts';

/** A MariaDB of our own: where its data are and what its one user is called. */
export interface PrivateDatabase {
  readonly folder: string;
  readonly password: string;
  /** What the user may touch: the product only its own database, tests the whole server. */
  readonly rights: 'own database' | 'whole server';
  /** Whether a committed row survives a power cut; tests trade that for speed. */
  readonly durable: boolean;
}

export const DATABASE_NAME = 'fallow';
export const DATABASE_USER = 'fallow';

const OWNER_GRACE_MS = 30_000;

/** Makes the data folder when it is missing, and writes what the server is to do when it starts. */
export function prepareFolder(database: PrivateDatabase): void {
  if (!existsSync(database.folder)) initialise(database.folder);
  writeFileSync(join(database.folder, 'init.sql'), startStatements(database), { mode: 0o600 });
}

/** Built beside its place and moved there whole, so that an interrupted start leaves no half. */
function initialise(folder: string): void {
  const half = `${folder}.new`;
  rmSync(half, { recursive: true, force: true });
  mkdirSync(dirname(folder), { recursive: true, mode: 0o700 });
  const { status, stderr, stdout } = spawnSync(
    findProgram('mariadb-install-db') ?? 'mariadb-install-db',
    [
      '--no-defaults',
      `--user=${userInfo().username}`,
      `--datadir=${half}`,
      '--auth-root-authentication-method=socket',
      '--skip-test-db',
      '--skip-name-resolve',
      '--innodb-log-file-size=48M',
    ],
    { encoding: 'utf8' },
  );
  if (status !== 0) {
    throw new Error(`MariaDB could not make its data folder ${folder}:\n${stderr || stdout}`);
  }
  renameSync(half, folder);
}

/** One statement a line, as the server wants it. The password holds no character to escape. */
function startStatements({ password, rights }: PrivateDatabase): string {
  const user = `'${DATABASE_USER}'@'127.0.0.1'`;
  const scope = rights === 'whole server' ? '*.*' : `${DATABASE_NAME}.*`;
  return [
    `CREATE DATABASE IF NOT EXISTS ${DATABASE_NAME};`,
    `CREATE USER IF NOT EXISTS ${user} IDENTIFIED BY '${password}';`,
    `ALTER USER ${user} IDENTIFIED BY '${password}';`,
    `GRANT ALL PRIVILEGES ON ${scope} TO ${user};`,
    '',
  ].join('\n');
}

/**
 * Makes sure that no other server works on the folder: one left behind by a start that was killed
 * is ended, one whose start still runs is respected.
 * @throws {Error} Naming the process that holds the folder.
 */
export async function freeFolder(folder: string): Promise<void> {
  for (const owner of ownersOf(folder)) {
    const parent = readProcess(owner.parentPid);
    if (parent?.program === 'node') {
      throw new Error(
        `${folder} is in use: Fallow runs already (process ${parent.pid}). Stop that one first.`,
      );
    }
    await endOwner(owner, folder);
  }
}

function ownersOf(folder: string): readonly RunningProcess[] {
  return runningProcesses().filter(
    (found) => found.program === 'mariadbd' && found.command.includes(`--datadir=${folder}`),
  );
}

async function endOwner({ pid }: RunningProcess, folder: string): Promise<void> {
  try {
    process.kill(pid, 'SIGTERM');
  } catch {
    // Gone already, or not ours to end: the wait below tells which.
  }
  const deadline = Date.now() + OWNER_GRACE_MS;
  while (ownersOf(folder).some((owner) => owner.pid === pid)) {
    if (Date.now() > deadline) {
      throw new Error(`${folder} is in use by the MariaDB process ${pid}, which does not end.`);
    }
    await wait(100);
  }
}
