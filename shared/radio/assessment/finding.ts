/**
 * What a scan of a band finds, and who takes it.
 *
 * @module radio/assessment/finding
 */
import type { SignalPath } from '../mixing/signal-path.ts';

/**
 * A product of all stations on one frequency at one dial setting. The scan lends the same object
 * again and again: take what you need, keep nothing of it.
 */
export interface Finding {
  /** Group of the spectrum. */
  group: number;
  /** Position of its strongest station. */
  strongest: number;
  m: number;
  n: number;
  path: SignalPath;
  /** Row of the dial. */
  row: number;
  dialHz: number;
  beatHz: number;
  /** A station of field E interferes with `n E + shiftDb`, weighted `+ weightingDb`. */
  shiftDb: number;
  weightingDb: number;
  /** How many stations of the group are heard: the strongest ones. */
  heard: number;
  /** Sum of their weighted powers. */
  heardPower: number;
}

/** A product of the stations of one group. */
export interface Product {
  readonly group: number;
  readonly m: number;
  readonly n: number;
  readonly path: SignalPath;
}

/** Who takes the findings of a scan. */
export interface FindingSink {
  /** Whether findings of which no station is heard are wanted, too. */
  readonly takesHidden: boolean;
  take(finding: Readonly<Finding>): void;
}

/** The orders up to which products are looked for. */
export interface Orders {
  readonly maxM: number;
  readonly maxN: number;
  /** Called between products; it throws when nobody waits for the answer any more. */
  readonly checkpoint?: (() => void) | undefined;
}
