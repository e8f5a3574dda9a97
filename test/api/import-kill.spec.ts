import { setTimeout as wait } from 'node:timers/promises';

import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';

import { importState } from '../../shared/contracts/list-import.ts';
import { Mortals } from '../support/import-kills.ts';
import { addRegion, cleanList, upload } from '../support/lists.ts';
import { seeded } from '../support/seeded-list.ts';

/** `npm run test:kill` tries more moments, and others by KILL_SEED. */
const MOMENTS = Number(process.env['KILL_MOMENTS'] ?? 3);
const random = seeded(Number(process.env['KILL_SEED'] ?? 20_261_201));
const ROWS = 10_000;
const LIST = cleanList(ROWS);
/** The last kills come when all is over. */
const SHARE_AFTER_END = 0.1;

let mortals: Mortals;
/** How long a check and a commit take that nobody kills, milliseconds. */
let checkMs: number;
let commitMs: number;
beforeAll(async () => {
  mortals = await Mortals.start();
  await undisturbed(); // Once to warm up.
  ({ checkMs, commitMs } = await undisturbed());
});

async function undisturbed() {
  const { path } = await upload(mortals.person, await addRegion(mortals.person), LIST);
  const begun = performance.now();
  await mortals.person.put(path, {}).expect(200);
  const between = performance.now();
  await mortals.person.post(`${path}/commit`).expect(202);
  expect((await rested(path)).state).toBe('committed');
  return { checkMs: between - begun, commitMs: performance.now() - between };
}
afterAll(() => mortals.end());

/** The state of an import once it rests; a server that is away is asked again. */
async function rested(path: string) {
  return vi.waitUntil(
    async () => {
      const { status, body } = await mortals.person.get(path);
      if (status !== 200) return false;
      const state = importState.parse(body);
      return state.state === 'committing' || state.state === 'checking' ? false : state;
    },
    { timeout: 60_000, interval: 100 },
  );
}

/** Checks and stores a list, again where it was refused or stopped in between. */
async function storeWhole(path: string): Promise<void> {
  await vi.waitUntil(
    async () => {
      const { state } = await rested(path);
      if (state === 'committed') return true;
      if (state === 'uploaded') await mortals.person.put(path, {});
      else await mortals.person.post(`${path}/commit`);
      return false;
    },
    { timeout: 90_000, interval: 100 },
  );
}

/** One moment in each equal part of the way from the check's begin to a little after the commit. */
const moments = Array.from({ length: MOMENTS }, (_, index) =>
  Math.round((100 * (1 + SHARE_AFTER_END) * (index + random())) / MOMENTS),
);

/** Goes that far on the way: the answer that is under way then may never come. */
async function goOn(path: string, share: number): Promise<void> {
  const isChecking = share < 0.5;
  if (!isChecking) {
    await mortals.person.put(path, {}).expect(200);
    await mortals.person.post(`${path}/commit`).expect(202);
    await wait((2 * share - 1) * commitMs);
    return;
  }
  void mortals.person.put(path, {}).then(
    () => undefined,
    () => undefined,
  );
  await wait(2 * share * checkMs);
}

describe.each(['worker', 'api', 'database'] as const)(
  'a list that is checked and stored when the %s',
  (who) => {
    it.each(moments)(
      'is killed at %i hundredths of the way is there whole or not at all, and goes in afterwards',
      { timeout: 240_000 },
      async (percent) => {
        const before = await mortals.stored();
        const regionId = await addRegion(mortals.person);
        const { path } = await upload(mortals.person, regionId, LIST);
        await goOn(path, percent / 100);

        await mortals.kill(who);

        const { stations } = await mortals.stored();
        expect([before.stations, before.stations + ROWS]).toContain(stations);
        await storeWhole(path);
        expect(await mortals.stored()).toEqual({
          editions: before.editions + 1,
          stations: before.stations + ROWS,
        });
      },
    );
  },
);
