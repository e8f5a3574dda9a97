import type { SiteDraft } from '../../shared/contracts/site.ts';
import type { SentStation } from '../../shared/contracts/station.ts';
import { stationsOnEveryChannel } from '../../shared/radio/channels/assumed-stations.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import type { RasterRange, Station } from '../../shared/radio/station.ts';
import type { Actor } from '../http/actor.ts';
import { InvalidError, UnauthenticatedError } from '../http/errors.ts';
import { BoundedCache } from './bounded-cache.ts';
import type { ListAtSite } from './engine-tasks.ts';
import { packStations, type StationColumns } from './station-columns.ts';

/** What is needed of the editions. */
interface EditionShelf {
  rasterOf(actor: Actor, editionId: number): Promise<readonly RasterRange[]>;
  everyStation(editionId: number): Promise<Station[]>;
}

/** A site and where its stations come from: exactly one of the three, as the contracts hold. */
export interface ListRequest {
  readonly site: SiteDraft;
  readonly editionId?: number | undefined;
  readonly stations?: readonly SentStation[] | undefined;
  readonly everyChannelDb?: number | undefined;
}

const KEPT_STATIONS = 1_000_000;

/** Finds the stations of a request. An edition never changes, so it is kept in memory, in bounds. */
export class ListsAtSites {
  private readonly editions: EditionShelf;
  private readonly kept = new BoundedCache<StationColumns>(KEPT_STATIONS);

  constructor(editions: EditionShelf) {
    this.editions = editions;
  }

  /**
   * @param path Where the site stands in the request, for faults: `site`, `cases.0.site`.
   * @throws {InvalidError} If the site lacks what the fields of its stations need.
   */
  async find(actor: Actor | undefined, request: ListRequest, path = 'site'): Promise<ListAtSite> {
    const { site, editionId } = request;
    if (editionId === undefined) return sentList(request, path);
    if (!actor) throw new UnauthenticatedError('Sign in to compute with an edition.');
    const raster = await this.editions.rasterOf(actor, editionId);
    demandPlace(site, path);
    return { site, raster, editionId, columns: await this.edition(editionId) };
  }

  private async edition(id: number): Promise<StationColumns> {
    const found = this.kept.get(String(id));
    if (found) return found;
    const columns = packStations(await this.editions.everyStation(id));
    this.kept.set(String(id), columns, columns.count);
    return columns;
  }
}

function sentList({ site, stations, everyChannelDb = 0 }: ListRequest, path: string): ListAtSite {
  const raster = defaultRaster(site.ituRegion);
  const list =
    stations?.map((each, id) => ({ ...each, id })) ??
    stationsOnEveryChannel(raster, everyChannelDb);
  if (list.some(({ fieldDb }) => fieldDb === null)) demandPlace(site, path);
  return { site, raster, editionId: null, columns: packStations(list) };
}

function demandPlace(site: SiteDraft, path: string): void {
  const needed = [
    ['latitude', 'degrees, north positive'],
    ['longitude', 'degrees, east positive'],
    ['ground', 'a class of ground: sea, wet, average, dry or poor'],
  ] as const;
  const issues = needed
    .filter(([field]) => site[field] === null)
    .map(([field, what]) => ({
      path: `${path}.${field}`,
      message: `Give ${what}: some stations have no field given, and it is computed from the place.`,
    }));
  if (issues.length > 0) throw new InvalidError(...issues);
}
