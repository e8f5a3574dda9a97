/**
 * What to do at the bench to prove a cause of a whistle, in words.
 *
 * Source: common practice.
 *
 * @module radio/whistles/whistle-test
 */
import { CAUTION } from '../caution.ts';
import type { UnwantedCarrier, WhistleSource } from './whistle-cause.ts';

/** Whether the test touches the set. */
const TOUCHES: Readonly<Record<WhistleSource, boolean>> = {
  image: true,
  breakthrough: true,
  'half-if': true,
  'oscillator-harmonic': true,
  product: true,
  intermodulation: true,
  'second-image': true,
  'adjacent-carrier': false,
  'if-harmonic': true,
  'bfo-harmonic': false,
  'second-oscillator': true,
};

/**
 * The test that tells a cause from the others.
 *
 * All tests are common practice.
 *
 * @param carrier The unwanted carrier.
 * @param slope How fast the pitch moves, hertz per hertz of dial.
 * @returns Sentences; with the usual caution where the set is touched.
 *
 * @example
 *   whistleTest(image, 2).startsWith('Turn the dial by 100 Hz: the pitch moves by 200 Hz.'); // true
 */
export function whistleTest(carrier: UnwantedCarrier, slope: number): string {
  const sentences = [tuning(slope), proof(carrier)];
  if (TOUCHES[carrier.cause]) sentences.push(CAUTION);
  return sentences.join(' ');
}

function tuning(slope: number): string {
  if (slope === 0) return 'Turn the dial a little: the pitch stays, only the strength changes.';
  return `Turn the dial by 100 Hz: the pitch moves by ${Math.round(100 * slope)} Hz.`;
}

function proof({ cause, frequencyHz, n }: UnwantedCarrier): string {
  const from = `${frequencyHz / 1000} kHz`;
  switch (cause) {
    case 'image':
    case 'oscillator-harmonic':
      return `Put a trap for ${from} in the aerial lead: whistle and programme of that station fade together.`;
    case 'half-if':
    case 'product':
      return `Put 6 dB of attenuation in the aerial lead: the whistle falls by ${6 * (n ?? 2)} dB, the wanted station by 6.`;
    case 'breakthrough':
      return `Put a trap for ${from} in the aerial lead: the whistle goes. It was there all over the dial.`;
    case 'intermodulation':
      return 'Put 6 dB of attenuation in the aerial lead: the whistle falls by 12 dB. It was there all over the dial.';
    case 'second-image':
      return `Feed ${from} from a generator in the aerial's place: it is heard here, and only the first IF rejects it.`;
    case 'adjacent-carrier':
      return `Tune to ${from}: the station is there in its own right. A narrower IF or a notch for the pitch helps, another IF does not.`;
    case 'if-harmonic':
      return `Take the aerial off: the whistle goes with the station. Shield and bypass the detector: it weakens. It is worst near ${from}.`;
    case 'bfo-harmonic':
      return 'Switch the beat oscillator off: the whistle goes.';
    case 'second-oscillator':
      return `Stop the second oscillator for a moment: nothing is left on ${from}. Without an aerial the carrier stays.`;
  }
}
