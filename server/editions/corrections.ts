import { Op, type Sequelize } from 'sequelize';

import type {
  AddedStation,
  Correction,
  CorrectionChange,
  CorrectionDraft,
  CorrectionQuery,
} from '../../shared/contracts/correction.ts';
import type { Page } from '../../shared/contracts/paging.ts';
import type { Region } from '../../shared/contracts/region.ts';
import { inTransaction } from '../db/transaction.ts';
import { type Actor, hasRole, requireRole } from '../http/actor.ts';
import { ConflictError, ForbiddenError, InvalidError, NotFoundError } from '../http/errors.ts';
import {
  addedIdentity,
  type CorrectedList,
  correctedList,
  correctionOfAdded,
  isAdded,
  type Listed,
} from './corrected-list.ts';
import { CorrectionModel } from './correction-model.ts';
import { EditionModel } from './edition-model.ts';
import { StationModel } from './station-model.ts';
import { RECORD_COLUMNS, toRecord } from './station-record.ts';

const MAX_CORRECTIONS = 5000;

/** What the corrections need of the other resources. */
export interface CorrectionSources {
  readonly regions: { get(actor: Actor, id: number): Promise<Region> };
  readonly people: { namesOf(ids: readonly number[]): Promise<ReadonlyMap<number, string>> };
  /** By what a station is recognised in another edition. */
  readonly identityOf: (station: AddedStation) => string;
}

/** Keeps what people correct of a region's list by hand, apart from what was imported. */
export class Corrections {
  private readonly database: Sequelize;
  private readonly sources: CorrectionSources;

  constructor(database: Sequelize, sources: CorrectionSources) {
    this.database = database;
    this.sources = sources;
    CorrectionModel.register(database);
  }

  /** An edition with all corrections of its region applied. */
  async appliedTo(edition: { id: number; regionId: number }): Promise<CorrectedList> {
    const corrections = await CorrectionModel.findAll({ where: { regionId: edition.regionId } });
    return correctedList(corrections, await listedIn(edition.id, corrections));
  }

  async list(actor: Actor, regionId: number, query: CorrectionQuery): Promise<Page<Correction>> {
    await this.sources.regions.get(actor, regionId);
    const stationOf = await this.stationsIn(regionId, query.editionId);
    const { rows, count } = await CorrectionModel.findAndCountAll({
      where: { regionId, ...(query.kind && { kind: query.kind }) },
      order: [['id', 'DESC']],
      limit: query.pageSize,
      offset: (query.page - 1) * query.pageSize,
    });
    return { items: await this.present(actor, rows, stationOf), total: count };
  }

  async get(actor: Actor, regionId: number, id: number): Promise<Correction> {
    const row = await this.load(actor, regionId, id);
    const [shown] = await this.present(actor, [row], await this.stationsIn(regionId));
    if (!shown) throw new NotFoundError('correction', id);
    return shown;
  }

  async add(actor: Actor, regionId: number, draft: CorrectionDraft): Promise<Correction> {
    await this.sources.regions.get(actor, regionId);
    if (isEdit(draft)) requireRole(actor, 'librarian');
    await refuseTooMany(regionId);
    const about =
      draft.kind === 'added'
        ? { identity: this.sources.identityOf(draft.station), station: draft.station }
        : await this.stationMeant(regionId, draft.stationId);
    const row = await CorrectionModel.create({
      regionId,
      authorId: actor.accountId,
      kind: draft.kind,
      ...about,
      fields: draft.kind === 'changed' ? draft.fields : null,
      note: draft.note,
      date: draft.date ?? today(),
    });
    return this.get(actor, regionId, row.id);
  }

  async change(
    actor: Actor,
    regionId: number,
    id: number,
    change: CorrectionChange,
  ): Promise<Correction> {
    await inTransaction(this.database, async () => {
      const row = await this.loadToChange(actor, regionId, id);
      refuseMisplaced(row, change);
      await row.update({
        note: change.note,
        ...(change.date && { date: change.date }),
        ...(change.fields && { fields: change.fields }),
        ...(change.station && {
          station: change.station,
          identity: this.sources.identityOf(change.station),
        }),
      });
    });
    return this.get(actor, regionId, id);
  }

  /** Takes a correction back; an added station goes with all that was said of it. */
  async remove(actor: Actor, regionId: number, id: number): Promise<void> {
    await inTransaction(this.database, async () => {
      const row = await this.loadToChange(actor, regionId, id);
      await CorrectionModel.destroy({ where: { regionId, identity: addedIdentity(id) } });
      await row.destroy();
    });
  }

  private async stationMeant(regionId: number, stationId: number) {
    if (isAdded(stationId)) {
      const id = correctionOfAdded(stationId);
      const by = await CorrectionModel.findOne({ where: { id, regionId, kind: 'added' } });
      if (by) return { identity: addedIdentity(id), station: by.station };
    }
    const row = await StationModel.findByPk(stationId);
    const edition = row && (await EditionModel.findOne({ where: { id: row.editionId, regionId } }));
    if (!row || !edition) {
      const message = 'No edition of this region has a station of this id.';
      throw new InvalidError({ path: 'stationId', message });
    }
    const { id: _id, patternDb: _patternDb, ...station } = toRecord(row);
    return { identity: row.identity, station };
  }

  /** Stations of the corrections in the edition asked for, else in the latest. */
  private async stationsIn(regionId: number, editionId?: number) {
    const edition = await EditionModel.findOne({
      where: { regionId, ...(editionId !== undefined && { id: editionId }) },
      order: [
        ['date', 'DESC'],
        ['id', 'DESC'],
      ],
    });
    if (!edition && editionId !== undefined) throw new NotFoundError('edition', editionId);
    return (await this.appliedTo({ id: edition?.id ?? 0, regionId })).stationOf;
  }

  private async load(actor: Actor, regionId: number, id: number): Promise<CorrectionModel> {
    await this.sources.regions.get(actor, regionId);
    const row = await CorrectionModel.findOne({ where: { id, regionId } });
    if (!row) throw new NotFoundError('correction', id);
    return row;
  }

  private async loadToChange(actor: Actor, regionId: number, id: number) {
    const row = await this.load(actor, regionId, id);
    if (isEditable(actor, row)) return row;
    throw new ForbiddenError('Only who made this correction or a librarian may change it.');
  }

  private async present(
    actor: Actor,
    rows: readonly CorrectionModel[],
    stationOf: ReadonlyMap<number, number>,
  ): Promise<Correction[]> {
    const names = await this.sources.people.namesOf(authorsOf(rows));
    return rows.map((row) => toCorrection(actor, row, names, stationOf.get(row.id) ?? null));
  }
}

export const authorsOf = (rows: readonly Pick<CorrectionModel, 'authorId'>[]): number[] =>
  rows.flatMap(({ authorId }) => authorId ?? []);

/** The edition's own stations that corrections may be about. */
async function listedIn(
  editionId: number,
  corrections: readonly CorrectionModel[],
): Promise<Listed[]> {
  const identities = [...new Set(corrections.map(({ identity }) => identity))];
  if (identities.length === 0) return [];
  const rows = await StationModel.findAll({
    attributes: [...RECORD_COLUMNS, 'identity'],
    where: { editionId, identity: { [Op.in]: identities } },
    order: [['id', 'ASC']],
    raw: true,
  });
  return rows.map((row) => ({ identity: row.identity, record: toRecord(row) }));
}

/** Adding and changing is a librarian's; what one heard anybody may say. */
const isEdit = ({ kind }: Pick<CorrectionModel, 'kind'>): boolean =>
  kind === 'added' || kind === 'changed';

/** Whether a person may change or remove a correction. */
export const isEditable = (
  actor: Actor,
  row: Pick<CorrectionModel, 'kind' | 'authorId'>,
): boolean => hasRole(actor, 'librarian') || (row.authorId === actor.accountId && !isEdit(row));

async function refuseTooMany(regionId: number): Promise<void> {
  if ((await CorrectionModel.count({ where: { regionId } })) < MAX_CORRECTIONS) return;
  throw new ConflictError(
    `This region has ${MAX_CORRECTIONS} corrections, which is the most. Remove old ones first.`,
  );
}

function refuseMisplaced({ kind }: CorrectionModel, change: CorrectionChange): void {
  const wanted = { added: 'station', changed: 'fields', 'off-air': null, heard: null }[kind];
  for (const path of ['station', 'fields'] as const) {
    if (change[path] === undefined || path === wanted) continue;
    throw new InvalidError({ path, message: `Leave this out: the correction is of kind ${kind}.` });
  }
}

const today = (): string => new Date().toISOString().slice(0, 10);

function toCorrection(
  actor: Actor,
  row: CorrectionModel,
  names: ReadonlyMap<number, string>,
  stationId: number | null,
): Correction {
  const { name, callSign, frequencyHz, latitude, longitude } = row.station;
  return {
    id: row.id,
    regionId: row.regionId,
    kind: row.kind,
    station: { name, callSign, frequencyHz, latitude, longitude },
    stationId,
    fields: row.kind === 'added' ? row.station : row.fields,
    note: row.note,
    date: row.date,
    authorName: names.get(row.authorId ?? 0) ?? '',
    editable: isEditable(actor, row),
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
  };
}
