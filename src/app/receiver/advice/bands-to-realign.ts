import type { Receiver } from '../../../../shared/radio/receiver';

/** A smaller loss is not worth opening a band for; common practice. */
const LEAST_LOSS_DB = 1;

/**
 * Loss at the low end of a band whose oscillator is left as it is while the IF moves: its signal
 * circuits then stand off by as much as the IF has moved, and its dial reads off by it.
 * Universal response of a tuned circuit, 10 lg(1 + (2 Q Δf/f)²) for each; common practice.
 */
export function lossLeftAlone(
  { circuits, lowHz }: Receiver['bands'][number],
  shiftHz: number,
): number {
  const off = (q: number) => 10 * Math.log10(1 + ((2 * q * shiftHz) / lowHz) ** 2);
  return circuits.reduce((loss, { qLow }) => loss + off(qLow), 0);
}

/** Which bands must be realigned when the IF moves, and which can be left alone, by name. */
export function bandsToRealign(
  { bands }: Pick<Receiver, 'bands'>,
  shiftHz: number,
): { readonly realign: string[]; readonly leave: string[] } {
  const isLeft = (band: Receiver['bands'][number]) =>
    band.circuits.length > 0 && lossLeftAlone(band, shiftHz) < LEAST_LOSS_DB;
  return {
    realign: bands.filter((band) => !isLeft(band)).map(({ name }) => name),
    leave: bands.filter(isLeft).map(({ name }) => name),
  };
}
