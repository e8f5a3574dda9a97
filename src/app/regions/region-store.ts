import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { pageOf } from '../../../shared/contracts/paging';
import { suppliedRaster } from '../../../shared/contracts/raster';
import { edition, region, type Region, type RegionDraft } from '../../../shared/contracts/region';
import { type Remote, remote } from '../core/remote';

const REGIONS = '/api/regions';
/** The most a page may hold. */
const MOST = 500;

/** Regions of the workshop and the editions of their lists. Verbs reject with the problem. */
@Injectable()
export class RegionStore {
  private readonly http = inject(HttpClient);

  readonly all = remote(() => `${REGIONS}?pageSize=${MOST}`, pageOf(region));

  /** One region; nothing while the id is undefined. Call in an injection context. */
  one(id: () => string | undefined): Remote<Region> {
    return remote(() => addressOf(id()), region);
  }

  /** Editions of a region's list. Call in an injection context. */
  editions(id: () => string) {
    return remote(() => `${addressOf(id()) ?? ''}/editions?pageSize=${MOST}`, pageOf(edition));
  }

  /** Rasters that come with the product. Call in an injection context. */
  suppliedRasters() {
    return remote(() => `/api/rasters?pageSize=${MOST}`, pageOf(suppliedRaster));
  }

  /** Stores a new region, or changes the one of that id. */
  async save(draft: RegionDraft, id?: string): Promise<Region> {
    const call =
      id === undefined
        ? this.http.post(REGIONS, draft)
        : this.http.put(`${REGIONS}/${encodeURIComponent(id)}`, draft);
    const saved = region.parse(await firstValueFrom(call));
    this.all.reload();
    return saved;
  }

  async remove(id: string): Promise<void> {
    await firstValueFrom(this.http.delete(`${REGIONS}/${encodeURIComponent(id)}`));
    this.all.reload();
  }
}

const addressOf = (id: string | undefined) =>
  id === undefined ? undefined : `${REGIONS}/${encodeURIComponent(id)}`;
