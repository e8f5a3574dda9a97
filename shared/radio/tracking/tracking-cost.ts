/**
 * What mistracking costs.
 *
 * Source: own rule; losses as in `circuitRejection`.
 *
 * @module radio/tracking/tracking-cost
 */
import { FrontEnd } from '../circuits/front-end.ts';
import type { Receiver } from '../receiver.ts';
import { tuningOf } from './tuning.ts';

/** Settings over a band at which the loss is looked at, both ends among them. */
const SETTINGS = 41;

/**
 * Greatest loss of a wanted station by signal circuits that stand beside it, over all bands with
 * tracking data, once coil and trimmer are refitted for an IF:
 * `10 log10(1 + (Q rho(fs, fc))^2)` for each circuit.
 *
 * @param receiver The receiver.
 * @param ifHz The IF, hertz.
 * @returns Decibels; null without tracking data, or where no refit is possible.
 * @throws {RangeError} If tracking data cannot be.
 *
 * @example
 *   trackingCost(receiver, 450_000); // null: no band has tracking data
 */
export function trackingCost(receiver: Receiver, ifHz: number): number | null {
  const losses = receiver.bands.flatMap((band) => {
    // An oscillator below a band that begins under the IF cannot run at all.
    if (band.oscillator === 'below' && band.lowHz <= ifHz) return [];
    const { tuning } = tuningOf(band, receiver.ifHz, ifHz);
    if (tuning === null) return [];
    const frontEnd = new FrontEnd(receiver, band);
    const step = (band.highHz - band.lowHz) / (SETTINGS - 1);
    return Array.from({ length: SETTINGS }, (_, index) => {
      const dialHz = band.lowHz + index * step;
      return frontEnd.circuitsDb(dialHz, tuning(dialHz));
    });
  });
  return losses.length > 0 ? Math.max(...losses) : null;
}
