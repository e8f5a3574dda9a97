import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import {
  type Correction,
  correction,
  type CorrectionChange,
  type CorrectionDraft,
} from '../../../shared/contracts/correction';
import { pageOf } from '../../../shared/contracts/paging';
import { remote } from '../core/remote';

/** The most corrections shown at once. */
export const CORRECTIONS_SHOWN = 20;

const addressOf = (regionId: string | number): string =>
  `/api/regions/${encodeURIComponent(regionId)}/corrections`;

/** What people corrected of a region's list by hand. Verbs reject with the problem. */
@Injectable()
export class CorrectionStore {
  private readonly http = inject(HttpClient);

  /** A page of them, the latest first. Call in an injection context. */
  list(regionId: () => number, page: () => number) {
    return remote(
      () => `${addressOf(regionId())}?page=${page()}&pageSize=${CORRECTIONS_SHOWN}`,
      pageOf(correction),
    );
  }

  async add(regionId: number, draft: CorrectionDraft): Promise<Correction> {
    return correction.parse(await firstValueFrom(this.http.post(addressOf(regionId), draft)));
  }

  async change(regionId: number, id: number, change: CorrectionChange): Promise<Correction> {
    const call = this.http.put(`${addressOf(regionId)}/${id}`, change);
    return correction.parse(await firstValueFrom(call));
  }

  async remove(regionId: number, id: number): Promise<void> {
    await firstValueFrom(this.http.delete(`${addressOf(regionId)}/${id}`));
  }
}
