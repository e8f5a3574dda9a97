import { MatButtonToggleHarness } from '@angular/material/button-toggle/testing';
import { MatSelectHarness } from '@angular/material/select/testing';

import { FakeServer, problemOf } from '../../core/fake-server';
import { openPage } from '../page-for-specs';
import { EDITION, FERRY_POINT, SITE } from '../stations-for-specs';
import { DifferencesPage } from './differences-page';

const WINTER = { ...EDITION, id: 4, label: 'Winter', date: '2025-12-01' };
const AUTUMN = { ...EDITION, id: 3, label: 'Autumn', date: '2025-09-01' };
const EDITIONS = 'GET /api/regions/1/editions?pageSize=500';
const BETWEEN = 'GET /api/editions/5/differences?against=4&page=1&pageSize=50';
const VERDICTS = 'POST /api/editions/5/verdicts';

const { official: _o, onRaster: _r, offAir: _a, ...rest } = FERRY_POINT;
const { corrections: _c, distanceM: _d, fieldDb: _f, ...LISTED } = rest;
const NONE = {
  added: 0,
  gone: 0,
  moved: 0,
  'changed-power': 0,
  'changed-frequency': 0,
  'changed-other': 0,
};
const WEAKER = {
  kinds: ['changed-power'],
  before: LISTED,
  after: { ...LISTED, powerDayW: 25_000 },
  movedM: 0,
  powerDayDb: -3.0103,
  powerNightDb: null,
};
const ANSWER = { items: [WEAKER], total: 1, counts: { ...NONE, 'changed-power': 1 }, same: 118 };

const FIGURES = { usable: 12, harmed: 0, deficitDb: 0, worst: null, emptyDial: null };
const beacon = { id: 9, name: 'Quay Beacon', frequencyHz: 455_000 };
const CHANGED = {
  receiverId: 1,
  receiverName: 'Kestrel',
  before: FIGURES,
  after: {
    ...FIGURES,
    harmed: 1,
    worst: { ...beacon, dialHz: 612_000, ratioDb: 12, grade: 'annoying' },
  },
  changed: true,
  causes: [{ ...beacon, edition: 'after', kinds: ['added'], dialHz: 612_000, ratioDb: 12 }],
  reason: null,
};
const SAME = { ...CHANGED, receiverId: 2, receiverName: 'Plover', changed: false, causes: [] };
const UNFIT = {
  ...SAME,
  receiverId: 3,
  receiverName: 'Wigeon',
  before: null,
  after: null,
  reason: 'It has no band yet.',
};

async function open(query = '', server = new FakeServer()) {
  server
    .on('GET /api/editions/5', () => EDITION)
    .on(EDITIONS, () => ({ items: [EDITION, WINTER, AUTUMN], total: 3 }))
    .on('GET /api/sites?pageSize=500', () => ({ items: [SITE], total: 1 }))
    .on(BETWEEN, () => ANSWER);
  const page = await openPage(DifferencesPage, server, {
    path: 'editions/:id/differences',
    url: `/editions/5/differences${query}`,
  });
  return { ...page, server };
}

describe('DifferencesPage', () => {
  it('shows one kind alone, as the address says', async () => {
    const none = { ...ANSWER, items: [], total: 0 };
    const { texts } = await open(
      '?kind=moved',
      new FakeServer().on(
        'GET /api/editions/5/differences?against=4&kind=moved&page=1&pageSize=50',
        () => none,
      ),
    );

    expect(await texts('nav [aria-current]')).toEqual(['Moved 0']);
    expect((await texts('app-differences-page > p')).join('')).toContain('None of this kind.');
  });

  it('compares with another edition once that is chosen, and keeps it in the address', async () => {
    const server = new FakeServer().on(
      'GET /api/editions/5/differences?against=3&page=1&pageSize=50',
      () => ({ ...ANSWER, items: [], total: 0, counts: NONE, same: 120 }),
    );
    const { loader, texts, address } = await open('', server);

    const select = await loader.getHarness(MatSelectHarness.with({ label: 'Compared with' }));
    await select.clickOptions({ text: /Autumn/ });

    expect(address()).toBe('/editions/5/differences?against=3');
    expect((await texts('app-differences-page > p')).join('')).toContain(
      'The two editions hold the same stations.',
    );
  });

  it('says that there is nothing to compare with', async () => {
    const server = new FakeServer();
    const opened = open('', server);
    server.on(EDITIONS, () => ({ items: [EDITION], total: 1 }));
    const { texts } = await opened;

    expect((await texts('app-empty')).join('')).toContain('Nothing to compare with');
    expect(await texts('app-verdict-section')).toEqual([]);
  });

  it('says that the other editions could not be read', async () => {
    const server = new FakeServer();
    const opened = open('', server);
    server.on(EDITIONS, () => problemOf(503, 'The database is away.'));
    const { texts } = await opened;

    expect((await texts('app-problem-note')).join('')).toContain('The database is away.');
  });

  it('says what went wrong while comparing', async () => {
    const server = new FakeServer();
    const opened = open('', server);
    server.on(BETWEEN, () => problemOf(503, 'Too much to do just now.'));
    const { texts } = await opened;

    expect((await texts('[role=alert]')).join('')).toContain('Too much to do just now.');
  });

  it('judges no receiver before a site is chosen', async () => {
    const { server, texts } = await open();

    expect((await texts('app-verdict-section')).join('')).toContain('Choose the site');
    expect(server.sent(VERDICTS)).toEqual([]);
  });

  it('says whose verdict changes, before and after and why; and whose does not', async () => {
    const server = new FakeServer().on(VERDICTS, () => ({
      items: [CHANGED, SAME, UNFIT],
      total: 3,
    }));
    const { texts } = await open('?site=3', server);

    expect((await texts('app-verdict-changes [role=status]')).join('')).toMatch(
      /^One verdict changes: 3 receivers judged\.$/,
    );
    const [changed] = await texts('.changed > li');
    expect(changed).toContain('Kestrel');
    expect(changed).toContain('the set harms none of them');
    expect(changed).toContain('the set harms 1 of them');
    expect(changed).toContain('Quay Beacon on 455 kHz (added) is heard at 612 kHz');
    const others = (await texts('app-verdict-changes > p.quiet')).join(' ');
    expect(others).toContain('As before: Plover.');
    expect(others).toContain('Wigeon: It has no band yet.');
  });

  it('says a station drowned as so many decibels below', async () => {
    const worst = { ...beacon, dialHz: 603_000, ratioDb: -35.4, grade: 'hidden' };
    const drowned = { ...CHANGED, after: { ...CHANGED.after, worst } };
    const causes = [{ ...CHANGED.causes[0], dialHz: 603_000, ratioDb: -35.4 }];
    const server = new FakeServer().on(VERDICTS, () => ({
      items: [{ ...drowned, causes }],
      total: 1,
    }));
    const { texts } = await open('?site=3', server);

    const [changed] = await texts('.changed > li');
    expect(changed).toContain('35 dB below what disturbs it');
    expect(changed).toContain('35 dB over the station wanted there');
  });

  it('asks page after page until all receivers are judged', async () => {
    let asked = 0;
    const server = new FakeServer().on(VERDICTS, () => ({
      items: [{ ...SAME, receiverId: ++asked }],
      total: 2,
    }));
    const { texts } = await open('?site=3', server);

    expect((await texts('app-verdict-changes [role=status]')).join('')).toContain(
      'No verdict changes: 2 receivers judged.',
    );
    expect(server.sent(VERDICTS)).toEqual([
      { against: 4, siteId: 3, period: 'night', page: 1 },
      { against: 4, siteId: 3, period: 'night', page: 2 },
    ]);
  });

  it('judges again by day', async () => {
    const server = new FakeServer().on(VERDICTS, () => ({ items: [SAME], total: 1 }));
    const { loader, address } = await open('?site=3', server);

    await (await loader.getHarness(MatButtonToggleHarness.with({ text: 'Day' }))).check();

    expect(address()).toBe('/editions/5/differences?site=3&period=day');
    expect(server.sent(VERDICTS).at(-1)).toMatchObject({ period: 'day' });
  });
});
