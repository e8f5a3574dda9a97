import { isDeepStrictEqual } from 'node:util';

import type { Plan } from '../../shared/contracts/plan.ts';
import { bareReceiver, type StoredReceiver } from '../../shared/contracts/receiver.ts';
import type { Edition } from '../../shared/contracts/region.ts';
import { bareSite, type StoredSite } from '../../shared/contracts/site.ts';
import type { PlanModel } from './plan-model.ts';

/** What stands now of all that plans were judged from. */
export interface PresentState {
  readonly receiver: StoredReceiver;
  readonly sites: ReadonlyMap<number, StoredSite>;
  /** The newest first. */
  readonly editions: readonly Edition[];
  /** What computing takes of an edition now, by its id. */
  readonly listVersions: ReadonlyMap<number, string>;
}

/** What has changed since a plan was judged. */
export function standingOf(row: PlanModel, present: PresentState): Plan['standing'] {
  const { snapshot } = row;
  const site = row.siteId === null ? undefined : present.sites.get(row.siteId);
  const saved = snapshot.savedReceiver ?? snapshot.receiver;
  return {
    newerEdition: newerThan(row, present.editions),
    isEditionCorrected: isCorrected(row, present.listVersions),
    isReceiverChanged: !isDeepStrictEqual(
      bareReceiver.parse(saved),
      bareReceiver.parse(present.receiver),
    ),
    isSiteChanged: !site || !isDeepStrictEqual(bareSite.parse(snapshot.site), bareSite.parse(site)),
  };
}

/** Stations were added, changed or put off the air by hand since; plans of old cannot tell. */
function isCorrected(
  { editionId, snapshot }: PlanModel,
  versions: PresentState['listVersions'],
): boolean {
  const [then, now] = [snapshot.listVersion, versions.get(editionId ?? 0)];
  return then !== undefined && now !== undefined && then !== now;
}

/** The newest edition of the region whose list a plan was judged by, if that is another one. */
function newerThan(row: PlanModel, editions: readonly Edition[]): Plan['standing']['newerEdition'] {
  const judgedBy = editions.find(({ id }) => id === row.editionId);
  const regionId = row.snapshot.regionId ?? judgedBy?.regionId;
  const date = row.snapshot.edition?.date ?? judgedBy?.date;
  const newest = editions.find((each) => each.regionId === regionId);
  if (!newest || date === undefined || newest.id === row.editionId || newest.date < date) {
    return null;
  }
  return { id: newest.id, label: newest.label, date: newest.date };
}
