import { describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/tracking.json' with { type: 'json' };
import {
  trackedDesign,
  type Tracking,
  designTracking,
  type TrackingInput,
} from '../../shared/radio/tracking/tracking.ts';
import {
  curveOf,
  trackingConstants,
  trackingError,
} from '../../shared/radio/tracking/tracking-curve.ts';
import {
  oscillatorFrequency,
  productFrequencies,
} from '../../shared/radio/mixing/superheterodyne.ts';
import { resonanceConstant } from '../../shared/radio/tracking/padded-circuit.ts';
import { circuitRejection } from '../../shared/radio/circuits/tuned-circuit.ts';

const { curve, parts, best, loss, refit, trimmerPeaks } = reference;
const POINTS = [600_000, 1_000_000, 1_400_000] as const;
const MEDIUM_WAVE: TrackingInput = {
  lowHz: 550_000,
  highHz: 1_600_000,
  ifHz: 455_000,
  oscillator: 'above',
  gangMinF: 40e-12,
  gangMaxF: 400e-12,
  strayF: 0,
  trimmer: 'gang',
  points: POINTS,
};

function pico(farads: number | null): number {
  return (farads ?? NaN) * 1e12;
}

function micro(henries: number | null): number {
  return (henries ?? NaN) * 1e6;
}

describe(`tracking curve: ${curve.source} [${curve.mark}]`, () => {
  const constants = trackingConstants(POINTS, 455_000);

  it('has the constants l, m and n', () => {
    expect(Math.sqrt(constants.l2)).toBeCloseTo(curve.lHz, 0);
    expect(Math.sqrt(constants.m2)).toBeCloseTo(curve.mHz, 0);
    expect(Math.sqrt(constants.n2)).toBeCloseTo(curve.nHz, 0);
  });

  it.each(curve.errors)('$dialHz Hz: $errorHz Hz', ({ dialHz, errorHz }) => {
    expect(Math.abs(trackingError(curveOf(constants), 455_000, dialHz) - errorHz)).toBeLessThan(
      0.01,
    );
  });
});

describe(`parts: ${parts.source} [${parts.mark}]`, () => {
  it.each(parts.checks)('trimmer across the $trimmer, stray $strayPf pF', (check) => {
    const strayF = check.strayPf * 1e-12;
    const trimmer = check.trimmer === 'coil' ? 'coil' : 'gang';
    const design: Tracking = designTracking({ ...MEDIUM_WAVE, trimmer, strayF });

    expect(design.refused).toBeNull();
    expect(pico(design.signalTrimmerF)).toBeCloseTo(parts.signalTrimmerPf, 4);
    expect(micro(design.signalCoilH)).toBeCloseTo(parts.signalCoilUh, 4);
    expect(micro(design.oscillatorCoilH)).toBeCloseTo(check.coilUh, 4);
    expect(pico(design.padderF)).toBeCloseTo(check.padderPf, 4);
    expect(pico(design.oscillatorTrimmerF)).toBeCloseTo(check.trimmerPf, 4);
  });
});

describe(`best points: ${best.source} [${best.mark}]`, () => {
  it.each(best.checks)(
    '$lowHz to $highHz Hz: $pointsHz',
    ({ lowHz, highHz, pointsHz, worstHz }) => {
      const wide = { ...MEDIUM_WAVE, lowHz, highHz, gangMinF: 20e-12, gangMaxF: 500e-12 };
      const design = designTracking({ ...wide, points: 'best' });

      pointsHz.forEach((hz, index) => {
        expect(Math.abs((design.pointsHz[index] ?? NaN) - hz)).toBeLessThanOrEqual(1);
      });
      expect(design.worstErrorHz).toBeCloseTo(worstHz, 1);
    },
  );
});

describe(`loss by mistracking: ${loss.source} [${loss.mark}]`, () => {
  it(`is ${loss.lossDb} dB`, () => {
    const { tunedHz, errorHz, q, lossDb } = loss;

    expect(circuitRejection(tunedHz + errorHz, tunedHz, q, 1)).toBeCloseTo(lossDb, 3);
  });
});

describe(`after a change of IF: ${refit.source} [${refit.mark}]`, () => {
  const before = designTracking(MEDIUM_WAVE);

  it.each(refit.checks)('to $ifHz Hz: coil $coilPercent %', (check) => {
    const input: TrackingInput = {
      ...MEDIUM_WAVE,
      ifHz: check.ifHz,
      fixedPadderF: refit.padderPf * 1e-12,
      alignHz: [refit.alignHz[0] ?? NaN, refit.alignHz[1] ?? NaN],
    };
    const after = designTracking(input);
    const change = (after.oscillatorCoilH ?? NaN) / (before.oscillatorCoilH ?? NaN) - 1;
    const { curve: refittedCurve } = trackedDesign(input);

    expect(100 * change).toBeCloseTo(check.coilPercent, 3);
    expect(pico(after.oscillatorTrimmerF)).toBeCloseTo(check.trimmerPf, 3);
    expect(trackingError(refittedCurve, check.ifHz, 1_000_000)).toBeCloseTo(check.errorHz, 0);
  });
});

describe(`trimmer peaks: ${trimmerPeaks.source} [${trimmerPeaks.mark}]`, () => {
  const { generatorHz, ifHz } = trimmerPeaks;

  it.each([
    { oscillator: 'above', rightHasLess: true },
    { oscillator: 'below', rightHasLess: false },
  ] as const)('oscillator $oscillator', ({ oscillator, rightHasLess }) => {
    const right = oscillatorFrequency(generatorHz, ifHz, oscillator);
    const peaks = [generatorHz - ifHz, generatorHz + ifHz];
    const wrong = peaks.find((hz) => hz !== right) ?? NaN;
    // At either the generator makes the IF; with one coil, capacitance goes by the square.
    const farads = (hz: number): number => resonanceConstant(100e-6) / hz ** 2;

    expect(peaks).toContain(right);
    for (const hz of peaks) expect(productFrequencies(hz, ifHz, 1, 1)).toContain(generatorHz);
    expect(farads(right) < farads(wrong)).toBe(rightHasLess);
  });
});
