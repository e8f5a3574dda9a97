import { line, type ScaleContinuousNumeric, scaleLinear, scaleLog, type ScaleLinear } from 'd3';

import type { Assessment } from '../../../../shared/contracts/assessment';
import { type CauseMark, causeMark } from '../cause-mark';
import { type HeardStation, type StationAtSite, stationMark } from '../choice-chart/choice-layout';
import { type PlacedLabel, placeLabels } from '../place-labels';

export type JudgedBand = Assessment['bands'][number];
export type JudgedResponse = JudgedBand['responses'][number];
export type DialScale = ScaleContinuousNumeric<number, number>;

/** Heights of the parts of a strip, from its upper edge down, CSS pixels. */
export const STRIP = { heard: 128, glass: 44, wanted: 48 } as const;
export const STRIP_HEIGHT = STRIP.heard + STRIP.glass + STRIP.wanted;

/** A response on the dial. */
export interface HeardMark {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  readonly response: JudgedResponse;
  readonly overNoiseDb: number;
  readonly look: CauseMark;
}

/** A wanted station under the dial. */
export interface WantedMark {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  readonly station: HeardStation;
}

/** Id of a response among the marks of every chart and table. */
export const responseMark = (band: string, each: JudgedResponse): string =>
  ['response', each.station, each.secondStation ?? '', each.m, each.n, each.dialHz, band].join('|');

/** How far a response stands over the noise as it is heard; null where no level is known. */
export function overNoise({ interferenceDb, weightingDb, noiseDb }: JudgedResponse): number | null {
  return interferenceDb === null || weightingDb === null || noiseDb === null
    ? null
    : interferenceDb + weightingDb - noiseDb;
}

/** The dial from end to end, linear or logarithmic. */
export function dialScale(low: number, high: number, width: number, isLog: boolean): DialScale {
  const ends: [number, number] = [0, width];
  return isLog ? scaleLog([low, high], ends) : scaleLinear([low, high], ends);
}

/** Levels over the noise, from 0 at the glass up to the loudest response. */
export function loudness(bands: readonly JudgedBand[]): ScaleLinear<number, number> {
  const levels = bands.flatMap(({ responses }) => responses.map((each) => overNoise(each) ?? 0));
  const top = Math.max(40, Math.ceil((Math.max(0, ...levels) + 6) / 20) * 20);
  return scaleLinear([0, top], [STRIP.heard, 12]);
}

/** Responses in view; those at or under the noise stand on the glass. */
export function heardMarks(
  band: JudgedBand,
  x: DialScale,
  y: ScaleLinear<number, number>,
): HeardMark[] {
  const [low = 0, high = 0] = x.domain();
  return band.responses.flatMap((response) => {
    const over = overNoise(response);
    const { dialHz } = response;
    if (over === null || dialHz === null || dialHz < low || dialHz > high) return [];
    return {
      id: responseMark(band.name, response),
      x: x(dialHz),
      y: y(Math.max(0, over)) - 5,
      response,
      overNoiseDb: over,
      look: causeMark(response.cause),
    };
  });
}

/** Rejection of the IF at a dial setting, between the points of the curve. */
function ifRejection({ rejection }: JudgedBand, dialHz: number): number {
  const scale = scaleLinear(
    rejection.map((point) => point.dialHz),
    rejection.map(({ ifDb }) => ifDb),
  );
  return scale.clamp(true)(dialHz);
}

/** The level of a breakthrough along the dial, as a path. */
export interface BreakthroughCurve {
  readonly id: string;
  readonly path: string;
  readonly colour: string;
}

const MOST_CURVES = 3;

/**
 * The loudest breakthroughs along the dial: heard at every setting, each at the level that the
 * signal circuits leave there. Where stray pick-up sets the limit, within 3 dB.
 */
export function breakthroughCurves(
  band: JudgedBand,
  x: DialScale,
  y: ScaleLinear<number, number>,
  noise: (hz: number) => number | null,
): BreakthroughCurve[] {
  const [low = 0, high = 0] = x.domain();
  return band.responses
    .filter(({ m, n, hidden, dialHz }) => m === 0 && n === 1 && hidden === null && dialHz !== null)
    .slice(0, MOST_CURVES)
    .map((response) => {
      const at = response.dialHz ?? 0;
      const level = (overNoise(response) ?? 0) + ifRejection(band, at) + (noise(at) ?? 0);
      const over = (hz: number) => level - ifRejection(band, hz) - (noise(hz) ?? 0);
      const settings = [low, ...band.rejection.map(({ dialHz }) => dialHz), high];
      const points = settings.filter((hz) => hz >= low && hz <= high);
      const path = line<number>(x, (hz) => y(Math.max(0, over(hz))) - 5)(points) ?? '';
      const { colour } = causeMark(response.cause);
      return { id: responseMark(band.name, response), path, colour };
    });
}

/** Stations of the band that stand over the noise, as bars hanging under the glass. */
export function wantedMarks(
  stations: readonly StationAtSite[],
  x: DialScale,
  noise: (hz: number) => number | null,
): WantedMark[] {
  const [low = 0, high = 0] = x.domain();
  const length = scaleLinear([0, 80], [3, STRIP.wanted - 16]).clamp(true);
  return stations.flatMap((station) => {
    const { fieldDb, frequencyHz } = station;
    if (fieldDb === null || frequencyHz < low || frequencyHz > high) return [];
    const over = fieldDb - (noise(frequencyHz) ?? 0);
    if (over <= 0) return [];
    return {
      id: stationMark(station.id),
      x: x(frequencyHz),
      y: STRIP.heard + STRIP.glass + length(over),
      station: { ...station, fieldDb },
    };
  });
}

/** Names of the loudest responses and the strongest stations, none over another. */
export function stripLabels(
  heard: readonly HeardMark[],
  wanted: readonly WantedMark[],
  nameOf: (station: number) => string,
  width: number,
  most: number,
): PlacedLabel[] {
  const loudest = heard
    .filter(({ response }) => response.hidden === null)
    .sort((a, b) => b.overNoiseDb - a.overNoiseDb)
    .slice(0, most)
    .map(({ id, x, y, response, overNoiseDb }) => ({
      id,
      text: nameOf(response.station),
      weight: 1000 + overNoiseDb,
      spots: [
        { x, y: y - 14 },
        { x: x + 60, y },
        { x: x - 60, y },
      ],
    }));
  const strongest = [...wanted]
    .sort((a, b) => b.station.fieldDb - a.station.fieldDb)
    .slice(0, most * 2)
    .map(({ id, x, station }) => ({
      id,
      text: station.name,
      weight: station.fieldDb,
      spots: [{ x, y: STRIP_HEIGHT - 6 }],
    }));
  const taken = heard
    .filter(({ response }) => response.hidden === null)
    .map(({ x, y }) => ({
      left: x - 6,
      right: x + 6,
      top: y - 6,
      bottom: y + 6,
    }));
  return placeLabels([...loudest, ...strongest], [0, width], taken);
}

/** A harmonic of the set's own on the dial. */
export interface StripHarmonic {
  readonly id: string;
  readonly text: string;
  readonly order: number;
  readonly x: number;
}

/** Orders of the harmonics over the strip, the lowest first where they crowd. */
export const harmonicLabels = (harmonics: readonly StripHarmonic[], width: number): PlacedLabel[] =>
  placeLabels(
    harmonics.map(({ id, text, order, x }) => ({
      id,
      text,
      weight: -order,
      spots: [
        { x, y: 2 },
        { x, y: 16 },
      ],
    })),
    [0, width],
  );
