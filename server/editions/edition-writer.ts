import type { Connection } from 'mariadb';
import { type InferAttributes, QueryTypes, type Sequelize, type Transaction } from 'sequelize';

import { EditionModel } from './edition-model.ts';
import { StationModel } from './station-model.ts';

export type NewStation = Omit<InferAttributes<StationModel>, 'id' | 'editionId'>;

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

const INSERT = `
  INSERT INTO stations (edition_id, name, call_sign, frequency_hz, latitude, longitude,
    power_day_w, power_night_w, hours, note, identity, fingerprint)
  VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)`;

const MARKS_AT_ONCE = 20_000;

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
        `SELECT id, identity, fingerprint FROM stations
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

  /** Adds stations by the connector's own batch: several times faster than one statement a row. */
  async append(
    editionId: number,
    stations: readonly NewStation[],
    transaction: Transaction,
  ): Promise<void> {
    if (stations.length === 0) return;
    const { connection } = transaction as unknown as { connection: Connection };
    const rows = stations.map((station) => [editionId, ...COLUMNS.map((name) => station[name])]);
    await connection.batch(INSERT, rows);
  }

  async finish(editionId: number, stations: number, transaction: Transaction): Promise<void> {
    await EditionModel.update({ stations }, { where: { id: editionId }, transaction });
  }

  async remove(editionId: number): Promise<void> {
    await StationModel.destroy({ where: { editionId } });
    await EditionModel.destroy({ where: { id: editionId } });
  }
}
