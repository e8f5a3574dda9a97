/**
 * Wave traps at the aerial terminal.
 *
 * Source: network theory; checked with ngspice.
 *
 * @module radio/circuits/trap
 */
import type { Trap } from '../receiver.ts';
import { type Decibels, decibels } from '../units.ts';

/**
 * Frequency of a trap: `1 / (2 pi sqrt(L C))`.
 *
 * @param trap Its coil and capacitor, both above 0.
 * @returns Hertz.
 * @throws {RangeError} If a part is not above 0.
 *
 * @example
 *   trapFrequency({ inductanceH: 500e-6, capacitanceF: 244.7076e-12 }); // 455000
 */
export function trapFrequency({
  inductanceH,
  capacitanceF,
}: Pick<Trap, 'inductanceH' | 'capacitanceF'>): number {
  if (!(inductanceH > 0)) throw new RangeError(`inductanceH must be above 0, got ${inductanceH}`);
  if (!(capacitanceF > 0)) {
    throw new RangeError(`capacitanceF must be above 0, got ${capacitanceF}`);
  }
  return 1 / (2 * Math.PI * Math.sqrt(inductanceH * capacitanceF));
}

/**
 * Loss that a trap inserts between aerial and receiver.
 *
 * - Parallel, in the aerial lead: `20 log10 |1 + Zp/(Rs + RL)|`,
 *   `1/Zp = 1/(jwL) + jwC + 1/(Q w0 L)`.
 * - Series, across the input: `20 log10 |1 + (Rs || RL)/Zs|`, `Zs = jwL + 1/(jwC) + w0 L/Q`.
 *
 * Source: the voltage divider, any network theory text.
 *
 * @param trap The trap, with the resistances of aerial and input; all values above 0.
 * @param frequencyHz Frequency, hertz, above 0.
 * @returns Loss, decibels, above 0.
 * @throws {RangeError} If a value is not above 0.
 *
 * @example
 *   trapLoss({ kind: 'parallel', inductanceH: 500e-6, capacitanceF: 244.7076e-12, q: 100,
 *     sourceOhms: 400, loadOhms: 1000 }, 455_000); // 40.265
 */
export function trapLoss(trap: Trap, frequencyHz: number): Decibels {
  if (!(frequencyHz > 0)) throw new RangeError(`frequencyHz must be above 0, got ${frequencyHz}`);
  for (const name of ['q', 'sourceOhms', 'loadOhms'] as const) {
    if (!(trap[name] > 0)) throw new RangeError(`${name} must be above 0, got ${trap[name]}`);
  }
  const w = 2 * Math.PI * frequencyHz;
  const w0 = 2 * Math.PI * trapFrequency(trap);
  return decibels(trap.kind === 'parallel' ? parallelLoss(trap, w, w0) : seriesLoss(trap, w, w0));
}

function parallelLoss({ inductanceH, capacitanceF, q, ...ends }: Trap, w: number, w0: number) {
  const conductance = 1 / (q * w0 * inductanceH);
  const susceptance = w * capacitanceF - 1 / (w * inductanceH);
  return ratioDb(1 / (ends.sourceOhms + ends.loadOhms), conductance, susceptance);
}

function seriesLoss({ inductanceH, capacitanceF, q, ...ends }: Trap, w: number, w0: number) {
  const resistance = (w0 * inductanceH) / q;
  const reactance = w * inductanceH - 1 / (w * capacitanceF);
  const { sourceOhms, loadOhms } = ends;
  return ratioDb((sourceOhms * loadOhms) / (sourceOhms + loadOhms), resistance, reactance);
}

/** `20 log10 |1 + a/(re + j im)|`. */
function ratioDb(a: number, re: number, im: number): number {
  const size = re * re + im * im;
  return 20 * Math.log10(Math.hypot(1 + (a * re) / size, (a * im) / size));
}
