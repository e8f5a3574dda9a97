import { QueryTypes, type Sequelize } from 'sequelize';

import type { StationQuery } from '../../shared/contracts/station-list.ts';
import type { RasterRange } from '../../shared/radio/station.ts';
import type { BoundedCache } from '../computing/bounded-cache.ts';
import { type CorrectedList, isAdded } from './corrected-list.ts';
import { allOf, type Condition, condition, stationConditions } from './station-conditions.ts';

/** An edition as a list is made from it. */
export interface PagedList {
  readonly editionId: number;
  /** Number of stations that were imported. */
  readonly stations: number;
  readonly raster: readonly RasterRange[];
  /** Null: as it was imported. */
  readonly corrected: CorrectedList | null;
}

export type PagedSort = 'frequency' | 'name' | 'power';

export interface Ordering {
  readonly sort: PagedSort;
  readonly descending: boolean;
}

interface Key {
  readonly id: number;
  readonly k: string | number;
}

/** What is remembered of one listing: how long it is, and the last row of every stretch. */
export interface Walk {
  total?: number;
  readonly ends: Key[];
}

export const SORT_COLUMNS = { frequency: 'frequency_hz', name: 'name', power: 'power_w' } as const;

const STRETCH = 5000;

/**
 * Pages of an edition's stations in the order of an index. A deep page is found from the last row of
 * the stretch before it, remembered from the first walk there, so that no page reads more than one
 * stretch of the index. Rows that were corrected by hand are merged in by the database.
 */
export class StationPages {
  private readonly database: Sequelize;
  private readonly walks: BoundedCache<Walk>;

  constructor(database: Sequelize, walks: BoundedCache<Walk>) {
    this.database = database;
    this.walks = walks;
  }

  /** Ids of one page, and the number of stations in all. */
  async page(list: PagedList, query: StationQuery, ordering: Ordering) {
    const offset = (query.page - 1) * query.pageSize;
    const walk = this.walkOf(list, query, ordering);
    walk.total ??= await this.count(list, query);
    if (offset >= walk.total) return { ids: [], total: walk.total };
    const stretch = Math.floor(offset / STRETCH);
    while (walk.ends.length < stretch) {
      const after = walk.ends.at(-1);
      const [end] = await this.rows(list, query, ordering, { after, from: STRETCH - 1, count: 1 });
      if (!end) return { ids: [], total: walk.total };
      walk.ends.push(end);
    }
    const after = walk.ends[stretch - 1];
    const from = offset - stretch * STRETCH;
    const keys = await this.rows(list, query, ordering, { after, from, count: query.pageSize });
    return { ids: keys.map(({ id }) => id), total: walk.total };
  }

  /** Ids of all stations that are asked for, in no order. */
  async ids(list: PagedList, query: StationQuery): Promise<Uint32Array> {
    const { sql, values } = source(list, query, 'id');
    const rows = await this.select<{ id: number }>(`SELECT id FROM (${sql}) AS listed`, values);
    return Uint32Array.from(rows, ({ id }) => id);
  }

  private async count(list: PagedList, query: StationQuery): Promise<number> {
    const isWhole = query.search === '' && query.only === undefined;
    if (
      isWhole &&
      query.fromHz === undefined &&
      query.toHz === undefined &&
      !hasCorrections(list)
    ) {
      return list.stations;
    }
    const { sql, values } = source(list, query, 'id');
    const [row] = await this.select<{ n: bigint }>(
      `SELECT COUNT(*) AS n FROM (${sql}) AS listed`,
      values,
    );
    return Number(row?.n ?? 0);
  }

  private rows(
    list: PagedList,
    query: StationQuery,
    ordering: Ordering,
    part: Part,
  ): Promise<Key[]> {
    const { sql, values } = pageSql(list, query, ordering, part);
    return this.select<Key>(sql, values);
  }

  private walkOf(list: PagedList, query: StationQuery, ordering: Ordering): Walk {
    const { search, fromHz, toHz, only } = query;
    const key = JSON.stringify([
      list.editionId,
      list.corrected?.state ?? null,
      only === 'off-raster' ? list.raster : null,
      [search, fromHz, toHz, only],
      ordering,
    ]);
    return this.walks.remember(key, 1, () => ({ ends: [] }));
  }

  private select<T extends object>(sql: string, replacements: unknown[]): Promise<T[]> {
    return this.database.query<T>(sql, { replacements, type: QueryTypes.SELECT });
  }
}

interface Part {
  /** The last row before the part; undefined: it begins the list. */
  readonly after: Key | undefined;
  /** Rows to pass over after that one. */
  readonly from: number;
  readonly count: number;
}

/** The statement of a page: `id`, and the sorted column as `k`, in order. */
export function pageSql(
  list: PagedList,
  query: StationQuery,
  { sort, descending }: Ordering,
  { after, from, count }: Part,
): Statement {
  const column = SORT_COLUMNS[sort];
  const [way, beyond] = descending ? ['DESC', '<'] : ['ASC', '>'];
  const rest = after
    ? condition(
        `${column} ${beyond} ? OR (${column} = ? AND id ${beyond} ?)`,
        after.k,
        after.k,
        after.id,
      )
    : condition('TRUE');
  const columns = `id, ${column} AS k`;
  const order = ` ORDER BY ${column} ${way}, id ${way}`;
  if (!hasCorrections(list)) {
    const { sql, values } = source(list, query, columns, rest, order);
    return { sql: `${sql} LIMIT ${count} OFFSET ${from}`, values };
  }
  // Enough of the edition's own, so that the corrected ones can be merged in among them.
  const { sql, values } = source(list, query, columns, rest, `${order} LIMIT ${from + count}`);
  const merged = `SELECT id, k FROM (${sql}) AS listed ORDER BY k ${way}, id ${way}`;
  return { sql: `${merged} LIMIT ${count} OFFSET ${from}`, values };
}

interface Statement {
  readonly sql: string;
  readonly values: unknown[];
}

const CORRECTED_COLUMNS = `
  id INT UNSIGNED PATH '$.id', name VARCHAR(200) PATH '$.name',
  call_sign VARCHAR(40) PATH '$.callSign', frequency_hz INT UNSIGNED PATH '$.frequencyHz',
  latitude DOUBLE PATH '$.latitude', power_w DOUBLE PATH '$.powerW'`;

/** Stations that are asked for, those corrected by hand in place of the edition's own. */
function source(
  list: PagedList,
  query: StationQuery,
  columns: string,
  rest = condition('TRUE'),
  order = '',
): Statement {
  const wanted = allOf(stationConditions(query, list.raster), rest);
  const own = allOf(condition('edition_id = ?', list.editionId), uncorrected(list, query), wanted);
  const official = `SELECT ${columns} FROM stations WHERE ${own.sql}${order}`;
  if (!hasCorrections(list)) return { sql: official, values: [...own.values] };
  const stations = [...(list.corrected?.stations.values() ?? [])].map(({ record }) => ({
    ...record,
    powerW: Math.max(record.powerDayW ?? -1, record.powerNightW ?? -1),
  }));
  return {
    sql: `(${official}) UNION ALL (SELECT ${columns}
      FROM JSON_TABLE(?, '$[*]' COLUMNS (${CORRECTED_COLUMNS})) AS corrected WHERE ${wanted.sql})`,
    values: [...own.values, JSON.stringify(stations), ...wanted.values],
  };
}

function uncorrected({ corrected }: PagedList, { only }: StationQuery): Condition {
  if (only === 'corrected') return condition('FALSE');
  const ids = [...(corrected?.stations.keys() ?? [])].filter((id) => !isAdded(id));
  return ids.length === 0 ? condition('TRUE') : condition('id NOT IN (?)', ids);
}

const hasCorrections = ({ corrected }: PagedList): boolean => (corrected?.stations.size ?? 0) > 0;
