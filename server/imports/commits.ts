import { AsyncLocalStorage } from 'node:async_hooks';
import { randomUUID } from 'node:crypto';

import type { Sequelize } from 'sequelize';

import { ConflictError } from '../http/errors.ts';
import type { Logger } from '../logger.ts';
import { busy } from './import-busy.ts';
import { claimCommit, dropCommit, failCommit } from './import-claims.ts';
import { ImportModel } from './import-model.ts';
import { ImportLost, type ListWriter, storeList } from './store-list.ts';
import type { Uploads } from './uploads.ts';

/** What storing lists needs of the editions. */
interface EditionStore extends ListWriter {
  latest(regionId: number): Promise<number | null>;
}

/** Stores checked lists, each as a job of this process that outlives its request. */
export class Commits {
  private readonly database: Sequelize;
  private readonly editions: EditionStore;
  private readonly uploads: Pick<Uploads, 'path'>;
  private readonly log: Logger;
  /** Runs a job outside the request that began it, and outside that request's transaction. */
  private readonly apart = AsyncLocalStorage.snapshot();
  private readonly jobs = new Set<Promise<void>>();

  constructor(
    database: Sequelize,
    editions: EditionStore,
    uploads: Pick<Uploads, 'path'>,
    log: Logger,
  ) {
    this.database = database;
    this.editions = editions;
    this.uploads = uploads;
    this.log = log;
  }

  /**
   * Claims an import and begins to store its list.
   * @throws {ConflictError} If its state, another import or another edition forbids it.
   */
  async begin(row: ImportModel): Promise<void> {
    const { id, regionId, counts } = row;
    if (counts && counts.new + counts.changed + counts.same === 0) {
      throw new ConflictError(
        'No row of the list can be stored. Mend the file and upload it again.',
      );
    }
    const worker = randomUUID();
    if (!(await claimCommit(id, regionId, worker))) throw await this.whyNotCommitted(row);
    if ((await this.editions.latest(regionId)) !== row.baseEditionId) {
      await dropCommit(id, worker);
      throw new ConflictError(
        'Another edition was stored or undone since this list was checked. Check it again.',
        'edition-changed',
      );
    }
    this.start(row, worker);
  }

  /** Waits for the jobs of this process: a stop lets them finish. */
  async settle(): Promise<void> {
    await Promise.all(this.jobs);
  }

  private start(row: ImportModel, worker: string): void {
    const order = {
      id: row.id,
      worker,
      path: this.uploads.path(row.storedName),
      reading: row.reading,
      total: row.counts?.total ?? 1,
      edition: {
        regionId: row.regionId,
        label: row.label ?? row.fileName,
        date: row.date ?? '',
        source: row.fileName,
      },
    };
    const job = this.apart(() => storeList(this.database, this.editions, order))
      .catch((error: unknown) => this.fail(row.id, worker, error))
      .finally(() => this.jobs.delete(job));
    this.jobs.add(job);
  }

  private async fail(id: number, worker: string, error: unknown): Promise<void> {
    if (error instanceof ImportLost) return;
    this.log.error({ error, importId: id }, 'import failed');
    const reason = 'The list could not be stored, and nothing of it was. Commit it again.';
    // A database that is away cannot be told; the lease ends by itself.
    await failCommit(id, worker, reason).catch(() => undefined);
  }

  private async whyNotCommitted(before: ImportModel): Promise<ConflictError> {
    const row = (await ImportModel.findByPk(before.id)) ?? before;
    const isNext = row.state === 'ready' || row.state === 'failed';
    if (isNext && row.counts) {
      return new ConflictError('Another list is being stored in this region. Wait for it.');
    }
    return isNext || row.state === 'uploaded'
      ? new ConflictError('Check the list first: say how its columns are to be read.')
      : busy(row);
  }
}
