import { Op, QueryTypes, type Sequelize } from 'sequelize';

import type {
  ImportCheck,
  ImportLayout,
  ImportMatching,
  ImportProposal,
  ImportState,
} from '../../shared/contracts/list-import.ts';
import type { Page, PageQuery } from '../../shared/contracts/paging.ts';
import type { Region } from '../../shared/contracts/region.ts';
import { inTransaction } from '../db/transaction.ts';
import type { Actor } from '../http/actor.ts';
import { ConflictError, NotFoundError } from '../http/errors.ts';
import { checkOrder, proposeAnew } from './check-order.ts';
import { BadListError } from './bad-list-error.ts';
import { cancel, layOut, queueCheck, queueCommit, undo } from './import-claims.ts';
import { ImportModel } from './import-model.ts';
import { toProposal, toState } from './import-answers.ts';
import { proposeList } from './list-proposal.ts';
import { noRejects, rejectedRows } from './list-rejects.ts';
import { BASE_GONE } from './store-job.ts';
import { busy } from './import-busy.ts';
import type { ImportWatch } from './import-watch.ts';
import type { ImportWorker } from './import-worker.ts';
import type { ReceivedFile, Uploads } from './uploads.ts';

/** What the imports need of the regions. */
interface RegionRegister {
  get(actor: Actor, id: number): Promise<Region>;
  byId(actor: Actor): Promise<ReadonlyMap<number, Region>>;
}

/** What the imports need of the editions. */
interface EditionStore {
  latest(regionId: number): Promise<number | null>;
  named(id: number, regionId: number): Promise<{ id: number; label: string; date: string } | null>;
  hide(editionId: number): Promise<void>;
}

const MAX_OPEN = 20;
const OPEN = ['uploaded', 'checking', 'ready', 'failed'] as const;
const KEPT_DAYS = 7;
const BASE_CHANGED = 'edition-changed';
const NO_FINDINGS = { causes: [], remarks: [] };

/** Takes lists in: upload, check, commit as a job, cancel and undo. */
export class Imports {
  private readonly database: Sequelize;
  private readonly regions: RegionRegister;
  private readonly editions: EditionStore;
  private readonly uploads: Uploads;
  private readonly worker: Pick<ImportWorker, 'wake'>;
  private readonly watch: ImportWatch;

  constructor(
    database: Sequelize,
    regions: RegionRegister,
    editions: EditionStore,
    uploads: Uploads,
    worker: Pick<ImportWorker, 'wake'>,
    watch: ImportWatch,
  ) {
    this.database = database;
    this.regions = regions;
    this.editions = editions;
    this.uploads = uploads;
    this.worker = worker;
    this.watch = watch;
  }

  /** Refuses an upload before its body is read. */
  async admit(actor: Actor, regionId: number): Promise<void> {
    await this.regions.get(actor, regionId);
    const regions = [...(await this.regions.byId(actor)).keys()];
    const open = await ImportModel.count({ where: { regionId: regions, state: OPEN } });
    if (open >= MAX_OPEN) {
      throw new ConflictError(
        `This workshop has ${open} imports that are neither stored nor cancelled. Cancel some first.`,
      );
    }
    this.worker.wake(); // By the time the file is here the worker is awake.
  }

  async take(regionId: number, file: ReceivedFile): Promise<ImportProposal> {
    try {
      const path = this.uploads.path(file.storedName);
      const proposed = await proposeList(this.editions, path, { ...file, regionId });
      const row = await ImportModel.create({
        ...file,
        regionId,
        state: 'uploaded',
        ...proposed,
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

  /** Takes the text of the file apart as asked; answers how it is proposed to be read now. */
  async layOut(
    actor: Actor,
    regionId: number,
    id: number,
    asked: ImportLayout,
  ): Promise<ImportProposal> {
    const row = await this.find(actor, regionId, id);
    const found = await proposeAnew(this.uploads.path(row.storedName), row, asked);
    if (!(await layOut(id, found))) throw busy(await this.find(actor, regionId, id));
    return toProposal(await this.find(actor, regionId, id));
  }

  /** Has the whole file read by the asked matching; answers what storing it would do. */
  async check(
    actor: Actor,
    regionId: number,
    id: number,
    asked: ImportMatching,
  ): Promise<ImportCheck> {
    const before = await this.find(actor, regionId, id);
    const path = this.uploads.path(before.storedName);
    const order = await checkOrder(this.editions, path, before, asked, await this.today());
    if (!(await queueCheck(id, order))) throw busy(await this.find(actor, regionId, id));
    this.worker.wake();
    await this.watch.settled(id);
    const row = await this.find(actor, regionId, id);
    if (row.state === 'uploaded' && row.reason) throw new BadListError(row.reason);
    if (row.state !== 'ready' || !row.counts) throw busy(row);
    return { rows: row.counts, faults: row.faults ?? [], ...(row.findings ?? NO_FINDINGS) };
  }

  /**
   * Has a checked list stored; that goes on when the request is over.
   * @throws {ConflictError} If its state, another import or another edition forbids it.
   */
  async commit(actor: Actor, regionId: number, id: number): Promise<ImportState> {
    const row = await this.find(actor, regionId, id);
    const { counts, reading } = row;
    if (counts && counts.new + counts.changed + counts.same === 0) {
      throw new ConflictError(
        'No row of the list can be stored. Mend the file and upload it again.',
      );
    }
    await inTransaction(this.database, async () => {
      if (!(await queueCommit(id, regionId))) throw await this.whyNotCommitted(row);
      if ((await this.editions.latest(regionId)) !== row.baseEditionId) {
        throw new ConflictError(
          'Another edition was stored or undone since this list was checked. Check it again.',
          BASE_CHANGED,
        );
      }
      const { addsTo } = reading;
      if (addsTo !== null && !(await this.editions.named(addsTo, regionId))) {
        throw new ConflictError(BASE_GONE, BASE_CHANGED);
      }
    });
    this.worker.wake();
    return this.state(actor, regionId, id);
  }

  /** Waits until no worker is at the import any more. */
  settled(id: number): Promise<void> {
    return this.watch.settled(id);
  }

  /** The import whenever it changes, as long as the actor may see it. */
  async changes(actor: Actor, regionId: number, id: number) {
    await this.find(actor, regionId, id);
    return this.watch.follow(id);
  }

  async rejects(actor: Actor, regionId: number, id: number) {
    const row = await this.find(actor, regionId, id);
    if (!row.counts || row.state === 'cancelled' || row.state === 'undone') {
      throw new ConflictError(
        'There are rejected rows only after a check, and until it is undone.',
      );
    }
    const { reading, storedName } = row;
    if (row.counts.rejected === 0)
      return { rows: noRejects(reading), delimiter: reading.delimiter };
    if (!(await this.uploads.has(storedName))) {
      throw new ConflictError(
        `Rejected rows can be downloaded until ${KEPT_DAYS} days after the list was stored.`,
      );
    }
    const rows = rejectedRows(this.uploads.path(storedName), reading);
    return { rows, delimiter: reading.delimiter };
  }

  /** Cancels an import, or undoes it as a whole where it was committed. */
  async remove(actor: Actor, regionId: number, id: number): Promise<void> {
    const row = await this.find(actor, regionId, id);
    const isUndone = await inTransaction(this.database, async () => {
      if (await cancel(id)) return true;
      const { editionId } = await this.find(actor, regionId, id);
      if (!(await undo(id))) return false;
      if (editionId !== null) await this.editions.hide(editionId);
      return true;
    });
    if (!isUndone) return;
    await this.uploads.remove(row.storedName);
    this.worker.wake();
  }

  /** Ends what was left lying: old uploads, files without an import. */
  async tidy(): Promise<void> {
    const long = new Date(Date.now() - KEPT_DAYS * 24 * 3_600_000);
    const old = await ImportModel.findAll({
      attributes: ['id'],
      where: { state: OPEN, createdAt: { [Op.lt]: long } },
    });
    for (const { id } of old) await cancel(id);
    await this.uploads.sweep(async (names) => {
      const kept = [
        { state: [...OPEN, 'committing'] },
        { state: 'committed', updatedAt: { [Op.gte]: long } },
      ];
      const rows = await ImportModel.findAll({
        attributes: ['storedName', 'state'],
        where: { storedName: [...names], [Op.or]: kept },
      });
      return new Map(rows.map(({ storedName, state }) => [storedName, state !== 'committed']));
    });
  }

  private async find(actor: Actor, regionId: number, id: number): Promise<ImportModel> {
    await this.regions.get(actor, regionId);
    const row = await ImportModel.findOne({ where: { id, regionId } });
    if (!row) throw new NotFoundError('import', id);
    return row;
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
