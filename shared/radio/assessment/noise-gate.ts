/**
 * A quick look whether a product of a station can come out of the noise anywhere near a setting.
 *
 * @module radio/assessment/noise-gate
 */
import { type Dial, HIDDEN_UNDER_DB } from './dial.ts';
import type { FrontEnd } from '../circuits/front-end.ts';

/** Rounding must not silence what is heard. */
const SLACK_DB = 1e-6;

/** The gate for one product, as ratios of powers. */
export interface ProductGate {
  /** The strongest station is silent if `factor^n` is at least its power times this. */
  readonly throughCircuits: number;
  /** It is silent past the circuits if its power times this is at most 1; 0: no stray pick-up. */
  readonly pastCircuits: number;
}

/**
 * Most products of most stations lie far under the noise. The gate finds them with a few
 * multiplications, without looking for settings and without logarithms: it takes the least
 * rejection within reach of the solution, the least noise of the band and the greatest weighting,
 * so it never silences what the full computation lets be heard.
 */
export class NoiseGate {
  private readonly dial: Dial;
  private readonly frontEnd: FrontEnd;
  /** For each group: the least loss of the terms that do not follow the dial, as a gain. */
  private readonly gains: Float64Array;
  private readonly strayDb: number;

  constructor(dial: Dial, frontEnd: FrontEnd, fixedDb: Float64Array, strayDb: number) {
    this.dial = dial;
    this.frontEnd = frontEnd;
    this.strayDb = strayDb;
    const greatest = frontEnd.greatestFixedDb;
    this.gains = fixedDb.map((lossDb) => 10 ** ((greatest - lossDb) / 10));
  }

  /** The gate for a product of order n whose mixer level is known. */
  forProduct(n: number, levelDb: number): ProductGate {
    const { greatestWeightingDb, leastNoiseDb } = this.dial;
    const overNoiseDb = greatestWeightingDb - (leastNoiseDb - HIDDEN_UNDER_DB) + SLACK_DB;
    return {
      throughCircuits: 10 ** ((levelDb + overNoiseDb) / 10),
      pastCircuits: n > 1 ? 0 : 10 ** ((overNoiseDb - this.strayDb) / 10),
    };
  }

  /** Whether no station of a group is heard within reach of a solution. */
  isSilent(gate: ProductGate, group: number, n: number, solutionHz: number): boolean {
    const { spectrum, reachHz } = this.dial;
    const first = spectrum.start[group] ?? 0;
    if ((spectrum.powers[0]?.[first] ?? NaN) * gate.pastCircuits > 1) return false;
    const hz = spectrum.hz[group] ?? NaN;
    const nearest = Math.min(solutionHz + reachHz, Math.max(solutionHz - reachHz, hz));
    const factor = this.frontEnd.leastFactor(hz, nearest) / (this.gains[group] ?? 1);
    const power = spectrum.powers[n - 1]?.[first] ?? NaN;
    return factor ** n >= power * gate.throughCircuits;
  }
}
