import { Op, type Sequelize } from 'sequelize';

import type { Page, PageQuery } from '../../shared/contracts/paging.ts';
import { rangesInForce } from '../../shared/contracts/raster.ts';
import type { Edition, Region } from '../../shared/contracts/region.ts';
import type { ListedStation, StationQuery } from '../../shared/contracts/station-list.ts';
import { nearestChannel } from '../../shared/radio/channels/raster.ts';
import type { Station } from '../../shared/radio/station.ts';
import type { Actor } from '../http/actor.ts';
import { NotFoundError } from '../http/errors.ts';
import { EditionModel } from './edition-model.ts';
import { StationModel } from './station-model.ts';
import { matchesSearch } from './station-search.ts';

/** What the editions need of the regions they belong to. */
interface RegionRegister {
  get(actor: Actor, id: number): Promise<Region>;
  byId(actor: Actor): Promise<ReadonlyMap<number, Region>>;
}

/** Keeps the editions of the regions' lists. */
export class Editions {
  private readonly regions: RegionRegister;

  constructor(database: Sequelize, regions: RegionRegister) {
    this.regions = regions;
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

  async get(actor: Actor, id: number): Promise<Edition> {
    const { row, region } = await this.find(actor, id);
    return toEdition(row, region);
  }

  async stations(actor: Actor, id: number, query: StationQuery): Promise<Page<ListedStation>> {
    const { row: edition, region } = await this.find(actor, id);
    const raster = rangesInForce(region.rasters, edition.date);
    const { rows, count } = await StationModel.findAndCountAll({
      where: { [Op.and]: [{ editionId: id }, matchesSearch(query.search)] },
      order: [
        ['frequencyHz', 'ASC'],
        ['id', 'ASC'],
      ],
      limit: query.pageSize,
      offset: (query.page - 1) * query.pageSize,
    });
    return { items: rows.map((row) => toStation(row, raster)), total: count };
  }

  async rasterOf(actor: Actor, id: number): Promise<Region['raster']> {
    const { row, region } = await this.find(actor, id);
    return rangesInForce(region.rasters, row.date);
  }

  /** Every station of an edition as the engine computes with it, in the order of the list. */
  async everyStation(id: number): Promise<Station[]> {
    const stations: Station[] = [];
    let after = 0;
    for (;;) {
      // A thousand at a time: reading a long list must not hold up other requests.
      const rows = await StationModel.findAll({
        attributes: [...COMPUTED_WITH],
        where: { editionId: id, id: { [Op.gt]: after } },
        order: [['id', 'ASC']],
        limit: READ_AT_ONCE,
        raw: true,
      });
      for (const row of rows) stations.push(toComputedWith(row));
      if (rows.length < READ_AT_ONCE) return stations;
      after = rows.at(-1)?.id ?? after;
    }
  }

  /** Some stations of an edition, as lists name them. */
  async named(id: number, stationIds: readonly number[]): Promise<StationModel[]> {
    return StationModel.findAll({
      attributes: ['id', 'name', 'callSign', 'frequencyHz'],
      where: { editionId: id, id: { [Op.in]: [...stationIds] } },
    });
  }

  /** The edition with the region it belongs to; another workshop's is not found. */
  async find(actor: Actor, id: number): Promise<{ row: EditionModel; region: Region }> {
    const row = await EditionModel.findByPk(id);
    const region = row && (await this.regions.byId(actor)).get(row.regionId);
    if (!row || !region) throw new NotFoundError('edition', id);
    return { row, region };
  }
}

const READ_AT_ONCE = 1000;
const COMPUTED_WITH = [
  'id',
  'name',
  'frequencyHz',
  'latitude',
  'longitude',
  'powerDayW',
  'powerNightW',
  'patternDb',
] as const;

const toComputedWith = (row: StationModel): Station => ({
  id: row.id,
  name: row.name,
  frequencyHz: row.frequencyHz,
  latitude: row.latitude,
  longitude: row.longitude,
  powerDayW: row.powerDayW,
  powerNightW: row.powerNightW,
  fieldDb: null,
  patternDb: row.patternDb?.split(',').map(Number) ?? null,
});

async function page(
  regions: ReadonlyMap<number, Region>,
  { page: number, pageSize }: PageQuery,
): Promise<Page<Edition>> {
  const { rows, count } = await EditionModel.findAndCountAll({
    where: { regionId: { [Op.in]: [...regions.keys()] } },
    order: [
      ['date', 'DESC'],
      ['id', 'DESC'],
    ],
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

const toStation = (row: StationModel, raster: Region['raster']): ListedStation => ({
  id: row.id,
  name: row.name,
  callSign: row.callSign,
  frequencyHz: row.frequencyHz,
  latitude: row.latitude,
  longitude: row.longitude,
  powerDayW: row.powerDayW,
  powerNightW: row.powerNightW,
  hours: row.hours,
  note: row.note,
  patternDb: null,
  onRaster: nearestChannel(raster, row.frequencyHz) === row.frequencyHz,
  offAir: false,
  corrections: [],
  distanceM: null,
  fieldDb: null,
});
