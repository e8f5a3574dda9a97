import { describe, expect, it } from 'vitest';

import {
  givenStations,
  plainBand,
  plainReceiver,
  siteIn,
} from '../../../test/support/plain-sets.ts';
import { assess } from '../assessment/assessment.ts';
import type { Response } from '../assessment/response.ts';
import type { Receiver } from '../receiver.ts';
import {
  secondConversionWarning,
  secondImage,
  secondOscillator,
  secondOscillatorHarmonics,
} from './second-conversion.ts';

const above = { ifHz: 85_000, oscillator: 'above' } as const;
const below = { ifHz: 85_000, oscillator: 'below' } as const;

/** A narrow second IF behind a first IF of 1600 kHz. */
function doubleSet(over: Partial<Receiver> = {}): Receiver {
  return plainReceiver({
    ifHz: 1_600_000,
    secondConversion: above,
    selectivity: { kind: 'widths', b6Hz: 6_000, b60Hz: 60_000 },
    bands: [plainBand({ lowHz: 2_000_000, highHz: 4_000_000, tuningToleranceHz: 0 })],
    ...over,
  });
}

function responses(receiver: Receiver, hz: number): readonly Response[] {
  const { bands } = assess({
    receiver,
    site: siteIn(1),
    ...givenStations([[hz, 110]]),
    raster: [{ lowHz: 2_000_000, highHz: 4_000_000, stepHz: 5_000 }],
    period: 'night',
    maxM: 3,
    maxN: 2,
    leaveOutBetterThan: null,
    limit: 100,
  });
  return bands[0]?.responses ?? [];
}

describe('frequencies of a second conversion', () => {
  it('are those of the examples', () => {
    expect(secondImage(1_600_000, above)).toBe(1_770_000);
    expect(secondOscillator(1_600_000, above)).toBe(1_685_000);
    expect(secondOscillatorHarmonics(doubleSet(), 1_600_000, 4_000_000)).toEqual([
      { harmonic: 1, dialHz: 1_685_000 },
      { harmonic: 2, dialHz: 3_370_000 },
    ]);
    expect(secondOscillatorHarmonics(plainReceiver(), 0, 1e9)).toEqual([]);
  });
});

describe('second image', () => {
  it.each([
    ['above', above, 3_000_000 + 170_000],
    ['below', below, 3_000_000 - 170_000],
  ] as const)('with the second oscillator %s is heard 2 IF2 from the dial', (_, second, dialHz) => {
    const found = responses(doubleSet({ secondConversion: second }), 3_000_000).find(
      ({ cause }) => cause === 'second-image',
    );

    expect(found).toMatchObject({ dialHz, beatHz: 0, m: 1, n: 1, name: 'second image' });
  });

  it('is rejected by the first IF as well as by the circuits, stray pick-up too', () => {
    const [free, stray] = [null, { if: 20, image: 20 }].map((strayDb) =>
      responses(doubleSet({ strayDb }), 3_000_000).find(({ cause }) => cause === 'second-image'),
    );
    const lines = new Map(free?.ledger.map(({ term, valueDb }) => [term, valueDb]));

    expect(lines.get('second-conversion')).toBe(-90);
    expect(free?.interferenceDb).toBeCloseTo(110 + (lines.get('circuit-1') ?? NaN) - 90, 9);
    expect(stray?.interferenceDb).toBeGreaterThanOrEqual(110 - 20 - 90);
  });

  it('is none of a set with one conversion', () => {
    const found = responses(doubleSet({ secondConversion: null }), 3_000_000);

    expect(found.some(({ cause }) => cause === 'second-image')).toBe(false);
  });
});

describe('second IF', () => {
  it('breaks through like the first', () => {
    const found = responses(doubleSet(), 86_000).find(({ cause }) => cause === 'breakthrough');

    expect(found).toMatchObject({
      m: 0,
      n: 1,
      beatHz: 1_000,
      name: 'breakthrough of the second IF',
    });
  });
});

describe('secondConversionWarning', () => {
  it('tells of an oscillator at zero and of a harmonic on the first IF', () => {
    const warning = (ifHz: number, second: number): string | null =>
      secondConversionWarning(
        { ifHz, secondConversion: { ifHz: second, oscillator: 'below' } },
        3_000,
      );

    expect(warning(1_600_000, 85_000)).toBeNull();
    expect(warning(455_000, 455_000)).toMatch(/zero/);
    expect(warning(1_600_000, 800_000)).toMatch(/Harmonic 2/);
    expect(secondConversionWarning({ ifHz: 1, secondConversion: null }, 1)).toBeNull();
  });
});
