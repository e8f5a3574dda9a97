/** Small-signal analyses of linear circuits by ngspice, a circuit simulator of its own. */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { findProgram, NGSPICE } from '../../server/dev/programs.ts';

/** Elements of a circuit as the simulator writes them; `out` is the node looked at. */
export interface Circuit {
  readonly elements: readonly string[];
  readonly out: string;
  readonly sweep: { readonly fromHz: number; readonly toHz: number; readonly points: number };
}

/** Voltage of the node looked at. */
export interface Phasor {
  readonly hz: number;
  readonly re: number;
  readonly im: number;
}

export const hasNgspice = findProgram(NGSPICE.program) !== undefined;

/**
 * Sweeps each circuit over its own frequencies, all in one run of the simulator.
 * @throws {Error} With what ngspice says, when it does not answer.
 */
export function simulate(circuits: readonly Circuit[]): Phasor[][] {
  const folder = mkdtempSync(join(tmpdir(), 'ngspice-'));
  try {
    circuits.forEach(({ elements }, index) => {
      writeFileSync(join(folder, `${index}.cir`), ['circuit', ...elements, '.end', ''].join('\n'));
    });
    writeFileSync(join(folder, 'all.cir'), scriptOf(circuits));
    const program = findProgram(NGSPICE.program) ?? NGSPICE.program;
    const run = spawnSync(program, ['-b', 'all.cir'], { cwd: folder, encoding: 'utf8' });
    return circuits.map((_, index) => readSweep(join(folder, `${index}.data`), run.stderr));
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** Level of each frequency against another of the same sweep, dB. */
export function levelDb({ re, im }: Phasor, reference: Phasor): number {
  return 20 * Math.log10(Math.hypot(re, im) / Math.hypot(reference.re, reference.im));
}

/**
 * Resonance of a circuit that is driven by a current of 1 A: where its susceptance, the imaginary
 * part of 1/V, passes through 0.
 */
export function resonanceOf(sweep: readonly Phasor[]): number {
  const at = sweep.findIndex((each) => susceptance(each) >= 0);
  const [below, above] = [sweep[at - 1], sweep[at]];
  if (!below || !above) throw new Error('The circuit has no resonance within the sweep.');
  const [from, to] = [susceptance(below), susceptance(above)];
  return below.hz + ((above.hz - below.hz) * -from) / (to - from);
}

const susceptance = ({ re, im }: Phasor): number => -im / (re * re + im * im);

function scriptOf(circuits: readonly Circuit[]): string {
  const analyses = circuits.flatMap(({ sweep, out }, index) => [
    `source ${index}.cir`,
    `ac lin ${sweep.points} ${sweep.fromHz} ${sweep.toHz}`,
    `wrdata ${index}.data v(${out})`,
    'destroy all',
    'remcirc',
  ]);
  const lines = ['script', '.control', 'set numdgt=15', ...analyses, 'quit', '.endc', '.end', ''];
  return lines.join('\n');
}

function readSweep(path: string, said: string): Phasor[] {
  if (!existsSync(path)) throw new Error(`ngspice gave no answer: ${said}`);
  return readFileSync(path, 'utf8')
    .trim()
    .split('\n')
    .map((line) => {
      const [hz = NaN, re = NaN, im = NaN] = line.trim().split(/\s+/).map(Number);
      return { hz, re, im };
    });
}
