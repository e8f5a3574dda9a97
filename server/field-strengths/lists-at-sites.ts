import type { SiteDraft } from '../../shared/contracts/site.ts';
import type { SentStation } from '../../shared/contracts/station.ts';
import { stationsOnEveryChannel } from '../../shared/radio/assumed-stations.ts';
import { type FieldStrength, fieldStrengths } from '../../shared/radio/field-strength.ts';
import { defaultRaster } from '../../shared/radio/raster.ts';
import type { Period } from '../../shared/radio/site.ts';
import type { RasterRange, Station } from '../../shared/radio/station.ts';
import type { Actor } from '../http/actor.ts';
import { InvalidError, UnauthenticatedError } from '../http/errors.ts';
import { BoundedCache } from './bounded-cache.ts';

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

/** The stations of a request with their fields at its site. */
export interface ListAtSite {
  readonly site: SiteDraft;
  readonly stations: readonly Station[];
  readonly raster: readonly RasterRange[];
  readonly fields: (period: Period) => readonly FieldStrength[];
}

const KEPT_STATIONS = 300_000;
const KEPT_FIELDS = 600_000;

/**
 * Finds the stations of a request and their fields. An edition never changes, so its stations and
 * their fields at a site are kept in memory, within bounds.
 */
export class ListsAtSites {
  private readonly editions: EditionShelf;
  private readonly listed = new BoundedCache<Station[]>(KEPT_STATIONS);
  private readonly computed = new BoundedCache<FieldStrength[]>(KEPT_FIELDS);

  constructor(editions: EditionShelf) {
    this.editions = editions;
  }

  /**
   * @param path Where the site stands in the request, for faults: `site`, `cases.0.site`.
   * @throws {InvalidError} If the site lacks what the fields of its stations need.
   */
  async find(actor: Actor | undefined, request: ListRequest, path = 'site'): Promise<ListAtSite> {
    const { site, editionId } = request;
    const list = await this.list(actor, request);
    if (list.stations.some(({ fieldDb }) => fieldDb === null)) demandPlace(site, path);
    const kept = new Map<Period, readonly FieldStrength[]>();
    return {
      site,
      ...list,
      fields: (period) => {
        const fields = kept.get(period) ?? this.fields(editionId, site, list.stations, period);
        kept.set(period, fields);
        return fields;
      },
    };
  }

  private async list(
    actor: Actor | undefined,
    { site, editionId, stations, everyChannelDb }: ListRequest,
  ): Promise<Pick<ListAtSite, 'stations' | 'raster'>> {
    const raster = defaultRaster(site.ituRegion);
    if (stations) return { raster, stations: stations.map((each, id) => ({ ...each, id })) };
    if (editionId === undefined) {
      return { raster, stations: stationsOnEveryChannel(raster, everyChannelDb ?? 0) };
    }
    if (!actor) throw new UnauthenticatedError('Sign in to compute with an edition.');
    const own = await this.editions.rasterOf(actor, editionId);
    return { raster: own, stations: await this.stationsOf(editionId) };
  }

  private async stationsOf(editionId: number): Promise<Station[]> {
    const key = String(editionId);
    const found = this.listed.get(key);
    if (found) return found;
    const stations = await this.editions.everyStation(editionId);
    this.listed.set(key, stations, stations.length);
    return stations;
  }

  private fields(
    editionId: number | undefined,
    site: SiteDraft,
    stations: readonly Station[],
    period: Period,
  ): FieldStrength[] {
    if (editionId === undefined) return fieldStrengths(site, stations, period);
    const key = [editionId, site.latitude, site.longitude, site.ground, period].join();
    const found = this.computed.get(key);
    if (found) return found;
    const fields = fieldStrengths(site, stations, period);
    this.computed.set(key, fields, fields.length);
    return fields;
  }
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
