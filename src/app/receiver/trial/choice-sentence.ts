import { greatestIndex } from 'd3';

import type { StationAtSite } from '../../charts/choice-chart/choice-layout';
import { kilohertz, tenths } from '../../charts/readings';
import type { Stretch } from './surroundings';

/** What the chart of the choice of IF shows, in a sentence with its own numbers. */
export function choiceSentence(
  stations: readonly StationAtSite[],
  { low, high }: Stretch,
  rejection: (offsetHz: number) => number,
  ifHz: number,
): string {
  const around = stations.filter(
    (each): each is StationAtSite & { fieldDb: number } =>
      each.fieldDb !== null && each.frequencyHz >= low && each.frequencyHz <= high,
  );
  const ends = $localize`${kilohertz(low)}:low: and ${kilohertz(high)}:high: kHz`;
  const passed = (each: { frequencyHz: number; fieldDb: number }) =>
    each.fieldDb - rejection(each.frequencyHz - ifHz);
  const worst = around[greatestIndex(around, passed) ?? -1];
  if (!worst) return $localize`No station with a known field lies between ${ends}:ends:.`;
  return $localize`${around.length}:count: stations lie between ${ends}:ends:. With the IF at ${kilohertz(ifHz)}:if: kHz most gets through from ${worst.name}:station: on ${kilohertz(worst.frequencyHz)}:frequency: kHz: ${tenths(worst.fieldDb)}:field: dB(µV/m) at the aerial, ${tenths(passed(worst))}:passed: after the IF.`;
}
