/**
 * The wave trap that does most against breakthrough.
 *
 * Source: own rule: the least power that is left of all offenders; losses as in `trapLoss`.
 *
 * @module radio/cures/cure-trap
 */
import { nearestPreferred, type Series } from '../circuits/preferred-values.ts';
import type { Trap } from '../receiver.ts';
import { trapLoss } from '../circuits/trap.ts';

/** A station heard on the IF without any trap. */
export interface Offender {
  readonly hz: number;
  /** Its weighted interference while the lowest wanted channel is tuned, dB(uV/m). */
  readonly levelDb: number;
  /** What stray pick-up leaves of it in any case; -Infinity: no limit. */
  readonly leastDb: number;
}

/** What a trap stands between. */
export type TrapEnds = Pick<Trap, 'q' | 'sourceOhms' | 'loadOhms'>;

/** A coil, trimmed by its core, with a capacitor of a series. */
export interface TrapPair {
  readonly inductanceH: number;
  readonly capacitanceF: number;
}

/** A trap with what it is tuned to. */
export interface CureTrap {
  readonly frequencyHz: number;
  readonly coilH: number;
  /** The trap with the capacitor of E12. */
  readonly trap: Trap;
  /** The coil's core takes up what the preferred capacitor leaves. */
  readonly pairs: Readonly<Record<Series, TrapPair>>;
}

/** Common values of chokes and coil kits, henries. Source: IEC 60063, series E6. */
const COILS_H = [10, 15, 22, 33, 47, 68, 100, 150, 220, 330, 470, 680, 1000].map((uH) => uH / 1e6);
const KINDS = ['parallel', 'series'] as const;
const GRID = 60;
const REFINEMENTS = 4;
const POINTS = 10;
interface Found {
  readonly trap: Trap;
  readonly hz: number;
  /** The loudest that is left, and the loss at the lowest wanted channel. */
  readonly worstDb: number;
  readonly costDb: number;
}

/**
 * Finds, for each coil, the frequency at which the worst of several stations is least bad while the
 * lowest wanted channel is tuned:
 *
 *     least over f of  max_i [max(L_i - T(f_i) + T(fs), stray_i)]
 *
 * and of these the coil and kind with the greatest net gain: what the ratio gains less the loss
 * `T(fs)` of the wanted channel, for a large coil rejects most and costs the channel dearly. The
 * trap seldom stands on the IF: between two stations it leans to the worse of them.
 *
 * @param offenders The stations heard on the IF.
 * @param dialHz fs, the lowest wanted channel, hertz.
 * @param ends Q and the resistances on both sides.
 * @returns The trap; null without offenders.
 * @throws {RangeError} If a value is not above 0.
 *
 * @example
 *   bestTrap([{ hz: 560e3, levelDb: 50, leastDb: -Infinity }], 600e3,
 *     { q: 100, sourceOhms: 400, loadOhms: 1000 })?.frequencyHz; // 559.9e3
 */
export function bestTrap(
  offenders: readonly Offender[],
  dialHz: number,
  ends: TrapEnds,
): CureTrap | null {
  if (offenders.length === 0) return null;
  const found = KINDS.flatMap((kind) =>
    COILS_H.map((inductanceH) => bestFrequency({ kind, inductanceH, ...ends }, offenders, dialHz)),
  );
  const net = ({ worstDb, costDb }: Found): number => -worstDb - costDb;
  return withPreferredCapacitor(found.reduce((a, b) => (net(b) > net(a) ? b : a)));
}

/** Looks along the offenders, then ever closer around the best. */
function bestFrequency(
  parts: Omit<Trap, 'capacitanceF'>,
  offenders: readonly Offender[],
  dialHz: number,
): Found {
  const at = (hz: number): Found => {
    const trap: Trap = { ...parts, capacitanceF: resonant(hz, parts.inductanceH) };
    const costDb = trapLoss(trap, dialHz);
    return { trap, hz, costDb, worstDb: worstLevel(trap, offenders, costDb) };
  };
  const better = (one: Found, other: Found): Found => (other.worstDb < one.worstDb ? other : one);
  const all = offenders.map(({ hz }) => hz);
  const [low, high] = [Math.min(...all) * 0.99, Math.max(...all) * 1.01];
  let step = (high - low) / GRID;
  const grid = Array.from({ length: GRID + 1 }, (_, index) => low + index * step);
  let best = [...all, ...grid].map(at).reduce(better);
  for (let turn = 0; turn < REFINEMENTS; turn++) {
    const middle = best.hz;
    for (let k = -POINTS; k <= POINTS; k++) best = better(best, at(middle + (k * step) / POINTS));
    step /= POINTS;
  }
  return best;
}

function worstLevel(trap: Trap, offenders: readonly Offender[], costDb: number): number {
  return offenders.reduce((worst, { hz, levelDb, leastDb }) => {
    const leftDb = Math.max(levelDb - trapLoss(trap, hz) + costDb, leastDb);
    return Math.max(worst, leftDb);
  }, -Infinity);
}

function withPreferredCapacitor({ trap, hz }: Found): CureTrap {
  const pair = (series: Series): TrapPair => {
    const capacitanceF = nearestPreferred(trap.capacitanceF, series);
    return { capacitanceF, inductanceH: resonant(hz, capacitanceF) };
  };
  const pairs = { E12: pair('E12'), E24: pair('E24') };
  return {
    frequencyHz: Math.round(hz),
    coilH: trap.inductanceH,
    trap: { ...trap, ...pairs.E12 },
    pairs,
  };
}

/** The other part of a resonant pair: `1/[(2 pi f)^2 part]`. */
function resonant(hz: number, part: number): number {
  return 1 / ((2 * Math.PI * hz) ** 2 * part);
}
