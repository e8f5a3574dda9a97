import { setImmediate } from 'node:timers/promises';

import { QueryTypes, type Sequelize } from 'sequelize';

import type {
  Difference,
  DifferenceKind,
  DifferencesAnswer,
  DifferencesQuery,
} from '../../shared/contracts/edition-differences.ts';
import type { Edition } from '../../shared/contracts/region.ts';
import type { StationRecord } from '../../shared/contracts/station-list.ts';
import type { BoundedCache } from '../computing/bounded-cache.ts';
import type { Actor } from '../http/actor.ts';
import { InvalidError } from '../http/errors.ts';
import type { EditionStations } from './edition-stations.ts';
import type { Editions } from './editions.ts';
import { StationModel } from './station-model.ts';
import { toRecord } from './station-record.ts';
import {
  changesOf,
  type Differing,
  movedBy,
  powerChange,
  type StationPair,
  stationPairs,
} from './station-pairs.ts';

/** A difference without the stations themselves: those of a page are read when it is shown. */
export interface KeptDifference extends Omit<Difference, 'before' | 'after'> {
  readonly beforeId: number | null;
  readonly afterId: number | null;
  readonly frequencyHz: number;
}

export interface KeptDifferences {
  /** By frequency. */
  readonly all: readonly KeptDifference[];
  readonly counts: Readonly<Record<DifferenceKind, number>>;
}

/** Two editions of one region. */
export interface ComparedEditions {
  readonly before: Edition;
  readonly after: Edition;
}

const IDS_AT_ONCE = 20_000;
const PAIRS_AT_ONCE = 5000;

/** Compares editions as they were imported. They never change, so what was found is kept in bounds. */
export class EditionDifferences {
  private readonly database: Sequelize;
  private readonly editions: Pick<Editions, 'get' | 'before'>;
  private readonly stations: Pick<EditionStations, 'byId'>;
  private readonly kept: BoundedCache<KeptDifferences>;

  constructor(
    database: Sequelize,
    editions: Pick<Editions, 'get' | 'before'>,
    stations: Pick<EditionStations, 'byId'>,
    kept: BoundedCache<KeptDifferences>,
  ) {
    this.database = database;
    this.editions = editions;
    this.stations = stations;
    this.kept = kept;
  }

  async page(actor: Actor, id: number, query: DifferencesQuery): Promise<DifferencesAnswer> {
    const compared = await this.compared(actor, id, query.against);
    const { all, counts } = await this.between(compared);
    const { kind, page, pageSize } = query;
    const wanted = kind ? all.filter(({ kinds }) => kinds.includes(kind)) : all;
    const shown = wanted.slice((page - 1) * pageSize, page * pageSize);
    return {
      items: await this.present(compared, shown),
      total: wanted.length,
      counts,
      same: compared.after.stations - all.filter(({ afterId }) => afterId !== null).length,
    };
  }

  /** The two editions, the one compared with first. */
  async compared(actor: Actor, id: number, against?: number): Promise<ComparedEditions> {
    const after = await this.editions.get(actor, id);
    const before =
      against === undefined
        ? await this.editions.before(actor, after)
        : await this.editions.get(actor, against);
    if (before?.regionId === after.regionId && before.id !== after.id) return { before, after };
    const message = before
      ? 'Give another edition of the same region.'
      : 'There is no edition before this one. Give another of its region.';
    throw new InvalidError({ path: 'against', message });
  }

  async between({ before, after }: ComparedEditions): Promise<KeptDifferences> {
    const key = `${before.id},${after.id}`;
    const found = this.kept.get(key);
    if (found) return found;
    const earlier = await this.differing(before.id, after.id);
    const later = await this.differing(after.id, before.id);
    const differences = await collected(stationPairs(earlier, later));
    this.kept.set(key, differences, 1 + differences.all.length);
    return differences;
  }

  /** Stations of one edition that the other has not exactly so, some thousands at a time. */
  private async differing(id: number, other: number): Promise<Differing[]> {
    const { first, last } = await this.idsOf(id);
    const found: Differing[] = [];
    for (let from = first; from <= last; from += IDS_AT_ONCE) {
      const rows = await this.database.query<StationModel>(
        `SELECT one.* FROM stations AS one
         LEFT JOIN stations AS other ON other.edition_id = :other
           AND other.identity = one.identity AND other.fingerprint = one.fingerprint
         WHERE one.edition_id = :id AND one.id BETWEEN :from AND :to AND other.id IS NULL`,
        {
          replacements: { id, other, from, to: from + IDS_AT_ONCE - 1 },
          type: QueryTypes.SELECT,
          model: StationModel,
          mapToModel: true,
        },
      );
      for (const row of rows) found.push({ ...toRecord(row), identity: row.identity });
    }
    return found;
  }

  private async idsOf(editionId: number): Promise<{ first: number; last: number }> {
    const [row] = await this.database.query<{ first: number | null; last: number | null }>(
      'SELECT MIN(id) AS first, MAX(id) AS last FROM stations WHERE edition_id = ?',
      { replacements: [editionId], type: QueryTypes.SELECT },
    );
    return { first: row?.first ?? 1, last: row?.last ?? 0 };
  }

  private async present(
    { before, after }: ComparedEditions,
    shown: readonly KeptDifference[],
  ): Promise<Difference[]> {
    const idsIn = (side: 'beforeId' | 'afterId') => shown.flatMap((each) => each[side] ?? []);
    const earlier = await this.stations.byId(before.id, idsIn('beforeId'), null);
    const later = await this.stations.byId(after.id, idsIn('afterId'), null);
    const named = (stations: ReadonlyMap<number, StationRecord>, id: number | null) =>
      stations.get(id ?? 0) ?? null;
    return shown.map(({ beforeId, afterId, frequencyHz: _, ...difference }) => ({
      ...difference,
      before: named(earlier, beforeId),
      after: named(later, afterId),
    }));
  }
}

/** Collects differences with the event loop free in between: there may be hundred thousands. */
async function collected(pairs: Iterable<StationPair>): Promise<KeptDifferences> {
  const all: KeptDifference[] = [];
  const counts = {
    added: 0,
    gone: 0,
    moved: 0,
    'changed-power': 0,
    'changed-frequency': 0,
    'changed-other': 0,
  };
  let seen = 0;
  for (const pair of pairs) {
    seen += 1;
    if (seen % PAIRS_AT_ONCE === 0) await setImmediate();
    const kinds = changesOf(pair);
    for (const kind of kinds) counts[kind] += 1;
    if (kinds.length > 0) all.push(toKept(pair, kinds));
  }
  all.sort((a, b) => a.frequencyHz - b.frequencyHz);
  return { all, counts };
}

function toKept(pair: StationPair, kinds: DifferenceKind[]): KeptDifference {
  const { before, after } = pair;
  return {
    kinds,
    beforeId: before?.id ?? null,
    afterId: after?.id ?? null,
    frequencyHz: (after ?? before)?.frequencyHz ?? 0,
    movedM: kinds.includes('moved') ? movedBy(pair) : null,
    powerDayDb: powerChange(before?.powerDayW ?? 0, after?.powerDayW ?? 0),
    powerNightDb: powerChange(before?.powerNightW ?? 0, after?.powerNightW ?? 0),
  };
}
