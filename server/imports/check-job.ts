import { stat } from 'node:fs/promises';

import type { ImportCheck } from '../../shared/contracts/list-import.ts';
import type { RasterRange } from '../../shared/radio/station.ts';
import { AddingTally } from './adding-tally.ts';
import { BadListError } from './bad-list-error.ts';
import { type CheckResult, finishCheck } from './import-claims.ts';
import type { ImportModel } from './import-model.ts';
import { checkList, type JudgedRow } from './list-check.ts';
import { type EditionMarks, tallyBeside } from './list-tally.ts';
import { JobLost, type Pulse } from './pulse.ts';
import type { RowTally } from './row-tally.ts';
import { SpoolWriter, type StationValues } from './spool.ts';

type Station = Extract<JudgedRow, { station: unknown }>['station'];

/** What checking needs of the editions. */
export interface CheckedEditions extends EditionMarks {
  latest(regionId: number): Promise<number | null>;
  valuesOf(station: NonNullable<Station>): StationValues;
}

/** What checking needs beside the import. */
export interface CheckTools {
  readonly editions: CheckedEditions;
  readonly uploads: { path(storedName: string): string; spool(storedName: string): string };
  readonly regions: { rasterOf(id: number): Promise<readonly RasterRange[]> };
}

export const MAX_ROWS = 2_000_000;

/** Checks a claimed import; the rows that are good are kept ready for storing. */
export async function runCheck(tools: CheckTools, row: ImportModel, pulse: Pulse): Promise<void> {
  const baseEditionId = await tools.editions.latest(row.regionId);
  const { rows, ...found } = await judgeIntoSpool(tools, row, baseEditionId, pulse);
  const result: CheckResult = {
    counts: rows,
    faults: found.faults,
    findings: { causes: found.causes, remarks: found.remarks },
    baseEditionId,
  };
  if (!(await finishCheck(row.id, row.worker ?? '', result))) throw new JobLost();
}

/** Judges the rows of the list beside an edition and spools the good ones. */
export async function judgeIntoSpool(
  { editions, uploads, regions }: CheckTools,
  row: Pick<ImportModel, 'regionId' | 'storedName' | 'reading'>,
  before: number | null,
  pulse: Pulse,
): Promise<ImportCheck> {
  const path = uploads.path(row.storedName);
  const raster = await regions.rasterOf(row.regionId);
  const tally = await tallyBeside(editions, row.reading, before, raster, () => pulse.beat(0));
  const spool = await SpoolWriter.begin(uploads.spool(row.storedName), row.reading);
  const progress = new ReadProgress(await sizeOf(path), pulse);
  try {
    const check = await checkList(path, row.reading, tally, async ({ judged, bytes }) => {
      for (const one of judged) {
        if ('station' in one && one.station) spool.add(editions.valuesOf(one.station));
      }
      await spool.flush();
      await progress.count(judged.length, bytes);
    });
    await spool.finish(replacedBy(tally));
    return check;
  } catch (error) {
    await spool.giveUp();
    throw error;
  }
}

const replacedBy = (tally: RowTally): readonly number[] =>
  tally instanceof AddingTally ? tally.replaced : [];

/** A file that went away is refused where it is read. */
const sizeOf = (path: string): Promise<number> =>
  stat(path).then(
    ({ size }) => size,
    () => 1,
  );

/** How far through the file the rows have come, told now and then. */
class ReadProgress {
  private readonly size: number;
  private readonly pulse: Pulse;
  private rows = 0;

  constructor(size: number, pulse: Pulse) {
    this.size = size;
    this.pulse = pulse;
  }

  count(rows: number, bytes: number): Promise<void> {
    this.rows += rows;
    if (this.rows <= MAX_ROWS) return this.pulse.beat(bytes / this.size);
    throw new BadListError(
      `The list has more than ${MAX_ROWS} rows. Split it, or leave out what you do not receive.`,
    );
  }
}
