import { describe, expect, it } from 'vitest';

import { site as siteSchema } from '../../shared/contracts/site.ts';
import type { Station } from '../../shared/radio/station.ts';
import type { Actor } from '../http/actor.ts';
import { NotFoundError } from '../http/errors.ts';
import { ListsAtSites } from './lists-at-sites.ts';

const actor: Actor = { accountId: 1, workshopId: 1, role: 'member', sessionId: 's' };
const site = siteSchema.parse({
  latitude: 47,
  longitude: -3,
  ground: 'average',
  noise: 'rural',
  ituRegion: 1,
});
const elsewhere = { ...site, latitude: 48 };

const station: Station = {
  id: 7,
  name: 'Vale',
  frequencyHz: 909_000,
  latitude: 48,
  longitude: -2,
  powerDayW: 1000,
  powerNightW: 1000,
  fieldDb: null,
};

function shelf() {
  let isThere = true;
  let read = 0;
  const readAll = () => {
    read += 1;
    return Promise.resolve([station]);
  };
  return {
    readings: () => read,
    remove: () => {
      isThere = false;
    },
    computedWith: (_: Actor, id: number) =>
      isThere
        ? Promise.resolve({ raster: [], version: '', read: readAll })
        : Promise.reject(new NotFoundError('edition', id)),
  };
}

describe('ListsAtSites', () => {
  it('reads an edition once, also for requests that come together', async () => {
    const editions = shelf();
    const lists = new ListsAtSites(editions);

    await Promise.all([1, 2, 3].map(() => lists.find(actor, { site, editionId: 5 })));
    await lists.find(actor, { site: elsewhere, editionId: 5 });

    expect(editions.readings()).toBe(1);
  });

  it('hands out the same room for the fields of an edition at a place, another elsewhere', async () => {
    const lists = new ListsAtSites(shelf());
    const first = await lists.find(actor, { site, editionId: 5 });
    const again = await lists.find(actor, {
      site: { ...site, noise: 'city' as const },
      editionId: 5,
    });
    const moved = await lists.find(actor, { site: elsewhere, editionId: 5 });
    const other = await lists.find(actor, { site, editionId: 6 });

    expect(again.kept?.night.state).toBe(first.kept?.night.state);
    expect(moved.kept?.night.state).not.toBe(first.kept?.night.state);
    expect(other.kept?.night.state).not.toBe(first.kept?.night.state);
  });

  it('answers nothing of an edition that is gone, whatever is still kept of it', async () => {
    const editions = shelf();
    const lists = new ListsAtSites(editions);
    await lists.find(actor, { site, editionId: 5 });

    editions.remove();

    await expect(lists.find(actor, { site, editionId: 5 })).rejects.toThrow(NotFoundError);
  });

  it('tries again when an edition could not be read', async () => {
    const editions = shelf();
    let isBroken = true;
    const gone = () => Promise.reject(new Error('gone away'));
    const lists = new ListsAtSites({
      computedWith: async (who, id) => {
        const opened = await editions.computedWith(who, id);
        return isBroken ? { ...opened, read: gone } : opened;
      },
    });
    await expect(lists.find(actor, { site, editionId: 5 })).rejects.toThrow('gone away');

    isBroken = false;

    expect((await lists.find(actor, { site, editionId: 5 })).columns.count).toBe(1);
  });
});
