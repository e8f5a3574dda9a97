import type { Receiver } from '../../../../shared/radio/receiver';

/** Which candidates are asked for, hertz. */
export interface CandidateRange {
  readonly fromHz: number;
  readonly toHz: number;
  readonly stepHz: number;
}

/** So many candidates show where to go, and are judged while one waits. */
const MOST = 160;
const STEPS = [500, 1000, 2000, 5000, 10_000, 20_000, 50_000];
const LEAST_HZ = 1000;
/** A set whose cans hardly move still shows what lies next to its IF. */
const LEAST_REACH = 0.02;

/** How far the IF of a set can be moved: by its cans, or inside its fixed filter. */
export function reachOf({ ifHz, ifRange, fixedFilter }: Receiver): { low: number; high: number } {
  const cans = { low: ifHz * (1 - ifRange), high: ifHz * (1 + ifRange) };
  const low = fixedFilter
    ? Math.max(cans.low, fixedFilter.centreHz - fixedFilter.widthHz / 2)
    : cans.low;
  const high = fixedFilter
    ? Math.min(cans.high, fixedFilter.centreHz + fixedFilter.widthHz / 2)
    : cans.high;
  return { low: Math.min(Math.ceil(low), ifHz), high: Math.max(Math.floor(high), ifHz) };
}

/** Candidates on round frequencies from one end of the cans' range to the other. */
export function candidateRange({ ifHz, ifRange }: Receiver): CandidateRange {
  const reach = Math.max(ifRange, LEAST_REACH);
  const [low, high] = [Math.max(LEAST_HZ, ifHz * (1 - reach)), ifHz * (1 + reach)];
  const stepHz = STEPS.find((step) => (high - low) / step < MOST) ?? Math.ceil((high - low) / MOST);
  return {
    fromHz: Math.max(LEAST_HZ, Math.ceil(low / stepHz) * stepHz),
    toHz: Math.floor(high / stepHz) * stepHz,
    stepHz,
  };
}
