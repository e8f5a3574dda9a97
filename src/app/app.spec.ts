import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';

import { App } from './app';
import { AppHarness } from './app-harness';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

const membership = (id: number, name: string, role: string) => ({ id, name, role });
const own = membership(1, 'Own', 'admin');
const ada = {
  id: 7,
  email: 'ada@example.org',
  name: 'Ada',
  workshop: own,
  workshops: [own, membership(2, 'Saltpan', 'librarian')],
};

async function arrange(status: number, body: object | null) {
  TestBed.configureTestingModule({
    imports: [App],
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([{ path: '**', component: Page }]),
    ],
  });
  await TestBed.compileComponents();
  const fixture = TestBed.createComponent(App);
  const calls = TestBed.inject(HttpTestingController);
  calls.expectOne('/api/session').flush(body, { status, statusText: String(status) });
  const loader = TestbedHarnessEnvironment.documentRootLoader(fixture);
  const app = await TestbedHarnessEnvironment.harnessForFixture(fixture, AppHarness);
  await vi.waitFor(async () => {
    expect(await app.links()).not.toEqual([]);
  });
  return { app, calls, loader };
}

describe('the frame of the pages', () => {
  it('leads a member to receivers, regions and sites', async () => {
    const { app } = await arrange(200, ada);

    expect(await app.navigation()).toEqual(['Receivers', 'Regions', 'Sites']);
  });

  it('leads a visitor to sign in or to register', async () => {
    const { app } = await arrange(401, null);

    await vi.waitFor(async () => {
      expect(await app.links()).toEqual(expect.arrayContaining(['Register', 'Sign in']));
    });
    expect(await app.navigation()).toEqual([]);
  });

  it('says that the server cannot be reached, and asks again', async () => {
    const { app, calls } = await arrange(500, null);

    await vi.waitFor(async () => {
      expect(await app.alert()).toContain('500');
    });
    await app.tryAgain();
    calls.expectOne('/api/session').flush(ada);

    await vi.waitFor(async () => {
      expect(await app.navigation()).toHaveLength(3);
    });
  });

  it('lets the keyboard skip to the page', async () => {
    const { app } = await arrange(200, ada);

    await app.skip();

    expect(document.activeElement?.id).toBe('content');
  });
});
