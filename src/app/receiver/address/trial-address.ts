import type { ParamMap, Params } from '@angular/router';

import { instant } from '../../../../shared/contracts/quantities';
import type { Period } from '../../../../shared/radio/site';
import type { StationSource } from '../trial/station-source';
import { casesText, type PlaceAndList, readCases } from './cases-address';

/** What the address of a receiver's page says; what it does not say is undefined. */
export interface TrialAddress {
  /** What of the set-up is on trial, as text. */
  readonly setUp: string | undefined;
  readonly siteId: number | undefined;
  readonly source: StationSource | undefined;
  readonly period: Period;
  /** The moment that is judged, ISO 8601; undefined: day or night everywhere. */
  readonly at: string | undefined;
  /** Further sites with their lists that one IF is to serve as well. */
  readonly others: readonly PlaceAndList[];
  readonly ifHz: number | undefined;
  /** Mark that is picked in the charts and tables. */
  readonly picked: string | undefined;
}

function wholeNumber(text: string | null): number | undefined {
  return text !== null && /^\d{1,15}$/.test(text) && Number(text) > 0 ? Number(text) : undefined;
}

function sourceFrom(params: ParamMap): StationSource | undefined {
  const editionId = wholeNumber(params.get('edition'));
  if (editionId !== undefined) return { kind: 'edition', editionId };
  const every = params.get('every');
  const fieldDb = every === null || every.trim() === '' ? NaN : Number(every);
  return Math.abs(fieldDb) <= 300 ? { kind: 'every-channel', fieldDb } : undefined;
}

/** Reads an address; what makes no sense counts as not said. */
export function readAddress(params: ParamMap): TrialAddress {
  return {
    setUp: params.get('set') ?? undefined,
    siteId: wholeNumber(params.get('site')),
    source: sourceFrom(params),
    period: params.get('period') === 'day' ? 'day' : 'night',
    at: instant.safeParse(params.get('at')).data,
    others: readCases(params.get('also')),
    ifHz: wholeNumber(params.get('if')),
    picked: params.get('mark') ?? undefined,
  };
}

/** Query parameters that say a change; null takes one out of the address. */
export function addressParams(change: Partial<TrialAddress>): Params {
  const params: Params = {};
  if ('setUp' in change) params['set'] = change.setUp ?? null;
  if ('siteId' in change) params['site'] = change.siteId ?? null;
  if ('period' in change) params['period'] = change.period;
  if ('at' in change) params['at'] = change.at ?? null;
  if ('others' in change) params['also'] = casesText(change.others ?? []);
  if ('ifHz' in change) params['if'] = change.ifHz ?? null;
  if ('picked' in change) params['mark'] = change.picked ?? null;
  if ('source' in change) {
    const { source } = change;
    params['edition'] = source?.kind === 'edition' ? source.editionId : null;
    params['every'] = source?.kind === 'every-channel' ? source.fieldDb : null;
  }
  return params;
}
