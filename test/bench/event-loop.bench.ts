/**
 * The whole server over HTTP with an edition of 100,000 stations in a real MariaDB: how long each
 * computation holds the event loop, from reading the request to the last byte of the answer.
 */
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Worker } from 'node:worker_threads';

import type { Sequelize } from 'sequelize';

import { createApp } from '../../server/app.ts';
import { readConfig } from '../../server/config.ts';
import { connectDatabase } from '../../server/db/connection.ts';
import { migrate } from '../../server/db/migrator.ts';
import { createLogger } from '../../server/logger.ts';
import { createServices } from '../../server/services.ts';
import { startDatabaseServer } from '../support/database-server.ts';
import { BENCH_RECEIVER } from '../support/seeded-list.ts';
import { longestHold } from './loop-hold.ts';
import { held, type Verdict } from './measure.ts';

const COUNT = 100_000;
const AIM_MS = 20;
const SITE = { latitude: 47, longitude: -30, ground: 'average', noise: 'rural', ituRegion: 1 };

interface Reply {
  readonly status: number;
  readonly bytes: number;
  readonly ms: number;
  readonly problem: string;
  /** The answer, where it is short. */
  readonly text: string;
}

/** What is asked, in order: the first reads the edition from the database. */
const REQUESTS: readonly (readonly [name: string, path: string, body: object])[] = [
  ['assessment that reads the edition', '/api/assessments', { receiver: BENCH_RECEIVER }],
  ['assessment again', '/api/assessments', { receiver: BENCH_RECEIVER }],
  [
    'assessment, every response wanted',
    '/api/assessments',
    { receiver: BENCH_RECEIVER, leaveOutBetterThan: null, limit: 10_000 },
  ],
  ['field strengths', '/api/field-strengths', { period: 'night' }],
  [
    'candidates',
    '/api/if-candidates',
    { receiver: oneBand(), periods: ['night'], fromHz: 450_000, toHz: 460_000, stepHz: 1000 },
  ],
  ['cures', '/api/cures', { receiver: oneBand(), periods: ['night'] }],
  [
    'breakthrough through a day',
    '/api/breakthrough-hours',
    { receiver: oneBand(), date: '2026-03-20' },
  ],
  ['whistles', '/api/whistles', { receiver: oneBand(), period: 'night', dialHz: 909_000 }],
];

/** Measures and answers the lines to print. */
export async function run(): Promise<Verdict[]> {
  const databaseServer = await startDatabaseServer();
  const folder = mkdtempSync(join(tmpdir(), 'fallow-bench-'));
  const config = readConfig({
    NODE_ENV: 'test',
    DATABASE_URL: databaseServer.url,
    DATA_DIR: folder,
    LIMIT_COMPUTE_ACCOUNT: '1000000',
  });
  const log = createLogger('silent');
  const database = connectDatabase(databaseServer.url, 10, log);
  await migrate(database, databaseServer.url);
  const services = createServices(database, config, log);
  const server = createApp(services, database, config, log).listen(0, '127.0.0.1');
  await once(server, 'listening');
  const client = await openClient(`http://127.0.0.1:${(server.address() as AddressInfo).port}`);
  try {
    const { problem, text } = await ask(client, '/api/regions', { name: 'Bench', ituRegion: 1 });
    if (problem) throw new Error(problem);
    const editionId = await fillEdition(database, (JSON.parse(text) as { id: number }).id);
    return await askAll(client, editionId);
  } finally {
    await client.terminate();
    server.closeAllConnections();
    server.close();
    await services.engine.close();
    await services.passwords.close();
    await database.close();
    await databaseServer.stop();
    rmSync(folder, { recursive: true });
  }
}

async function askAll(client: Worker, editionId: number): Promise<Verdict[]> {
  // What the runtime compiles once for all is not what computing holds up.
  await ask(client, '/api/assessments', {
    site: SITE,
    receiver: BENCH_RECEIVER,
    everyChannelDb: 70,
  });
  const verdicts: Verdict[] = [];
  for (const [name, path, body] of REQUESTS) {
    let reply: Reply | undefined;
    const { holdMs, gapMs } = await longestHold(async () => {
      reply = await ask(client, path, { site: SITE, editionId, ...body });
    });
    if (reply?.status !== 200) throw new Error(`${name}: ${reply?.status} ${reply?.problem}`);
    const size = `${(reply.bytes / 1e6).toFixed(1)} MB in ${reply.ms.toFixed(0)} ms`;
    const text = `${name}, ${size}: loop held ${holdMs.toFixed(1)} ms (clock ${gapMs.toFixed(1)})`;
    verdicts.push(held(text, holdMs, AIM_MS, 'ms'));
  }
  return verdicts;
}

async function openClient(url: string): Promise<Worker> {
  const client = new Worker(new URL('bench-client.mjs', import.meta.url), { workerData: { url } });
  await once(client, 'message');
  return client;
}

async function ask(client: Worker, path: string, body: object): Promise<Reply> {
  client.postMessage({ path, body });
  const [reply] = (await once(client, 'message')) as [Reply];
  return reply;
}

/** Stations on the channels of ITU Region 1 within 3000 km, written by the database itself. */
async function fillEdition(database: Sequelize, regionId: number): Promise<number> {
  await database.query(
    `INSERT INTO editions (id, region_id, label, date, source, note, stations, created_at, updated_at)
     VALUES (1, ${regionId}, 'bench', '2026-03-20', 'bench', '', ${COUNT}, NOW(), NOW())`,
  );
  await database.query(
    `INSERT INTO stations (edition_id, name, call_sign, frequency_hz, latitude, longitude,
       power_day_w, power_night_w, hours, note, identity, fingerprint)
     SELECT 1, CONCAT('Station ', seq), '', 531000 + 9000 * (seq MOD 120),
       47 + 40 * (RAND(seq) - 0.5), -30 + 60 * (RAND(seq + 1000000) - 0.5),
       POW(10, 2 + 3 * RAND(seq + 2000000)), POW(10, 2 + 3 * RAND(seq + 3000000)), '', '',
       LPAD(seq, 22, '0'), LPAD(seq, 22, '0')
     FROM seq_1_to_${COUNT}`,
  );
  return 1;
}

function oneBand(): object {
  return { ...BENCH_RECEIVER, bands: BENCH_RECEIVER.bands.slice(1, 2) };
}
