import { describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/superheterodyne.json' with { type: 'json' };
import { capacitanceChange } from '../../shared/radio/mixing/beat-oscillator.ts';
import { harmonicsOnChannels } from '../../shared/radio/candidates/harmonics-on-channels.ts';
import { whistlePitch } from '../../shared/radio/mixing/harmonic-whistles.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import {
  halfIfFrequencies,
  imageFrequency,
  oscillatorFrequency,
  productFrequencies,
  rangeRatio,
} from '../../shared/radio/mixing/superheterodyne.ts';

const { frequencies, rangeRatios, whistles, capacitance } = reference;

describe(`responses at one dial setting: ${frequencies.source} [${frequencies.mark}]`, () => {
  const { dialHz, ifHz } = frequencies;

  it('puts oscillator, image and half-IF responses where the definitions do', () => {
    expect(oscillatorFrequency(dialHz, ifHz, 'above')).toBe(frequencies.oscillatorHz);
    expect(imageFrequency(dialHz, ifHz, 'above')).toBe(frequencies.imageHz);
    expect(halfIfFrequencies(dialHz, ifHz, 'above')).toEqual(frequencies.halfIfHz);
  });

  it.each(frequencies.products)('product ($m, $n): $hz Hz', ({ m, n, hz }) => {
    const found = productFrequencies(frequencies.oscillatorHz, ifHz, m, n);

    expect(found[0]).toBeCloseTo(hz[0] ?? NaN, 6);
    expect(found[1]).toBeCloseTo(hz[1] ?? NaN, 6);
  });
});

describe(`range ratios: ${rangeRatios.source} [${rangeRatios.mark}]`, () => {
  const { lowHz, highHz, ifHz, signal, oscillator } = rangeRatios;

  it(`${signal} of the signal circuits, ${oscillator} of the oscillator`, () => {
    const ends = [lowHz, highHz].map((hz) => oscillatorFrequency(hz, ifHz, 'above'));

    expect(rangeRatio(lowHz, highHz)).toBeCloseTo(signal, 5);
    expect(rangeRatio(ends[0] ?? NaN, ends[1] ?? NaN)).toBeCloseTo(oscillator, 5);
  });
});

describe(`harmonics of the IF: ${whistles.source} [${whistles.mark}]`, () => {
  const band = { lowHz: 520_000, highHz: 1_710_000 };

  it.each(whistles.checks)(
    'IF $ifHz, harmonic $harmonic beats with $channelHz by $beatHz Hz',
    ({ ifHz, ...expected }) => {
      expect(harmonicsOnChannels(ifHz, [band], defaultRaster(1))).toContainEqual(expected);
      expect(whistlePitch(expected.harmonic, ifHz, expected.channelHz, 0)).toBe(expected.beatHz);
    },
  );
});

describe(`IF capacitances: ${capacitance.source} [${capacitance.mark}]`, () => {
  it.each(capacitance.checks)('$fromHz to $toHz Hz: $percent %', ({ fromHz, toHz, percent }) => {
    const digits = String(percent).split('.')[1]?.length ?? 0;

    expect(100 * capacitanceChange(fromHz, toHz)).toBeCloseTo(percent, digits);
  });
});
