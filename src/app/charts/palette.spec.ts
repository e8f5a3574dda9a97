import { lab, rgb } from 'd3';

import { type HueName, hues } from './palette';

/**
 * What a person with the deficiency sees, on linear RGB, severity 1.0: Machado, Oliveira and
 * Fernandes, "A Physiologically-based Model for Simulation of Color Vision Deficiency", IEEE
 * Transactions on Visualization and Computer Graphics 15 (2009), table of matrices.
 */
const SIGHT = {
  'full colour vision': [1, 0, 0, 0, 1, 0, 0, 0, 1],
  protanopia: [
    0.152286, 1.052583, -0.204868, 0.114503, 0.786281, 0.099216, -0.003882, -0.048116, 1.051998,
  ],
  deuteranopia: [
    0.367322, 0.860646, -0.227968, 0.280085, 0.672501, 0.047413, -0.01182, 0.04294, 0.968881,
  ],
  tritanopia: [
    1.255528, -0.076749, -0.178779, -0.078411, 0.930809, 0.147602, 0.004733, 0.691367, 0.3039,
  ],
};

const GROUNDS = { paper: ['#fdf9f0', '#f6f0e3'], walnut: ['#17110d', '#211913'] };

/** IEC 61966-2-1 (sRGB) to linear light. */
const toLinear = (channel: number): number =>
  channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
const fromLinear = (light: number): number =>
  light <= 0.0031308 ? 12.92 * light : 1.055 * light ** (1 / 2.4) - 0.055;

function linear(colour: string): [number, number, number] {
  const { r, g, b } = rgb(colour);
  return [toLinear(r / 255), toLinear(g / 255), toLinear(b / 255)];
}

function seen(colour: string, matrix: readonly number[]): string {
  const [r, g, b] = linear(colour);
  const row = (at: number) =>
    (matrix[at] ?? 0) * r + (matrix[at + 1] ?? 0) * g + (matrix[at + 2] ?? 0) * b;
  const channel = (at: number) => 255 * fromLinear(Math.min(1, Math.max(0, row(at))));
  return rgb(channel(0), channel(3), channel(6)).toString();
}

/** Colour difference, CIE 1976. */
function difference(one: string, other: string): number {
  const a = lab(one);
  const b = lab(other);
  return Math.hypot(a.l - b.l, a.a - b.a, a.b - b.b);
}

/** Contrast ratio of WCAG 2.2. */
function contrast(one: string, other: string): number {
  const luminance = (colour: string) => {
    const [r, g, b] = linear(colour);
    return 0.2126 * r + 0.7152 * g + 0.0722 * b;
  };
  const [dark = 0, light = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (light + 0.05) / (dark + 0.05);
}

const names = Object.keys(hues) as HueName[];

describe('the hues of the charts', () => {
  it('reproduce the contrast of black on white, 21:1 (WCAG 2.2)', () => {
    expect(contrast('#000', '#fff')).toBeCloseTo(21, 6);
  });

  it('are at most five', () => {
    expect(names.length).toBeLessThanOrEqual(5);
  });

  describe.each(['paper', 'walnut'] as const)('on %s', (theme) => {
    it.each(names)('%s stands out from the ground by 3:1', (name) => {
      for (const ground of GROUNDS[theme]) {
        expect(contrast(hues[name][theme], ground)).toBeGreaterThanOrEqual(3);
      }
    });

    it.each(Object.entries(SIGHT))('are told apart in pairs with %s', (_, matrix) => {
      const colours = names.map((name) => seen(hues[name][theme], matrix));
      const distances = colours.flatMap((one, at) =>
        colours.slice(at + 1).map((other) => difference(one, other)),
      );

      expect(Math.min(...distances)).toBeGreaterThanOrEqual(20);
    });
  });
});
