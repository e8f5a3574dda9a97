/**
 * All cures of a receiver of six bands against 5,000 stations, day and night, beside 400 candidates
 * for its IF over the same: looking for the best IF is the greatest part of the table.
 */
import { judgeCandidates } from '../../shared/radio/candidates/candidates.ts';
import { findCures } from '../../shared/radio/cures/cures.ts';
import {
  BENCH_RASTER,
  BENCH_RECEIVER,
  BENCH_SITE,
  givenFields,
  seededStations,
} from '../support/seeded-list.ts';
import { best, held, type Verdict } from './measure.ts';

const AIM = 1;

/** Measures and answers the lines to print. */
export function run(): Verdict[] {
  const stations = seededStations(5000);
  const fields = givenFields(stations);
  const site = BENCH_SITE;
  const at = { site, stations, raster: BENCH_RASTER, fields: { day: fields, night: fields } };
  const asked = { receiver: BENCH_RECEIVER, periods: ['day', 'night'], maxM: 3, maxN: 2 } as const;
  const range = { fromHz: 435_000, toHz: 474_900, stepHz: 100 };
  const candidatesMs = best(2, () => judgeCandidates({ ...asked, ...range, cases: [at] }));
  const curesMs = best(2, () => findCures({ ...asked, ...at }));
  const ratio = curesMs / candidatesMs;
  const text =
    `all cures, 5000 stations, day and night: ${curesMs.toFixed(0)} ms; 400 candidates ` +
    `${candidatesMs.toFixed(0)} ms, ratio ${ratio.toFixed(2)}`;
  return [held(text, ratio, AIM)];
}
