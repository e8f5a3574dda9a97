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
/** Longer than it takes from the commit to the end on a quiet machine: some kills come too late. */
const SPAN_MS = 900;

let mortals: Mortals;
beforeAll(async () => {
  mortals = await Mortals.start();
});
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

const moments = Array.from({ length: MOMENTS }, () => Math.round(random() * SPAN_MS));

describe.each(['worker', 'api', 'database'] as const)(
  'a list that is stored when the %s',
  (who) => {
    it.each(moments)(
      'is killed after %i ms is there whole or not at all, and the next one goes in',
      { timeout: 240_000 },
      async (moment) => {
        const before = await mortals.stored();
        const regionId = await addRegion(mortals.person);
        const { path } = await upload(mortals.person, regionId, LIST);
        await mortals.person.put(path, {}).expect(200);
        await mortals.person.post(`${path}/commit`).expect(202);

        await wait(moment);
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
