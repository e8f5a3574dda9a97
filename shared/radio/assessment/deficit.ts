/**
 * What a band lacks to its protection ratio, and the worst that is heard on it.
 *
 * Source: own rule: decibels that lack to the protection ratio, which do not saturate.
 *
 * @module radio/assessment/deficit
 */
import type { BandScan } from './band-scan.ts';
import type { Finding, FindingSink } from './finding.ts';
import type { Dial } from './dial.ts';

/** Kinds of response that are told apart. */
export const KINDS = ['breakthrough', 'image', 'products'] as const;
export type Kind = (typeof KINDS)[number];

/** The worst single response of a kind. */
export interface Worst {
  readonly ratioDb: number;
  readonly dialHz: number;
  /** Position of the station in the spectrum. */
  readonly position: number;
  readonly m: number;
  readonly n: number;
  readonly row: number;
  readonly beatHz: number;
}

/** The loudest response on a setting without a usable station. */
export interface Loudest {
  readonly overNoiseDb: number;
  readonly dialHz: number;
  readonly position: number;
}

/** A usable station with the ratio it is left with; Infinity: nothing is heard beside it. */
export interface UsableStation {
  readonly position: number;
  readonly dialHz: number;
  readonly ratioDb: number;
}

/** Adds up, over one scan of a band, what is heard at each setting, apart by kind. */
export class Deficit implements FindingSink {
  readonly takesHidden = false;
  readonly worst: Record<Kind, Worst | null> = { breakthrough: null, image: null, products: null };
  loudest: Loudest | null = null;
  private readonly dial: Dial;
  private readonly powers: Record<Kind, Float64Array>;
  /** Smallest ratio of a breakthrough where no usable station is. */
  private emptyBreakthroughDb = Infinity;

  constructor({ dial }: Pick<BandScan, 'dial'>) {
    this.dial = dial;
    const column = (): Float64Array => new Float64Array(dial.vacant + 1);
    this.powers = { breakthrough: column(), image: column(), products: column() };
  }

  take(finding: Readonly<Finding>): void {
    // Worst figures, the loudest on an empty dial and the power sums all pass over what is hidden.
    if (finding.heard === 0) return;
    const { dial } = this;
    const { m, n, row, strongest } = finding;
    const kind = kindOf(m, n, dial.band.oscillatorHarmonic);
    const powers = this.powers[kind];
    powers[row] = (powers[row] ?? 0) + finding.heardPower;
    const levelDb =
      n * (dial.spectrum.fieldDb[strongest] ?? NaN) + finding.shiftDb + finding.weightingDb;
    const ratioDb = (dial.wantedDb[row] ?? NaN) - levelDb;
    this.keepWorst(kind, finding, ratioDb);
    if ((dial.wanted[row] ?? -1) >= 0) return;
    if (m === 0) this.emptyBreakthroughDb = Math.min(this.emptyBreakthroughDb, ratioDb);
    this.keepLoudest(finding, levelDb - (dial.noiseDb[row] ?? NaN));
  }

  /** The usable stations of the band, with what all responses together leave them. */
  usable(): UsableStation[] {
    const { dial } = this;
    return Array.from(dial.usableRows, (row) => ({
      position: dial.wanted[row] ?? -1,
      dialHz: dial.hz[row] ?? NaN,
      ratioDb: this.ratioDb(row, null),
    }));
  }

  /**
   * The deficit: decibels missing to the protection ratio, summed over the usable stations, and
   * once for the worst breakthrough at an empty setting. A breakthrough counts at the setting at
   * which it is judged and at no other, though it is heard at all of them.
   *
   * @param kind Counts only this kind of response; left out: all of them.
   */
  deficitDb(kind: Kind | null = null): number {
    const missing = (ratioDb: number): number => Math.max(0, this.dial.protectionDb - ratioDb);
    let onStations = 0;
    for (const row of this.dial.usableRows) onStations += missing(this.ratioDb(row, kind));
    const counts = kind === null || kind === 'breakthrough';
    return onStations + (counts ? missing(this.emptyBreakthroughDb) : 0);
  }

  /** What one kind, or all together, leave a usable station; Infinity: nothing is heard. */
  private ratioDb(row: number, kind: Kind | null): number {
    const { breakthrough, image, products } = this.powers;
    const power =
      kind === null
        ? (breakthrough[row] ?? 0) + (image[row] ?? 0) + (products[row] ?? 0)
        : (this.powers[kind][row] ?? 0);
    return power > 0 ? (this.dial.wantedDb[row] ?? NaN) - 10 * Math.log10(power) : Infinity;
  }

  private keepWorst(kind: Kind, finding: Readonly<Finding>, ratioDb: number): void {
    const worst = this.worst[kind];
    if (worst !== null && worst.ratioDb < ratioDb) return;
    const { strongest: position, dialHz, m, n, row, beatHz } = finding;
    const found: Worst = { ratioDb, dialHz, position, m, n, row, beatHz };
    const { ids } = this.dial.spectrum;
    if (worst === null || isBefore(found, worst, ids)) this.worst[kind] = found;
  }

  private keepLoudest(finding: Readonly<Finding>, overNoiseDb: number): void {
    if (this.loudest !== null && this.loudest.overNoiseDb >= overNoiseDb) return;
    this.loudest = { overNoiseDb, dialHz: finding.dialHz, position: finding.strongest };
  }
}

/**
 * Kind of a product.
 *
 * @param m Order of the oscillator.
 * @param n Order of the signal.
 * @param harmonic Harmonic of the oscillator that converts the wanted signal.
 * @returns The kind.
 * @example
 *   kindOf(2, 2, 1); // 'products'
 */
export function kindOf(m: number, n: number, harmonic: number): Kind {
  if (m === 0) return 'breakthrough';
  return m === harmonic && n === 1 ? 'image' : 'products';
}

/**
 * Order of responses: ratio, then dial setting, station, m, n.
 *
 * @param one A response.
 * @param other Another.
 * @param ids Ids of the stations by their position.
 * @returns Whether `one` comes first.
 * @example
 *   const found = { ratioDb: 20, dialHz: 1_000_000, position: 0, m: 1, n: 1 };
 *   isBefore(found, { ...found, m: 2 }, [7]); // true
 */
export function isBefore(one: Worst, other: Worst, ids: readonly number[]): boolean {
  const difference =
    one.ratioDb - other.ratioDb ||
    one.dialHz - other.dialHz ||
    (ids[one.position] ?? 0) - (ids[other.position] ?? 0) ||
    one.m - other.m ||
    one.n - other.n;
  return difference < 0;
}
