import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { FakeServer, problemOf } from '../../core/fake-server';
import { EditionStore } from '../edition-store';
import { EDITION, FERRY_POINT, NOWHERE, PLACES, SITE } from '../stations-for-specs';
import { EditionPage } from './edition-page';
import { EditionPageHarness } from './edition-page-harness';

const LIST = 'GET /api/editions/5/stations';

async function open(url = '/editions/5', server = new FakeServer()) {
  server
    .on('GET /api/editions/5', () => EDITION)
    .on('GET /api/sites?pageSize=500', () => ({ items: [SITE], total: 1 }))
    .on(`${LIST}/places`, () => PLACES)
    .on(LIST, () => ({ items: [FERRY_POINT, NOWHERE], total: 120 }))
    .on(`${LIST}?page=2`, () => ({ items: [NOWHERE], total: 120 }))
    .on(`${LIST}?search=ferry`, () => ({ items: [FERRY_POINT], total: 1 }))
    .on(`${LIST}?search=zzz`, () => ({ items: [], total: 0 }));
  TestBed.configureTestingModule({
    providers: [
      EditionStore,
      provideHttpClient(withInterceptors([server.intercept])),
      provideRouter(
        [
          { path: 'editions/:id', component: EditionPage },
          { path: 'editions/:id/stations/:stationId', children: [] },
        ],
        withComponentInputBinding(),
      ),
    ],
  });
  const { fixture } = await RouterTestingHarness.create(url);
  const page = await TestbedHarnessEnvironment.loader(fixture).getHarness(EditionPageHarness);
  return { page, server };
}

const address = () => TestBed.inject(Router).url;

describe('EditionPage', () => {
  it('shows each station with what the list says and what it does not', async () => {
    const { page } = await open();

    const [first, second] = await page.rows();

    expect(first?.slice(0, 6)).toEqual([
      '613.5',
      'Ferry Point',
      '–',
      '47.31°\u00a0N, 8.05°\u00a0W',
      '50\u00a0kW',
      'silent',
    ]);
    expect(first?.[6]).toContain('off the raster');
    expect(first?.[6]).toContain('04:00 to 22:00');
    expect(second?.slice(0, 5)).toEqual(['613.5', '–', 'QXB', '–', '–']);
  });

  it('says what was corrected and by whom, and keeps what is listed in sight', async () => {
    const { page } = await open();

    const [, second] = await page.rows();

    expect(second?.[5]).toMatch(/^250\u00a0W\s*listed 1\u00a0kW$/);
    expect(second?.[6]).toContain('changed by hand: Ada Quill, 2 Mar 2026');
    expect(second?.[6]).toContain('By letter');
  });

  it('turns the page on the server and keeps it in the address', async () => {
    const { page } = await open();

    await (await page.paginator()).goToNextPage();

    expect(await page.rows()).toHaveLength(1);
    expect(address()).toBe('/editions/5?page=2');
  });

  it('searches on the server once there is a pause, from the first page on', async () => {
    const { page } = await open('/editions/5?page=2');

    await page.search(' ferry ');

    await vi.waitFor(async () => {
      expect(await page.text()).toContain('One station for “ferry”');
    });
    expect(address()).toBe('/editions/5?search=ferry');
  });

  it('filters by what is typed in kilohertz and at a site, on the server', async () => {
    const { page, server } = await open();

    await page.type('From', '0,6 MHz');
    await page.choose('Heard from site', 'Attic');
    await vi.waitFor(() => {
      expect(address()).toBe('/editions/5?fromHz=600000&site=3');
    });
    await page.type('Within', '250');

    await vi.waitFor(() => {
      expect(address()).toBe('/editions/5?fromHz=600000&site=3&maxDistanceM=250000');
    });
    const query = '?fromHz=600000&site=3&maxDistanceM=250000';
    expect(server.sent(`${LIST}${query}`)).toHaveLength(1);
    expect(server.sent(`${LIST}/places${query}`)).toHaveLength(1);
  });

  it('sorts by the heads of the table, on the server', async () => {
    const { page, server } = await open();

    await page.sortBy('Power by day');

    expect(address()).toBe('/editions/5?sort=power&direction=desc');
    expect(server.sent(`${LIST}?sort=power&direction=desc`)).toHaveLength(1);
  });

  it('says that nothing was found and leads back to all stations', async () => {
    const { page } = await open('/editions/5?search=zzz');
    expect(await page.text()).toContain('No station for “zzz”');

    await page.press('Show all stations');

    expect(await page.rows()).toHaveLength(2);
  });

  it('goes through the stations of the map by keys, and chooses them in the table', async () => {
    const { page, server } = await open();

    await page.keyOnMap('Home');

    expect(address()).toBe('/editions/5?station=1');
    expect((await page.chosen())[0]).toContain('Ferry Point');

    expect(server.sent(`${LIST}/places`)).toHaveLength(1);

    await page.keyOnMap('Enter');

    expect(address()).toBe('/editions/5/stations/1?station=1');
  });

  it('leaves out of an address what makes no sense', async () => {
    const { page } = await open('/editions/5?page=none&maxDistanceM=5&sort=field&colour=red');

    expect(await page.rows()).toHaveLength(2);
  });

  it('says what went wrong and tries again', async () => {
    const server = new FakeServer().on(`${LIST}/places?search=vale`, () => PLACES);
    const opened = open('/editions/5?search=vale', server);
    server.on(`${LIST}?search=vale`, () => problemOf(500, 'Something went wrong on our side.'));
    const { page } = await opened;
    expect(await page.text()).toContain('Something went wrong on our side.');
    server.on(`${LIST}?search=vale`, () => ({ items: [NOWHERE], total: 1 }));

    await page.press('Try again');

    expect(await page.text()).not.toContain('went wrong on our side');
  });
});
