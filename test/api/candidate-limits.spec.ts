/** Candidates over several cases, and what keeps an IF out of reach. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { type Candidate, candidatesAnswer } from '../../shared/contracts/candidates.ts';
import type { ReceiverInput } from '../../shared/contracts/receiver.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, importList } from '../support/lists.ts';
import { sentReceiver } from '../support/receivers.ts';
import { BARE_SITE, sentSite } from '../support/sites.ts';

let server: ApiServer;
let librarian: ApiClient;
let editionId: number;
beforeAll(async () => {
  server = await startApiServer();
  librarian = await server.newcomer();
  editionId = await importList(librarian, await addRegion(librarian), cleanList(300));
});
afterAll(() => server.close());

const { name: _name, ...SITE } = sentSite();
const range = { fromHz: 445_000, toHz: 465_000, stepHz: 5000 };

async function judge(request: object, receiver = sentReceiver()): Promise<Map<number, Candidate>> {
  const { body } = await librarian
    .post('/api/if-candidates', { receiver, ...range, ...request })
    .expect(200);
  return new Map(candidatesAnswer.parse(body).candidates.map((each) => [each.ifHz, each]));
}

describe('several cases', () => {
  const onTheIf = [{ name: 'Near the IF', frequencyHz: 456_000, fieldDb: 95 }];

  it('count where they are worst, each with stations, an edition or every channel', async () => {
    const cases = [
      { site: BARE_SITE, stations: onTheIf },
      { site: SITE, editionId },
      { site: { ...BARE_SITE, noise: 'rural' }, everyChannelDb: 70 },
    ];
    const [together, ...apart] = await Promise.all([
      judge({ cases }),
      ...cases.map((each) => judge(each)),
    ]);

    for (const [ifHz, { deficitDb }] of together) {
      const worst = Math.max(...apart.map((each) => each.get(ifHz)?.deficitDb ?? NaN));
      expect(deficitDb).toBeCloseTo(worst, 6);
    }
  });

  it('never look better for one more case', async () => {
    const one = { site: BARE_SITE, everyChannelDb: 60 };
    const [alone, both] = await Promise.all([
      judge({ cases: [one] }),
      judge({ cases: [one, { site: BARE_SITE, stations: onTheIf }] }),
    ]);

    for (const [ifHz, { deficitDb }] of both) {
      expect(deficitDb).toBeGreaterThanOrEqual(alone.get(ifHz)?.deficitDb ?? NaN);
    }
    expect(both.get(455_000)?.deficitDb).toBeGreaterThan(alone.get(455_000)?.deficitDb ?? NaN);
  });

  it.each<[string, object]>([
    ['cases.1.editionId', { editionId: 999_999 }],
    ['cases.1.everyChannelDb', { everyChannelDb: 'loud' }],
    ['cases.1.stations', {}],
  ])('with a bad %s are refused', async (path, source) => {
    const cases = [
      { site: BARE_SITE, everyChannelDb: 60 },
      { site: SITE, ...source },
    ];
    const request = { receiver: sentReceiver(), ...range, cases };

    const { status, body } = await librarian.post('/api/if-candidates', request);

    if (path.endsWith('editionId')) {
      expect(status).toBe(404);
      return;
    }
    expect(status).toBe(400);
    expect(body.issues.map((each: { path: string }) => each.path)).toContain(path);
  });
});

describe('an IF', () => {
  const where = { site: BARE_SITE, everyChannelDb: 60 };

  it.each<[string, Partial<ReceiverInput>, number[], RegExp]>([
    [
      'the beat oscillator',
      { bfo: { centreHz: 455_000, rangeHz: 5000, pitchHz: 800 } },
      [450_000, 455_000, 460_000],
      /beat oscillator reaches 5 kHz/u,
    ],
    [
      'a fixed filter',
      { fixedFilter: { kind: 'ceramic', centreHz: 455_000, widthHz: 6000 } },
      [455_000],
      /ceramic filter passes only near 455 kHz/u,
    ],
    ['the IF transformers', { ifRange: 0.015 }, [450_000, 455_000, 460_000], /reach 1\.5 %/u],
  ])('beyond %s says so, and stands after all within', async (_what, part, within, reason) => {
    const found = [...(await judge(where, sentReceiver(part))).values()];

    const ok = found.slice(0, within.length);
    expect(ok.map(({ ifHz }) => ifHz).sort()).toEqual(within);
    for (const { reachable } of ok) expect(reachable).toEqual({ ok: true, reason: null });
    for (const { reachable } of found.slice(within.length)) {
      expect(reachable.ok).toBe(false);
      expect(reachable.reason).toMatch(reason);
    }
  });

  it('gives the BFO’s shift with it', async () => {
    const bfo = { centreHz: 455_000, rangeHz: 20_000, pitchHz: 800 };
    const found = await judge(where, sentReceiver({ bfo }));

    expect(found.get(460_000)?.bfoShiftHz).toBe(5000);
    expect(found.get(450_000)?.bfoShiftHz).toBe(-5000);
  });
});
