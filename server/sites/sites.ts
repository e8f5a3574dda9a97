import type { Sequelize } from 'sequelize';

import type { Page, SearchQuery } from '../../shared/contracts/paging.ts';
import type { NamedSite, StoredSite } from '../../shared/contracts/site.ts';
import { containing } from '../db/search.ts';
import { inTransaction } from '../db/transaction.ts';
import { type Actor, mayChange } from '../http/actor.ts';
import { ForbiddenError, NotFoundError } from '../http/errors.ts';
import { SiteModel } from './site-model.ts';

/** Keeps the sites of workshops. A site of another workshop is not there. */
export class Sites {
  private readonly database: Sequelize;

  constructor(database: Sequelize) {
    this.database = database;
    SiteModel.register(database);
  }

  async list(actor: Actor, { page, pageSize, search }: SearchQuery): Promise<Page<StoredSite>> {
    const { rows, count } = await SiteModel.findAndCountAll({
      where: { workshopId: actor.workshopId, name: containing(search) },
      order: [
        ['name', 'ASC'],
        ['id', 'ASC'],
      ],
      limit: pageSize,
      offset: (page - 1) * pageSize,
    });
    return { items: rows.map((row) => toSite(actor, row)), total: count };
  }

  async get(actor: Actor, id: number): Promise<StoredSite> {
    return toSite(actor, await load(actor, id));
  }

  async add(actor: Actor, draft: NamedSite): Promise<StoredSite> {
    const { workshopId, accountId } = actor;
    return toSite(actor, await SiteModel.create({ ...draft, workshopId, ownerId: accountId }));
  }

  async change(actor: Actor, id: number, draft: NamedSite): Promise<StoredSite> {
    return inTransaction(this.database, async () => {
      const row = await loadToChange(actor, id);
      return toSite(actor, await row.update(draft));
    });
  }

  async remove(actor: Actor, id: number): Promise<void> {
    await inTransaction(this.database, async () => (await loadToChange(actor, id)).destroy());
  }
}

async function load({ workshopId }: Actor, id: number, lock = false): Promise<SiteModel> {
  const row = await SiteModel.findOne({ where: { id, workshopId }, lock });
  if (!row) throw new NotFoundError('site', id);
  return row;
}

async function loadToChange(actor: Actor, id: number): Promise<SiteModel> {
  const row = await load(actor, id, true);
  if (mayChange(actor, row.ownerId)) return row;
  throw new ForbiddenError('Only its owner or an admin may change this site.');
}

const toSite = (actor: Actor, row: SiteModel): StoredSite => ({
  id: row.id,
  editable: mayChange(actor, row.ownerId),
  name: row.name,
  latitude: row.latitude,
  longitude: row.longitude,
  ground: row.ground,
  noise: row.noise,
  indoors: row.indoors,
  noiseFloorDb: row.noiseFloorDb,
  ituRegion: row.ituRegion,
});
