/**
 * Writes lists of invented stations as CSV.
 *
 *     npx tsx server/dev/generate-list.ts --rows 20000 --seed 7 --raster 9 > list.csv
 *     npx tsx server/dev/generate-list.ts --demo        (rewrites the lists in datasets/demo)
 */
import { createWriteStream } from 'node:fs';
import { Readable, type Writable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';

import { stringify } from 'csv-stringify';

import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import { DEMO_LISTS, demoRows } from './demo-lists.ts';
import { COLUMNS, type ListPlan, type ListRow, listRows } from './list-generator.ts';

const MAX_ROWS = 1_000_000;
const DEMO_FOLDER = new URL('../../datasets/demo/', import.meta.url);

/** Streams rows as CSV with a header. */
export function writeList(rows: Iterable<ListRow>, to: Writable): Promise<void> {
  const csv = stringify({ header: true, columns: [...COLUMNS] });
  return pipeline(Readable.from(rows), csv, to, { end: to !== process.stdout });
}

/** A list of any size on the raster of 9 or 10 kHz, over an area of open sea. */
export function plainPlan(rows: number, seed: number, rasterKhz: 9 | 10): ListPlan {
  return {
    seed,
    rows,
    raster: defaultRaster(rasterKhz === 9 ? 1 : 2),
    callPrefix: 'QT',
    area: { south: 30, north: 50, west: -40, east: -15 },
  };
}

async function run(): Promise<void> {
  const { values } = parseArgs({
    options: {
      rows: { type: 'string', default: '20000' },
      seed: { type: 'string', default: '1' },
      raster: { type: 'string', default: '9' },
      demo: { type: 'boolean', default: false },
    },
  });
  if (values.demo) {
    for (const list of DEMO_LISTS) {
      await writeList(demoRows(list), createWriteStream(new URL(list.file, DEMO_FOLDER)));
    }
    return;
  }
  const [rows, seed] = [Number(values.rows), Number(values.seed)];
  if (!Number.isInteger(rows) || rows < 1 || rows > MAX_ROWS) {
    throw new RangeError(`--rows: give a whole number from 1 to ${MAX_ROWS}, not ${values.rows}`);
  }
  if (!Number.isInteger(seed)) throw new RangeError(`--seed: give a whole number`);
  if (values.raster !== '9' && values.raster !== '10') {
    throw new RangeError(`--raster: give 9 or 10, not ${values.raster}`);
  }
  await writeList(listRows(plainPlan(rows, seed, values.raster === '9' ? 9 : 10)), process.stdout);
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  try {
    await run();
  } catch (error) {
    // A reader that has seen enough closes the pipe.
    if (error instanceof Error && 'code' in error && error.code === 'EPIPE') process.exit(0);
    console.error(error instanceof Error ? error.message : error);
    process.exitCode = 1;
  }
}
