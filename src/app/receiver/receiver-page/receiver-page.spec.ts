import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { DeferBlockBehavior, TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { ChoicePage } from '../choice-page/choice-page';
import { edition, raster, receiver, region } from '../choice-page/choice-sample';
import { ReceiverPage } from './receiver-page';
import { ReceiverPageHarness } from './receiver-page-harness';

const site = { id: 4, name: 'Shed', editable: true, noise: 'rural', ituRegion: 2 };
const none = { deficitDb: 0, worstRatioDb: null, grade: null, dialHz: null, station: null };
const judged = {
  breakthrough: none,
  image: none,
  products: none,
  breakthroughChangeDb: -20,
  changeSigmaDb: 4,
};
const candidate = (ifHz: number, deficitDb: number) => ({
  ifHz,
  deficitDb,
  reachable: { ok: true, reason: null },
  rasterDistanceHz: { if: 0, twice: 0, thrice: 0 },
  day: judged,
  night: judged,
  windowHz: { low: ifHz - 500, high: ifHz + 500 },
  harmonics: [],
  intermodulation: { count: 0, nearestBeatHz: null },
  bfoShiftHz: null,
  capacitanceChange: 0,
  trackingCostDb: null,
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
const answers = {
  '/api/field-strengths': { fields: [field] },
  '/api/if-candidates': {
    present: candidate(560_000, 40),
    candidates: [candidate(555_000, 2), candidate(560_000, 40)],
    ranking: '555 kHz comes before 560 kHz: it leaves less to be desired.',
  },
  '/api/assessments': {
    verdict: { usable: 3, harmed: [], emptyDial: null, deficitDb: 0 },
    warnings: [],
    skipped: [],
    bands: [],
  },
};

const listed = (...items: unknown[]) => ({ items, total: items.length });

async function open(address: string, sites: unknown[] = [site], editions: unknown[] = [edition]) {
  TestBed.configureTestingModule({
    // What comes into view later has specs of its own.
    deferBlockBehavior: DeferBlockBehavior.Manual,
    providers: [
      provideRouter(
        [
          {
            path: 'receivers/:id',
            component: ReceiverPage,
            children: [{ path: '', component: ChoicePage }],
          },
        ],
        withComponentInputBinding(),
      ),
      provideHttpClient(),
      provideHttpClientTesting(),
    ],
  });
  const router = await RouterTestingHarness.create(address);
  const http = TestBed.inject(HttpTestingController);
  TestBed.tick();
  const flush = (url: string, body: object) =>
    http.expectOne((call) => call.url === url).flush(body);
  flush('/api/receivers/1', receiver);
  flush('/api/sites?pageSize=500', listed(...sites));
  flush('/api/editions?pageSize=500', listed(...editions));
  flush(
    '/api/regions?pageSize=500',
    listed({ ...region, raster, rasters: [{ from: null, ranges: raster }] }),
  );
  await router.fixture.whenStable();
  const loader = TestbedHarnessEnvironment.loader(router.fixture);
  const page = await loader.getHarness(ReceiverPageHarness);
  return { page, http, address: () => TestBed.inject(Router).url };
}

/** Lets questions settle, then answers all that are open. */
async function answer(http: HttpTestingController): Promise<void> {
  await new Promise((resolve) => setTimeout(resolve, 160));
  TestBed.tick();
  for (const [url, body] of Object.entries(answers)) {
    for (const call of http.match(url)) if (!call.cancelled) call.flush(body);
  }
  TestBed.tick();
}

describe("a receiver's page", () => {
  it('fills the address with the first site and the list of its region', async () => {
    const { page, address } = await open('/receivers/1');

    expect(await page.title()).toBe('Bench set');
    expect(address()).toBe('/receivers/1?site=4&edition=7');
  });

  it('assumes a station on every channel when no list fits the site, and says so', async () => {
    const { page, address } = await open('/receivers/1', [site], []);

    expect(address()).toBe('/receivers/1?site=4&every=70');
    expect(await page.assumptionText()).toContain('a station of 70 dB(µV/m) is assumed');
  });

  it('asks where the aerial is when there is no site', async () => {
    const { page } = await open('/receivers/1', []);

    expect(await page.isSiteAskedFor()).toBe(true);
  });

  it('says so when the address names a list that is not there', async () => {
    const { page } = await open('/receivers/1?site=4&edition=99');

    expect(await page.alertTexts()).toEqual([
      'The site or the list that this address names is not here. Choose another above.',
    ]);
  });

  it('gives advice, and puts what it advises on trial and into the address', async () => {
    const { page, http, address } = await open('/receivers/1?site=4&edition=7');
    await answer(http);
    expect(await page.adviceText()).toContain('560 is on a channel here. Set it to 555 ± 0.5 kHz');

    await page.press('Put 555 kHz on trial');
    await answer(http);

    expect(address()).toBe('/receivers/1?site=4&edition=7&if=555000');
  });

  it('judges with the IF on trial and compares with the set as it is', async () => {
    const { http } = await open('/receivers/1?site=4&edition=7&period=day&if=555000');
    await new Promise((resolve) => setTimeout(resolve, 160));

    const judgedAt = http
      .match('/api/assessments')
      .map(({ request }) => request.body as { receiver: { ifHz: number }; period: string })
      .map(({ receiver: { ifHz }, period }) => [ifHz, period]);

    expect(judgedAt.sort()).toEqual([
      [555_000, 'day'],
      [560_000, 'day'],
    ]);
  });

  it('shows a problem of the computation with a way to try again', async () => {
    const { page, http } = await open('/receivers/1?site=4&edition=7');
    await new Promise((resolve) => setTimeout(resolve, 160));
    http
      .expectOne('/api/field-strengths')
      .flush(
        { type: 'unavailable', title: 'Back in a moment.', status: 503, instance: 'x' },
        { status: 503, statusText: 'Unavailable' },
      );
    expect((await page.alertTexts()).join()).toContain('Back in a moment.');

    await page.press('Try again');
    await answer(http);

    expect(await page.alertTexts()).toEqual([]);
  });
});
