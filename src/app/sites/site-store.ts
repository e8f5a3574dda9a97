import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { pageOf } from '../../../shared/contracts/paging';
import { type NamedSite, type StoredSite, storedSite } from '../../../shared/contracts/site';
import { type Remote, remote } from '../core/remote';

const SITES = '/api/sites';
/** The most a page may hold. */
const MOST = 500;

/** Sites of the workshop. Verbs reject with the server's problem. */
@Injectable()
export class SiteStore {
  private readonly http = inject(HttpClient);

  readonly all = remote(() => `${SITES}?pageSize=${MOST}`, pageOf(storedSite));

  /** One site; nothing while the id is undefined. Call in an injection context. */
  one(id: () => string | undefined): Remote<StoredSite> {
    return remote(() => {
      const wanted = id();
      return wanted === undefined ? undefined : `${SITES}/${encodeURIComponent(wanted)}`;
    }, storedSite);
  }

  /** Stores a new site, or changes the one of that id. */
  async save(draft: NamedSite, id?: string): Promise<StoredSite> {
    const call =
      id === undefined
        ? this.http.post(SITES, draft)
        : this.http.put(`${SITES}/${encodeURIComponent(id)}`, draft);
    const saved = storedSite.parse(await firstValueFrom(call));
    this.all.reload();
    return saved;
  }

  async remove(id: string): Promise<void> {
    await firstValueFrom(this.http.delete(`${SITES}/${encodeURIComponent(id)}`));
    this.all.reload();
  }
}
