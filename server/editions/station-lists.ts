import type { Page } from '../../shared/contracts/paging.ts';
import type { Edition } from '../../shared/contracts/region.ts';
import { bareSite, type SiteDraft, type StoredSite } from '../../shared/contracts/site.ts';
import {
  type ListedStation,
  MOST_PLACES,
  type OneStationQuery,
  type PlacesQuery,
  type StationPlaces,
  type StationQuery,
  type StationRecord,
} from '../../shared/contracts/station-list.ts';
import { nearestChannel } from '../../shared/radio/channels/raster.ts';
import { USUAL_SKY_WAVE } from '../../shared/radio/propagation/sky-wave.ts';
import type { Engine } from '../computing/engine.ts';
import type { ListsAtSites } from '../computing/lists-at-sites.ts';
import type { StationOrders } from '../computing/station-orders.ts';
import type { Actor } from '../http/actor.ts';
import { NotFoundError } from '../http/errors.ts';
import type { CorrectedList } from './corrected-list.ts';
import { authorsOf, isEditable } from './corrections.ts';
import type { EditionStations } from './edition-stations.ts';
import type { Ordering, PagedList, StationPages } from './station-pages.ts';

/** What lists of stations need of the other resources. */
export interface StationListSources {
  readonly stations: EditionStations;
  readonly pages: StationPages;
  readonly sites: { get(actor: Actor, id: number): Promise<StoredSite> };
  readonly people: { namesOf(ids: readonly number[]): Promise<ReadonlyMap<number, string>> };
  readonly lists: Pick<ListsAtSites, 'find'>;
  readonly orders: Pick<StationOrders, 'roomFor'>;
  readonly engine: Pick<Engine, 'run'>;
}

interface Opened {
  readonly edition: Edition;
  readonly corrected: CorrectedList | null;
}

interface Found {
  readonly ids: readonly number[];
  readonly total: number;
  readonly distanceM?: readonly (number | null)[];
  readonly fieldDb?: readonly (number | null)[];
}

/** Lists the stations of an edition: searched, filtered, sorted, by pages. */
export class StationLists {
  private readonly sources: StationListSources;

  constructor(sources: StationListSources) {
    this.sources = sources;
  }

  async page(
    actor: Actor,
    editionId: number,
    query: StationQuery,
    signal?: AbortSignal,
  ): Promise<Page<ListedStation>> {
    const { stations } = this.sources;
    const opened = await stations.open(actor, editionId, query.corrections);
    const site = await this.siteOf(actor, query);
    const found =
      site && dependsOnSite(query)
        ? await this.pick(actor, opened, site, query, signal)
        : await this.sources.pages.page(pagedList(opened), query, orderingOf(query));
    const records = await stations.byId(editionId, found.ids, opened.corrected);
    const shown = found.ids.flatMap((id) => records.get(id) ?? []);
    const items = await this.present(actor, opened, shown);
    const fields = site ? await this.measure(actor, site, items, query, signal) : [];
    return {
      items: items.map((item, index) => ({ ...item, ...fields[index] })),
      total: found.total,
    };
  }

  /** One station, with what a list says of it. */
  async one(
    actor: Actor,
    editionId: number,
    stationId: number,
    query: OneStationQuery,
  ): Promise<ListedStation> {
    const { stations } = this.sources;
    const opened = await stations.open(actor, editionId, query.corrections);
    const site = await this.siteOf(actor, query);
    const records = await stations.byId(editionId, [stationId], opened.corrected);
    const [item] = await this.present(actor, opened, [...records.values()]);
    if (!item) throw new NotFoundError('station', stationId);
    const [field] = site ? await this.measure(actor, site, [item], query) : [];
    return { ...item, ...field };
  }

  /** The strongest stations that are found, as a map shows them. */
  async places(
    actor: Actor,
    editionId: number,
    query: PlacesQuery,
    signal?: AbortSignal,
  ): Promise<StationPlaces> {
    const { stations, pages } = this.sources;
    const opened = await stations.open(actor, editionId, query.corrections);
    const site = await this.siteOf(actor, query);
    const strongest: StationQuery = {
      ...query,
      sort: site ? 'field' : 'power',
      page: 1,
      pageSize: MOST_PLACES,
    };
    const found: Found = site
      ? await this.pick(actor, opened, site, strongest, signal)
      : await pages.page(pagedList(opened), strongest, orderingOf(strongest));
    const records = await stations.byId(editionId, found.ids, opened.corrected);
    const shown = found.ids.flatMap((id, at) => placeOf(opened, records.get(id), found, at) ?? []);
    return {
      items: shown,
      total: found.total,
      withoutPlace: found.ids.length - shown.length,
    };
  }

  private async siteOf(
    actor: Actor,
    { site }: Pick<StationQuery, 'site'>,
  ): Promise<SiteDraft | null> {
    return site === undefined ? null : bareSite.parse(await this.sources.sites.get(actor, site));
  }

  /** What depends on where one listens is picked in a thread, from fields that all of them share. */
  private async pick(
    actor: Actor,
    opened: Opened,
    site: SiteDraft,
    query: StationQuery,
    signal?: AbortSignal,
  ): Promise<Found> {
    const { lists, pages, orders, engine } = this.sources;
    const { sort, period, page, pageSize } = query;
    const corrections = query.corrections;
    const list = await lists.find(actor, { site, editionId: opened.edition.id, corrections });
    const isNarrowed = query.search !== '' || query.only !== undefined;
    const picked = await engine.run(
      'pickStations',
      {
        list,
        period,
        order: orders.roomFor(list, period, sort),
        sort,
        descending: isDescending(query),
        among: isNarrowed ? await pages.ids(pagedList(opened), query) : null,
        fromHz: query.fromHz ?? 0,
        toHz: query.toHz ?? Infinity,
        maxDistanceM: query.maxDistanceM ?? Infinity,
        minFieldDb: query.minFieldDb ?? -Infinity,
        offset: (page - 1) * pageSize,
        limit: pageSize,
      },
      { signal },
    );
    return picked.read();
  }

  /** Distance and field of the stations of one page. */
  private async measure(
    actor: Actor,
    site: SiteDraft,
    items: readonly ListedStation[],
    { period }: Pick<StationQuery, 'period'>,
    signal?: AbortSignal,
  ): Promise<Pick<ListedStation, 'distanceM' | 'fieldDb'>[]> {
    const { lists, engine } = this.sources;
    const stations = items.map((item) => ({ ...item, fieldDb: null, path: null }));
    const list = await lists.find(actor, { site, stations });
    const task = { list, time: period, skyWave: USUAL_SKY_WAVE };
    const { fields } = (await engine.run('fieldStrengths', task, { signal })).read();
    return fields.map(({ distanceM, fieldDb }) => ({ distanceM, fieldDb }));
  }

  private async present(
    actor: Actor,
    { edition, corrected }: Opened,
    records: readonly StationRecord[],
  ): Promise<ListedStation[]> {
    const { stations } = this.sources;
    const official = await stations.byId(edition.id, changedAmong(records, corrected), null);
    const marked = records.map(({ id }) => corrected?.stations.get(id));
    const authors = marked.flatMap((each) => authorsOf(each?.corrections ?? []));
    const names = authors.length === 0 ? null : await this.sources.people.namesOf(authors);
    return records.map((record, index) => ({
      ...record,
      official: official.get(record.id) ?? null,
      onRaster: nearestChannel(edition.raster, record.frequencyHz) === record.frequencyHz,
      offAir: marked[index]?.offAir ?? false,
      corrections: (marked[index]?.corrections ?? []).map((mark) => ({
        ...{ id: mark.id, kind: mark.kind, date: mark.date, note: mark.note },
        authorName: names?.get(mark.authorId ?? 0) ?? '',
        editable: isEditable(actor, mark),
      })),
      distanceM: null,
      fieldDb: null,
    }));
  }
}

const pagedList = ({ edition, corrected }: Opened): PagedList => ({
  editionId: edition.id,
  stations: edition.stations,
  raster: edition.raster,
  corrected,
});

/** Those of which a correction changed what the list says. */
const changedAmong = (
  records: readonly StationRecord[],
  corrected: CorrectedList | null,
): number[] =>
  records.flatMap(({ id }) =>
    corrected?.stations.get(id)?.corrections.some(({ kind }) => kind === 'changed') ? id : [],
  );

/** Null for a station without a place. */
function placeOf(
  { edition, corrected }: Opened,
  record: StationRecord | undefined,
  { distanceM, fieldDb }: Found,
  at: number,
): StationPlaces['items'][number] | null {
  if (record?.latitude == null || record.longitude === null) return null;
  const { id, name, callSign, frequencyHz, latitude, longitude, powerDayW, powerNightW } = record;
  return {
    ...{ id, frequencyHz, latitude, longitude, powerDayW, powerNightW },
    name: name || callSign,
    onRaster: nearestChannel(edition.raster, frequencyHz) === frequencyHz,
    offAir: corrected?.stations.get(id)?.offAir ?? false,
    distanceM: distanceM?.[at] ?? null,
    fieldDb: fieldDb?.[at] ?? null,
  };
}

const dependsOnSite = ({ sort, maxDistanceM, minFieldDb }: StationQuery): boolean =>
  sort === 'distance' || sort === 'field' || maxDistanceM !== undefined || minFieldDb !== undefined;

const isDescending = ({ sort, direction }: StationQuery): boolean =>
  (direction ?? (sort === 'power' || sort === 'field' ? 'desc' : 'asc')) === 'desc';

const orderingOf = (query: StationQuery): Ordering => ({
  sort: query.sort === 'name' || query.sort === 'power' ? query.sort : 'frequency',
  descending: isDescending(query),
});
