import type { Sequelize, Transaction } from 'sequelize';

import { beat, finishCommit } from './import-claims.ts';
import { judgedRows } from './list-check.ts';
import type { ListReading } from './list-reading.ts';
import { addingTally, type EditionMarks } from './list-tally.ts';
import { type KnownRow, RowTally } from './row-tally.ts';
import type { StationRow } from './station-row.ts';

/** What storing needs of the editions. */
export interface ListWriter extends EditionMarks {
  begin(
    draft: { regionId: number; label: string; date: string; source: string },
    transaction: Transaction,
  ): Promise<number>;
  append(
    editionId: number,
    stations: readonly (StationRow & KnownRow)[],
    transaction: Transaction,
  ): Promise<void>;
  /** Takes over what stays of another edition; answers how many stations the new one has then. */
  keep(
    editionId: number,
    from: number,
    replaced: readonly number[],
    transaction: Transaction,
  ): Promise<number>;
  finish(editionId: number, stations: number, transaction: Transaction): Promise<void>;
}

/** A claimed import: everything that storing it takes. */
export interface StoreOrder {
  readonly id: number;
  readonly worker: string;
  readonly path: string;
  readonly reading: ListReading;
  /** Rows the check counted; measures the progress. */
  readonly total: number;
  readonly edition: { regionId: number; label: string; date: string; source: string };
}

const ROWS_AT_ONCE = 2000;
const BEAT_MS = 500;

/** The worker has lost the import: it was cancelled, or was thought dead. */
export class ImportLost extends Error {}

/**
 * Stores the good rows of a list as a new edition, in one transaction with the import's own state:
 * whatever happens at any moment, both are there or neither is.
 * @throws {ImportLost} If the import was cancelled meanwhile; nothing is stored then.
 */
export async function storeList(
  database: Sequelize,
  writer: ListWriter,
  order: StoreOrder,
): Promise<void> {
  const transaction = await database.transaction();
  try {
    const editionId = await writer.begin(order.edition, transaction);
    const stored = await storeRows(writer, order, editionId, transaction);
    await writer.finish(editionId, stored, transaction);
    if (!(await finishCommit(order.id, order.worker, editionId, transaction))) {
      throw new ImportLost();
    }
    await transaction.commit();
  } catch (error) {
    await transaction.rollback().catch(() => undefined); // The connection may be gone already.
    throw error;
  }
}

/** The rows of the file and, where they add to an edition, what stays of that one. */
async function storeRows(
  writer: ListWriter,
  order: StoreOrder,
  editionId: number,
  transaction: Transaction,
): Promise<number> {
  const { addsTo } = order.reading;
  if (addsTo === null) return copyRows(writer, order, new RowTally(), editionId, transaction);
  const tally = await addingTally(writer, addsTo);
  await copyRows(writer, order, tally, editionId, transaction);
  return writer.keep(editionId, addsTo, tally.replaced, transaction);
}

async function copyRows(
  writer: ListWriter,
  { id, worker, path, reading, total }: StoreOrder,
  tally: RowTally,
  editionId: number,
  transaction: Transaction,
): Promise<number> {
  let batch: (StationRow & KnownRow)[] = [];
  let read = 0;
  let stored = 0;
  let nextBeat = 0;
  for await (const judged of judgedRows(path, reading, tally)) {
    read += 1;
    if ('station' in judged && judged.station) batch.push(judged.station);
    if (batch.length < ROWS_AT_ONCE) continue;
    await writer.append(editionId, batch, transaction);
    stored += batch.length;
    batch = [];
    if (performance.now() < nextBeat) continue;
    nextBeat = performance.now() + BEAT_MS;
    // The last hundredth is the commit itself.
    if (!(await beat(id, worker, Math.min(0.99, read / total)))) throw new ImportLost();
  }
  await writer.append(editionId, batch, transaction);
  return stored + batch.length;
}
