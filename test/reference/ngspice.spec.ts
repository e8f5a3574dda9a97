import { describe, expect, it } from 'vitest';

import { pick, seededRandom } from '../../server/dev/random.ts';
import { coupledPairRejection } from '../../shared/radio/circuits/coupled-pair.ts';
import type { Trap } from '../../shared/radio/receiver.ts';
import { designTracking, type TrackingInput } from '../../shared/radio/tracking/tracking.ts';
import { trapLoss } from '../../shared/radio/circuits/trap.ts';
import { circuitRejection, detuning } from '../../shared/radio/circuits/tuned-circuit.ts';
import {
  coupledPair,
  isolatedCircuits,
  paddedTank,
  plainTank,
  trapBetween,
} from '../support/circuits.ts';
import {
  type Circuit,
  hasNgspice,
  levelDb,
  type Phasor,
  resonanceOf,
  simulate,
} from '../support/ngspice.ts';

const CASES = 12;
const random = seededRandom(455);
const between = (low: number, high: number): number => low * (high / low) ** random();
const many = <T>(draw: () => T): T[] => Array.from({ length: CASES }, draw);

/** Sweep whose middle point is the frequency itself. */
const around = (hz: number, share: number, points = 81) => ({
  fromHz: hz * (1 - share),
  toHz: hz * (1 + share),
  points,
});
const middleOf = (sweep: readonly Phasor[]): Phasor => {
  const middle = sweep[(sweep.length - 1) / 2];
  if (!middle) throw new Error('The sweep has no middle.');
  return middle;
};

/** Largest difference between the simulator and a formula over a sweep, dB. */
function worstDb(sweep: readonly Phasor[], lossDb: (point: Phasor) => number): number {
  expect(sweep.length).toBeGreaterThan(10);
  return Math.max(
    ...sweep.map((point) => Math.abs(levelDb(point, middleOf(sweep)) + lossDb(point))),
  );
}

it('has ngspice, without which the formulas are not checked against a simulator', ({ skip }) => {
  if (!hasNgspice && !process.env['CI']) {
    const note = 'ngspice is missing (apt-get install ngspice): nothing was checked against it.';
    console.warn(note);
    skip(note);
  }
  expect(hasNgspice).toBe(true);
});

describe.runIf(hasNgspice)('isolated circuits against ngspice', () => {
  const cascades = many(() => ({
    hz: Math.round(between(150_000, 30_000_000)),
    circuits: Array.from({ length: 1 + Math.floor(random() * 4) }, () => ({
      q: between(15, 200),
      henries: between(1e-6, 1e-3),
    })),
  }));

  it('agree within 0.001 dB from near 0 to twice the resonance', () => {
    const sweeps = simulate(
      cascades.map(({ hz, circuits }) => ({
        elements: isolatedCircuits(circuits, hz),
        out: `n${circuits.length}`,
        sweep: around(hz, 0.95),
      })),
    );

    cascades.forEach(({ hz, circuits }, index) => {
      const loss = (point: Phasor) =>
        circuits.reduce((sum, { q }) => sum + circuitRejection(point.hz, hz, q, 1), 0);
      expect(worstDb(sweeps[index] ?? [], loss)).toBeLessThan(0.001);
    });
  });
});

describe.runIf(hasNgspice)('coupled pairs against ngspice', () => {
  const pairs = many(() => ({
    hz: pick(random, [110_000, 455_000, 465_000, 1_600_000]),
    q: between(40, 120),
    kappa: between(0.5, 1.5),
    henries: between(1e-4, 3e-3),
  }));

  // The coupling grows with frequency, which the narrow-band formula leaves out: 20 log10(f/f0) is
  // 0.34 dB at f0/1.04.
  it('agree within 0.35 dB over 4 % on either side', () => {
    const sweeps = simulate(
      pairs.map(({ hz, q, kappa, henries }) => ({
        elements: coupledPair(q, henries, hz, kappa),
        out: 'b',
        sweep: around(hz, 1 - 1 / 1.04),
      })),
    );

    pairs.forEach(({ hz, q, kappa }, index) => {
      const loss = (point: Phasor) => coupledPairRejection(q * detuning(point.hz, hz), kappa);
      expect(worstDb(sweeps[index] ?? [], loss)).toBeLessThan(0.35);
    });
  });
});

describe.runIf(hasNgspice)('wave traps against ngspice', () => {
  const traps = many<Trap>(() => ({
    kind: pick(random, ['parallel', 'series']),
    inductanceH: between(20e-6, 1e-3),
    capacitanceF: between(50e-12, 2e-9),
    q: between(30, 200),
    sourceOhms: between(50, 2000),
    loadOhms: between(100, 20_000),
  }));

  it('agree within 0.001 dB, below, at and above the frequency of the trap', () => {
    const circuitOf = (trap: Trap, withTrap: boolean): Circuit => ({
      elements: trapBetween(trap, withTrap),
      out: 'out',
      sweep: around(1 / (2 * Math.PI * Math.sqrt(trap.inductanceH * trap.capacitanceF)), 0.9),
    });
    const sweeps = simulate(
      traps.flatMap((trap) => [circuitOf(trap, true), circuitOf(trap, false)]),
    );

    traps.forEach((trap, index) => {
      const [trapped = [], bare = []] = sweeps.slice(2 * index, 2 * index + 2);
      expect(trapped.length).toBe(81);
      trapped.forEach((point, at) => {
        const without = bare[at] ?? { hz: NaN, re: NaN, im: NaN };
        expect(Math.abs(levelDb(point, without) + trapLoss(trap, point.hz))).toBeLessThan(0.001);
      });
    });
  });
});

describe.runIf(hasNgspice)('tracked circuits against ngspice', () => {
  const designs = [...many(() => bandWith('above')), ...many(() => bandWith('below'))].map(
    (input) => ({ input, design: designTracking(input) }),
  );
  const built = designs.filter(({ design }) => design.refused === null);

  it('are mostly designs that can be built, of both kinds', () => {
    const kinds = new Set(built.map(({ input }) => `${input.oscillator} ${input.trimmer}`));

    expect(kinds.size).toBe(4);
  });

  it('resonate within 1 Hz of what is promised, all over the dial', () => {
    const checks = built.flatMap(checksOf);
    const sweeps = simulate(checks.map(({ circuit }) => circuit));

    expect(checks.length).toBeGreaterThan(4 * CASES);
    checks.forEach(({ promisedHz }, index) => {
      expect(Math.abs(resonanceOf(sweeps[index] ?? []) - promisedHz)).toBeLessThan(1);
    });
  });

  function bandWith(oscillator: 'above' | 'below'): TrackingInput {
    const lowHz = Math.round(between(150_000, 6_000_000)) + (oscillator === 'below' ? 500_000 : 0);
    const highHz = Math.round(lowHz * between(1.6, 2.7));
    const swing = oscillator === 'below' ? (highHz - 455_000) / (lowHz - 455_000) : highHz / lowHz;
    const gangMinF = between(10e-12, 30e-12);
    return {
      lowHz,
      highHz,
      ifHz: 455_000,
      oscillator,
      gangMinF,
      gangMaxF: gangMinF * swing ** 2 * between(1.5, 2.5),
      strayF: pick(random, [0, 2e-12]),
      trimmer: pick(random, ['gang', 'coil']),
      points: 'best',
    };
  }
});

/** Both circuits of a design at five settings of the gang, and where they should resonate. */
function checksOf({
  input,
  design,
}: {
  input: TrackingInput;
  design: ReturnType<typeof designTracking>;
}) {
  const { trimmer, strayF, oscillator, ifHz } = input;
  const above = oscillator === 'above';
  const part = (value: number | null): number => value ?? NaN;
  const [signal, own] = [
    { coilH: part(design.signalCoilH), trimmerF: part(design.signalTrimmerF) },
    { coilH: part(design.oscillatorCoilH), trimmerF: part(design.oscillatorTrimmerF) },
  ];
  const [plain, padded] = above ? [signal, own] : [own, signal];
  const parts = { ...padded, padderF: part(design.padderF), trimmer, strayF };
  return design.errors
    .filter((_, index) => index % 11 === 0)
    .flatMap(({ dialHz, errorHz }) => {
      const ownHz = dialHz + (above ? ifHz : -ifHz) + errorHz;
      const [plainHz, paddedHz] = above ? [dialHz, ownHz] : [ownHz, dialHz];
      const gangF = 1 / ((2 * Math.PI * plainHz) ** 2 * plain.coilH) - plain.trimmerF;
      const sweep = (hz: number) => around(hz, 0.003, 61);
      return [
        {
          promisedHz: plainHz,
          circuit: {
            elements: plainTank(plain.coilH, plain.trimmerF, gangF),
            out: 'a',
            sweep: sweep(plainHz),
          },
        },
        {
          promisedHz: paddedHz,
          circuit: { elements: paddedTank(parts, gangF), out: 'a', sweep: sweep(paddedHz) },
        },
      ];
    });
}
