import {
  literal,
  Op,
  QueryTypes,
  type Sequelize,
  type Transaction,
  UniqueConstraintError,
  type WhereOptions,
} from 'sequelize';

import type { ImportCheck } from '../../shared/contracts/list-import.ts';
import { inTransaction } from '../db/transaction.ts';
import { ImportModel } from './import-model.ts';
import type { Proposed } from './list-proposal.ts';
import type { ListReading } from './list-reading.ts';

/** What a check is to be made by. */
export interface CheckOrder {
  readonly reading: ListReading;
  readonly sample: string[][];
  readonly headerKey: string;
  readonly label: string;
  readonly date: string;
}

/** What a check found. */
export interface CheckResult {
  readonly counts: ImportCheck['rows'];
  readonly faults: ImportCheck['faults'];
  readonly findings: Pick<ImportCheck, 'causes' | 'remarks'>;
  readonly baseEditionId: number | null;
}

/** A worker that dies three times over the same list would do so again. */
const MAX_ATTEMPTS = 3;
const LEASE = literal('NOW(3) + INTERVAL 20 SECOND');
const AT_WORK = ['checking', 'committing'] as const;
const FREE = { worker: null, leaseUntil: null, committingRegionId: null };
/** No worker has it, or the one that had it counts as dead. */
const UNHELD = { [Op.or]: [{ leaseUntil: null }, { leaseUntil: { [Op.lt]: literal('NOW(3)') } }] };

/*
 * A check or a commit is a job that waits in the table until a worker takes it. Every change of
 * state is one conditional UPDATE: of two processes or two librarians only one gets the row. A
 * worker holds a lease by the database's clock; one that dies loses it to the next.
 */

/** Keeps how the file is to be taken apart; what was found by an earlier way is no longer true. */
export const layOut = (id: number, proposed: Proposed): Promise<boolean> =>
  change(
    { ...FREE, ...proposed, state: 'uploaded', counts: null, faults: null, findings: null },
    { id, state: ['uploaded', 'ready', 'failed'] },
  );

/** Asks for a check; false when the import's state does not allow it. */
export const queueCheck = (id: number, order: CheckOrder): Promise<boolean> =>
  change(
    {
      ...FREE,
      ...order,
      state: 'checking',
      attempts: 0,
      counts: null,
      faults: null,
      findings: null,
      progress: 0,
      reason: null,
    },
    { id, state: ['uploaded', 'ready', 'failed'] },
  );

/** Asks for a commit; false when the import's state or another import forbids it. */
export async function queueCommit(id: number, regionId: number): Promise<boolean> {
  try {
    return await change(
      {
        state: 'committing',
        worker: null,
        leaseUntil: null,
        attempts: 0,
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

/** Takes the job that has waited longest; null when none waits. */
export function takeJob(database: Sequelize, worker: string): Promise<ImportModel | null> {
  return inTransaction(database, async () => {
    const [next] = await database.query<{ id: number }>(
      `SELECT id FROM imports
       WHERE state IN ('checking', 'committing') AND attempts < ${MAX_ATTEMPTS}
         AND (lease_until IS NULL OR lease_until < NOW(3))
       ORDER BY updated_at LIMIT 1 FOR UPDATE SKIP LOCKED`,
      { type: QueryTypes.SELECT },
    );
    if (!next) return null;
    const attempts = literal('attempts + 1');
    await ImportModel.update({ worker, leaseUntil: LEASE, attempts }, { where: next });
    return ImportModel.findByPk(next.id);
  });
}

/** Says how far the worker is and that it lives; false when it has lost the import. */
export const beat = (id: number, worker: string, progress: number): Promise<boolean> =>
  change({ progress, leaseUntil: LEASE }, { id, worker, state: AT_WORK }, null);

export const finishCheck = (id: number, worker: string, result: CheckResult): Promise<boolean> =>
  change({ ...FREE, ...result, state: 'ready', progress: 0 }, { id, worker, state: 'checking' });

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

/** A check that cannot be finished leaves the import as it was uploaded. */
export const failCheck = (where: { id: number; worker: string }, reason: string) =>
  change({ ...FREE, state: 'uploaded', reason }, { ...where, state: 'checking' });

export const failCommit = (where: { id: number; worker: string }, reason: string) =>
  change({ ...FREE, state: 'failed', reason }, { ...where, state: 'committing' });

/** Leaves a job to the next worker; one that was only told to stop has not failed at it. */
export const giveBack = (id: number, worker: string, isStopped: boolean): Promise<boolean> =>
  change(
    {
      worker: null,
      leaseUntil: null,
      ...(isStopped && { attempts: literal('attempts - 1') }),
    },
    { id, worker, state: AT_WORK },
  );

/** The worker is known to be dead: its jobs need not wait until their leases end. */
export const releaseJobsOf = (worker: string): Promise<boolean> =>
  change({ worker: null, leaseUntil: null }, { worker, state: AT_WORK });

/** Ends the jobs that no worker has survived. */
export async function failHopeless(): Promise<void> {
  const hopeless = { ...UNHELD, attempts: { [Op.gte]: MAX_ATTEMPTS } };
  const again = 'was stopped each time. Nothing was stored';
  await change(
    { ...FREE, state: 'failed', reason: `Storing the list ${again}; commit it again.` },
    { state: 'committing', ...hopeless },
  );
  await change(
    { ...FREE, state: 'uploaded', reason: `Checking the list ${again}; check it again.` },
    { state: 'checking', ...hopeless },
  );
}

/** Whether there is a job that a worker could take. */
export async function hasWaitingJobs(): Promise<boolean> {
  const attempts = { [Op.lt]: MAX_ATTEMPTS };
  return (await ImportModel.count({ where: { state: AT_WORK, attempts, ...UNHELD } })) > 0;
}

/** Cancels what is not committed; a worker that is at it notices and takes everything back. */
export const cancel = (id: number): Promise<boolean> =>
  change(
    { ...FREE, state: 'cancelled', faults: null },
    { id, state: ['uploaded', 'checking', 'ready', 'committing', 'failed'] },
  );

/** Part of the transaction that hides the edition. */
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
