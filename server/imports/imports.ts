import { AsyncLocalStorage } from 'node:async_hooks';
import { randomUUID } from 'node:crypto';
import { parse } from 'node:path';

import { Op, QueryTypes, type Sequelize } from 'sequelize';

import type {
  ImportCheck,
  ImportMatching,
  ImportProposal,
  ImportState,
} from '../../shared/contracts/list-import.ts';
import type { Page, PageQuery } from '../../shared/contracts/paging.ts';
import type { Region } from '../../shared/contracts/region.ts';
import { inTransaction } from '../db/transaction.ts';
import type { Actor } from '../http/actor.ts';
import { ConflictError, NotFoundError } from '../http/errors.ts';
import type { Logger } from '../logger.ts';
import { askedColumns } from './asked-columns.ts';
import {
  cancel,
  claimCheck,
  claimCommit,
  dropCheck,
  dropCommit,
  failCommit,
  failExpired,
  finishCheck,
  undo,
} from './import-claims.ts';
import { ImportModel } from './import-model.ts';
import { toProposal, toState } from './import-answers.ts';
import { checkList } from './list-check.ts';
import { inspectList, type ListReading } from './list-inspection.ts';
import { rejectedRows } from './list-rejects.ts';
import { type KnownRow, RowTally } from './row-tally.ts';
import { ImportLost, type ListWriter, storeList } from './store-list.ts';
import type { ReceivedFile, Uploads } from './uploads.ts';

/** What the imports need of the regions. */
interface RegionRegister {
  get(actor: Actor, id: number): Promise<Region>;
}

/** What the imports need of the editions. */
interface EditionStore extends ListWriter {
  latest(regionId: number): Promise<number | null>;
  marks(editionId: number): AsyncIterable<readonly KnownRow[]>;
  remove(editionId: number): Promise<void>;
}

const MAX_OPEN = 50;
const KEPT_DAYS = 7;

/** Takes lists in: upload, check, commit as a job, cancel and undo. */
export class Imports {
  private readonly database: Sequelize;
  private readonly regions: RegionRegister;
  private readonly editions: EditionStore;
  private readonly uploads: Uploads;
  private readonly log: Logger;
  /** Runs a job outside the request that began it, and outside that request's transaction. */
  private readonly apart = AsyncLocalStorage.snapshot();
  private readonly jobs = new Set<Promise<void>>();

  constructor(
    database: Sequelize,
    regions: RegionRegister,
    editions: EditionStore,
    uploads: Uploads,
    log: Logger,
  ) {
    this.database = database;
    this.regions = regions;
    this.editions = editions;
    this.uploads = uploads;
    this.log = log;
    ImportModel.register(database);
  }

  /** Refuses an upload before its body is read. */
  async admit(actor: Actor, regionId: number): Promise<void> {
    await this.regions.get(actor, regionId);
    const open = await ImportModel.count({
      where: { regionId, state: ['uploaded', 'checking', 'ready', 'failed'] },
    });
    if (open < MAX_OPEN) return;
    throw new ConflictError(`This region has ${open} open imports. Cancel some first.`);
  }

  async take(regionId: number, file: ReceivedFile): Promise<ImportProposal> {
    try {
      const { reading, sample } = await inspectList(this.uploads.path(file.storedName));
      const row = await ImportModel.create({
        ...file,
        regionId,
        state: 'uploaded',
        reading,
        sample,
        progress: 0,
      });
      return toProposal(row);
    } catch (error) {
      await this.uploads.remove(file.storedName);
      throw error;
    }
  }

  /** The imports of a region, the latest first. */
  async list(
    actor: Actor,
    regionId: number,
    { page, pageSize }: PageQuery,
  ): Promise<Page<ImportState>> {
    await this.regions.get(actor, regionId);
    await failExpired();
    const { rows, count } = await ImportModel.findAndCountAll({
      where: { regionId },
      order: [['id', 'DESC']],
      limit: pageSize,
      offset: (page - 1) * pageSize,
    });
    return { items: rows.map((row) => ({ ...toState(row), faults: [] })), total: count };
  }

  async state(actor: Actor, regionId: number, id: number): Promise<ImportState> {
    return toState(await this.find(actor, regionId, id));
  }

  /** Reads the whole file by the asked matching and says what storing it would do. */
  async check(
    actor: Actor,
    regionId: number,
    id: number,
    asked: ImportMatching,
  ): Promise<ImportCheck> {
    const row = await this.find(actor, regionId, id);
    const columns = askedColumns(row.reading.columns, asked.columns);
    const worker = randomUUID();
    if (!(await claimCheck(id, worker))) throw busy(await this.find(actor, regionId, id));
    try {
      const reading = { ...row.reading, columns };
      const { baseEditionId, ...found } = await this.compare(row, reading);
      const isKept = await finishCheck(id, worker, {
        reading,
        label: asked.label ?? (parse(row.fileName).name.slice(0, 120) || 'List'),
        date: asked.date ?? (await this.today()),
        counts: found.rows,
        faults: found.faults,
        baseEditionId,
      });
      if (!isKept) throw busy(await this.find(actor, regionId, id));
      return found;
    } catch (error) {
      await dropCheck(id, worker);
      throw error;
    }
  }

  /** Begins to store the list; the job goes on when the request is over. */
  async commit(actor: Actor, regionId: number, id: number): Promise<ImportState> {
    const row = await this.find(actor, regionId, id);
    const { counts } = row;
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
    this.begin(row, worker);
    return this.state(actor, regionId, id);
  }

  async rejects(actor: Actor, regionId: number, id: number) {
    const row = await this.find(actor, regionId, id);
    if (!row.counts || row.state === 'cancelled' || row.state === 'undone') {
      throw new ConflictError(
        'There are rejected rows only after a check, and until it is undone.',
      );
    }
    return {
      rows: rejectedRows(this.uploads.path(row.storedName), row.reading),
      delimiter: row.reading.delimiter,
    };
  }

  /** Cancels an import, or undoes it as a whole where it was committed. */
  async remove(actor: Actor, regionId: number, id: number): Promise<void> {
    const row = await this.find(actor, regionId, id);
    const isUndone = await inTransaction(this.database, async () => {
      if (await cancel(id)) return true;
      const { editionId } = await this.find(actor, regionId, id);
      if (!(await undo(id))) return false;
      if (editionId !== null) await this.editions.remove(editionId);
      return true;
    });
    if (isUndone) await this.uploads.remove(row.storedName);
  }

  /** Ends what was left lying: dead workers' imports, old uploads, files without an import. */
  async tidy(): Promise<void> {
    await failExpired();
    const old = await ImportModel.findAll({
      attributes: ['id'],
      where: {
        state: ['uploaded', 'checking', 'ready', 'failed'],
        createdAt: { [Op.lt]: new Date(Date.now() - KEPT_DAYS * 24 * 3_600_000) },
      },
    });
    for (const { id } of old) await cancel(id);
    await this.uploads.sweep(async (names) => {
      const rows = await ImportModel.findAll({
        attributes: ['storedName'],
        where: { storedName: [...names], state: { [Op.notIn]: ['cancelled', 'undone'] } },
      });
      return new Set(rows.map(({ storedName }) => storedName));
    });
  }

  /** Waits for the jobs of this process: a stop lets them finish. */
  async settle(): Promise<void> {
    await Promise.all(this.jobs);
  }

  private async find(actor: Actor, regionId: number, id: number): Promise<ImportModel> {
    await this.regions.get(actor, regionId);
    await failExpired();
    const row = await ImportModel.findOne({ where: { id, regionId } });
    if (!row) throw new NotFoundError('import', id);
    return row;
  }

  private async compare(row: ImportModel, reading: ListReading) {
    const tally = new RowTally();
    const baseEditionId = await this.editions.latest(row.regionId);
    if (baseEditionId !== null) {
      for await (const marks of this.editions.marks(baseEditionId)) tally.know(marks);
    }
    const found = await checkList(this.uploads.path(row.storedName), reading, tally);
    return { ...found, baseEditionId };
  }

  private begin(row: ImportModel, worker: string): void {
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

  private async today(): Promise<string> {
    const [row] = await this.database.query<{ today: string }>(
      "SELECT DATE_FORMAT(NOW(), '%Y-%m-%d') AS today",
      { type: QueryTypes.SELECT },
    );
    return row?.today ?? '';
  }
}

const WORDS: Readonly<Partial<Record<ImportState['state'], string>>> = {
  checking: 'is being checked',
  committing: 'is being stored',
  committed: 'has been stored',
  cancelled: 'was cancelled',
  undone: 'was undone',
};

const busy = ({ state }: ImportModel): ConflictError =>
  new ConflictError(`This import ${WORDS[state] ?? 'has changed'}.`);
