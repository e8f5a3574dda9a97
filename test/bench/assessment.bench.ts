/**
 * Assessing a receiver, and 400 candidates for its IF, against a bare loop over the same stations:
 * ratios in one run, the best of several turns each.
 */
import { assess } from '../../shared/radio/assessment/assessment.ts';
import { judgeCandidates } from '../../shared/radio/candidates/candidates.ts';
import type { Station } from '../../shared/radio/station.ts';
import {
  BENCH_RASTER,
  BENCH_RECEIVER,
  BENCH_SITE,
  givenFields,
  seededStations,
} from '../support/seeded-list.ts';
import { bareCase, bareLoop, type BareResult } from './bare-loop.ts';
import { best, megabytesOf, type Measured } from './measure.ts';

const ORDERS = { maxM: 3, maxN: 2 };

function assessment(stations: Station[]): void {
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
}

function againstBareLoop(count: number, turns: number): Measured & { perJudged: number } {
  const stations = seededStations(count);
  const bare = bareCase(BENCH_RECEIVER, stations, BENCH_RASTER);
  const result: BareResult = { judged: 0, smallestDb: Infinity };
  const loop = best(turns, () => {
    result.judged = 0;
    bareLoop(bare, BENCH_RECEIVER.ifHz, ORDERS.maxM, ORDERS.maxN, result);
  });
  const engine = best(turns, () => assessment(stations));
  return {
    name: `assessment, ${count} stations, ${result.judged} judged settings`,
    ms: engine,
    bareMs: loop,
    perJudged: engine / result.judged,
  };
}

function candidatesAgainstBareLoops(): Measured {
  const stations = seededStations(5_000);
  const fields = givenFields(stations);
  const bare = bareCase(BENCH_RECEIVER, stations, BENCH_RASTER);
  const candidates = Array.from({ length: 400 }, (_, index) => 435_000 + 100 * index);
  const loop = best(1, () => {
    for (const ifHz of candidates) {
      const result: BareResult = { judged: 0, smallestDb: Infinity };
      bareLoop(bare, ifHz, ORDERS.maxM, ORDERS.maxN, result);
      bareLoop(bare, ifHz, ORDERS.maxM, ORDERS.maxN, result);
    }
  });
  const engine = best(2, () =>
    judgeCandidates({
      receiver: BENCH_RECEIVER,
      cases: [
        {
          site: BENCH_SITE,
          stations,
          fields: { day: fields, night: fields },
          raster: BENCH_RASTER,
        },
      ],
      periods: ['day', 'night'],
      fromHz: 435_000,
      toHz: 474_900,
      stepHz: 100,
      ...ORDERS,
    }),
  );
  return { name: '400 candidates, 5000 stations, day and night', ms: engine, bareMs: loop };
}

/** Measures and answers the lines to print. */
export function run(): string[] {
  const small = againstBareLoop(5_000, 9);
  const memory = megabytesOf(() => assessment(seededStations(100_000)));
  const large = againstBareLoop(100_000, 3);
  const candidates = candidatesAgainstBareLoops();
  const lines = [small, large, candidates].map(
    ({ name, ms, bareMs }) =>
      `${name}: ${ms.toFixed(1)} ms, bare loop ${bareMs.toFixed(1)} ms, ratio ${(ms / bareMs).toFixed(2)}`,
  );
  return [
    ...lines,
    `cost of a judged setting at 100000 over that at 5000: ${(large.perJudged / small.perJudged).toFixed(2)}`,
    `memory of an assessment of 100000 stations: ${memory.toFixed(0)} MB`,
  ];
}
