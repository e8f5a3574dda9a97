/**
 * A candidate for the IF in one period.
 *
 * Source: own rule, as in `Deficit`.
 *
 * @module radio/candidates/candidate-period
 */
import type { Kind } from '../assessment/deficit.ts';
import { type Grade, grade } from '../hearing/grades.ts';
import type { JudgedIf, WorstOnBand } from '../assessment/listening.ts';
import type { Period } from '../site.ts';
import { changeUncertainty } from '../hearing/uncertainty.ts';

/** One IF, judged in each period at each site. */
export type Judgement = ReadonlyMap<Period, readonly JudgedIf[]>;

/** The worst response of one kind; null where none is heard. */
export interface KindOfResponse {
  readonly deficitDb: number;
  readonly worstRatioDb: number | null;
  readonly grade: Grade | null;
  readonly dialHz: number | null;
  readonly station: number | null;
}

/** A candidate in one period, at the site where it fares worst. */
export interface CandidatePeriod {
  readonly breakthrough: KindOfResponse;
  readonly image: KindOfResponse;
  readonly products: KindOfResponse;
  /** Change of the worst breakthrough against the present IF; negative: less of it. */
  readonly breakthroughChangeDb: number | null;
  readonly changeSigmaDb: number | null;
}

/**
 * Deficit in the worse period and the worst case.
 *
 * @param judgement The IF, judged.
 * @returns Decibels; 0 when there is nothing to judge.
 */
export function deficitOf(judgement: Judgement): number {
  return Math.max(0, ...[...judgement.values()].flat().map(({ deficitDb }) => deficitDb));
}

/**
 * What is answered about a candidate in one period.
 *
 * The change compares the worst breakthrough with that of the present IF at the same site: the
 * difference of the two ratios, so that field, wanted level and noise mostly cancel. It is null
 * when either lets none be heard.
 *
 * @param cases The candidate at each site.
 * @param present The present IF at each site, in the same order.
 * @returns The answer for the site with the largest deficit; of equals the first.
 * @throws {RangeError} If there is no site.
 */
export function candidatePeriod(
  cases: readonly JudgedIf[],
  present: readonly JudgedIf[],
): CandidatePeriod {
  const deficits = cases.map(({ deficitDb }) => deficitDb);
  const index = deficits.indexOf(Math.max(...deficits));
  const judged = cases[index];
  if (judged === undefined) throw new RangeError('cases: give at least one');
  const now = judged.worst.breakthrough;
  const before = present[index]?.worst.breakthrough ?? null;
  const known = now !== null && before !== null;
  return {
    breakthrough: kindOfResponse(judged, 'breakthrough'),
    image: kindOfResponse(judged, 'image'),
    products: kindOfResponse(judged, 'products'),
    breakthroughChangeDb: known ? before.ratioDb - now.ratioDb : null,
    changeSigmaDb: known ? changeSigma(now) : null,
  };
}

function kindOfResponse({ kindDeficitDb, worst }: JudgedIf, kind: Kind): KindOfResponse {
  const found = worst[kind];
  const deficitDb = kindDeficitDb[kind];
  if (found === null) {
    return { deficitDb, worstRatioDb: null, grade: null, dialHz: null, station: null };
  }
  const { dial } = found.scan;
  return {
    deficitDb,
    worstRatioDb: found.ratioDb,
    grade: grade(dial.band.service, found.ratioDb, dial.protectionDb),
    dialHz: Math.round(found.dialHz),
    station: dial.spectrum.ids[found.position] ?? null,
  };
}

function changeSigma({ scan, row, n, beatHz }: WorstOnBand): number {
  const { dial } = scan;
  return changeUncertainty(n, dial.band.circuits.length, (hz) => dial.weightingDb(row, hz), beatHz);
}
