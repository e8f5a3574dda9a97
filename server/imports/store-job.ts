import type { Sequelize, Transaction } from 'sequelize';

import { BadListError } from './bad-list-error.ts';
import { type CheckedEditions, type CheckTools, judgeIntoSpool } from './check-job.ts';
import { finishCommit } from './import-claims.ts';
import type { ImportModel } from './import-model.ts';
import { JobLost, type Pulse } from './pulse.ts';
import { hasSpool, spoolParts, type StationValues } from './spool.ts';

/** What storing needs of the editions. */
export interface ListWriter extends CheckedEditions {
  begin(
    draft: { regionId: number; label: string; date: string; source: string },
    transaction: Transaction,
  ): Promise<number>;
  append(
    editionId: number,
    stations: readonly StationValues[],
    transaction: Transaction,
  ): Promise<void>;
  /**
   * Takes over what stays of another edition; answers how many stations the new one has then, or null
   * where that edition is no longer there.
   */
  keep(
    editionId: number,
    from: number,
    replaced: readonly number[],
    transaction: Transaction,
    beat: () => Promise<void>,
  ): Promise<number | null>;
  finish(editionId: number, stations: number, transaction: Transaction): Promise<void>;
}

/** Why rows cannot be added to an edition that was undone or deleted. */
export const BASE_GONE =
  'The edition that these rows were to complete is no longer there. Check the list again.';

/** What storing needs beside the import. */
export interface StoreTools extends CheckTools {
  readonly database: Sequelize;
  readonly editions: ListWriter;
}

/**
 * Stores the good rows of a claimed import as a new edition, in one transaction with the import's
 * own state: whatever happens at any moment, both are there or neither is.
 * @throws {JobLost} If the import was cancelled meanwhile; nothing is stored then.
 */
export async function runStore(tools: StoreTools, row: ImportModel, pulse: Pulse): Promise<void> {
  const spool = tools.uploads.spool(row.storedName);
  // Another machine may have made the check: what it kept ready is made here again.
  if (!(await hasSpool(spool, row.reading))) await judgeIntoSpool(tools, row, null, pulse);
  const { database, editions } = tools;
  const transaction = await database.transaction();
  try {
    const editionId = await editions.begin(editionOf(row), transaction);
    const stored = await storeSpool(editions, row, spool, editionId, pulse, transaction);
    await editions.finish(editionId, stored, transaction);
    if (!(await finishCommit(row.id, row.worker ?? '', editionId, transaction))) {
      throw new JobLost();
    }
    await transaction.commit();
  } catch (error) {
    await transaction.rollback().catch(() => undefined); // The connection may be gone already.
    throw error;
  }
}

const editionOf = ({ regionId, label, fileName, date }: ImportModel) => ({
  regionId,
  label: label ?? fileName,
  date: date ?? '',
  source: fileName,
});

/** Stores the spool and, where it adds to an edition, what stays of that one. */
async function storeSpool(
  editions: ListWriter,
  { reading, counts }: ImportModel,
  spool: string,
  editionId: number,
  pulse: Pulse,
  transaction: Transaction,
): Promise<number> {
  let stored = 0;
  let replaced: readonly number[] | null = null;
  for await (const part of spoolParts(spool)) {
    if ('replaced' in part) replaced = part.replaced;
    else {
      await editions.append(editionId, part.stations, transaction);
      stored += part.stations.length;
      await pulse.beat(stored / (counts?.total ?? stored));
    }
  }
  if (replaced === null) throw new Error('The spool is gone, or is not whole.');
  const { addsTo } = reading;
  if (addsTo === null) return stored;
  const whole = await editions.keep(editionId, addsTo, replaced, transaction, () => pulse.beat(1));
  if (whole === null) throw new BadListError(BASE_GONE);
  return whole;
}
