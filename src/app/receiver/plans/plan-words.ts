import type { Params } from '@angular/router';

import type { Plan } from '../../../../shared/contracts/plan';
import { addressParams } from '../address/trial-address';

/** Stations a plan was judged by, in words. */
export const stationsOf = ({ editionLabel, everyChannelDb }: Plan): string =>
  editionLabel ?? $localize`${everyChannelDb ?? 0}:field: dB(µV/m) on every channel`;

/** Address of the receiver's page with the plan's choice on trial again. */
export function trialOf({ siteId, editionId, everyChannelDb, period, ifHz }: Plan): Params {
  const source =
    editionId === null
      ? ({ kind: 'every-channel', fieldDb: everyChannelDb ?? 0 } as const)
      : ({ kind: 'edition', editionId } as const);
  return addressParams({ siteId: siteId ?? undefined, source, period, ifHz });
}
