/**
 * Ways of a signal through a receiver of one or two conversions.
 *
 * @module radio/mixing/signal-path
 */

/** By number, so that columns can hold it. */
export const SIGNAL_PATH = {
  /** Through the first mixer to the IF, as in every superheterodyne. */
  first: 0,
  /** Through the first mixer to the image of the second. */
  secondImage: 1,
  /** At the second IF, past both mixers. */
  secondIf: 2,
} as const;

export type SignalPath = (typeof SIGNAL_PATH)[keyof typeof SIGNAL_PATH];
