import { readFile } from 'node:fs/promises';
import { PassThrough } from 'node:stream';
import { text } from 'node:stream/consumers';

import { describe, expect, it } from 'vitest';

import club from '../../datasets/demo/club.json' with { type: 'json' };
import receivers from '../../datasets/demo/receivers.json' with { type: 'json' };
import sites from '../../datasets/demo/sites.json' with { type: 'json' };
import { receiverDraft } from '../../shared/contracts/receiver.ts';
import { regionDraft } from '../../shared/contracts/region.ts';
import { namedSite } from '../../shared/contracts/site.ts';
import { defaultRaster, rasterChannels } from '../../shared/radio/channels/raster.ts';
import { DEMO_LISTS, demoRows } from './demo-lists.ts';
import { plainPlan, writeList } from './generate-list.ts';
import { COLUMNS, listRows } from './list-generator.ts';

const demoFile = (name: string) =>
  readFile(new URL(`../../datasets/demo/${name}`, import.meta.url), 'utf8');

describe('the demo lists', () => {
  it.each(DEMO_LISTS.map((list) => [list.file, list] as const))(
    '%s is what its plan makes, to the byte',
    async (file, list) => {
      const csv = new PassThrough();
      const [written] = await Promise.all([text(csv), writeList(demoRows(list), csv)]);

      expect(written).toBe(await demoFile(file));
    },
  );

  it.each(DEMO_LISTS.map((list) => [list.file, demoRows(list)] as const))(
    '%s holds 150 to 300 stations with call signs that nobody is allotted',
    (_file, rows) => {
      expect(rows.length).toBeGreaterThanOrEqual(150);
      expect(rows.length).toBeLessThanOrEqual(300);
      expect(rows.filter(({ call_sign }) => !call_sign.startsWith('Q'))).toEqual([]);
    },
  );
});

describe('the demo club', () => {
  it.each(receivers.map((each) => [each.name, each] as const))('has a receiver: %s', (_, each) => {
    expect(receiverDraft.safeParse(each).error).toBeUndefined();
  });

  it.each(sites.map((each) => [each.name, each] as const))('has a site: %s', (_, each) => {
    expect(namedSite.safeParse(each).error).toBeUndefined();
  });

  it.each(club.regions)('has the region $name with a list of its own', ({ edition, ...region }) => {
    expect(regionDraft.safeParse(region).error).toBeUndefined();
    expect(DEMO_LISTS.map(({ file }) => file)).toContain(edition.file);
  });

  it('has one person of each role, at addresses that reach nobody', () => {
    const roles = club.people.map(({ role }) => role);

    expect(roles.toSorted()).toEqual(['admin', 'librarian', 'member']);
    expect(club.people.every(({ email }) => email.endsWith('.example'))).toBe(true);
  });
});

describe('generated lists', () => {
  it('are the same for the same seed and others for another', () => {
    const [first, again] = [plainPlan(500, 7, 9), plainPlan(500, 7, 9)].map((p) => [
      ...listRows(p),
    ]);

    expect(again).toEqual(first);
    expect([...listRows(plainPlan(500, 8, 9))]).not.toEqual(first);
  });

  it('stay on the raster, in their area, and have every column filled but the note', () => {
    const rows = [...listRows(plainPlan(2000, 3, 10))];
    const channels = rasterChannels(defaultRaster(2), 0, Infinity);

    for (const row of rows) {
      expect(channels).toContain(row.frequency_khz * 1000);
      expect(Math.abs(row.latitude - 40)).toBeLessThan(10.2);
      expect(row.power_night_kw).toBeLessThanOrEqual(row.power_day_kw);
      expect(COLUMNS.filter((c) => c !== 'note' && row[c] === '')).toEqual([]);
    }
    expect(rows.some(({ power_night_kw }) => power_night_kw === 0)).toBe(true);
  });

  it('are made as they are read', () => {
    const rows = listRows(plainPlan(1_000_000, 1, 9));

    expect(rows.next().value).toMatchObject({ call_sign: 'QTAAAA' });
  });
});
