import { literal, Op, type Transaction, UniqueConstraintError, type WhereOptions } from 'sequelize';

import type { ImportCheck } from '../../shared/contracts/list-import.ts';
import { ImportModel } from './import-model.ts';
import type { Proposed } from './list-proposal.ts';
import type { ListReading } from './list-reading.ts';

/** What a check found, with what it was made by. */
export interface CheckResult {
  readonly reading: ListReading;
  readonly sample: string[][];
  readonly headerKey: string;
  readonly label: string;
  readonly date: string;
  readonly counts: ImportCheck['rows'];
  readonly faults: ImportCheck['faults'];
  readonly findings: Pick<ImportCheck, 'causes' | 'remarks'>;
  readonly baseEditionId: number | null;
}

const LEASE = literal('NOW(3) + INTERVAL 20 SECOND');
const EXPIRED = { [Op.lt]: literal('NOW(3)') };
const FREE = { worker: null, leaseUntil: null, committingRegionId: null };

/*
 * Every change of state is one conditional UPDATE: of two processes or two librarians only one gets
 * the row. A worker holds a lease by the database's clock; one that dies loses it.
 */

/** Keeps how the file is to be taken apart; what was found by an earlier way is no longer true. */
export const layOut = (id: number, proposed: Proposed): Promise<boolean> =>
  change(
    { ...FREE, ...proposed, state: 'uploaded', counts: null, faults: null, findings: null },
    { id, state: ['uploaded', 'ready', 'failed'] },
  );

/** Marks the import as being checked; false when its state does not allow it. */
export const claimCheck = (id: number, worker: string): Promise<boolean> =>
  change(
    { state: 'checking', worker, leaseUntil: LEASE },
    {
      id,
      [Op.or]: [
        { state: ['uploaded', 'ready', 'failed'] },
        { state: 'checking', leaseUntil: EXPIRED },
      ],
    },
  );

export const finishCheck = (id: number, worker: string, result: CheckResult): Promise<boolean> =>
  change(
    { ...FREE, ...result, state: 'ready', progress: 0, reason: null },
    { id, worker, state: 'checking' },
  );

/** A check that could not be finished leaves the import as it was uploaded. */
export const dropCheck = (id: number, worker: string): Promise<boolean> =>
  change({ ...FREE, state: 'uploaded', counts: null }, { id, worker, state: 'checking' });

/** Marks the import as being committed; false when its state or another import forbids it. */
export async function claimCommit(id: number, regionId: number, worker: string): Promise<boolean> {
  try {
    return await change(
      {
        state: 'committing',
        worker,
        leaseUntil: LEASE,
        committingRegionId: regionId,
        progress: 0,
        reason: null,
      },
      { id, state: ['ready', 'failed'], counts: { [Op.not]: null } },
    );
  } catch (error) {
    if (error instanceof UniqueConstraintError) return false;
    throw error;
  }
}

/** Gives an import back that was claimed and not begun. */
export const dropCommit = (id: number, worker: string): Promise<boolean> =>
  change({ ...FREE, state: 'ready' }, { id, worker, state: 'committing' });

/** Says how far the worker is and that it lives; false when it has lost the import. */
export const beat = (id: number, worker: string, progress: number): Promise<boolean> =>
  change({ progress, leaseUntil: LEASE }, { id, worker, state: 'committing' }, null);

/** Part of the transaction that stores the edition: both are there or neither. */
export const finishCommit = (
  id: number,
  worker: string,
  editionId: number,
  transaction: Transaction,
): Promise<boolean> =>
  change(
    { ...FREE, state: 'committed', editionId, progress: 1, faults: null },
    { id, worker, state: 'committing' },
    transaction,
  );

export const failCommit = (id: number, worker: string, reason: string): Promise<boolean> =>
  change({ ...FREE, state: 'failed', reason }, { id, worker, state: 'committing' }, null);

/** Imports whose worker died while committing: its transaction is gone, so nothing was stored. */
export const failExpired = (): Promise<boolean> =>
  change(
    {
      ...FREE,
      state: 'failed',
      reason: 'The server stopped while storing the list. Nothing was stored; commit it again.',
    },
    { state: 'committing', leaseUntil: EXPIRED },
  );

/** Cancels what is not committed; a worker that is storing notices and takes everything back. */
export const cancel = (id: number): Promise<boolean> =>
  change(
    { ...FREE, state: 'cancelled', faults: null },
    { id, state: ['uploaded', 'checking', 'ready', 'committing', 'failed'] },
  );

/** Part of the transaction that removes the edition. */
export const undo = (id: number): Promise<boolean> =>
  change({ ...FREE, state: 'undone', editionId: null }, { id, state: 'committed' });

async function change(
  values: Parameters<typeof ImportModel.update>[0],
  where: WhereOptions,
  transaction?: Transaction | null,
): Promise<boolean> {
  const [matched] = await ImportModel.update(values, {
    where,
    ...(transaction !== undefined && { transaction }),
  });
  return matched > 0;
}
