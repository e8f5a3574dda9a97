import type { ComponentHarness, ComponentHarnessConstructor } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { FakeServer, problemOf } from '../../core/fake-server';
import { ComparePage } from './compare/compare-page';
import { PlanList } from './plan-list/plan-list';
import { PlanPage } from './plan-page/plan-page';
import {
  ComparePageHarness,
  OnePlanHarness,
  PlanListHarness,
  SharedPlanPageHarness,
} from './plan-pages-harness';
import { keptPlan } from './plan-sample';
import { PlansStore } from './plans-store';
import { SharedPlanPage } from './shared-plan/shared-plan-page';

const ALL = 'GET /api/receivers/1/plans?pageSize=500';
const ONE = 'GET /api/receivers/1/plans/3';
const OTHER = 'GET /api/receivers/1/plans/4';
const other = keptPlan({ id: 4, name: 'Left where it is', ifHz: 560_000 }, { harmed: [1] });
const newerEdition = { id: 9, label: 'Autumn', date: '2026-09-01' };
const outdated = keptPlan({
  standing: {
    newerEdition,
    isEditionCorrected: true,
    isReceiverChanged: true,
    isSiteChanged: false,
  },
});

async function open<T extends ComponentHarness>(
  address: string,
  server: FakeServer,
  harness: ComponentHarnessConstructor<T>,
) {
  TestBed.configureTestingModule({
    providers: [
      PlansStore,
      provideHttpClient(withInterceptors([server.intercept])),
      provideRouter(
        [
          { path: 'receivers/:id/plans', component: PlanList },
          { path: 'receivers/:id/plans/compare', component: ComparePage },
          { path: 'receivers/:id/plans/:planId', component: PlanPage },
          { path: 'shared/:token', component: SharedPlanPage },
        ],
        withComponentInputBinding(),
      ),
    ],
  });
  const router = await RouterTestingHarness.create(address);
  await router.fixture.whenStable();
  const loader = TestbedHarnessEnvironment.loader(router.fixture);
  return loader.getHarness(harness);
}

const plans = (...items: unknown[]) =>
  new FakeServer().on(ALL, () => ({ items, total: items.length }));

describe('the list of plans', () => {
  it('says what is to be known about each at a glance', async () => {
    const page = await open('/receivers/1/plans', plans(outdated, other), PlanListHarness);

    const text = await page.text();
    expect(text).toContain('Into the guard band');
    expect(text).toContain('a newer edition of the list exists');
    expect(text).toContain('the set-up was changed since');
    expect(text).toContain('its list was corrected since');
  });

  it('leads to the comparison of two that are chosen, the older first', async () => {
    const page = await open('/receivers/1/plans', plans(other, keptPlan()), PlanListHarness);

    await page.tick(/Left where it is/);
    await page.tick(/Into the guard band/);
    await page.press('Compare the two chosen');

    expect(TestBed.inject(Router).url).toBe('/receivers/1/plans/compare?a=3&b=4');
  });

  it('says so when there is none, and how to come to one', async () => {
    const page = await open('/receivers/1/plans', plans(), PlanListHarness);

    expect(await page.headingTexts()).toContain('No plan is kept yet');
  });

  it('offers to try again when the server is away', async () => {
    const server = new FakeServer().on(ALL, () => problemOf(503, 'Not ready yet.'));
    const page = await open('/receivers/1/plans', server, PlanListHarness);
    expect((await page.alertTexts()).join()).toContain('Not ready yet.');

    server.on(ALL, () => ({ items: [other], total: 1 }));
    await page.press('Try again');

    expect(await page.text()).toContain('Left where it is');
  });
});

describe('the page of a plan', () => {
  it('names stations with their call signs, before and after, and every term', async () => {
    const server = new FakeServer().on(ONE, () => keptPlan());
    const page = await open('/receivers/1/plans/3', server, OnePlanHarness);

    const text = await page.text();
    expect(text).toContain('Alder (QAA)');
    expect(text).toContain('the set harms 2 of them');
    expect(text).toContain('the set harms none of them');
    expect(text).toContain('The plan keeps the worst 1 of 90 responses.');
    expect(text).toContain('from list.csv');
    expect(await page.row('Left to be desired')).toMatch(/40\.0.*4\.0/s);
    expect(await page.isOffered('Judge again')).toBe(false);
  });

  it('judges an outdated plan again as a new one by the newest list, and compares', async () => {
    const POST = 'POST /api/receivers/1/plans';
    const server = plans(outdated, other)
      .on(ONE, () => outdated)
      .on(OTHER, () => other)
      .on(POST, () => other);
    const page = await open('/receivers/1/plans/3', server, OnePlanHarness);
    expect(await page.text()).toContain('A newer edition of this region’s list'.replace('’', "'"));

    expect(await page.text()).toContain('Stations of its list were corrected by hand since');

    await page.press('Judge again');

    expect(server.sent(POST)).toEqual([
      expect.objectContaining({ editionId: 9, siteId: 4, ifHz: 555_000, receiver: null }),
    ]);
    expect(TestBed.inject(Router).url).toBe('/receivers/1/plans/compare?a=3&b=4');
  });

  it('makes a link, tells it once, and ends it', async () => {
    let sharing: { sharedBy: string; sharedAt: string } | null = null;
    const SHARE = '/api/receivers/1/plans/3/share';
    const server = new FakeServer()
      .on(ONE, () => keptPlan({ sharing }))
      .on(`POST ${SHARE}`, () => {
        sharing = { sharedBy: 'Ottil Marrow', sharedAt: '2026-03-03T10:00:00.000Z' };
        return { token: 'abc', sharedAt: sharing.sharedAt };
      })
      .on(`DELETE ${SHARE}`, () => {
        sharing = null;
        return null;
      });
    const page = await open('/receivers/1/plans/3', server, OnePlanHarness);

    await page.press('Share by a link');
    expect(await page.linkField()).toMatch(/\/shared\/abc$/);
    expect(await page.text()).toContain('Shared by Ottil Marrow');

    await page.press('End the link');
    expect(await page.linkField()).toBeUndefined();
    expect(await page.text()).toContain('The link has ended');
  });
});

describe('two plans compared', () => {
  const server = () =>
    plans(keptPlan(), other)
      .on(ONE, () => other)
      .on(OTHER, () => keptPlan({}, { harmed: [0], deficitDb: 12 }));

  it('say in words what got better and worse, and which stations', async () => {
    const page = await open('/receivers/1/plans/compare?a=3&b=4', server(), ComparePageHarness);

    expect(await page.row('Left to be desired')).toMatch(/worse$/);
    expect(await page.row('Stations harmed')).toMatch(/same$/);
    const items = (await page.itemTexts()).join('|');
    expect(items).toMatch(/Birch, 612.*was 20/);
    expect(items).toMatch(/Alder, 1730.*now 20/);
  });

  it('ask for two plans while one is missing', async () => {
    const page = await open('/receivers/1/plans/compare?a=3', server(), ComparePageHarness);

    expect(await page.headingTexts()).toContain('Choose two plans');
  });
});

describe('the page of a link', () => {
  const LINK = 'GET /api/shared-plans/abc';

  it('shows the plan, that it is read only, by which workshop and since when', async () => {
    const shared = {
      ...keptPlan(),
      workshopName: 'Dial Club',
      sharedAt: '2026-03-03T10:00:00.000Z',
    };
    const page = await open(
      '/shared/abc',
      new FakeServer().on(LINK, () => shared),
      SharedPlanPageHarness,
    );

    expect(await page.text()).toContain('Read only: shared by Dial Club on 3 Mar 2026');
    expect(await page.headingTexts()).toContain('What is heard, and why');
    expect(await page.isOffered('Share by a link')).toBe(false);
  });

  it('says so when the link leads nowhere', async () => {
    const server = new FakeServer().on(LINK, () => problemOf(404, 'This link leads to no plan.'));
    const page = await open('/shared/abc', server, SharedPlanPageHarness);

    expect(await page.headingTexts()).toEqual(['Nothing is shared here']);
    expect(await page.isOffered('Try again')).toBe(false);
  });
});
