import { literal, QueryTypes, type Sequelize } from 'sequelize';

import type { Page, PageQuery } from '../../shared/contracts/paging.ts';
import { type DatedRaster, rangesInForce } from '../../shared/contracts/raster.ts';
import type { Region, RegionDraft } from '../../shared/contracts/region.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import { isDeadlock } from '../db/database-faults.ts';
import { inTransaction } from '../db/transaction.ts';
import { type Actor, hasRole } from '../http/actor.ts';
import { ConflictError, NotFoundError } from '../http/errors.ts';
import { RegionModel } from './region-model.ts';

const EDITIONS = literal('(SELECT COUNT(*) FROM editions WHERE editions.region_id = Region.id)');

/** Keeps the regions of a workshop. */
export class Regions {
  private readonly database: Sequelize;

  constructor(database: Sequelize) {
    this.database = database;
    RegionModel.register(database);
  }

  async list(actor: Actor, { page, pageSize }: PageQuery): Promise<Page<Region>> {
    const { workshopId } = actor;
    const rows = await RegionModel.findAll({
      attributes: { include: [[EDITIONS, 'editions']] },
      where: { workshopId },
      order: [
        ['name', 'ASC'],
        ['id', 'ASC'],
      ],
      limit: pageSize,
      offset: (page - 1) * pageSize,
    });
    const total = await RegionModel.count({ where: { workshopId } });
    return { items: rows.map((row) => toRegion(actor, row)), total };
  }

  async get(actor: Actor, id: number): Promise<Region> {
    return toRegion(actor, await find(actor, id));
  }

  /** The raster in force, for work done in nobody's name; empty where the region is gone. */
  async rasterOf(id: number): Promise<Region['raster']> {
    const row = await RegionModel.findByPk(id);
    return row ? rangesToday(row.rasters) : [];
  }

  /** The workshop's regions by id, for what belongs to them. */
  async byId(actor: Actor): Promise<ReadonlyMap<number, Region>> {
    const rows = await RegionModel.findAll({ where: { workshopId: actor.workshopId } });
    return new Map(rows.map((row) => [row.id, toRegion(actor, row)]));
  }

  async add(actor: Actor, draft: RegionDraft): Promise<Region> {
    const row = await RegionModel.create({ workshopId: actor.workshopId, ...filled(draft) });
    return this.get(actor, row.id);
  }

  async change(actor: Actor, id: number, draft: RegionDraft): Promise<Region> {
    await this.whileFree(actor, id, (row) => row.update(filled(draft, row)));
    return this.get(actor, id);
  }

  /**
   * Removes the region; its editions are gone at once, their many stations are cleared bit by bit.
   * Plans keep what they were judged against.
   */
  async remove(actor: Actor, id: number): Promise<void> {
    await this.whileFree(actor, id, async (row) => {
      await this.database.query('UPDATE editions SET region_id = NULL WHERE region_id = ?', {
        replacements: [id],
        type: QueryTypes.UPDATE,
      });
      await row.destroy();
    });
  }

  /** An import in progress holds the region; waiting for it could take as long as the import. */
  private async whileFree(
    actor: Actor,
    id: number,
    work: (row: RegionModel) => Promise<unknown>,
  ): Promise<void> {
    await inTransaction(this.database, async () => {
      const row = await find(actor, id);
      try {
        await this.database.query('SELECT id FROM regions WHERE id = ? FOR UPDATE NOWAIT', {
          replacements: [id],
          type: QueryTypes.SELECT,
        });
      } catch (error) {
        if (!isDeadlock(error)) throw error;
        throw new ConflictError(
          'A list is being stored in this region. Wait for it, or cancel it.',
        );
      }
      await work(row);
    });
  }
}

async function find({ workshopId }: Actor, id: number): Promise<RegionModel> {
  const row = await RegionModel.findOne({
    attributes: { include: [[EDITIONS, 'editions']] },
    where: { id, workshopId },
  });
  if (!row) throw new NotFoundError('region', id);
  return row;
}

/** A region without a raster of its own has the ITU Region's; what it has stays unless that changes. */
function filled({ name, ituRegion, raster, rasters }: RegionDraft, before?: RegionModel) {
  const usual = before?.ituRegion === ituRegion ? before.rasters : always(defaultRaster(ituRegion));
  const given = rasters ?? (raster ? always(raster) : usual);
  const byDate = [...given].sort((a, b) => (a.from ?? '').localeCompare(b.from ?? ''));
  return { name, ituRegion, rasters: byDate };
}

const always = (ranges: DatedRaster['ranges']): DatedRaster[] => [{ from: null, ranges }];

const rangesToday = (rasters: readonly DatedRaster[]): DatedRaster['ranges'] =>
  rangesInForce(rasters, new Date().toISOString().slice(0, 10));

function toRegion(actor: Actor, row: RegionModel): Region {
  const { id, name, ituRegion, rasters } = row;
  return {
    id,
    name,
    ituRegion,
    raster: rangesToday(rasters),
    rasters,
    editable: hasRole(actor, 'librarian'),
    editions: Number(row.get('editions') ?? 0),
  };
}
