import type { SiteDraft } from '../../shared/contracts/site.ts';
import type { SentStation } from '../../shared/contracts/station.ts';
import { stationsOnEveryChannel } from '../../shared/radio/channels/assumed-stations.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import type { Period } from '../../shared/radio/site.ts';
import type { RasterRange, Station } from '../../shared/radio/station.ts';
import type { Actor } from '../http/actor.ts';
import { InvalidError, UnauthenticatedError } from '../http/errors.ts';
import { BoundedCache } from './bounded-cache.ts';
import type { ListAtSite } from './engine-tasks.ts';
import { contentKey, placeKey } from './list-key.ts';
import { roomForFields, type SharedFields } from './shared-fields.ts';
import { packStations, type StationColumns } from './station-columns.ts';

/** What is needed of the editions. */
interface EditionShelf {
  computedWith(
    actor: Actor,
    editionId: number,
    corrections?: 'applied' | 'none',
  ): Promise<EditionContent>;
}

/** What computing takes of an edition. */
export interface EditionContent {
  readonly raster: readonly RasterRange[];
  /** Equal for the same stations. */
  readonly version: string;
  read(): Promise<Station[]>;
}

/** A site and where its stations come from: exactly one of the three, as the contracts hold. */
export interface ListRequest {
  readonly site: SiteDraft;
  readonly editionId?: number | undefined;
  readonly stations?: readonly SentStation[] | undefined;
  readonly everyChannelDb?: number | undefined;
  /** Left out: an edition is taken as corrected by hand. */
  readonly corrections?: 'applied' | 'none';
}

const KEPT_STATIONS = 1_000_000;
const KEPT_FIELDS = 2_000_000;

/**
 * Finds the stations of a request. What was read of an edition is kept in memory within bounds, and
 * so is room for the fields of its stations at a site, which the threads fill; another process can
 * make both again.
 */
export class ListsAtSites {
  private readonly editions: EditionShelf;
  private readonly kept = new BoundedCache<StationColumns>(KEPT_STATIONS);
  private readonly reading = new Map<string, Promise<StationColumns>>();
  private readonly fields = new BoundedCache<Record<Period, SharedFields>>(KEPT_FIELDS);

  constructor(editions: EditionShelf) {
    this.editions = editions;
  }

  /**
   * @param path Where the site stands in the request, for faults: `site`, `cases.0.site`.
   * @throws {InvalidError} If the site lacks what the fields of its stations need.
   */
  async find(actor: Actor | undefined, request: ListRequest, path = 'site'): Promise<ListAtSite> {
    const { site, editionId, corrections } = request;
    if (editionId === undefined) return sentList(request, path);
    if (!actor) throw new UnauthenticatedError('Sign in to compute with an edition.');
    const opened = await this.editions.computedWith(actor, editionId, corrections);
    const { raster, version } = opened;
    demandPlace(site, path);
    const content = contentKey({ editionId, version });
    const columns = await this.stations(content, () => opened.read());
    const kept = this.fields.remember(placeKey(content, site), 2 * columns.count, () => ({
      day: roomForFields(columns.count),
      night: roomForFields(columns.count),
    }));
    return { site, raster, content, columns, kept };
  }

  /** Read once, also when several ask at the same time. */
  private stations(content: string, read: EditionContent['read']): Promise<StationColumns> {
    const found = this.kept.get(content) ?? this.reading.get(content);
    if (found) return Promise.resolve(found);
    const reading = this.read(content, read).finally(() => this.reading.delete(content));
    this.reading.set(content, reading);
    return reading;
  }

  private async read(content: string, read: EditionContent['read']): Promise<StationColumns> {
    const columns = await packStations(await read());
    this.kept.set(content, columns, columns.count);
    return columns;
  }
}

async function sentList(
  { site, stations, everyChannelDb = 0 }: ListRequest,
  path: string,
): Promise<ListAtSite> {
  const raster = defaultRaster(site.ituRegion);
  const list =
    stations?.map((each, id) => ({ ...each, id })) ??
    stationsOnEveryChannel(raster, everyChannelDb);
  if (list.some(({ fieldDb }) => fieldDb === null)) demandPlace(site, path);
  return { site, raster, content: null, kept: null, columns: await packStations(list) };
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
