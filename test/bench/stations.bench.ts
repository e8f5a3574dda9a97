/**
 * The stations of an edition of 1,000,000 over HTTP, as a librarian reads them: pages of 100 by each
 * order, first and deep, filtered and seen from a site; two editions of 100,000 compared; and undoing.
 */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { type Connection, createConnection } from 'mariadb';

import { endProcess } from '../../server/dev/bound-process.ts';
import { anyFreePort } from '../../server/dev/free-port.ts';
import { databaseUrl, launchMariaDB } from '../../server/dev/private-mariadb.ts';
import { ApiClient } from '../support/api-client.ts';
import { launch, listening, stop } from '../support/launch-server.ts';
import { held, told, type Verdict } from './measure.ts';

const LONG = Number(process.env['STATIONS_ROWS'] ?? 1_000_000);
const COMPARED = 100_000;
const TURNS = 20;
const AIM_MS = 60;
/** What depends on a site is reckoned, not looked up: the first answer reads the whole edition. */
const SITE_AIM_MS = 150;

/** Listings that come from an index: whichever page of them is read. */
const LISTINGS = [
  ['by frequency', ''],
  ['by name', 'sort=name'],
  ['by power', 'sort=power'],
  ['by name, descending', 'sort=name&direction=desc'],
  ['between two frequencies', 'fromHz=600000&toHz=700000'],
  ['of one frequency', 'search=909 kHz'],
  ['by name, off the raster', 'sort=name&only=off-raster'],
] as const;

interface Club {
  readonly person: ApiClient;
  readonly connection: Connection;
  readonly regionId: number;
}

/** Milliseconds that something takes. */
async function timed(work: () => PromiseLike<unknown>): Promise<number> {
  const begun = performance.now();
  await work();
  return performance.now() - begun;
}

/** An edition made by the database itself; every tenth station differs with the version. */
async function addEdition({ connection, regionId }: Club, stations: number, version: number) {
  const { insertId } = await connection.query<{ insertId: bigint }>(
    `INSERT INTO editions (region_id, label, date, source, note, stations, created_at, updated_at)
     VALUES (?, ?, ?, 'bench', '', ?, NOW(3), NOW(3))`,
    [regionId, `Edition ${version}`, `2026-01-${String(version).padStart(2, '0')}`, stations],
  );
  await connection.query(
    `INSERT INTO stations (edition_id, name, call_sign, frequency_hz, latitude, longitude,
       power_day_w, power_night_w, hours, note, identity, fingerprint)
     SELECT ?, CONCAT('Radio Vale ', seq * 7919 MOD ?), '', 531000 + 9000 * (seq * 31 MOD 120),
       40 + (seq MOD 20000) / 1000, (seq MOD 17000) / 1000,
       1000 * (1 + seq MOD 50) + IF(seq MOD 10 = 0, ?, 0), 100, '', '', LPAD(seq, 22, '0'),
       LPAD(CONCAT(seq, IF(seq MOD 10 = 0, CONCAT('v', ?), '')), 22, '0')
     FROM seq_1_to_${stations}`,
    [insertId, stations, version, version],
  );
  return Number(insertId);
}

/** A committed import of an edition, which can be undone. */
async function addImport({ connection, regionId }: Club, editionId: number): Promise<string> {
  const { insertId } = await connection.query<{ insertId: bigint }>(
    `INSERT INTO imports (region_id, state, file_name, stored_name, reading, sample, edition_id,
       progress, created_at, updated_at)
     VALUES (?, 'committed', 'bench', UUID(), '{}', '[]', ?, 1, NOW(3), NOW(3))`,
    [regionId, editionId],
  );
  return `/api/regions/${regionId}/imports/${insertId}`;
}

/** The slowest but five in a hundred of several answers to a listing, milliseconds. */
async function p95(person: ApiClient, path: string, pages: (turn: number) => number) {
  const took: number[] = [];
  for (let turn = 0; turn < TURNS; turn++) {
    const page = `${path}&pageSize=100&page=${pages(turn)}`;
    took.push(await timed(() => person.get(page).expect(200)));
  }
  return took.sort((a, b) => a - b)[Math.floor(0.95 * (took.length - 1))] ?? 0;
}

async function pagesOf({ person }: Club, editionId: number): Promise<Verdict[]> {
  const verdicts: Verdict[] = [];
  for (const [name, query] of LISTINGS) {
    const path = `/api/editions/${editionId}/stations?${query}`;
    const { body } = await person.get(`${path}&pageSize=100`).expect(200);
    const last = Math.max(1, Math.floor(body.total / 100));
    const first = await p95(person, path, () => 1);
    const walk = await timed(() => person.get(`${path}&pageSize=100&page=${last}`).expect(200));
    // Anywhere, in no order.
    const deep = await p95(person, path, (turn) => 1 + ((turn * 7919) % last));
    verdicts.push(
      held(`${name}, first page: ${first.toFixed(0)} ms at p95`, first, AIM_MS, 'ms'),
      held(`${name}, any of ${last} pages: ${deep.toFixed(0)} ms at p95`, deep, AIM_MS, 'ms'),
      told(`${name}, the way to the last page for the first time: ${walk.toFixed(0)} ms`),
    );
  }
  return verdicts;
}

async function seenFrom({ person }: Club, editionId: number): Promise<Verdict[]> {
  const site = { name: 'Attic', latitude: 47, longitude: 11, ground: 'average', noise: 'rural' };
  const { body } = await person.post('/api/sites', { ...site, ituRegion: 1 }).expect(201);
  const path = `/api/editions/${editionId}/stations?site=${body.id}&sort=field`;
  const begin = await timed(() => person.get(`${path}&pageSize=100`).expect(200));
  const again = await p95(person, path, (turn) => 1 + turn);
  return [
    told(`by field at a site, reckoned for the first time: ${(begin / 1000).toFixed(1)} s`),
    held(`by field at a site: ${again.toFixed(0)} ms at p95`, again, SITE_AIM_MS, 'ms'),
  ];
}

async function comparing(club: Club): Promise<Verdict[]> {
  const before = await addEdition(club, COMPARED, 2);
  const after = await addEdition(club, COMPARED, 3);
  const path = `/api/editions/${after}/differences?against=${before}`;
  const compare = await timed(() => club.person.get(path).expect(200));
  const again = await p95(club.person, path, (turn) => 1 + turn);
  return [
    held(`two editions of ${COMPARED} compared: ${compare.toFixed(0)} ms`, compare, 3000, 'ms'),
    held(`a page of their differences: ${again.toFixed(0)} ms at p95`, again, AIM_MS, 'ms'),
    ...(await undoing(club, after, COMPARED)),
  ];
}

/** The answer, and how long reads take while the stations are cleared. */
async function undoing(club: Club, editionId: number, stations: number): Promise<Verdict[]> {
  const path = await addImport(club, editionId);
  const undo = await timed(() => club.person.delete(path).expect(204));
  const begun = performance.now();
  const reads: number[] = [];
  for (;;) {
    reads.push(await timed(() => club.person.get('/api/regions').expect(200)));
    const [left] = await club.connection.query<{ id: number }[]>(
      'SELECT id FROM editions WHERE id = ?',
      [editionId],
    );
    if (!left) break;
  }
  const p99 = reads.sort((a, b) => a - b)[Math.floor(0.99 * (reads.length - 1))] ?? 0;
  const cleared = (performance.now() - begun) / 1000;
  return [
    held(`undoing ${stations}: ${undo.toFixed(0)} ms`, undo, 2000, 'ms'),
    held(
      `cleared behind it in ${cleared.toFixed(0)} s, reads meanwhile ${p99.toFixed(0)} ms at p99`,
      p99,
      250,
      'ms',
    ),
  ];
}

async function measure(club: Club): Promise<Verdict[]> {
  let editionId = 0;
  const adding = await timed(async () => {
    editionId = await addEdition(club, LONG, 1);
  });
  return [
    told(`an edition of ${LONG}, made by the database in ${(adding / 1000).toFixed(0)} s`),
    ...(await pagesOf(club, editionId)),
    ...(await seenFrom(club, editionId)),
    ...(await comparing(club)),
    ...(await undoing(club, editionId, LONG)),
  ];
}

/** Measures and answers the lines to print. */
export async function run(): Promise<Verdict[]> {
  const root = mkdtempSync(join(tmpdir(), 'fallow-bench-'));
  const database = {
    folder: join(root, 'database'),
    password: 'bench',
    rights: 'own database',
    durable: true,
  } as const;
  const port = await anyFreePort('127.0.0.1');
  const mariadb = await launchMariaDB(database, port);
  const url = databaseUrl(database, port);
  const api = launch({ DATABASE_URL: url, DATA_DIR: join(root, 'files') });
  try {
    const person = await ApiClient.open((await listening(api)).url);
    const account = { email: 'ada@example.org', name: 'Ada', password: 'a soldering iron' };
    await person.post('/api/accounts', account).expect(201);
    const { body } = await person.post('/api/regions', { name: 'Vale', ituRegion: 1 }).expect(201);
    const connection = await createConnection(url);
    try {
      return await measure({ person, connection, regionId: body.id });
    } finally {
      await connection.end();
    }
  } finally {
    await stop(api.child);
    await endProcess(mariadb, 10_000);
    rmSync(root, { recursive: true });
  }
}
