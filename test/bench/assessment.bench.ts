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
import { best, held, megabytesOf, type Verdict } from './measure.ts';

/** A thing measured, beside the least it could cost. */
interface Measured {
  readonly name: string;
  readonly ms: number;
  readonly bareMs: number;
}

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

const againstBare = ({ name, ms, bareMs }: Measured): Verdict => {
  const text = `${name}: ${ms.toFixed(1)} ms, bare loop ${bareMs.toFixed(1)} ms`;
  return held(`${text}, ratio ${(ms / bareMs).toFixed(2)}`, ms / bareMs, 2);
};

/** Measures and answers the lines to print. */
export function run(): Verdict[] {
  const small = againstBareLoop(5_000, 25);
  const memory = megabytesOf(() => assessment(seededStations(100_000)));
  const large = againstBareLoop(100_000, 3);
  const growth = large.perJudged / small.perJudged;
  const candidates = candidatesAgainstBareLoops();
  return [
    ...[small, large, candidates].map(againstBare),
    held(`400 candidates: ${candidates.ms.toFixed(0)} ms`, candidates.ms, 1500, 'ms'),
    held(`a judged setting at 100000 over one at 5000: ${growth.toFixed(2)}`, growth, 1.5),
    held(`memory of assessing 100000: ${memory.toFixed(0)} MB`, memory, 150, 'MB'),
  ];
}
