import { line, type ScaleLinear, scaleLinear } from 'd3';

import { type PlacedLabel, placeLabels, type Spot, textWidth } from '../place-labels';
import { kilohertz } from '../readings';
import { type Window } from '../zoom-window';

/** A station at the site, as the charts know it. */
export interface StationAtSite {
  readonly id: number;
  readonly name: string;
  readonly frequencyHz: number;
  /** Field at the site, dB(µV/m); null: not computed. */
  readonly fieldDb: number | null;
  readonly distanceM: number | null;
}

/** A station whose field is known. */
export type HeardStation = StationAtSite & { readonly fieldDb: number };

/** Id of a station among the marks of every chart. */
export const stationMark = (id: number): string => `station-${id}`;

/** A station drawn as a stem. */
export interface Stem {
  readonly id: string;
  readonly station: HeardStation;
  readonly x: number;
  /** Top of the stem: the field. */
  readonly y: number;
  /** Field less the IF's rejection at its distance, dB(µV/m). */
  readonly passedDb: number;
  /** Top of the part that the passband lets through. */
  readonly passedY: number;
}

const LEAST_SPAN = 40;
const LABELLED = 24;
const SAMPLES = 240;

/** Levels in tens of decibels, from under the noise to over the strongest station. */
export function levelScale(
  stations: readonly HeardStation[],
  noiseDb: number | null,
  height: number,
): ScaleLinear<number, number> {
  const fields = stations.map(({ fieldDb }) => fieldDb);
  const lowest = noiseDb ?? Math.min(30, ...fields);
  const floor = Math.floor((lowest - 8) / 10) * 10;
  const top = Math.max(floor + LEAST_SPAN, Math.ceil((Math.max(0, ...fields) + 6) / 10) * 10);
  return scaleLinear([floor, top], [height, 0]);
}

/** Stations in view as stems; what lies under the foot of the scale stands on it. */
export function stems(
  stations: readonly HeardStation[],
  x: ScaleLinear<number, number>,
  y: ScaleLinear<number, number>,
  rejection: (offsetHz: number) => number,
  ifHz: number,
): Stem[] {
  const [floor = 0] = y.domain();
  const [low = 0, high = 0] = x.domain();
  return stations
    .filter(({ frequencyHz }) => frequencyHz >= low && frequencyHz <= high)
    .map((station) => {
      const passedDb = station.fieldDb - rejection(station.frequencyHz - ifHz);
      return {
        id: stationMark(station.id),
        station,
        x: x(station.frequencyHz),
        y: y(Math.max(floor, station.fieldDb)),
        passedDb,
        passedY: y(Math.max(floor, passedDb)),
      };
    });
}

/** Above so many stems those that share a pixel are drawn as one: the strongest hides the others. */
const CROWDED = 500;

/** The stems to draw; each is still read out. */
export function thinned(all: readonly Stem[]): readonly Stem[] {
  if (all.length <= CROWDED) return all;
  const tallest = new Map<number, Stem>();
  for (const stem of all) {
    const pixel = Math.round(stem.x);
    const other = tallest.get(pixel);
    if (!other || stem.y < other.y) tallest.set(pixel, stem);
  }
  return [...tallest.values()];
}

/** Half the size of a stem's head with its outline. */
const HEAD = 5;

/** Over the head, else beside it, else higher up. */
const spotsAround = (x: number, y: number, aside: number): Spot[] => [
  { x, y: y - 14 },
  { x: x + aside, y },
  { x: x - aside, y },
  { x, y: y - 28 },
];

/** Names at the heads of the strongest stems, none over another. */
export function stemLabels(
  drawn: readonly Stem[],
  width: number,
  isNarrow: boolean,
): PlacedLabel[] {
  const strongest = [...drawn]
    .sort((a, b) => b.station.fieldDb - a.station.fieldDb)
    .slice(0, isNarrow ? 8 : LABELLED);
  const requests = strongest.map(({ id, station, x, y }) => {
    const numeral = kilohertz(station.frequencyHz);
    const text = isNarrow ? numeral : `${numeral} ${station.name}`;
    return {
      id,
      text,
      weight: station.fieldDb,
      spots: spotsAround(x, y, textWidth(text) / 2 + HEAD + 4),
    };
  });
  const taken = drawn.map(({ x, y }) => ({
    left: x - HEAD,
    right: x + HEAD,
    top: y - HEAD,
    bottom: y + HEAD,
  }));
  return placeLabels(requests, [0, width], taken);
}

/** The passband's curve, hung from the top of the chart at the IF on trial. */
export function passbandPath(
  window: Window,
  x: ScaleLinear<number, number>,
  y: ScaleLinear<number, number>,
  rejection: (offsetHz: number) => number,
  ifHz: number,
): string {
  const [floor = 0, top = 0] = y.domain();
  const [low, high] = window;
  const points = Array.from(
    { length: SAMPLES + 1 },
    (_, at) => low + ((high - low) * at) / SAMPLES,
  );
  if (ifHz > low && ifHz < high) points.push(ifHz);
  points.sort((a, b) => a - b);
  const curve = line<number>(
    (hz) => x(hz),
    (hz) => y(Math.max(floor, top - rejection(hz - ifHz))),
  );
  return curve(points) ?? '';
}
