/**
 * How much there is to judge, before it is judged.
 *
 * Source: own estimate.
 *
 * @module radio/assessment/judged-settings
 */
import { lowerBound } from '../channels/spectrum.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import { sideSign } from '../mixing/superheterodyne.ts';
import type { Band, Receiver } from '../receiver.ts';
import { MEETINGS } from './dial-settings.ts';
import type { Orders } from './finding.ts';

/**
 * Dial settings at which products of a list are judged on all bands: for each product the listed
 * frequencies that it brings onto the band, times the settings within B60/2 of where each is heard,
 * on the average of the band. The time a judgement takes goes with this number.
 *
 * @param receiver The receiver.
 * @param frequenciesHz Listed frequencies, ascending, each once.
 * @param orders Highest orders of oscillator and signal.
 * @returns The number, right within a factor of two where the list is as dense all along a band.
 * @throws {RangeError} If the selectivity of the receiver is out of range.
 *
 * @example
 *   judgedSettings(receiver, [1_800_000], { maxM: 1, maxN: 1 }); // 1: its image, on 680 kHz
 */
export function judgedSettings(
  receiver: Pick<Receiver, 'ifHz' | 'selectivity' | 'bands'>,
  frequenciesHz: readonly number[],
  orders: Orders,
): number {
  const { ifHz, bands, selectivity } = receiver;
  const { b60Hz } = ifSelectivity(selectivity, ifHz);
  const within = (lowHz: number, highHz: number): number =>
    Math.max(0, lowerBound(frequenciesHz, highHz + 1) - lowerBound(frequenciesHz, lowHz));
  const near = within(ifHz - b60Hz / 2, ifHz + b60Hz / 2);
  return bands.reduce((sum, band) => {
    const listed = within(band.lowHz, band.highHz);
    const share = Math.min(1, b60Hz / (band.highHz - band.lowHz));
    const moving = solutions(band, ifHz, orders, within) * Math.max(1, listed * share);
    return sum + moving + near * (listed + 2);
  }, 0);
}

/** Listed frequencies that a product brings onto the band, over all products. */
function solutions(
  { lowHz, highHz, oscillator, oscillatorHarmonic }: Band,
  ifHz: number,
  { maxM, maxN }: Orders,
  within: (lowHz: number, highHz: number) => number,
): number {
  const signedIf = sideSign(oscillator) * ifHz;
  let sum = 0;
  for (let m = 1; m <= maxM; m++) {
    for (let n = 1; n <= maxN; n++) {
      for (const { signal, offset } of MEETINGS) {
        const ends = [lowHz, highHz].map((dialHz) => {
          const target = Math.max(0, (m * (dialHz + signedIf)) / oscillatorHarmonic);
          return (signal * (target - offset * ifHz)) / n;
        });
        sum += within(Math.min(...ends), Math.max(...ends));
      }
    }
  }
  return sum;
}
