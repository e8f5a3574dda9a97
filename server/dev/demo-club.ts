import { randomUUID } from 'node:crypto';
import { copyFile, readFile } from 'node:fs/promises';

import type { Sequelize } from 'sequelize';
import * as z from 'zod';

import { newReceiver } from '../../shared/contracts/receiver.ts';
import { regionDraft } from '../../shared/contracts/region.ts';
import { accountDraft, role } from '../../shared/contracts/session.ts';
import { namedSite } from '../../shared/contracts/site.ts';
import { inTransaction } from '../db/transaction.ts';
import type { Actor } from '../http/actor.ts';
import type { Services } from '../services.ts';
import type { DemoSignIn } from './api-process.ts';

const FOLDER = new URL('../../datasets/demo/', import.meta.url);

const club = z.object({
  workshop: z.object({ name: z.string() }),
  people: z.array(z.object({ name: z.string(), email: z.string(), role })).nonempty(),
  regions: z.array(
    regionDraft.extend({
      edition: z.object({ label: z.string(), date: z.iso.date(), file: z.string() }),
    }),
  ),
});
type Club = z.output<typeof club>;

const read = async (file: string): Promise<unknown> =>
  JSON.parse(await readFile(new URL(file, FOLDER), 'utf8'));

/**
 * Fills an empty database with the demo club. Its accounts come last, together with all they own:
 * a start that is killed before leaves a database that is still empty of people, and begins anew.
 */
export async function loadDemoClub(
  services: Services,
  database: Sequelize,
  password: string,
): Promise<void> {
  if (!(await services.accounts.isEmpty())) return;
  const { workshop, people, regions } = club.parse(await read('club.json'));
  const workshopId = await services.workshops.found(workshop.name);
  for (const region of regions) await addRegion(services, workshopId, region);
  await inTransaction(database, () => addPeople(services, workshopId, people, password));
}

/** Takes the region's list in by the same way as an uploaded one. */
async function addRegion(
  { regions, imports, uploads }: Services,
  workshopId: number,
  { edition, ...draft }: Club['regions'][number],
): Promise<void> {
  const actor: Actor = { accountId: 0, workshopId, role: 'admin', sessionId: '' };
  const { id: regionId } = await regions.add(actor, draft);
  const storedName = randomUUID();
  await copyFile(new URL(edition.file, FOLDER), uploads.path(storedName));
  const { id } = await imports.take(regionId, { storedName, fileName: edition.file });
  const { label, date } = edition;
  const { faults } = await imports.check(actor, regionId, id, { label, date });
  if (faults.length > 0) throw new Error(`${edition.file}: ${JSON.stringify(faults[0])}`);
  await imports.commit(actor, regionId, id);
  await imports.settled(id);
  const { state, reason } = await imports.state(actor, regionId, id);
  if (state !== 'committed') throw new Error(`${edition.file}: ${state}, ${reason ?? ''}`);
}

async function addPeople(
  services: Services,
  workshopId: number,
  people: Club['people'],
  password: string,
): Promise<void> {
  for (const { name, email, role: place } of people) {
    const id = await services.accounts.register(accountDraft.parse({ name, email, password }));
    await services.workshops.admit(id, workshopId, place);
    await services.accounts.beginIn(id, workshopId);
    if (place === 'member') await addBelongings(services, { accountId: id, workshopId });
  }
}

async function addBelongings(
  { sites, receivers }: Services,
  owner: Pick<Actor, 'accountId' | 'workshopId'>,
): Promise<void> {
  const actor: Actor = { ...owner, role: 'member', sessionId: '' };
  for (const site of z.array(namedSite).parse(await read('sites.json'))) {
    await sites.add(actor, site);
  }
  for (const receiver of z.array(newReceiver).parse(await read('receivers.json'))) {
    await receivers.add(actor, receiver);
  }
}

/** The demo accounts that can still be entered with this password. */
export async function demoSignIns(services: Services, password: string): Promise<DemoSignIn[]> {
  const { people } = club.parse(await read('club.json'));
  const tried = await Promise.all(
    people.map(async ({ email, role: place }): Promise<DemoSignIn | null> => {
      const isOpen = await services.accounts.verify({ email, password }).then(
        () => true,
        () => false,
      );
      return isOpen ? { role: place, email, password } : null;
    }),
  );
  return tried.filter((each) => each !== null);
}
