/**
 * Fields of 100,000 stations at a site, against the geodesic distances alone: ratios in one run.
 * The list stands on the channels of ITU Region 1 within 3000 km, as lists do; a second one has a
 * frequency of its own for each station.
 */
import geodesy from 'geographiclib-geodesic';

import { fieldStrengths } from '../../shared/radio/propagation/field-strength.ts';
import type { ReceptionTime, Site } from '../../shared/radio/site.ts';
import type { Station } from '../../shared/radio/station.ts';
import { breakthroughHours } from '../../shared/radio/assessment/breakthrough-hours.ts';
import { BENCH_RASTER, BENCH_RECEIVER, seeded } from '../support/seeded-list.ts';
import { best, held, told, type Verdict } from './measure.ts';

const COUNT = 100_000;
const AIM_MS = 1000;
const HOURS_AIM_MS = 5000;
const HOUR_MS = 3_600_000;
const SITE: Site = {
  latitude: 47,
  longitude: -30,
  ground: 'average',
  noise: 'rural',
  indoors: false,
  noiseFloorDb: null,
  ituRegion: 1,
};

function stationsOn(frequencyHz: (index: number) => number, count: number): Station[] {
  const random = seeded(7);
  return Array.from({ length: count }, (_, id) => ({
    id,
    name: '',
    frequencyHz: frequencyHz(id),
    latitude: 47 + 40 * (random() - 0.5),
    longitude: -30 + 60 * (random() - 0.5),
    powerDayW: 10 ** (2 + 3 * random()),
    powerNightW: 10 ** (2 + 3 * random()),
    fieldDb: null,
  }));
}

function distances(stations: readonly Station[]): number {
  const { WGS84, DISTANCE } = geodesy.Geodesic;
  const { latitude: here, longitude: there } = SITE;
  return stations.reduce((sum, { latitude, longitude }) => {
    const { s12 } = WGS84.Inverse(here ?? 0, there ?? 0, latitude ?? 0, longitude ?? 0, DISTANCE);
    return sum + (s12 ?? 0);
  }, 0);
}

/** A receiver of six bands through a day, every hour: fields, and what comes through. */
function hours(stations: readonly Station[]): Verdict {
  const midnight = Date.parse('2026-03-20T00:00:00Z');
  const times = Array.from({ length: 24 }, (_, hour) => new Date(midnight + hour * HOUR_MS));
  const asked = { receiver: BENCH_RECEIVER, site: SITE, raster: BENCH_RASTER, stations, times };
  const ms = best(1, () => breakthroughHours(asked));
  return held(`${COUNT} stations, 24 hours of a day: ${ms.toFixed(0)} ms`, ms, HOURS_AIM_MS, 'ms');
}

/** Measures and answers the lines to print. */
export function run(): Verdict[] {
  const channels = stationsOn((id) => 531_000 + 9000 * (id % 120), COUNT);
  const alone = best(3, () => distances(channels));
  const line = (name: string, stations: readonly Station[], time: ReceptionTime): Verdict => {
    const ms = best(2, () => fieldStrengths(SITE, stations, time));
    const geodesics = (alone * stations.length) / COUNT;
    const ratio = `geodesics alone ${geodesics.toFixed(0)} ms, ratio ${(ms / geodesics).toFixed(2)}`;
    const text = `${name}: ${ms.toFixed(0)} ms, ${ratio}`;
    return stations.length === COUNT ? held(text, ms, AIM_MS, 'ms') : told(text);
  };
  return [
    line(`${COUNT} stations on 120 channels, day`, channels, 'day'),
    line(`${COUNT} stations on 120 channels, night`, channels, 'night'),
    line(
      `${COUNT} stations on 120 channels, at sunset`,
      channels,
      new Date('2026-03-20T20:00:00Z'),
    ),
    line(
      `2000 stations on 2000 frequencies, day`,
      stationsOn((id) => 531_000 + 500 * id, 2000),
      'day',
    ),
    hours(channels),
  ];
}
