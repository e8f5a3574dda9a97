import { Injectable, linkedSignal } from '@angular/core';

import { type Page, pageOf } from '../../../shared/contracts/paging';
import { edition } from '../../../shared/contracts/region';
import {
  type ListedStation,
  listedStation,
  type StationQuery,
} from '../../../shared/contracts/station-list';
import { remote } from '../core/remote';

/** Stations found, and what was searched for. */
interface StationPage extends Page<ListedStation> {
  readonly search: string;
}

const addressOf = (id: string) => `/api/editions/${encodeURIComponent(id)}`;

/** Editions and their stations. Both are read in an injection context. */
@Injectable()
export class EditionStore {
  one(id: () => string) {
    return remote(() => addressOf(id()), edition);
  }

  /** A page of an edition's stations; the page before stays until the next one is there. */
  stations(id: () => string, query: () => StationQuery) {
    const page = remote(() => {
      const { page, pageSize, search } = query();
      const asked = new URLSearchParams({ page: `${page}`, pageSize: `${pageSize}`, search });
      return `${addressOf(id())}/stations?${asked.toString()}`;
    }, pageOf(listedStation));
    const value = linkedSignal<StationPage | undefined, StationPage | undefined>({
      source: () => {
        const found = page.value();
        return found && { ...found, search: query().search };
      },
      computation: (next, previous) => next ?? previous?.value,
    });
    return { ...page, value: value.asReadonly() };
  }
}
