import { Op, QueryTypes, type Sequelize } from 'sequelize';

import type { Page, PageQuery } from '../../shared/contracts/paging.ts';
import { rangesInForce } from '../../shared/contracts/raster.ts';
import type { Edition, EditionChange, Region } from '../../shared/contracts/region.ts';
import { inTransaction } from '../db/transaction.ts';
import type { Actor } from '../http/actor.ts';
import { ConflictError, NotFoundError } from '../http/errors.ts';
import { EditionModel } from './edition-model.ts';
import type { EditionWriter } from './edition-writer.ts';
import { StationModel } from './station-model.ts';

/** What the editions need of the regions they belong to. */
interface RegionRegister {
  get(actor: Actor, id: number): Promise<Region>;
  byId(actor: Actor): Promise<ReadonlyMap<number, Region>>;
}

const NEWEST: [string, string][] = [
  ['date', 'DESC'],
  ['id', 'DESC'],
];

/** Keeps the editions of the regions' lists. */
export class Editions {
  private readonly database: Sequelize;
  private readonly regions: RegionRegister;
  private readonly writer: Pick<EditionWriter, 'hide'>;

  constructor(database: Sequelize, regions: RegionRegister, writer: Pick<EditionWriter, 'hide'>) {
    this.database = database;
    this.regions = regions;
    this.writer = writer;
    EditionModel.register(database);
    StationModel.register(database);
  }

  /** All editions of the workshop, the newest first. */
  async list(actor: Actor, query: PageQuery): Promise<Page<Edition>> {
    return page(await this.regions.byId(actor), query);
  }

  async listOf(actor: Actor, regionId: number, query: PageQuery): Promise<Page<Edition>> {
    const region = await this.regions.get(actor, regionId);
    return page(new Map([[region.id, region]]), query);
  }

  /** The edition; another workshop's is not found. */
  async get(actor: Actor, id: number): Promise<Edition> {
    const { row, region } = await this.find(actor, id);
    return toEdition(row, region);
  }

  /** The edition of the same region that stood before, if any. */
  async before(actor: Actor, { id, regionId, date }: Edition): Promise<Edition | null> {
    const region = await this.regions.get(actor, regionId);
    const isEarlier = { [Op.or]: [{ date: { [Op.lt]: date } }, { date, id: { [Op.lt]: id } }] };
    const row = await EditionModel.findOne({ where: { regionId, ...isEarlier }, order: NEWEST });
    return row && toEdition(row, region);
  }

  async change(actor: Actor, id: number, change: EditionChange): Promise<Edition> {
    const { row, region } = await this.find(actor, id);
    return toEdition(await row.update(change), region);
  }

  /** Takes an edition away at once, its stations in the background; not while a plan names it. */
  async remove(actor: Actor, id: number): Promise<void> {
    await inTransaction(this.database, async () => {
      await this.find(actor, id);
      const plans = await this.plansNaming(id);
      if (plans.length > 0) throw new PlansNameIt(plans);
      await this.writer.hide(id);
    });
  }

  private plansNaming(id: number): Promise<NamingPlan[]> {
    return this.database.query<NamingPlan>(
      `SELECT plans.id, plans.receiver_id AS receiverId, plans.name,
         receivers.name AS receiverName
       FROM plans JOIN receivers ON receivers.id = plans.receiver_id
       WHERE plans.edition_id = ? ORDER BY plans.id LIMIT 20 FOR UPDATE`,
      { replacements: [id], type: QueryTypes.SELECT },
    );
  }

  private async find(actor: Actor, id: number): Promise<{ row: EditionModel; region: Region }> {
    const row = await EditionModel.findByPk(id);
    const region = row && (await this.regions.byId(actor)).get(row.regionId);
    if (!row || !region) throw new NotFoundError('edition', id);
    return { row, region };
  }
}

interface NamingPlan {
  readonly id: number;
  readonly receiverId: number;
  readonly name: string;
  readonly receiverName: string;
}

class PlansNameIt extends ConflictError {
  constructor(plans: readonly NamingPlan[]) {
    const named = plans.map(
      ({ name, receiverName }) => `“${name}” of ${receiverName || 'a receiver without a name'}`,
    );
    super(
      `Plans were judged against this edition: ${named.join(', ')}. Delete them first, or keep it.`,
      'edition-in-plans',
      { plans },
    );
  }
}

async function page(
  regions: ReadonlyMap<number, Region>,
  { page: number, pageSize }: PageQuery,
): Promise<Page<Edition>> {
  const { rows, count } = await EditionModel.findAndCountAll({
    where: { regionId: { [Op.in]: [...regions.keys()] } },
    order: NEWEST,
    limit: pageSize,
    offset: (number - 1) * pageSize,
  });
  return { items: rows.map((row) => toEdition(row, regions.get(row.regionId))), total: count };
}

const toEdition = (row: EditionModel, region: Region | undefined): Edition => ({
  id: row.id,
  regionId: row.regionId,
  regionName: region?.name ?? '',
  label: row.label,
  date: row.date,
  source: row.source,
  note: row.note,
  stations: row.stations,
  raster: rangesInForce(region?.rasters ?? [], row.date),
  editable: region?.editable ?? false,
  createdAt: row.createdAt.toISOString(),
});
