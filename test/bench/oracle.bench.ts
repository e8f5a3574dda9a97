/**
 * The engine against the slow oracle of the tests, which follows every product of every station over
 * the dial by multiplying out. Some of the stations are followed, against the whole list; the time is
 * scaled by their number, which it is in proportion to: each is followed by itself.
 */
import { assess } from '../../shared/radio/assessment/assessment.ts';
import { type PlainCase, plainResponses } from '../support/plain-assessment.ts';
import {
  BENCH_RASTER,
  BENCH_RECEIVER,
  BENCH_SITE,
  givenFields,
  seededStations,
} from '../support/seeded-list.ts';
import { best, reached, type Verdict } from './measure.ts';

const COUNT = 5000;
const EVERY = 250;
const AIM = 50;
const ORDERS = { maxM: 3, maxN: 2 };

/** Measures and answers the lines to print. */
export function run(): Verdict[] {
  const stations = seededStations(COUNT);
  const engineMs = best(5, () => {
    assess({
      receiver: BENCH_RECEIVER,
      site: BENCH_SITE,
      stations,
      fields: givenFields(stations),
      raster: BENCH_RASTER,
      period: 'night',
      leaveOutBetterThan: 'slightly-annoying',
      limit: 2000,
      ...ORDERS,
    });
  });
  const followed = Math.ceil(COUNT / EVERY);
  const oracleMs = (oneTurn(stations) * COUNT) / followed;
  const ratio = oracleMs / engineMs;
  const text =
    `${COUNT} stations: ${engineMs.toFixed(0)} ms; oracle ${(oracleMs / 1000).toFixed(0)} s, ` +
    `scaled from ${followed} stations followed: ${ratio.toFixed(0)} times as fast`;
  return [reached(text, ratio, AIM)];
}

/** Processor time of following one station in so many, milliseconds. */
function oneTurn(stations: ReturnType<typeof seededStations>): number {
  const all = stations.map(({ id, frequencyHz, fieldDb }) => ({
    id,
    frequencyHz,
    fieldDb: fieldDb ?? NaN,
    groundDb: fieldDb ?? NaN,
    given: true,
  }));
  const plain: PlainCase = {
    receiver: BENCH_RECEIVER,
    site: BENCH_SITE,
    stations: all,
    raster: BENCH_RASTER,
    period: 'night',
    ...ORDERS,
  };
  const begin = process.cpuUsage();
  plainResponses(
    plain,
    all.filter((_, index) => index % EVERY === 0),
  );
  const { user, system } = process.cpuUsage(begin);
  return (user + system) / 1000;
}
