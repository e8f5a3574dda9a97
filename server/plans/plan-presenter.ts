import type { Plan, SharedPlan, WholePlan } from '../../shared/contracts/plan.ts';
import type { SiteDraft } from '../../shared/contracts/site.ts';
import { type Actor, mayChange } from '../http/actor.ts';
import type { PlanModel } from './plan-model.ts';
import type { PlanShareModel } from './plan-share-model.ts';
import { type PresentState, standingOf } from './plan-standing.ts';

/** What is said about plans beside what they keep. */
export interface PlanSurroundings {
  readonly present: PresentState;
  readonly names: ReadonlyMap<number, string>;
  readonly shares: ReadonlyMap<number, PlanShareModel>;
}

/** What a plan says by itself. */
const findingsOf = ({ name, ifHz, createdAt, snapshot }: PlanModel) => {
  const { regionId: _regionId, listVersion: _listVersion, ...kept } = snapshot;
  const [edition, savedReceiver] = [kept.edition ?? null, kept.savedReceiver ?? null];
  return { ...kept, edition, savedReceiver, name, ifHz, keptAt: createdAt.toISOString() };
};

export function toPlan(actor: Actor, row: PlanModel, around: PlanSurroundings): Plan {
  const { names, shares, present } = around;
  const share = shares.get(row.id);
  return {
    ...findingsOf(row),
    id: row.id,
    receiverId: row.receiverId,
    siteId: row.siteId,
    editionId: row.editionId,
    keptBy: names.get(row.ownerId) ?? '',
    editable: mayChange(actor, row.ownerId),
    standing: standingOf(row, present),
    sharing: share
      ? { sharedBy: names.get(share.sharedBy) ?? '', sharedAt: share.sharedAt.toISOString() }
      : null,
  };
}

export const toWholePlan = (actor: Actor, row: PlanModel, around: PlanSurroundings): WholePlan => ({
  ...toPlan(actor, row, around),
  ...workingOf(row),
});

/** Tells nobody's name, no id, and the place no closer than the models need. */
export const toSharedPlan = (
  row: PlanModel,
  said: Pick<SharedPlan, 'workshopName' | 'sharedAt'>,
): SharedPlan => {
  const findings = findingsOf(row);
  return { ...findings, ...workingOf(row), ...said, site: coarse(findings.site) };
};

const workingOf = ({ working }: PlanModel) => working ?? { stations: [], judged: null };

const coarse = (site: SiteDraft): SiteDraft => ({
  ...site,
  latitude: toTenths(site.latitude),
  longitude: toTenths(site.longitude),
});

const toTenths = (degrees: number | null): number | null =>
  degrees === null ? null : Math.round(degrees * 10) / 10;
