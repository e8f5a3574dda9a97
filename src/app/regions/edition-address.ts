import type { ParamMap, Params } from '@angular/router';

import { type StationQuery, stationQuery } from '../../../shared/contracts/station-list';

const usual = stationQuery.parse({});

/** The order of a list of stations, for addresses and for words. */
export type Order = Required<Pick<StationQuery, 'sort' | 'direction'>>;

/** Names of what an address may ask, as the server calls them. */
const NAMES = [
  'page',
  'pageSize',
  'search',
  'fromHz',
  'toHz',
  'only',
  'site',
  'period',
  'maxDistanceM',
  'minFieldDb',
  'corrections',
  'sort',
  'direction',
] as const satisfies readonly (keyof StationQuery)[];

/** What narrows a list down; order and page do not. */
const FILTERS = ['search', 'fromHz', 'toHz', 'only', 'maxDistanceM', 'minFieldDb'] as const;

/** What an address asks of an edition's stations; what makes no sense there is left out. */
export function stationQueryFrom(params: ParamMap): StationQuery {
  return sensible(
    Object.fromEntries(NAMES.filter((name) => params.has(name)).map((n) => [n, params.get(n)])),
  );
}

function sensible(asked: Readonly<Record<string, unknown>>): StationQuery {
  const parsed = stationQuery.safeParse(asked);
  if (parsed.success) return parsed.data;
  const wrong = new Set(parsed.error.issues.map(({ path }) => path[0]));
  return sensible(Object.fromEntries(Object.entries(asked).filter(([name]) => !wrong.has(name))));
}

/** A query as it is written into an address: what is usual is left out. */
export function asked(query: Partial<StationQuery>): Record<string, string> {
  const said = NAMES.filter((name) => {
    const value = query[name];
    return value !== undefined && value !== '' && value !== usual[name];
  });
  return Object.fromEntries(said.map((name) => [name, String(query[name])]));
}

/** Query parameters that say a change; null takes one out of the address. */
export function changeParams(change: Partial<Record<keyof StationQuery, unknown>>): Params {
  const written = asked(change as Partial<StationQuery>);
  return Object.fromEntries(Object.keys(change).map((name) => [name, written[name] ?? null]));
}

export const isFiltered = (query: StationQuery): boolean =>
  FILTERS.some((name) => query[name] !== usual[name]);

/** Takes every filter out of the address, and leaves site, order and what is chosen. */
export const noFilters: Params = Object.fromEntries([...FILTERS, 'page'].map((n) => [n, null]));

/** Power and field begin with the greatest, the others with the least. */
export const orderOf = ({ sort, direction }: Pick<StationQuery, 'sort' | 'direction'>): Order => ({
  sort,
  direction: direction ?? (sort === 'power' || sort === 'field' ? 'desc' : 'asc'),
});
