import type { Params } from '@angular/router';

import type { Plan, PlanInput, ReadablePlan } from '../../../../shared/contracts/plan';
import { addressParams } from '../address/trial-address';

type Judged = Pick<ReadablePlan, 'edition' | 'editionLabel' | 'everyChannelDb'>;

/** Stations a plan was judged by, in words. */
export function stationsOf({ edition, editionLabel, everyChannelDb }: Judged): string {
  if (edition) return `${edition.regionName}, ${edition.label}`;
  return editionLabel ?? $localize`${everyChannelDb ?? 0}:field: dB(µV/m) on every channel`;
}

/** A station by the place it has in a plan's list, with its call sign. */
export function stationName({ stations }: Pick<ReadablePlan, 'stations'>, place: number): string {
  const found = stations[place];
  if (!found) return $localize`a station`;
  return found.callSign === '' ? found.name : `${found.name} (${found.callSign})`;
}

/** What is to be known about a plan at a glance. */
export function notesOn({ standing, sharing, savedReceiver }: Plan): string[] {
  const { newerEdition, isEditionCorrected, isReceiverChanged, isSiteChanged } = standing;
  return [
    ...(newerEdition ? [$localize`a newer edition of the list exists`] : []),
    ...(isEditionCorrected ? [$localize`its list was corrected since`] : []),
    ...(isReceiverChanged ? [$localize`the set-up was changed since`] : []),
    ...(isSiteChanged ? [$localize`the site was changed since`] : []),
    ...(savedReceiver ? [$localize`judged with a set-up on trial`] : []),
    ...(sharing ? [$localize`shared by a link`] : []),
  ];
}

/** Address of the receiver's page with the plan's choice on trial again. */
export function trialOf({ siteId, editionId, everyChannelDb, period, ifHz }: Plan): Params {
  const source =
    editionId === null
      ? ({ kind: 'every-channel', fieldDb: everyChannelDb ?? 0 } as const)
      : ({ kind: 'edition', editionId } as const);
  return addressParams({ siteId: siteId ?? undefined, source, period, ifHz });
}

/**
 * The same choice of IF to be judged by what there is now: the newest edition, the receiver and the
 * site as they are. A set-up on trial stays on trial. Null where the site or the list is gone.
 */
export function judgedAnew(kept: Plan): PlanInput | null {
  const { siteId, editionId, everyChannelDb, standing } = kept;
  const newest = standing.newerEdition?.id ?? editionId;
  if (siteId === null || (newest === null && everyChannelDb === null)) return null;
  return {
    name: anew(kept.name),
    note: kept.note,
    siteId,
    editionId: newest,
    everyChannelDb,
    period: kept.period,
    ifHz: kept.ifHz,
    receiver: kept.savedReceiver === null ? null : kept.receiver,
  };
}

const LONGEST = 120;

function anew(name: string): string {
  const words = $localize`, judged again`;
  return name.endsWith(words) ? name : name.slice(0, LONGEST - words.length) + words;
}
