import { randomUUID } from 'node:crypto';

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
import {
  cancel,
  claimCheck,
  dropCheck,
  failExpired,
  finishCheck,
  layOut,
  undo,
} from './import-claims.ts';
import { ImportModel } from './import-model.ts';
import { toProposal, toState } from './import-answers.ts';
import { checkList } from './list-check.ts';
import { proposeList } from './list-proposal.ts';
import type { ListReading } from './list-reading.ts';
import { rejectedRows } from './list-rejects.ts';
import { type EditionMarks, tallyBeside } from './list-tally.ts';
import { busy } from './import-busy.ts';
import type { Commits } from './commits.ts';
import type { ReceivedFile, Uploads } from './uploads.ts';

/** What the imports need of the regions. */
interface RegionRegister {
  get(actor: Actor, id: number): Promise<Region>;
}

/** What the imports need of the editions. */
interface EditionStore extends EditionMarks {
  latest(regionId: number): Promise<number | null>;
  named(id: number, regionId: number): Promise<{ id: number; label: string; date: string } | null>;
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
  private readonly commits: Pick<Commits, 'begin'>;

  constructor(
    database: Sequelize,
    regions: RegionRegister,
    editions: EditionStore,
    uploads: Uploads,
    commits: Pick<Commits, 'begin'>,
  ) {
    this.database = database;
    this.regions = regions;
    this.editions = editions;
    this.uploads = uploads;
    this.commits = commits;
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

  /** Reads the whole file by the asked matching and says what storing it would do. */
  async check(
    actor: Actor,
    regionId: number,
    id: number,
    asked: ImportMatching,
  ): Promise<ImportCheck> {
    const row = await this.find(actor, regionId, id);
    const path = this.uploads.path(row.storedName);
    const order = await checkOrder(this.editions, path, row, asked, await this.today());
    const worker = randomUUID();
    if (!(await claimCheck(id, worker))) throw busy(await this.find(actor, regionId, id));
    try {
      const { raster } = await this.regions.get(actor, regionId);
      const { baseEditionId, ...found } = await this.compare(row, order.reading, raster);
      const isKept = await finishCheck(id, worker, {
        ...order,
        counts: found.rows,
        faults: found.faults,
        findings: { causes: found.causes, remarks: found.remarks },
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
    await this.commits.begin(await this.find(actor, regionId, id));
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

  private async find(actor: Actor, regionId: number, id: number): Promise<ImportModel> {
    await this.regions.get(actor, regionId);
    await failExpired();
    const row = await ImportModel.findOne({ where: { id, regionId } });
    if (!row) throw new NotFoundError('import', id);
    return row;
  }

  private async compare(row: ImportModel, reading: ListReading, raster: Region['raster']) {
    const baseEditionId = await this.editions.latest(row.regionId);
    const tally = await tallyBeside(this.editions, reading, baseEditionId, raster);
    const found = await checkList(this.uploads.path(row.storedName), reading, tally);
    return { ...found, baseEditionId };
  }

  private async today(): Promise<string> {
    const [row] = await this.database.query<{ today: string }>(
      "SELECT DATE_FORMAT(NOW(), '%Y-%m-%d') AS today",
      { type: QueryTypes.SELECT },
    );
    return row?.today ?? '';
  }
}
