/**
 * A list of 100,000 rows from file to committed, against reading it with csv-parse alone and
 * inserting its rows by the connector's batch alone: a ratio in one run. Meanwhile somebody reads
 * at a fixed rate. IMPORT_ROWS=1000000 measures a longer list.
 */
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

import { parse } from 'csv-parse/sync';
import { createConnection } from 'mariadb';

import { endProcess } from '../../server/dev/bound-process.ts';
import { anyFreePort } from '../../server/dev/free-port.ts';
import { databaseUrl, launchMariaDB } from '../../server/dev/private-mariadb.ts';
import { runningProcesses } from '../../server/dev/process-table.ts';
import { ApiClient } from '../support/api-client.ts';
import { launch, listening, type ServerProcess, stop } from '../support/launch-server.ts';
import { held, told, type Verdict } from './measure.ts';

const ROWS = Number(process.env['IMPORT_ROWS'] ?? 100_000);
const READS_EVERY_MS = 20;

const HEADER = 'name,frequency_khz,latitude,longitude,power_day_kw,power_night_kw,note';

/** About 100 bytes a row. */
const list = [
  HEADER,
  ...Array.from(
    { length: ROWS },
    (_, index) =>
      `Radio Vale ${index},${531 + 9 * (index % 120)},${(40 + (index % 20_000) / 1e3).toFixed(4)},` +
      `${(index % 17_000) / 1e3},${1 + (index % 50)},${(index % 5) / 10},` +
      `relayed from the valley for tests number ${index}`,
  ),
].join('\n');

/** Resident set of a process, megabytes. */
const residentMb = (pid: number): number =>
  Number(/^VmRSS:\s*(\d+)/m.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1] ?? 0) / 1024;

/** Processor time a process has taken, seconds; a hundredth is the least that the kernel tells. */
function processorSeconds(pid: number): number {
  const told = readFileSync(`/proc/${pid}/stat`, 'utf8');
  const fields = told.slice(told.lastIndexOf(')') + 2).split(' ');
  return (Number(fields[11]) + Number(fields[12])) / 100;
}

interface Took {
  readonly seconds: number;
  /** Processor time, which others on the machine do not lengthen. */
  readonly processor: number;
}

/** How long something takes, and how much of the processors the named processes need for it. */
async function taken(pids: readonly number[], work: () => Promise<unknown>): Promise<Took> {
  const sum = () => pids.reduce((total, pid) => total + processorSeconds(pid), 0);
  const before = sum();
  const seconds = await timed(work);
  return { seconds, processor: sum() - before };
}

async function timed(work: () => Promise<unknown>): Promise<number> {
  const begun = performance.now();
  await work();
  return (performance.now() - begun) / 1000;
}

/** What the least costs: parsing without judging, and inserting without anything else. */
async function bareSeconds(url: string, pids: readonly number[]) {
  let rows: string[][] = [];
  const parsing = await taken(pids, () => {
    rows = parse(list, { from_line: 2 });
    return Promise.resolve();
  });
  const connection = await createConnection(url);
  try {
    await connection.query('CREATE TABLE bare LIKE stations');
    const inserting = await taken(pids, async () => {
      await connection.beginTransaction();
      for (let at = 0; at < rows.length; at += 2000) {
        const batch = rows.slice(at, at + 2000).map(([name, khz, lat, lon, day, night, note]) => {
          const mark = `${name}`.padEnd(22, '-').slice(0, 22);
          return [name, 1000 * Number(khz), Number(lat), Number(lon), day, night, note, mark, mark];
        });
        await connection.batch(
          `INSERT INTO bare (edition_id, name, call_sign, frequency_hz, latitude, longitude,
             power_day_w, power_night_w, hours, note, identity, fingerprint)
           VALUES (1, ?, '', ?, ?, ?, ?, ?, '', ?, ?, ?)`,
          batch,
        );
      }
      await connection.commit();
    });
    await connection.query('DROP TABLE bare');
    return { parsing, inserting };
  } finally {
    await connection.end();
  }
}

/** Reads at a fixed rate until told to stop; answers how long each took, in order. */
function readMeanwhile(person: ApiClient, path: string) {
  const tookMs: number[] = [];
  const end = new AbortController();
  const reading = (async () => {
    const underWay: Promise<void>[] = [];
    while (!end.signal.aborted) {
      const begun = performance.now();
      underWay.push(
        person.get(path).then(() => {
          tookMs.push(performance.now() - begun);
        }),
      );
      await wait(READS_EVERY_MS);
    }
    await Promise.all(underWay);
  })();
  return async (): Promise<readonly number[]> => {
    end.abort();
    await reading;
    return tookMs.sort((a, b) => a - b);
  };
}

/** The API process and its worker. */
const withChildren = (apiPid: number): readonly number[] => [
  apiPid,
  ...runningProcesses()
    .filter(({ parentPid }) => parentPid === apiPid)
    .map(({ pid }) => pid),
];

/** Memory of API and worker, sampled; answers the growth over what they had at first, megabytes. */
function watchMemory(pids: readonly number[]) {
  const sum = () => pids.reduce((total, pid) => total + residentMb(pid), 0);
  const idle = sum();
  let most = idle;
  const timer = setInterval(() => (most = Math.max(most, sum())), 50);
  return () => {
    clearInterval(timer);
    return { idle, growth: most - idle };
  };
}

async function untilState(person: ApiClient, path: string, wanted: string): Promise<void> {
  for (;;) {
    const { body } = await person.get(path);
    if (body.state === wanted) return;
    if (body.state === 'failed') throw new Error(body.reason);
    await wait(50);
  }
}

async function upload(person: ApiClient, regionId: number, content: string): Promise<string> {
  const { body } = await person
    .change('post', `/api/regions/${regionId}/imports`)
    .attach('file', Buffer.from(content), 'vale.csv');
  return `/api/regions/${regionId}/imports/${body.id}`;
}

async function takeIn(
  person: ApiClient,
  regionId: number,
  content: string,
  pids: readonly number[] = [],
) {
  let path = '';
  const uploading = await taken(pids, async () => {
    path = await upload(person, regionId, content);
  });
  const checking = await taken(pids, () => person.put(path, {}).expect(200));
  const storing = await taken(pids, async () => {
    await person.post(`${path}/commit`).expect(202);
    await untilState(person, path, 'committed');
  });
  return { path, uploading, checking, storing };
}

const shown = ({ seconds, processor }: Took): string =>
  `${seconds.toFixed(2)} s (${processor.toFixed(2)} s)`;

const sumOf = (parts: readonly Took[], what: keyof Took): number =>
  parts.reduce((sum, part) => sum + part[what], 0);

async function measure(url: string, api: ServerProcess, mariadbPid: number): Promise<Verdict[]> {
  const person = await ApiClient.open((await listening(api)).url);
  await person.post('/api/accounts', {
    email: 'ada@example.org',
    name: 'Ada',
    password: 'a soldering iron',
  });
  const { body: region } = await person.post('/api/regions', { name: 'Vale', ituRegion: 1 });
  // A short list first: the worker is awake, as it is after a club's first upload.
  await takeIn(person, region.id, list.split('\n').slice(0, 2000).join('\n'));
  const ours = withChildren(api.child.pid ?? 0);
  const all = [...ours, mariadbPid];
  const bare = await bareSeconds(url, [process.pid, mariadbPid]);

  const memory = watchMemory(ours);
  const stopReading = readMeanwhile(person, '/api/regions');
  const { path, uploading, checking, storing } = await takeIn(person, region.id, list, all);
  const reads = await stopReading();
  const { idle, growth } = memory();
  const undoing = await timed(() => person.delete(path).expect(204));
  const phases = [uploading, checking, storing];
  const whole = sumOf(phases, 'seconds');
  const alone = [bare.parsing, bare.inserting];
  const ratio = whole / sumOf(alone, 'seconds');
  const processorRatio = sumOf(phases, 'processor') / sumOf(alone, 'processor');
  // Time and memory are meant for 100,000 rows; of a longer list they may grow with it.
  const share100k = Math.max(1, ROWS / 100_000);
  const p99 = reads[Math.floor(0.99 * (reads.length - 1))] ?? 0;
  return [
    told(
      `${ROWS} rows, ${(list.length / 1e6).toFixed(1)} MB, in brackets the processor time: upload ${shown(uploading)}, check ${shown(checking)}, store ${shown(storing)}; alone: csv-parse ${shown(bare.parsing)}, insert ${shown(bare.inserting)}`,
    ),
    held(`file to committed: ${whole.toFixed(2)} s`, whole, 10 * share100k, 's'),
    held(
      `time over csv-parse and insert alone: ${ratio.toFixed(2)} (of processor time, with the reads meanwhile: ${processorRatio.toFixed(2)})`,
      ratio,
      2,
    ),
    held(`${reads.length} reads meanwhile, p99: ${p99.toFixed(0)} ms`, p99, 250, 'ms'),
    held(
      `memory of API and worker: ${idle.toFixed(0)} MB idle, ${growth.toFixed(0)} MB more at most`,
      growth,
      150 * share100k,
      'MB',
    ),
    held(`undo: ${undoing.toFixed(2)} s`, undoing, 2, 's'),
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
    return await measure(url, api, mariadb.pid ?? 0);
  } finally {
    await stop(api.child);
    await endProcess(mariadb, 10_000);
    rmSync(root, { recursive: true });
  }
}
