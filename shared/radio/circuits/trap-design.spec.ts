import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { nearestPreferred } from './preferred-values.ts';
import { trapFrequency } from './trap.ts';
import { designTrap, type TrapInput } from './trap-design.ts';

const input: TrapInput = {
  frequencyHz: 455_000,
  kind: 'parallel',
  inductanceH: 500e-6,
  q: 100,
  sourceOhms: 400,
  loadOhms: 1000,
  atHz: [455_000, 540_000],
};

describe('nearestPreferred', () => {
  it('gives the value of its example', () => {
    expect(nearestPreferred(244.7, 'E12')).toBe(220);
    expect(nearestPreferred(244.7, 'E24')).toBe(240);
  });

  it('knows values across decades, without rounding errors', () => {
    expect(nearestPreferred(9.7e-12, 'E12')).toBe(10e-12);
    expect(nearestPreferred(0.0093, 'E24')).toBe(0.0091);
  });

  it('keeps preferred values, and is within half a step of any other', () => {
    const widestHalfStep = Math.sqrt(15 / 13) - 1 + 1e-9;
    fc.assert(
      fc.property(fc.double({ min: 1e-13, max: 1e6, noNaN: true }), (value) => {
        const nearest = nearestPreferred(value, 'E24');

        expect(nearestPreferred(nearest, 'E24')).toBe(nearest);
        expect(Math.abs(nearest / value - 1)).toBeLessThanOrEqual(widestHalfStep);
      }),
    );
  });

  it('refuses what is not above 0', () => {
    expect(() => nearestPreferred(0, 'E12')).toThrow(/value/);
    expect(() => nearestPreferred(Infinity, 'E12')).toThrow(/value/);
  });
});

describe('designTrap', () => {
  it('gives the value of its example, and the capacitor that belongs to the coil', () => {
    const { parts, loss } = designTrap(input);

    expect(loss[0]?.db).toBeCloseTo(40.265, 3);
    expect(parts.capacitanceF * 1e12).toBeCloseTo(244.7076, 4);
  });

  it('says what frequency the preferred values give', () => {
    const { preferred } = designTrap(input);

    expect(preferred.E12).toMatchObject({ inductanceH: 500e-6, capacitanceF: 220e-12 });
    expect(preferred.E24.capacitanceF).toBe(240e-12);
    expect(preferred.E24.frequencyHz).toBe(Math.round(trapFrequency(preferred.E24)));
    expect(preferred.E24.frequencyHz).toBeCloseTo(459_441, -2);
  });

  it('finds the coil for a capacitor as well', () => {
    const { parts, preferred } = designTrap({
      ...input,
      inductanceH: undefined,
      capacitanceF: 250e-12,
    });

    expect(trapFrequency(parts)).toBeCloseTo(455_000, 3);
    expect(preferred.E12).toMatchObject({ capacitanceF: 250e-12, inductanceH: 470e-6 });
  });

  it.each([
    [{ inductanceH: undefined }, /either a coil or a capacitor/],
    [{ capacitanceF: 1e-12 }, /either a coil or a capacitor/],
    [{ inductanceH: 0 }, /inductanceH/],
    [{ inductanceH: undefined, capacitanceF: -1 }, /capacitanceF/],
    [{ frequencyHz: 0 }, /frequencyHz/],
    [{ q: 0 }, /q must/],
    [{ atHz: [0] }, /frequencyHz/],
  ])('refuses %j', (over, message) => {
    expect(() => designTrap({ ...input, ...over })).toThrow(message);
  });
});
