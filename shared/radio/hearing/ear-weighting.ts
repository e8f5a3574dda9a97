/**
 * Weighting of audible noise and tones by the ear.
 *
 * Source: ITU-R BS.468, from memory, not re-read.
 *
 * @module radio/hearing/ear-weighting
 */

/**
 * Weighting network of ITU-R BS.468 in decibels.
 *
 *     18.2 + 20 log10[1.246332637532143e-4 f / sqrt(h1^2 + h2^2)]
 *
 * with two polynomials h1 and h2 in f. 0 dB near 1 kHz, 12.2 dB near 6.3 kHz.
 * Source: ITU-R BS.468, the coefficients from memory of the literature, not re-read.
 *
 * @param frequencyHz Audio frequency, hertz, from 0.
 * @returns Weighting, decibels; -Infinity at 0.
 *
 * @example
 *   earWeighting(6300); // 12.2
 */
export function earWeighting(frequencyHz: number): number {
  return 18.2 + 10 * Math.log10(response(frequencyHz));
}

/**
 * The same network as a ratio of powers: `10^(earWeighting/10)`.
 *
 * @param frequencyHz Audio frequency, hertz, from 0.
 * @returns Ratio of powers; 0 at 0.
 *
 * @example
 *   earWeightingPower(0); // 0
 */
export function earWeightingPower(frequencyHz: number): number {
  return 10 ** 1.82 * response(frequencyHz);
}

function response(f: number): number {
  const f2 = f * f;
  const h1 =
    ((-4.737338981378384e-24 * f2 + 2.043828333606125e-15) * f2 - 1.363894795463638e-7) * f2 + 1;
  const h2 = ((1.306612257412824e-19 * f2 - 2.118150887518656e-11) * f2 + 5.559488023498642e-4) * f;
  const numerator = 1.246332637532143e-4 * f;
  return (numerator * numerator) / (h1 * h1 + h2 * h2);
}
