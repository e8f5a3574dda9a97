import { type AbstractControl, FormArray, FormGroup } from '@angular/forms';

import type { ReceiverDraft } from '../../../../../shared/contracts/receiver';
import { fittedNumber, held, neededWhile, number } from './held';

type Tracking = NonNullable<ReceiverDraft['bands'][number]['tracking']>;

/** A point lies in the list of points of the tracking data. */
const areGiven = (points: AbstractControl | null): boolean => {
  const tracking = points?.parent;
  return tracking?.get('fitted')?.value === true && tracking.get('best')?.value === false;
};
const point = () =>
  held<number | null>(
    null,
    neededWhile(areGiven, $localize`Give a frequency of the band where the error is nothing.`),
  );

/** How the oscillator of a band follows its signal circuits. */
export const trackingControls = () =>
  new FormGroup({
    fitted: held(false),
    gangMinF: fittedNumber($localize`Give the least capacitance of the gang, for example 40 pF.`),
    gangMaxF: fittedNumber($localize`Give the largest capacitance of the gang, about 400 pF.`),
    strayF: fittedNumber($localize`Give the stray capacitance, 0 where nothing is known.`, 0),
    trimmer: held<Tracking['trimmer']>('gang'),
    best: held(true),
    points: new FormArray([point(), point(), point()]),
    fixedPadderF: number(null),
    alignHz: new FormArray([number(null), number(null)]),
  });
export type TrackingControls = ReturnType<typeof trackingControls>;
export type TrackingFields = ReturnType<TrackingControls['getRawValue']>;

/** What the fields say; null where no tracking data are known. */
export function trackingOf({ fitted, best, ...fields }: TrackingFields): object | null {
  if (!fitted) return null;
  const { points, fixedPadderF, alignHz, ...rest } = fields;
  return {
    ...rest,
    points: best ? 'best' : points,
    ...(fixedPadderF === null ? {} : { fixedPadderF }),
    ...(alignHz.every((hz) => hz === null) ? {} : { alignHz }),
  };
}

/** Tracking data as the fields show them. */
export function trackingFieldsOf(
  tracking: Tracking | null,
): Parameters<TrackingControls['patchValue']>[0] {
  if (tracking === null) return { fitted: false };
  const { points, fixedPadderF, alignHz, ...rest } = tracking;
  return {
    ...rest,
    fitted: true,
    best: points === 'best',
    points: points === 'best' ? [null, null, null] : [...points],
    fixedPadderF: fixedPadderF ?? null,
    alignHz: alignHz ? [...alignHz] : [null, null],
  };
}
