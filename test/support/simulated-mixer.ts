/** A mixer as a bare device: a curve of current against voltage, driven by two cosines. */
import FFT from 'fft.js';

const SAMPLES = 2 ** 15;

/** What drives the device; frequencies are whole numbers of cycles in the span looked at. */
export interface Drive {
  readonly oscillator: number;
  readonly oscillatorVolts: number;
  readonly signal: number;
  readonly signalVolts: number;
}

/**
 * Amplitude of every line of the device's current, by frequency. Both cosines close in the span, so
 * no line spreads.
 */
export function spectrumOf(current: (volts: number) => number, drive: Drive): Float64Array {
  const { oscillator, oscillatorVolts, signal, signalVolts } = drive;
  const turn = (2 * Math.PI) / SAMPLES;
  const samples = Array.from({ length: SAMPLES }, (_, at) =>
    current(
      oscillatorVolts * Math.cos(((oscillator * at) % SAMPLES) * turn) +
        signalVolts * Math.cos(((signal * at) % SAMPLES) * turn),
    ),
  );
  const fft = new FFT(SAMPLES);
  const out: number[] = fft.createComplexArray();
  fft.realTransform(out, samples);
  return Float64Array.from({ length: SAMPLES / 2 }, (_, line) => {
    const size = Math.hypot(out[2 * line] ?? NaN, out[2 * line + 1] ?? NaN) / SAMPLES;
    return line === 0 ? size : 2 * size;
  });
}

/**
 * Lines `|m oscillator +- n signal|` of all orders up to a highest one; sampling folds those above
 * half the number of samples.
 */
export function productLines({ oscillator, signal }: Drive, highest: number): Set<number> {
  const orders = Array.from({ length: highest + 1 }, (_, order) => order);
  const sums = orders.flatMap((m) =>
    orders.flatMap((n) => [m * oscillator + n * signal, m * oscillator - n * signal]),
  );
  return new Set(
    sums.map((line) => {
      const turned = Math.abs(line) % SAMPLES;
      return Math.min(turned, SAMPLES - turned);
    }),
  );
}

/** Modified Bessel function of the first kind, by its series: `sum (x/2)^(2k + m)/(k! (k + m)!)`. */
export function besselI(order: number, x: number): number {
  let term = 1;
  for (let factor = 1; factor <= order; factor++) term *= x / 2 / factor;
  let sum = 0;
  for (let k = 1; term > sum * 1e-17; k++) {
    sum += term;
    term *= (x / 2) ** 2 / (k * (k + order));
  }
  return sum;
}
