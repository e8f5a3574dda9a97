import type { Receiver } from '../../../../shared/radio/receiver';

/** A stretch of frequencies, hertz. */
interface Stretch {
  readonly low: number;
  readonly high: number;
}

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

/** How far the IF of a set can be moved: by its cans, inside its fixed filter, with its BFO. */
export function reachOf({ ifHz, ifRange, fixedFilter, bfo, bands }: Receiver): Stretch {
  const limits: Stretch[] = [{ low: ifHz * (1 - ifRange), high: ifHz * (1 + ifRange) }];
  if (fixedFilter) limits.push(around(fixedFilter.centreHz, fixedFilter.widthHz / 2));
  if (bfo) limits.push(around(ifHz, bfo.rangeHz));
  for (const { oscillator, lowHz } of bands) {
    // An oscillator below the signal must not come to a stop.
    if (oscillator === 'below') limits.push({ low: 0, high: lowHz - 1 });
  }
  const low = Math.max(...limits.map((each) => each.low));
  const high = Math.min(...limits.map((each) => each.high));
  return { low: Math.min(Math.ceil(low), ifHz), high: Math.max(Math.floor(high), ifHz) };
}

const around = (middle: number, half: number): Stretch => ({
  low: middle - half,
  high: middle + half,
});

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
