/**
 * Products of the mixer in words.
 *
 * Source: terms of the trade, common practice.
 *
 * @module radio/assessment/product-names
 */
import type { Cause } from './response.ts';

const ORDINALS = ['', '', '2nd ', '3rd ', '4th ', '5th '];

/**
 * What kind of response a product is.
 *
 * @param m Order of the oscillator.
 * @param n Order of the signal.
 * @param harmonic Harmonic of the oscillator that converts the wanted signal.
 * @returns The cause.
 *
 * @example
 *   causeOf(2, 2, 1); // 'half-if'
 */
export function causeOf(m: number, n: number, harmonic: number): Cause {
  if (m === 0) return 'breakthrough';
  if (n === 1) return m === harmonic ? 'image' : 'oscillator-harmonic';
  return n === 2 && m === 2 * harmonic ? 'half-if' : 'product';
}

/**
 * Names a product for people.
 *
 * @param m Order of the oscillator.
 * @param n Order of the signal.
 * @param harmonic Harmonic of the oscillator that converts the wanted signal.
 * @param relation Where the signal, or its harmonic, lies: `plus` and `less` the IF from the
 *   harmonic of the oscillator, or `below` when the oscillator's harmonic and the signal add to it.
 * @returns A phrase without a full stop.
 *
 * @example
 *   productName(2, 1, 1, 'less'); // "oscillator's 2nd harmonic less IF"
 */
export function productName(
  m: number,
  n: number,
  harmonic: number,
  relation: 'plus' | 'less' | 'below',
): string {
  switch (causeOf(m, n, harmonic)) {
    case 'image':
      return 'image';
    case 'breakthrough':
      return n === 1 ? 'IF breakthrough' : `station at ${n === 2 ? 'half' : 'a third of'} the IF`;
    case 'half-if':
      return `half-IF response, ${oscillatorPhrase(m, n, relation)}`;
    default:
      return oscillatorPhrase(m, n, relation);
  }
}

/** "signal's 2nd harmonic on oscillator's 3rd harmonic plus IF". */
function oscillatorPhrase(m: number, n: number, relation: 'plus' | 'less' | 'below'): string {
  const signal = n === 1 ? '' : `signal's ${ORDINALS[n] ?? `${n}th `}harmonic on `;
  const oscillator = m === 1 ? 'oscillator' : `oscillator's ${ORDINALS[m] ?? `${m}th `}harmonic`;
  if (relation === 'below') return `${signal}IF less ${oscillator}`;
  return `${signal}${oscillator} ${relation} IF`;
}
