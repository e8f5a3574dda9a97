import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { FakeServer, problemOf } from '../../core/fake-server';
import { SiteList } from '../site-list/site-list';
import { SiteStore } from '../site-store';
import { SitePage } from './site-page';
import { SitePageHarness } from './site-page-harness';

const STORED = {
  id: 3,
  editable: true,
  name: 'Signal Hill',
  latitude: 48.2,
  longitude: 16.4,
  ground: 'average',
  noise: 'residential',
  indoors: false,
  noiseFloorDb: null,
  ituRegion: 1,
};

afterEach(() => {
  localStorage.clear();
});

async function open(url: string, stored: object = STORED) {
  const server = new FakeServer()
    .on('GET /api/sites?pageSize=500', () => ({ items: [stored], total: 1 }))
    .on('GET /api/sites/3', () => stored)
    .on('POST /api/sites', () => STORED)
    .on('DELETE /api/sites/3', () => null);
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(withInterceptors([server.intercept])),
      provideRouter(
        [
          {
            path: 'sites',
            providers: [SiteStore],
            children: [
              { path: '', component: SiteList },
              { path: 'new', component: SitePage },
              { path: ':id', component: SitePage },
            ],
          },
        ],
        withComponentInputBinding(),
      ),
    ],
  });
  const { fixture } = await RouterTestingHarness.create(url);
  const page = await TestbedHarnessEnvironment.loader(fixture).getHarness(SitePageHarness);
  return { page, server, root: TestbedHarnessEnvironment.documentRootLoader(fixture) };
}

describe('SitePage', () => {
  it('names the field and what would be right, and sends nothing', async () => {
    const { page, server } = await open('/sites/new');
    await page.type('Name', 'Signal Hill');
    await page.choose('ITU Region', /^1/);
    await page.type('Latitude', '95');
    await page.type('Longitude', '16.4');

    await page.press('Save the site');

    expect(await page.problems()).toContain('Give a latitude between -90 and 90 degrees.');
    expect(await page.errorOf('Latitude')).toBe('Give a latitude between -90 and 90 degrees.');
    expect(await page.textIn('Latitude')).toBe('95');
    expect(server.sent('POST /api/sites')).toEqual([]);
  });

  it('fills in both coordinates from a locator', async () => {
    const { page } = await open('/sites/new');

    await page.type('Locator, or both coordinates at once', 'JN58td');

    expect(await page.textIn('Latitude')).toBe('48.1458°\u00a0N');
    expect(await page.textIn('Longitude')).toBe('11.625°\u00a0E');
  });

  it('stores what the contract takes and goes back to the list', async () => {
    const { page, server } = await open('/sites/new');
    await page.type('Name', ' Signal Hill ');
    await page.choose('ITU Region', /^2/);
    await page.type('Latitude', '33° 54′ S');
    await page.type('Longitude', '18.4');
    await page.choose('Ground', /^Sea/);

    await page.press('Save the site');

    expect(server.sent('POST /api/sites')).toEqual([
      {
        name: 'Signal Hill',
        latitude: -33.9,
        longitude: 18.4,
        ground: 'sea',
        noise: 'residential',
        indoors: false,
        noiseFloorDb: null,
        ituRegion: 2,
      },
    ]);
    expect(TestBed.inject(Router).url).toBe('/sites');
  });

  it('puts what the server objects to on the field it names', async () => {
    const { page, server } = await open('/sites/3');
    server.on('PUT /api/sites/3', () =>
      problemOf(400, 'Some values are not valid.', [
        { path: 'name', message: 'Another site is called that.' },
      ]),
    );

    await page.press('Save the site');

    expect(await page.errorOf('Name')).toBe('Another site is called that.');
    expect(await page.textIn('Name')).toBe('Signal Hill');
  });

  it('only shows a site that belongs to someone else', async () => {
    const { page } = await open('/sites/3', { ...STORED, editable: false });

    expect(await page.textIn('Name')).toBe('Signal Hill');
    expect(await page.buttons()).toEqual(['Back to the sites']);
  });

  it('brings back what was typed and not saved, until it is discarded', async () => {
    const first = await open('/sites/3');
    await first.page.type('Name', 'Signal Hall');
    await vi.waitFor(() => {
      expect(localStorage.length).toBe(1);
    });
    TestBed.resetTestingModule();

    const { page } = await open('/sites/3');
    expect(await page.textIn('Name')).toBe('Signal Hall');
    await page.press('Discard it');

    expect(await page.textIn('Name')).toBe('Signal Hill');
    expect(localStorage.length).toBe(0);
  });

  it('deletes only after asking', async () => {
    const { page, server, root } = await open('/sites/3');
    await page.press('Delete');
    const dialog = await root.getHarness(MatDialogHarness);
    expect(await dialog.getTitleText()).toBe('Delete Signal Hill?');
    expect(server.sent('DELETE /api/sites/3')).toHaveLength(0);

    await (await root.getHarness(MatButtonHarness.with({ text: 'Delete the site' }))).click();

    await vi.waitFor(() => {
      expect(server.sent('DELETE /api/sites/3')).toHaveLength(1);
      expect(TestBed.inject(Router).url).toBe('/sites');
    });
  });
});
