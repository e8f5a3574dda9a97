import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { FakeServer, problemOf } from '../../core/fake-server';
import { EditionStore } from '../edition-store';
import { EditionPage } from './edition-page';
import { EditionPageHarness } from './edition-page-harness';

const EDITION = {
  id: 5,
  regionId: 1,
  regionName: 'Vale',
  label: 'Spring',
  date: '2026-03-01',
  source: 'vale.csv',
  note: '',
  stations: 120,
  createdAt: '2026-03-01T10:00:00.000Z',
};
const FERRY_POINT = {
  id: 1,
  name: 'Ferry Point',
  callSign: '',
  frequencyHz: 613_500,
  latitude: 47.31,
  longitude: -8.05,
  powerDayW: 50_000,
  powerNightW: 0,
  hours: '04:00 to 22:00',
  note: '',
  onRaster: false,
};
const NOWHERE = {
  ...FERRY_POINT,
  id: 2,
  name: '',
  callSign: 'QXB',
  latitude: null,
  longitude: null,
  powerDayW: null,
  powerNightW: 250,
  hours: '',
  onRaster: true,
};

const stations = (page: number, search = '') =>
  `GET /api/editions/5/stations?page=${page}&pageSize=50&search=${search}`;

async function open(url = '/editions/5', server = new FakeServer()) {
  server
    .on('GET /api/editions/5', () => EDITION)
    .on(stations(1), () => ({ items: [FERRY_POINT, NOWHERE], total: 120 }))
    .on(stations(2), () => ({ items: [NOWHERE], total: 120 }))
    .on(stations(1, 'ferry'), () => ({ items: [FERRY_POINT], total: 1 }))
    .on(stations(1, 'zzz'), () => ({ items: [], total: 0 }));
  TestBed.configureTestingModule({
    providers: [
      EditionStore,
      provideHttpClient(withInterceptors([server.intercept])),
      provideRouter(
        [{ path: 'editions/:id', component: EditionPage }],
        withComponentInputBinding(),
      ),
    ],
  });
  const { fixture } = await RouterTestingHarness.create(url);
  return TestbedHarnessEnvironment.loader(fixture).getHarness(EditionPageHarness);
}

describe('EditionPage', () => {
  it('shows each station with what the list says and what it does not', async () => {
    const page = await open();

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
    expect(second).toEqual(['613.5', '–', 'QXB', '–', '–', '250\u00a0W', '']);
  });

  it('turns the page on the server and keeps it in the address', async () => {
    const page = await open();

    await (await page.paginator()).goToNextPage();

    expect(await page.rows()).toHaveLength(1);
    expect(TestBed.inject(Router).url).toBe('/editions/5?page=2&pageSize=50');
  });

  it('searches on the server once there is a pause, from the first page on', async () => {
    const page = await open('/editions/5?page=2');

    await page.search(' ferry ');

    await vi.waitFor(async () => {
      expect(await page.text()).toContain('One station for “ferry”');
    });
    expect(TestBed.inject(Router).url).toBe('/editions/5?search=ferry');
  });

  it('says that nothing was found and leads back to all stations', async () => {
    const page = await open('/editions/5?search=zzz');
    expect(await page.text()).toContain('No station for “zzz”');

    await page.press('Show all stations');

    expect(await page.rows()).toHaveLength(2);
  });

  it('shows the first page where the address makes no sense', async () => {
    const page = await open('/editions/5?page=none');

    expect(await page.rows()).toHaveLength(2);
  });

  it('says what went wrong and tries again', async () => {
    const server = new FakeServer();
    const opened = open('/editions/5?search=vale', server);
    server.on(stations(1, 'vale'), () => problemOf(500, 'Something went wrong on our side.'));
    const page = await opened;
    expect(await page.text()).toContain('Something went wrong on our side.');
    server.on(stations(1, 'vale'), () => ({ items: [NOWHERE], total: 1 }));

    await page.press('Try again');

    expect(await page.rows()).toHaveLength(1);
  });
});
