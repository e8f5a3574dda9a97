/** The circuits of the engine as lists of elements for a simulator. */
import type { Trap } from '../../shared/radio/receiver.ts';

const across = (name: string, node: string, farads: number): string[] =>
  farads > 0 ? [`C${name} ${node} 0 ${farads}`] : [];

/** Loss resistor across a coil that gives it a Q at a frequency. */
const lossOhms = (q: number, hz: number, henries: number): number => q * 2 * Math.PI * hz * henries;

const tuningFarads = (hz: number, henries: number): number =>
  1 / ((2 * Math.PI * hz) ** 2 * henries);

/** Parallel circuits one after the other, each driven by a valve: a current by the voltage before. */
export function isolatedCircuits(
  circuits: readonly { readonly q: number; readonly henries: number }[],
  hz: number,
): string[] {
  const stages = circuits.flatMap(({ q, henries }, index) => [
    `G${index} 0 n${index + 1} n${index} 0 0.001`,
    `L${index} n${index + 1} 0 ${henries}`,
    `C${index} n${index + 1} 0 ${tuningFarads(hz, henries)}`,
    `R${index} n${index + 1} 0 ${lossOhms(q, hz, henries)}`,
  ]);
  return ['Vin n0 0 dc 0 ac 1', ...stages];
}

/** Two equal parallel circuits with coupled coils, the first driven by a current. */
export function coupledPair(q: number, henries: number, hz: number, kappa: number): string[] {
  const circuit = (node: string): string[] => [
    `L${node} ${node} 0 ${henries}`,
    ...across(node, node, tuningFarads(hz, henries)),
    `R${node} ${node} 0 ${lossOhms(q, hz, henries)}`,
  ];
  return ['Iin 0 a dc 0 ac 1', ...circuit('a'), ...circuit('b'), `Kab La Lb ${kappa / q}`];
}

/** A source and its load with a trap between them, or without one. */
export function trapBetween(trap: Trap, withTrap: boolean): string[] {
  const { kind, inductanceH, capacitanceF, q, sourceOhms, loadOhms } = trap;
  const hz = 1 / (2 * Math.PI * Math.sqrt(inductanceH * capacitanceF));
  const isInSeries = withTrap && kind === 'parallel';
  const ends = [
    'Vin in 0 dc 0 ac 1',
    `Rs in ${isInSeries ? 'a' : 'out'} ${sourceOhms}`,
    `RL out 0 ${loadOhms}`,
  ];
  if (!withTrap) return ends;
  if (isInSeries) {
    const loss = lossOhms(q, hz, inductanceH);
    return [...ends, `Lt a out ${inductanceH}`, `Ct a out ${capacitanceF}`, `Rt a out ${loss}`];
  }
  const loss = (2 * Math.PI * hz * inductanceH) / q;
  return [...ends, `Lt out b ${inductanceH}`, `Rt b c ${loss}`, `Ct c 0 ${capacitanceF}`];
}

/** A coil with a gang section, driven by a current. */
export function plainTank(coilH: number, trimmerF: number, gangF: number): string[] {
  return [
    'Iin 0 a dc 0 ac 1',
    `La a 0 ${coilH}`,
    `Ra a 0 1e6`,
    ...across('g', 'a', gangF + trimmerF),
  ];
}

interface PaddedParts {
  readonly coilH: number;
  readonly padderF: number;
  readonly trimmerF: number;
  readonly trimmer: 'gang' | 'coil';
  readonly strayF: number;
}

/** A coil with the gang through a padder, driven by a current; the trimmer in one of two places. */
export function paddedTank(parts: PaddedParts, gangF: number): string[] {
  const { coilH, padderF, trimmerF, trimmer, strayF } = parts;
  return [
    'Iin 0 a dc 0 ac 1',
    `La a 0 ${coilH}`,
    'Ra a 0 1e6',
    `Cp a g ${padderF}`,
    ...across('g', 'g', gangF + (trimmer === 'gang' ? trimmerF : strayF)),
    ...across('t', 'a', trimmer === 'coil' ? trimmerF : 0),
    // The simulator's direct-current analysis wants a way to ground from every node.
    'Rg g 0 1e15',
  ];
}
