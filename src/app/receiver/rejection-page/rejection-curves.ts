import type { Receiver } from '../../../../shared/radio/receiver';
import {
  type RejectionChange,
  rejectionAlternatives,
} from '../../../../shared/radio/rejection/rejection-alternatives';
import type { Curve } from '../../charts/curves/curve';
import { kilohertz, tenths } from '../../charts/readings';

/** The changes in the order they are offered; the set as it is always stands. */
export const REJECTION_CHANGES: readonly {
  readonly change: RejectionChange;
  readonly name: string;
}[] = [
  { change: 'one-more-circuit', name: $localize`one more circuit` },
  { change: 'higher-q', name: $localize`Q half as high again` },
  { change: 'other-side', name: $localize`oscillator on the other side` },
  { change: 'trap', name: $localize`best trap for the IF` },
  { change: 'no-stray', name: $localize`no stray pick-up` },
];

const names = new Map<RejectionChange, string>([
  ['as-it-is', $localize`as it is`],
  ...REJECTION_CHANGES.map(({ change, name }) => [change, name] as const),
]);

/** Image or IF rejection along one band. */
export interface RejectionChart {
  readonly id: string;
  /** Place of its band in the set. */
  readonly at: number;
  readonly heading: string;
  readonly sentence: string;
  readonly range: { readonly low: number; readonly high: number };
  readonly curves: readonly Curve[];
}

/** Two charts a band: image, then IF rejection, as the set is and with the changes chosen. */
export function rejectionCharts(
  receiver: Receiver,
  chosen: readonly RejectionChange[],
): RejectionChart[] {
  return receiver.bands.flatMap((band, at) => {
    const shown = rejectionAlternatives(receiver, at).filter(
      ({ change }) => change === 'as-it-is' || chosen.includes(change),
    );
    const curvesOf = (kind: 'imageDb' | 'ifDb'): Curve[] =>
      shown.map(({ change, points }) => ({
        id: change,
        name: names.get(change) ?? change,
        points: points.map((point) => ({ at: point.dialHz, level: point[kind] })),
      }));
    const range = { low: band.lowHz, high: band.highHz };
    const [image, breakthrough] = [curvesOf('imageDb'), curvesOf('ifDb')];
    return [
      {
        id: `${at}-image`,
        at,
        heading: $localize`Image rejection, ${band.name}:band:`,
        sentence: leastSentence(image),
        range,
        curves: image,
      },
      {
        id: `${at}-if`,
        at,
        heading: $localize`IF rejection, ${band.name}:band:`,
        sentence: leastSentence(breakthrough),
        range,
        curves: breakthrough,
      },
    ];
  });
}

/** Where each curve is lowest: that is where stations get through. */
export function leastSentence(curves: readonly Curve[]): string {
  const parts = curves.map(({ name, points }) => {
    const least = points.reduce((low, each) =>
      (each.level ?? Infinity) < (low.level ?? Infinity) ? each : low,
    );
    return $localize`${name}:change:, ${tenths(least.level ?? 0)}:level: dB at ${kilohertz(least.at)}:dial: kHz`;
  });
  return $localize`Least: ${parts.join('; ')}:curves:.`;
}
