import { Op } from 'sequelize';

import type { Edition } from '../../shared/contracts/region.ts';
import type { StationRecord } from '../../shared/contracts/station-list.ts';
import type { Station } from '../../shared/radio/station.ts';
import type { EditionContent } from '../computing/lists-at-sites.ts';
import type { Actor } from '../http/actor.ts';
import { type CorrectedList, isAdded } from './corrected-list.ts';
import type { Corrections } from './corrections.ts';
import type { Editions } from './editions.ts';
import { StationModel } from './station-model.ts';
import { RECORD_COLUMNS, toComputedWith, toRecord } from './station-record.ts';

const READ_AT_ONCE = 1000;

/** Reads the stations of editions, as imported or as corrected by hand. */
export class EditionStations {
  private readonly editions: Pick<Editions, 'get'>;
  private readonly corrections: Pick<Corrections, 'appliedTo'>;

  constructor(editions: Pick<Editions, 'get'>, corrections: Pick<Corrections, 'appliedTo'>) {
    this.editions = editions;
    this.corrections = corrections;
  }

  /** What every computation with an edition takes. */
  async computedWith(
    actor: Actor,
    editionId: number,
    corrections: 'applied' | 'none' = 'applied',
  ): Promise<EditionContent> {
    const { edition, corrected } = await this.open(actor, editionId, corrections);
    return {
      raster: edition.raster,
      version: corrected?.version ?? '',
      read: () => this.everyStation(editionId, corrected),
    };
  }

  /** Some stations as lists name them. */
  async named(actor: Actor, editionId: number, ids: readonly number[]): Promise<StationRecord[]> {
    const { corrected } = await this.open(actor, editionId, 'applied');
    return [...(await this.byId(editionId, ids, corrected)).values()];
  }

  /** The edition, and what was corrected of it unless its imported state is asked for. */
  async open(actor: Actor, editionId: number, corrections: 'applied' | 'none') {
    const edition: Edition = await this.editions.get(actor, editionId);
    const corrected = corrections === 'none' ? null : await this.corrections.appliedTo(edition);
    return { edition, corrected };
  }

  /** Some stations by their id, as corrected where a corrected list is given. */
  async byId(
    editionId: number,
    ids: readonly number[],
    corrected: CorrectedList | null,
  ): Promise<Map<number, StationRecord>> {
    const found = new Map<number, StationRecord>();
    for (const id of ids) {
      const record = corrected?.stations.get(id)?.record;
      if (record) found.set(id, record);
    }
    const own = ids.filter((id) => !found.has(id) && !isAdded(id));
    const rows = await StationModel.findAll({
      attributes: [...RECORD_COLUMNS],
      where: { editionId, id: { [Op.in]: own } },
      raw: true,
    });
    for (const row of rows) found.set(row.id, toRecord(row));
    return found;
  }

  /** Whether any imported station has a directional pattern. */
  async hasPatterns(editionId: number): Promise<boolean> {
    const where = { editionId, patternDb: { [Op.ne]: null } };
    return (await StationModel.findOne({ attributes: ['id'], where })) !== null;
  }

  /**
   * The imported stations in the order of the list, a thousand at a time: reading a long list
   * must not hold up other requests.
   */
  async *batches(editionId: number): AsyncGenerator<StationRecord[]> {
    let after = 0;
    for (;;) {
      const rows = await StationModel.findAll({
        attributes: [...RECORD_COLUMNS],
        where: { editionId, id: { [Op.gt]: after } },
        order: [['id', 'ASC']],
        limit: READ_AT_ONCE,
        raw: true,
      });
      if (rows.length > 0) yield rows.map(toRecord);
      if (rows.length < READ_AT_ONCE) return;
      after = rows.at(-1)?.id ?? after;
    }
  }

  /** Corrected stations stand where the list has them; added ones come last. */
  private async everyStation(
    editionId: number,
    corrected: CorrectedList | null,
  ): Promise<Station[]> {
    const stations: Station[] = [];
    for await (const batch of this.batches(editionId)) {
      for (const record of batch) {
        const instead = corrected?.stations.get(record.id);
        stations.push(toComputedWith(instead?.record ?? record, instead?.offAir ?? false));
      }
    }
    for (const [id, { record, offAir }] of corrected?.stations ?? []) {
      if (isAdded(id)) stations.push(toComputedWith(record, offAir));
    }
    return stations;
  }
}
