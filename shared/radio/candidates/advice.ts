/**
 * The numbers of the one sentence of advice on top of a receiver's page.
 *
 * Source: own rule: the first candidate, beside what it changes.
 *
 * @module radio/candidates/advice
 */
import type { Candidate, Candidates } from './candidates.ts';
import type { Period } from '../site.ts';
import type { FrequencySpan } from '../mixing/tuning-spans.ts';

/** What is advised. */
export interface Advice {
  /** The IF to move to; null: none is better than the present one. */
  readonly ifHz: number | null;
  /** Period in which the present IF fares worse; the change is of that period. */
  readonly period: Period;
  /** Change of the worst breakthrough; negative: less. Null: at one of the two none is heard. */
  readonly breakthroughChangeDb: number | null;
  readonly changeSigmaDb: number | null;
  /** Whether breakthrough is heard at the present IF, and at the chosen one. */
  readonly isHeardNow: boolean;
  readonly isHeardThen: boolean;
  /** By how much the deficit falls, decibels; 0 when nothing is advised. */
  readonly deficitGainDb: number;
  /** What the generator, the counter and drift must keep. */
  readonly windowHz: FrequencySpan;
  /** What else must move. */
  readonly capacitanceChange: number;
  readonly bfoShiftHz: number;
  /** The change is smaller than its own uncertainty. */
  readonly borderline: boolean;
}

/** A deficit must fall by this much before a set is opened for it, decibels. */
const WORTHWHILE_DB = 1;

/**
 * Picks the candidate to advise: the first in order, if it is within reach and its deficit is at
 * least 1 dB smaller than that of the present IF.
 *
 * @param judged The candidates, in order, and the present IF.
 * @returns The advice.
 *
 * @example
 *   advise(judgeCandidates({ receiver, cases: [judged], periods: ['night'], fromHz: 551_000,
 *     toHz: 560_000, stepHz: 500, maxM: 3, maxN: 2 })).ifHz; // 555000
 */
export function advise({ present, candidates }: Candidates): Advice {
  const best = candidates[0];
  const gain = best === undefined ? 0 : present.deficitDb - best.deficitDb;
  const pays = best !== undefined && best.reachable.ok && gain >= WORTHWHILE_DB;
  const chosen = pays ? best : present;
  const period = worsePeriod(present);
  const { breakthroughChangeDb = null, changeSigmaDb = null } = chosen[period] ?? {};
  return {
    ifHz: pays ? best.ifHz : null,
    period,
    breakthroughChangeDb,
    changeSigmaDb,
    isHeardNow: isHeard(present, period),
    isHeardThen: isHeard(chosen, period),
    deficitGainDb: pays ? gain : 0,
    windowHz: chosen.windowHz,
    capacitanceChange: chosen.capacitanceChange,
    bfoShiftHz: chosen.bfoShiftHz,
    borderline:
      breakthroughChangeDb !== null &&
      changeSigmaDb !== null &&
      Math.abs(breakthroughChangeDb) < changeSigmaDb,
  };
}

function isHeard(candidate: Candidate, period: Period): boolean {
  return (candidate[period]?.breakthrough.worstRatioDb ?? null) !== null;
}

/** Night, unless day alone was asked or breakthrough is worse by day. */
function worsePeriod({ day, night }: Candidate): Period {
  if (night === undefined) return 'day';
  if (day === undefined) return 'night';
  return day.breakthrough.deficitDb > night.breakthrough.deficitDb ? 'day' : 'night';
}
