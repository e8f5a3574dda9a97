/**
 * Rejection of everything between the aerial and the mixer, on one band.
 *
 * Source: tuned circuits in cascade, as in `circuitRejection`; stray pick-up is common practice.
 *
 * @module radio/circuits/front-end
 */
import { aerialLoss, type FixedLoss } from './aerial.ts';
import type { Band, Receiver, Trap, TunedCircuit } from '../receiver.ts';
import { trapFrequency, trapLoss } from './trap.ts';
import { circuitRejection, detuning } from './tuned-circuit.ts';

/** Something that does not follow the dial, by name. */
interface FixedTerm extends FixedLoss {
  readonly term: 'aerial' | 'trap';
}

/** One line of the rejection. */
export interface RejectionTerm {
  readonly term: 'aerial' | 'trap' | `circuit-${number}`;
  readonly lossDb: number;
}

/**
 * A(f): circuits, tuned to the dial or to where tracking leaves them, and terms that do not follow
 * the dial, each less its value at the dial setting.
 *
 *     A(f) = sum [C_i(f) - C_i(fs)] + sum [T_j(f) - T_j(fs)],  C_i tuned to fc
 */
export class FrontEnd {
  /** Terms that do not follow the dial. */
  private readonly fixed: readonly FixedTerm[];
  private readonly band: Band;
  /** Q of each circuit at the low end, and its rise per hertz. */
  private readonly qs: Float64Array;
  private readonly slopes: Float64Array;
  private readonly leastQs: Float64Array;

  /**
   * @param receiver The receiver.
   * @param band One of its bands.
   * @throws {RangeError} If the band is upside down or a Q is not above 0.
   */
  constructor(receiver: Receiver, band: Band) {
    if (!(band.highHz > band.lowHz)) {
      throw new RangeError(`highHz must be above lowHz, got ${band.lowHz} to ${band.highHz}`);
    }
    for (const { qLow, qHigh } of band.circuits) {
      if (!(qLow > 0 && qHigh > 0))
        throw new RangeError(`Q must be above 0, got ${qLow}, ${qHigh}`);
    }
    this.band = band;
    this.fixed = fixedTerms(receiver, band);
    this.leastQs = Float64Array.from(band.circuits, ({ qLow, qHigh }) => Math.min(qLow, qHigh));
    this.qs = Float64Array.from(band.circuits, ({ qLow }) => qLow);
    this.slopes = Float64Array.from(
      band.circuits,
      ({ qLow, qHigh }) => (qHigh - qLow) / (band.highHz - band.lowHz),
    );
  }

  /** Rejection of the circuits tuned to a frequency, decibels. */
  circuitsDb(frequencyHz: number, tunedHz: number): number {
    const rho = detuning(frequencyHz, tunedHz);
    let factor = 1;
    for (let index = 0; index < this.qs.length; index++) {
      const q = (this.qs[index] ?? 0) + (this.slopes[index] ?? 0) * (tunedHz - this.band.lowHz);
      const x = q * rho;
      factor *= 1 + x * x;
    }
    return 10 * Math.log10(factor);
  }

  /** Sum of the terms that do not follow the dial, decibels; not yet less that at the dial. */
  fixedDb(frequencyHz: number): number {
    let sum = 0;
    for (const { lossDb } of this.fixed) sum += lossDb(frequencyHz);
    return sum;
  }

  /** Least factor that the circuits can reject by, tuned anywhere on the band: `product of 1 + x^2`. */
  leastFactor(frequencyHz: number, tunedHz: number): number {
    const rho = detuning(frequencyHz, tunedHz);
    let factor = 1;
    for (const q of this.leastQs) factor *= 1 + (q * rho) ** 2;
    return factor;
  }

  /** The most that the terms which do not follow the dial lose at any setting of the band. */
  get greatestFixedDb(): number {
    const { lowHz, highHz } = this.band;
    return this.fixed.reduce((sum, { greatestDb }) => sum + greatestDb(lowHz, highHz), 0);
  }

  /**
   * A(f).
   *
   * @param frequencyHz Frequency asked about, hertz, above 0.
   * @param dialHz Dial setting fs, hertz.
   * @param tunedHz Where the circuits are tuned, hertz; fs without tracking data.
   * @returns Decibels; 0 at the dial setting.
   */
  rejectionDb(frequencyHz: number, dialHz: number, tunedHz = dialHz): number {
    return (
      this.circuitsDb(frequencyHz, tunedHz) -
      this.circuitsDb(dialHz, tunedHz) +
      this.fixedDb(frequencyHz) -
      this.fixedDb(dialHz)
    );
  }

  /** A(f) line by line; the lines add up to `rejectionDb`. */
  lines(frequencyHz: number, dialHz: number, tunedHz = dialHz): RejectionTerm[] {
    const circuits = this.band.circuits.map((circuit, index): RejectionTerm => {
      const q = qAt(circuit, this.band, tunedHz);
      const lossDb =
        circuitRejection(frequencyHz, tunedHz, q, 1) - circuitRejection(dialHz, tunedHz, q, 1);
      return { term: `circuit-${index + 1}`, lossDb };
    });
    const others = this.fixed.map(({ term, lossDb }): RejectionTerm => ({
      term,
      lossDb: lossDb(frequencyHz) - lossDb(dialHz),
    }));
    return [...circuits, ...others];
  }
}

/**
 * Q of a circuit, linear in frequency between the ends of the band.
 *
 * @param circuit Q at both ends.
 * @param band The band.
 * @param tunedHz Frequency it is tuned to, hertz.
 * @returns The Q.
 *
 * @example
 *   qAt({ qLow: 50, qHigh: 70 }, { lowHz: 500_000, highHz: 1_500_000 }, 1_000_000); // 60
 */
export function qAt(
  { qLow, qHigh }: TunedCircuit,
  { lowHz, highHz }: Pick<Band, 'lowHz' | 'highHz'>,
  tunedHz: number,
): number {
  return qLow + ((qHigh - qLow) * (tunedHz - lowHz)) / (highHz - lowHz);
}

function fixedTerms({ aerial, trap }: Receiver, band: Band): FixedTerm[] {
  const loss = aerialLoss(aerial, band);
  return [
    ...(loss === null ? [] : [{ term: 'aerial' as const, ...loss }]),
    ...(trap === null ? [] : [{ term: 'trap' as const, ...fixedTrapLoss(trap) }]),
  ];
}

/** A trap's loss has one peak, at its resonance. */
function fixedTrapLoss(trap: Trap): FixedLoss {
  const resonanceHz = trapFrequency(trap);
  const lossDb = (hz: number): number => trapLoss(trap, hz);
  return {
    lossDb,
    greatestDb: (lowHz, highHz) => lossDb(Math.min(highHz, Math.max(lowHz, resonanceHz))),
  };
}
