/**
 * Whether a receiver can be moved to another IF.
 *
 * Source: reach of cores and trimmers, 3 to 6 %, from memory of the literature, not re-read.
 *
 * @module radio/candidates/if-reach
 */
import type { Receiver } from '../receiver.ts';

/** Rounding must not put an IF on the limit out of reach. */
const SLACK = 1e-12;

/**
 * Why an IF is out of reach: the range of the IF transformers, a fixed filter, the beat
 * oscillator, an oscillator that would have to run at zero.
 *
 * Cores and trimmers typically reach 3 to 6 % of the frequency (from memory, not re-read).
 *
 * @param receiver The receiver as it is.
 * @param ifHz The IF asked about, hertz.
 * @returns A sentence, or null when the IF is within reach.
 *
 * @example
 *   outOfReach(receiver, 555_000); // null: 0.9 % from 560 kHz
 */
export function outOfReach(receiver: Receiver, ifHz: number): string | null {
  const { fixedFilter, bfo, ifRange } = receiver;
  const change = ifHz / receiver.ifHz - 1;
  if (Math.abs(change) > ifRange + SLACK) {
    return `The IF transformers reach ${percent(ifRange)} %, not ${percent(Math.abs(change))} %.`;
  }
  if (fixedFilter !== null && Math.abs(ifHz - fixedFilter.centreHz) > fixedFilter.widthHz / 2) {
    return `The ${fixedFilter.kind} filter passes only near ${fixedFilter.centreHz / 1000} kHz.`;
  }
  if (bfo !== null && Math.abs(ifHz - receiver.ifHz) > bfo.rangeHz) {
    return `The beat oscillator reaches ${bfo.rangeHz / 1000} kHz to either side.`;
  }
  const stopped = receiver.bands.find(
    ({ oscillator, lowHz }) => oscillator === 'below' && lowHz <= ifHz,
  );
  if (stopped === undefined) return null;
  return `On the band ${stopped.name} the oscillator, below the signal, would reach zero.`;
}

function percent(fraction: number): string {
  return String(Math.round(fraction * 1000) / 10);
}
