import type { Connection } from 'mariadb';
import { type InferAttributes, QueryTypes, type Sequelize, type Transaction } from 'sequelize';

import { inTransaction } from '../db/transaction.ts';
import { EditionModel } from './edition-model.ts';
import { StationModel } from './station-model.ts';

export type NewStation = Omit<InferAttributes<StationModel>, 'id' | 'editionId' | 'patternDb'> & {
  /** Gains of the aerial, dB, every 10 degrees from north; null where the list tells none. */
  readonly patternDb: readonly number[] | null;
};

export interface NewEdition {
  readonly regionId: number;
  readonly label: string;
  readonly date: string;
  readonly source: string;
}

/** What comparing a list with an edition needs of a station. */
export interface StationMark {
  readonly id: number;
  readonly identity: string;
  readonly fingerprint: string;
  readonly latitude: number | null;
  readonly longitude: number | null;
}

const COLUMNS = [
  'name',
  'callSign',
  'frequencyHz',
  'latitude',
  'longitude',
  'powerDayW',
  'powerNightW',
  'hours',
  'note',
  'identity',
  'fingerprint',
] as const satisfies readonly (keyof NewStation)[];

/** What is stored of a station, in the order of the statement below. */
export type StationValues = readonly (string | number | null)[];

const insertInto = (editionId: number): string => `
  INSERT INTO stations (edition_id, name, call_sign, frequency_hz, latitude, longitude,
    power_day_w, power_night_w, hours, note, identity, fingerprint, pattern_db)
  VALUES (${editionId}, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)`;

/** Everything that a station is in another edition as well. */
const KEPT = `name, call_sign, frequency_hz, latitude, longitude, power_day_w, power_night_w,
  pattern_db, hours, note, identity, fingerprint`;

const MARKS_AT_ONCE = 20_000;
const KEPT_AT_ONCE = 20_000;
const CLEARED_AT_ONCE = 5000;

/** Writes whole editions and takes them back; the caller's transaction makes it all or nothing. */
export class EditionWriter {
  private readonly database: Sequelize;

  constructor(database: Sequelize) {
    this.database = database;
  }

  /** Edition against which a new list of the region is compared; null when it has none yet. */
  async latest(regionId: number): Promise<number | null> {
    const row = await EditionModel.findOne({
      attributes: ['id'],
      where: { regionId },
      order: [
        ['date', 'DESC'],
        ['id', 'DESC'],
      ],
    });
    return row?.id ?? null;
  }

  /** Identities and fingerprints of an edition's stations, some thousands at a time. */
  async *marks(editionId: number): AsyncGenerator<StationMark[]> {
    let after = 0;
    for (;;) {
      const marks = await this.database.query<StationMark>(
        `SELECT id, identity, fingerprint, latitude, longitude FROM stations
         WHERE edition_id = ? AND id > ? ORDER BY id LIMIT ${MARKS_AT_ONCE}`,
        { replacements: [editionId, after], type: QueryTypes.SELECT },
      );
      if (marks.length > 0) yield marks;
      if (marks.length < MARKS_AT_ONCE) return;
      after = marks.at(-1)?.id ?? after;
    }
  }

  async begin(draft: NewEdition, transaction: Transaction): Promise<number> {
    const row = await EditionModel.create({ ...draft, note: '', stations: 0 }, { transaction });
    return row.id;
  }

  valuesOf(station: NewStation): StationValues {
    return [...COLUMNS.map((name) => station[name]), station.patternDb?.join(',') ?? null];
  }

  /** Adds stations by the connector's own batch: several times faster than one statement a row. */
  async append(
    editionId: number,
    stations: readonly StationValues[],
    transaction: Transaction,
  ): Promise<void> {
    if (stations.length === 0) return;
    const { connection } = transaction as unknown as { connection: Connection };
    await connection.batch(insertInto(editionId), stations);
  }

  /** An edition of a region by its name; null when the region has no such edition. */
  async named(id: number, regionId: number): Promise<EditionModel | null> {
    return EditionModel.findOne({ where: { id, regionId } });
  }

  /**
   * Takes over what stays of another edition, some thousand stations at a time; answers how many the
   * edition has then, or null where the other was taken away meanwhile.
   */
  async keep(
    editionId: number,
    from: number,
    replaced: readonly number[],
    transaction: Transaction,
    beat: () => Promise<void>,
  ): Promise<number | null> {
    const { first, last } = await this.idsOf(from, transaction);
    for (let at = first; at <= last; at += KEPT_AT_ONCE) {
      const to = at + KEPT_AT_ONCE - 1;
      const gone = replaced.filter((id) => id >= at && id <= to);
      await this.database.query(
        `INSERT INTO stations (edition_id, ${KEPT})
         SELECT ?, ${KEPT} FROM stations
         WHERE edition_id = ? AND id BETWEEN ? AND ? ${gone.length > 0 ? 'AND id NOT IN (?)' : ''}
         ORDER BY id`,
        {
          replacements: [editionId, from, at, to, gone],
          type: QueryTypes.INSERT,
          transaction,
        },
      );
      await beat();
    }
    if (!(await this.isListed(from, transaction))) return null;
    return StationModel.count({ where: { editionId }, transaction });
  }

  private async idsOf(editionId: number, transaction: Transaction) {
    const [range] = await this.database.query<{ first: number; last: number }>(
      `SELECT COALESCE(MIN(id), 1) AS first, COALESCE(MAX(id), 0) AS last
       FROM stations WHERE edition_id = ?`,
      { replacements: [editionId], type: QueryTypes.SELECT, transaction },
    );
    return range ?? { first: 1, last: 0 };
  }

  /** Whether an edition is still its region's; it stays so until the transaction ends. */
  private async isListed(editionId: number, transaction: Transaction): Promise<boolean> {
    const found = await this.database.query(
      'SELECT id FROM editions WHERE id = ? AND region_id IS NOT NULL LOCK IN SHARE MODE',
      { replacements: [editionId], type: QueryTypes.SELECT, transaction },
    );
    return found.length > 0;
  }

  async finish(editionId: number, stations: number, transaction: Transaction): Promise<void> {
    await EditionModel.update({ stations }, { where: { id: editionId }, transaction });
  }

  /** Takes an edition out of its region: from then on nobody sees it. */
  async hide(editionId: number): Promise<void> {
    await this.database.query('UPDATE editions SET region_id = NULL WHERE id = ?', {
      replacements: [editionId],
      type: QueryTypes.UPDATE,
    });
  }

  async hasHidden(): Promise<boolean> {
    const [hidden] = await this.database.query(
      'SELECT id FROM editions WHERE region_id IS NULL LIMIT 1',
      { type: QueryTypes.SELECT },
    );
    return hidden !== undefined;
  }

  /**
   * Takes some thousand stations of a hidden edition away, at last the edition; false when there is
   * none, or when others are at it.
   */
  clearSome(): Promise<boolean> {
    return inTransaction(this.database, async () => {
      const [hidden] = await this.database.query<{ id: number }>(
        'SELECT id FROM editions WHERE region_id IS NULL LIMIT 1 FOR UPDATE SKIP LOCKED',
        { type: QueryTypes.SELECT },
      );
      if (!hidden) return false;
      const where = { editionId: hidden.id };
      const cleared = await StationModel.destroy({ where, limit: CLEARED_AT_ONCE });
      if (cleared < CLEARED_AT_ONCE) await EditionModel.destroy({ where: hidden });
      return true;
    });
  }
}
