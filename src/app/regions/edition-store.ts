import { HttpClient } from '@angular/common/http';
import { inject, Injectable, linkedSignal, type Signal } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import {
  type DifferencesQuery,
  differencesAnswer,
} from '../../../shared/contracts/edition-differences';
import { receiverVerdicts, type VerdictsRequest } from '../../../shared/contracts/edition-verdicts';
import { type Page, pageOf } from '../../../shared/contracts/paging';
import { edition, type Edition, type EditionChange } from '../../../shared/contracts/region';
import { storedSite } from '../../../shared/contracts/site';
import {
  listedStation,
  type ListedStation,
  stationPlaces,
  type StationQuery,
} from '../../../shared/contracts/station-list';
import { remote } from '../core/remote';
import { asked } from './edition-address';

/** Stations found, and what was asked for. */
export interface StationPage extends Page<ListedStation> {
  readonly query: StationQuery;
}

/** The most a page may hold. */
const MOST = 500;

export const editionAddress = (id: string | number): string =>
  `/api/editions/${encodeURIComponent(id)}`;

const withQuery = (address: string, query: Readonly<Record<string, string>>): string => {
  const text = new URLSearchParams(query).toString();
  return text === '' ? address : `${address}?${text}`;
};

/** What was there last, until there is something newer. */
function kept<T>(source: () => T | undefined): Signal<T | undefined> {
  return linkedSignal<T | undefined, T | undefined>({
    source,
    computation: (next, previous) => next ?? previous?.value,
  }).asReadonly();
}

/** Editions and their stations. What is read, is read in an injection context. */
@Injectable()
export class EditionStore {
  private readonly http = inject(HttpClient);

  one(id: () => string) {
    return remote(() => editionAddress(id()), edition);
  }

  /** All editions of a region; nothing while it is not known. */
  ofRegion(regionId: () => number | undefined) {
    return remote(() => {
      const id = regionId();
      return id === undefined ? undefined : `/api/regions/${id}/editions?pageSize=${MOST}`;
    }, pageOf(edition));
  }

  sites() {
    return remote(() => `/api/sites?pageSize=${MOST}`, pageOf(storedSite));
  }

  /** A page of an edition's stations; the page before stays until the next one is there. */
  stations(id: () => string, query: () => StationQuery) {
    const page = remote(
      () => withQuery(`${editionAddress(id())}/stations`, asked(query())),
      pageOf(listedStation),
    );
    const value = kept((): StationPage | undefined => {
      const found = page.value();
      return found && { ...found, query: query() };
    });
    return { ...page, value };
  }

  /** The strongest stations that the filter finds, for a map; those before stay meanwhile. */
  places(id: () => string, query: () => StationQuery) {
    const places = remote(() => {
      const {
        page: _page,
        pageSize: _size,
        sort: _sort,
        direction: _direction,
        ...filter
      } = query();
      return withQuery(`${editionAddress(id())}/stations/places`, asked(filter));
    }, stationPlaces);
    return { ...places, value: kept(places.value) };
  }

  /** One station; nothing while there is no id. */
  station(id: () => string, stationId: () => string | undefined, query: () => StationQuery) {
    return remote(() => {
      const wanted = stationId();
      if (wanted === undefined) return undefined;
      const { site, period, corrections } = query();
      const address = `${editionAddress(id())}/stations/${encodeURIComponent(wanted)}`;
      return withQuery(address, asked({ site, period, corrections }));
    }, listedStation);
  }

  /** What changed against another edition; nothing while there is no other. */
  differences(id: () => string, query: () => DifferencesQuery | undefined) {
    return remote(() => {
      const wanted = query();
      if (!wanted) return undefined;
      const said = Object.entries(wanted).filter(([, value]) => value !== undefined);
      const text = said.map(([name, value]) => [name, String(value)]);
      return withQuery(
        `${editionAddress(id())}/differences`,
        Object.fromEntries(text) as Record<string, string>,
      );
    }, differencesAnswer);
  }

  /** Judges a page of the workshop's receivers with two editions; rejects with the problem. */
  async verdicts(id: string, request: Partial<VerdictsRequest> & Pick<VerdictsRequest, 'siteId'>) {
    const call = this.http.post(`${editionAddress(id)}/verdicts`, request);
    return pageOf(receiverVerdicts).parse(await firstValueFrom(call));
  }

  async change(id: string, change: EditionChange): Promise<Edition> {
    return edition.parse(await firstValueFrom(this.http.put(editionAddress(id), change)));
  }

  async remove(id: string): Promise<void> {
    await firstValueFrom(this.http.delete(editionAddress(id)));
  }
}
