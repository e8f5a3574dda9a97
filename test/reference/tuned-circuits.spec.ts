import { describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/tuned-circuits.json' with { type: 'json' };
import { coupledPairRejection } from '../../shared/radio/circuits/coupled-pair.ts';
import type { Trap } from '../../shared/radio/receiver.ts';
import { trapFrequency, trapLoss } from '../../shared/radio/circuits/trap.ts';
import { circuitRejection, detuning } from '../../shared/radio/circuits/tuned-circuit.ts';

const { examinationItems, isolated, ifRejection, coupledPair, traps, trapCosts } = reference;

describe(`image rejection ratios as published [${examinationItems.mark}]`, () => {
  it.each(examinationItems.checks)(
    '$source',
    ({ q, frequencyHz, resonanceHz, ratio, tolerance }) => {
      const found = 10 ** (circuitRejection(frequencyHz, resonanceHz, q, 1) / 20);

      expect(Math.abs(found - ratio)).toBeLessThan(tolerance);
    },
  );
});

describe(`isolated circuits: ${isolated.source} [${isolated.mark}]`, () => {
  it.each(isolated.checks)('$frequencyHz Hz: $rejectionDb dB', ({ frequencyHz, rejectionDb }) => {
    const found = [1, 2, 3].map((circuits) =>
      circuitRejection(frequencyHz, isolated.resonanceHz, isolated.q, circuits),
    );

    found.forEach((db, index) => expect(db).toBeCloseTo(rejectionDb[index] ?? NaN, 4));
  });
});

describe(`IF rejection: ${ifRejection.source} [${ifRejection.mark}]`, () => {
  it.each(ifRejection.checks)('dial $dialHz Hz: $rejectionDb dB', ({ dialHz, rejectionDb }) => {
    const found = circuitRejection(ifRejection.ifHz, dialHz, ifRejection.q, 1);

    expect(found).toBeCloseTo(rejectionDb, 3);
  });
});

describe(`coupled pair: ${coupledPair.source} [${coupledPair.mark}]`, () => {
  it.each(coupledPair.checks)(
    '$frequencyHz Hz: $rejectionDb dB',
    ({ frequencyHz, rejectionDb }) => {
      const x = coupledPair.q * detuning(frequencyHz, coupledPair.resonanceHz);
      const found = coupledPairRejection(x, coupledPair.coupling);

      expect(Math.abs(found - rejectionDb)).toBeLessThan(coupledPair.toleranceDb);
    },
  );
});

describe(`wave traps: ${traps.source} [${traps.mark}]`, () => {
  it('resonates at 455 kHz', () => {
    expect(trapFrequency(traps)).toBeCloseTo(455_000, -1);
  });

  it.each(traps.checks)('$kind, $frequencyHz Hz: $lossDb dB', ({ kind, frequencyHz, lossDb }) => {
    const trap: Trap = { ...traps, kind: kind === 'parallel' ? 'parallel' : 'series' };

    expect(Math.abs(trapLoss(trap, frequencyHz) - lossDb)).toBeLessThan(0.001);
  });
});

describe(`cost of a trap: ${trapCosts.source} [${trapCosts.mark}]`, () => {
  it.each(trapCosts.checks)('coil of $inductanceH H: $lossDb dB', ({ inductanceH, lossDb }) => {
    const capacitanceF = 1 / ((2 * Math.PI * trapCosts.frequencyHz) ** 2 * inductanceH);
    const trap: Trap = { ...traps, kind: 'parallel', inductanceH, capacitanceF };

    expect(Math.abs(trapLoss(trap, trapCosts.dialHz) - lossDb)).toBeLessThan(trapCosts.toleranceDb);
  });
});
