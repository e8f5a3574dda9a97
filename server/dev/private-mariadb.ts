import type { ChildProcess } from 'node:child_process';
import { readFileSync, rmSync } from 'node:fs';
import { userInfo } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

import { createConnection } from 'mariadb';

import { endProcess, isRunning, spawnBound } from './bound-process.ts';
import {
  DATABASE_NAME,
  DATABASE_USER,
  freeFolder,
  prepareFolder,
  type PrivateDatabase,
} from './database-folder.ts';
import { firstFreePort } from './free-port.ts';
import { findProgram, MARIADB } from './programs.ts';

const HOST = '127.0.0.1';
const READY_WITHIN_MS = 120_000;

/** Time a server may take to write everything down when it is asked to end. */
export const DATABASE_GRACE_MS = 60_000;

/** Address under which the API reaches the private server. */
export function databaseUrl({ password }: PrivateDatabase, port: number): string {
  return `mariadb://${DATABASE_USER}:${password}@${HOST}:${port}/${DATABASE_NAME}`;
}

/** Somebody else listens where the server was to listen. */
class PortTakenError extends Error {}

/**
 * Starts a MariaDB of our own on the first free port at or after the one wanted. A port that was
 * free a moment ago may be taken when the server comes to it: then the next one is tried.
 */
export async function launchOnFreePort(
  database: PrivateDatabase,
  wanted: number,
): Promise<{ readonly child: ChildProcess; readonly port: number }> {
  const port = await firstFreePort(HOST, wanted);
  try {
    return { child: await launchMariaDB(database, port), port };
  } catch (error) {
    if (error instanceof PortTakenError) return launchOnFreePort(database, port + 1);
    throw error;
  }
}

/**
 * Starts a MariaDB of our own on loopback and waits until it answers to our password.
 * @throws {Error} With the end of its log, when it does not come up.
 */
export async function launchMariaDB(
  database: PrivateDatabase,
  port: number,
): Promise<ChildProcess> {
  const program = findProgram(MARIADB.program) ?? MARIADB.program;
  await freeFolder(database.folder);
  prepareFolder(database);
  rmSync(join(database.folder, 'mariadbd.pid'), { force: true });
  const child = spawnBound(program, serverOptions(database, port), { stdio: 'ignore' });
  try {
    await untilReady(child, database, port);
    return child;
  } catch (error) {
    await endProcess(child, DATABASE_GRACE_MS);
    throw error;
  }
}

/** The socket's name is relative to the data folder: a full path may be too long for the system. */
function serverOptions({ folder, durable }: PrivateDatabase, port: number): readonly string[] {
  return [
    '--no-defaults',
    `--user=${userInfo().username}`,
    `--datadir=${folder}`,
    '--socket=mariadbd.sock',
    '--pid-file=mariadbd.pid',
    `--log-error=${join(folder, 'error.log')}`,
    `--init-file=${join(folder, 'init.sql')}`,
    `--bind-address=${HOST}`,
    `--port=${port}`,
    '--skip-name-resolve',
    '--character-set-server=utf8mb4',
    '--collation-server=utf8mb4_unicode_ci',
    '--default-time-zone=+00:00',
    '--local-infile=1',
    '--innodb-buffer-pool-size=256M',
    '--innodb-log-file-size=48M',
    '--max-allowed-packet=64M',
    `--innodb-flush-log-at-trx-commit=${durable ? 1 : 0}`,
  ];
}

async function untilReady(child: ChildProcess, database: PrivateDatabase, port: number) {
  const failed = new Promise<Error>((resolve) => child.once('error', resolve));
  const deadline = Date.now() + READY_WITHIN_MS;
  while (Date.now() < deadline) {
    if (await answers(child, database, port)) return;
    const error = await Promise.race([failed, wait(50)]);
    if (error instanceof Error) throw error;
    if (!isRunning(child)) break;
  }
  const log = logEnd(database.folder);
  const Reason = log.includes('Address already in use') ? PortTakenError : Error;
  throw new Reason(`MariaDB did not start on port ${port}. ${log}`);
}

/** A greeting alone may come from another server on that port: the process and password must fit. */
async function answers(child: ChildProcess, database: PrivateDatabase, port: number) {
  if (readText(join(database.folder, 'mariadbd.pid')).trim() !== String(child.pid)) return false;
  try {
    const connection = await createConnection(databaseUrl(database, port));
    await connection.end();
    return true;
  } catch {
    return false;
  }
}

function logEnd(folder: string): string {
  const path = join(folder, 'error.log');
  return `The end of ${path}:\n${readText(path).trimEnd().split('\n').slice(-15).join('\n')}`;
}

function readText(path: string): string {
  try {
    return readFileSync(path, 'utf8');
  } catch {
    return '';
  }
}
