/**
 * All cures of a receiver's unwanted responses on one table.
 *
 * Source: own rule; judged as in `judgeCandidates`.
 *
 * @module radio/cures/cures
 */
import { CAUTION } from '../caution.ts';
import {
  CureBench,
  type CuresInput,
  type JudgedSetUp,
  type WantedChannel,
  wantedLoss,
  type WorstOfStation,
} from './cure-bench.ts';
import { betterIf } from './cure-move.ts';
import { offendersOf } from './cure-offenders.ts';
import {
  type CureKind,
  type CurePlan,
  movePlan,
  oneMoreCircuitPlan,
  otherSidePlans,
  screeningPlan,
  trapPlan,
} from './cure-plans.ts';
import { bestTrap, type CureTrap, type TrapEnds } from './cure-trap.ts';
import type { Period } from '../site.ts';

/** One of the worst cases, before and after. */
export interface CureGain {
  readonly period: Period;
  readonly station: number;
  /** Where it is worst before, whole hertz. */
  readonly dialHz: number;
  readonly beforeDb: number;
  /** The worst that the station still does in that period anywhere; null: no longer heard. */
  readonly afterDb: number | null;
  readonly gainDb: number | null;
}

/** One cure. */
export interface Cure {
  readonly kind: CureKind;
  readonly name: string;
  /** The three stations that do worst, worst first. */
  readonly gainDb: readonly CureGain[];
  readonly deficitBeforeDb: number;
  readonly deficitAfterDb: number;
  /** Loss that it adds at the lowest wanted channel, decibels. */
  readonly costDb: number;
  readonly parts: readonly string[];
  readonly ifHz?: number;
  readonly trap?: CureTrap;
  readonly reversible: boolean;
  readonly caution: string;
}

/** The whole table. */
export interface Cures {
  readonly cures: readonly Cure[];
}

const WORST_CASES = 3;
/** An open-wire aerial and a valve set's input; assumed unless the receiver has a trap. */
const USUAL_ENDS: TrapEnds = { q: 100, sourceOhms: 400, loadOhms: 1000 };

/**
 * Judges what can be done about a receiver: the IF moved, a trap, both, the oscillator on the other
 * side, one more tuned circuit, screening. What cannot be done is left out: a move without a better
 * IF within reach, a trap where no station comes through on the IF.
 *
 * @param input Receiver, site, stations with their fields, periods and orders.
 * @returns The cures, in the order of `CURE_KINDS`.
 * @throws {RangeError} If a value is out of range; the message names it.
 *
 * @example
 *   findCures({ receiver, ...judged, periods: ['night'], ...orders }).cures[0]?.name; // 'Move the IF to 572.6 kHz'
 */
export function findCures(input: CuresInput): Cures {
  const bench = new CureBench(input);
  const before = bench.judge({ receiver: input.receiver, ifHz: input.receiver.ifHz });
  const channel = bench.lowestWanted(before);
  const cases = worstCases(before);
  const cures = plansFor(input, bench, before).map((plan) => {
    const after = bench.judge(plan.setUp);
    return cureOf(input, plan, { before, after, cases, channel });
  });
  return { cures };
}

function plansFor(input: CuresInput, bench: CureBench, before: JudgedSetUp): CurePlan[] {
  const { receiver } = input;
  const movedHz = betterIf(input);
  const moved = movedHz === null ? [] : [movePlan(receiver, movedHz)];
  const judged = moved.map(({ setUp }) => ({ ifHz: setUp.ifHz, judged: bench.judge(setUp) }));
  const traps = [{ ifHz: receiver.ifHz, judged: before }, ...judged].flatMap((at) => {
    const channel = bench.lowestWanted(at.judged);
    const offenders = offendersOf({ receiver, ifHz: at.ifHz }, at.judged, channel, bench.reachHz);
    const trap = bestTrap(offenders, channel.dialHz, receiver.trap ?? USUAL_ENDS);
    return trap === null ? [] : [trapPlan(receiver, at.ifHz, trap)];
  });
  return [
    ...moved,
    ...traps,
    ...otherSidePlans(receiver),
    oneMoreCircuitPlan(receiver),
    screeningPlan(receiver),
  ];
}

interface Compared {
  readonly before: JudgedSetUp;
  readonly after: JudgedSetUp;
  readonly cases: readonly WorstOfStation[];
  readonly channel: WantedChannel;
}

function cureOf({ receiver }: CuresInput, plan: CurePlan, compared: Compared): Cure {
  const { kind, name, setUp, parts, reversible, trap } = plan;
  const { before, after, cases, channel } = compared;
  const presentLossDb = wantedLoss({ receiver, ifHz: receiver.ifHz }, channel);
  return {
    kind,
    name,
    gainDb: cases.map((each) => gainOf(each, after)),
    deficitBeforeDb: before.deficitDb,
    deficitAfterDb: after.deficitDb,
    costDb: wantedLoss(setUp, channel) - presentLossDb,
    parts,
    ...(setUp.ifHz === receiver.ifHz ? {} : { ifHz: setUp.ifHz }),
    ...(trap === undefined ? {} : { trap }),
    reversible,
    caution: CAUTION,
  };
}

function gainOf(
  { period, station, dialHz, ratioDb }: WorstOfStation,
  after: JudgedSetUp,
): CureGain {
  const still = after.worst.find((each) => each.station === station && each.period === period);
  const afterDb = still?.ratioDb ?? null;
  const gainDb = afterDb === null ? null : afterDb - ratioDb;
  return { period, station, dialHz: Math.round(dialHz), beforeDb: ratioDb, afterDb, gainDb };
}

/** The stations that do worst, each in the period in which it does. */
function worstCases({ worst }: JudgedSetUp): WorstOfStation[] {
  const cases: WorstOfStation[] = [];
  for (const each of worst.toSorted((a, b) => a.ratioDb - b.ratioDb)) {
    if (cases.length === WORST_CASES) break;
    if (!cases.some(({ station }) => station === each.station)) cases.push(each);
  }
  return cases;
}
