import type { HarnessLoader } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import type { Type } from '@angular/core';
import { DeferBlockBehavior, TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import type { Candidate } from '../../../../shared/contracts/candidates';
import type { Cure } from '../../../../shared/contracts/cures';
import { FakeServer } from '../../core/fake-server';
import { ReceiverStore } from '../receiver-page/receiver-store';
import { TrialInputs } from '../trial/trial-inputs';
import { TrialStore } from '../trial/trial-store';
import { ChoiceViewStore } from './choice-view-store';

/** For specs: a receiver, two sites and a list, and what the server says of them. */

const when = '2026-03-01T10:00:00.000Z';
export const raster = [{ lowHz: 540_000, highHz: 1_700_000, stepHz: 10_000 }];
export const receiver = {
  id: 1,
  version: 1,
  ownerName: 'Ottil Marrow',
  editable: true,
  createdAt: when,
  updatedAt: when,
  name: 'Bench set',
  ifHz: 560_000,
  selectivity: { kind: 'widths', b6Hz: 3000, b60Hz: 12_000 },
  bands: [{ name: 'Range 4', lowHz: 600_000, highHz: 1_600_000, oscillator: 'above' }],
};
const site = (id: number, name: string, place: object) => ({
  id,
  name,
  editable: true,
  noise: 'rural',
  ground: 'average',
  ituRegion: 2,
  ...place,
});
const sites = [
  site(4, 'Shed', { latitude: 46, longitude: -63 }),
  site(5, 'Loft', { latitude: 48, longitude: -66 }),
  site(6, 'Nowhere', {}),
];
export const edition = {
  id: 7,
  regionId: 2,
  regionName: 'Coast',
  label: 'Spring',
  date: '2026-03-01',
  source: 'list.csv',
  note: '',
  stations: 1,
  raster,
  editable: true,
  createdAt: when,
};
export const region = { id: 2, name: 'Coast', ituRegion: 2, editable: true, editions: 1, raster };

const none = { deficitDb: 0, worstRatioDb: null, grade: null, dialHz: null, station: null };
const judged = {
  breakthrough: none,
  image: none,
  products: none,
  breakthroughChangeDb: -20,
  changeSigmaDb: 4,
};

/** A candidate that differs from a harmless one by what is given. */
export const sampleCandidate = (
  changes: Partial<Candidate> & Pick<Candidate, 'ifHz'>,
): Candidate => ({
  deficitDb: 0,
  reachable: { ok: true, reason: null },
  rasterDistanceHz: { if: 0, twice: 0, thrice: 0 },
  day: judged,
  night: judged,
  windowHz: { low: changes.ifHz - 500, high: changes.ifHz + 500 },
  harmonics: [],
  intermodulation: { count: 0, nearestBeatHz: null },
  bfoShiftHz: 0,
  capacitanceChange: 0,
  trackingCostDb: null,
  ...changes,
});

/** A cure that differs from a harmless one by what is given. */
export const sampleCure = (changes: Partial<Cure> & Pick<Cure, 'kind' | 'name'>): Cure => ({
  gainDb: [
    { period: 'night', station: 9, dialHz: 612_000, beforeDb: 3, afterDb: 41.2, gainDb: 38.2 },
  ],
  deficitBeforeDb: 40,
  deficitAfterDb: 40,
  costDb: 0,
  parts: [],
  reversible: true,
  caution: '',
  ...changes,
});

const field = {
  station: 9,
  name: 'Alder',
  frequencyHz: 560_000,
  latitude: null,
  longitude: null,
  distanceM: 12_000,
  groundDb: 80,
  skyDb: null,
  fieldDb: 80,
  notes: [],
};

/** A server that answers for the sample; what it says can be changed before a page is opened. */
export function sampleServer(): FakeServer {
  const listed = (...items: unknown[]) => ({ items, total: items.length });
  const candidates = [sampleCandidate({ ifHz: 555_000, deficitDb: 2 })];
  const present = sampleCandidate({ ifHz: 560_000, deficitDb: 40 });
  const verdict = { usable: 3, harmed: [], emptyDial: null, deficitDb: 0 };
  return new FakeServer()
    .on('GET /api/receivers/1', () => receiver)
    .on('GET /api/sites?pageSize=500', () => listed(...sites))
    .on('GET /api/editions?pageSize=500', () => listed(edition))
    .on('GET /api/regions?pageSize=500', () =>
      listed({ ...region, rasters: [{ from: null, ranges: raster }] }),
    )
    .on('POST /api/field-strengths', () => ({ fields: [field] }))
    .on('POST /api/if-candidates', () => ({ present, candidates, ranking: '' }))
    .on('POST /api/assessments', () => ({ verdict, warnings: [], skipped: [], bands: [] }));
}

/** What a part of the page needs around it; for the providers of a spec's host. */
export const AROUND = [
  ReceiverStore,
  { provide: TrialInputs, useExisting: ReceiverStore },
  TrialStore,
  ChoiceViewStore,
];

/** A part of the page, opened at an address. */
export interface OpenedPart {
  readonly loader: HarnessLoader;
  readonly text: () => string;
  readonly query: () => URLSearchParams;
  /** Lets questions settle and be answered. */
  readonly settle: () => Promise<void>;
}

/** Opens a host component as the page of a receiver. */
export async function openPart(
  host: Type<unknown>,
  server: FakeServer,
  query = 'site=4&edition=7',
): Promise<OpenedPart> {
  TestBed.configureTestingModule({
    // What comes into view later has specs of its own.
    deferBlockBehavior: DeferBlockBehavior.Manual,
    providers: [
      provideRouter([{ path: 'receivers/:id', component: host }]),
      provideHttpClient(withInterceptors([server.intercept])),
    ],
  });
  const { fixture } = await RouterTestingHarness.create(`/receivers/1?${query}`);
  const settle = async () => {
    // Stores wait until a question has stood for a while before they ask it.
    await new Promise((resolve) => setTimeout(resolve, 250));
    await fixture.whenStable();
  };
  await settle();
  return {
    loader: TestbedHarnessEnvironment.loader(fixture),
    text: () => (fixture.nativeElement as HTMLElement).textContent.replace(/\s+/g, ' '),
    query: () => new URL(TestBed.inject(Router).url, 'http://here').searchParams,
    settle,
  };
}
