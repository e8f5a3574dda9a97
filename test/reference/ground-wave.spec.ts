import { readFileSync } from 'node:fs';

import { describe, expect, it } from 'vitest';

import propagation from '../../datasets/reference/propagation.json' with { type: 'json' };
import { flatEarthAttenuation } from '../../shared/radio/propagation/flat-earth.ts';
import { GROUNDS } from '../../shared/radio/propagation/ground.ts';
import { groundWave } from '../../shared/radio/propagation/ground-wave.ts';
import { ResidueSeries } from '../../shared/radio/propagation/spherical-earth.ts';
import type { Ground } from '../../shared/radio/site.ts';
import { hertz, metres } from '../../shared/radio/units.ts';

/** Tolerance of the published data: they are computed with terms left out below 0.05 %. */
const TOLERANCE_DB = 0.1;

interface Published {
  readonly frequencyMhz: number;
  readonly permittivity: number;
  readonly conductivity: number;
  readonly points: { readonly distanceKm: number; readonly fieldDb: number }[];
}

/** Rows of the published table, gathered by frequency and ground. */
function published(): Published[] {
  const file = new URL('../../datasets/reference/ground-wave-lfmf.csv', import.meta.url);
  const curves = new Map<string, Published>();
  for (const line of readFileSync(file, 'utf8').trim().split('\n').slice(1)) {
    const [frequencyMhz, permittivity, conductivity, distanceKm, fieldDb] = line
      .split(',')
      .map(Number) as [number, number, number, number, number];
    const key = `${frequencyMhz} ${permittivity} ${conductivity}`;
    const curve = curves.get(key) ?? { frequencyMhz, permittivity, conductivity, points: [] };
    curve.points.push({ distanceKm, fieldDb });
    curves.set(key, curve);
  }
  return [...curves.values()];
}

// Source [S]: validation data published with LFMF, the low and medium frequency propagation model
// of the National Telecommunications and Information Administration (US government work).
describe('the ground wave against the data published with NTIA LFMF', () => {
  it.each(published())(
    'agrees at $frequencyMhz MHz over permittivity $permittivity, $conductivity S/m',
    ({ frequencyMhz, permittivity, conductivity, points }) => {
      const wave = groundWave(hertz(frequencyMhz * 1e6), { permittivity, conductivity });

      for (const { distanceKm, fieldDb } of points) {
        const off = Math.abs(wave(metres(distanceKm * 1000)) - fieldDb);
        expect(off, `${distanceKm} km`).toBeLessThan(TOLERANCE_DB);
      }
    },
  );
});

describe(`the ground wave against ${propagation.groundWave.source} [C]`, () => {
  it.each(propagation.groundWave.checks)(
    '$frequencyHz Hz, $distanceM m: $fieldDb dB(uV/m)',
    ({ frequencyHz, distanceM, fieldDb, ...ground }) => {
      const field = groundWave(hertz(frequencyHz), ground)(metres(distanceM));

      expect(Math.abs(field - fieldDb)).toBeLessThan(propagation.groundWave.toleranceDb);
    },
  );
});

describe(`the residue series against ${propagation.residueSeries.source} [C]`, () => {
  it.each(propagation.residueSeries.checks)(
    '$frequencyHz Hz, $ground ground, $distanceM m: $fieldDb dB(uV/m)',
    ({ frequencyHz, ground, distanceM, fieldDb }) => {
      const wave = groundWave(hertz(frequencyHz), GROUNDS[ground as Ground]);
      const off = Math.abs(wave(metres(distanceM)) - fieldDb);

      expect(off).toBeLessThan(propagation.residueSeries.toleranceDb);
    },
  );
});

describe(`the flat earth against ${propagation.flatEarth.source} [C]`, () => {
  it.each(propagation.flatEarth.checks)(
    '$frequencyHz Hz, $distanceM m: $fieldDb dB(uV/m)',
    ({ frequencyHz, distanceM, fieldDb, ...ground }) => {
      const overPerfectGround = 20 * Math.log10(300_000) - 20 * Math.log10(distanceM / 1000);
      const attenuation = flatEarthAttenuation(hertz(frequencyHz), ground, metres(distanceM));

      expect(overPerfectGround + attenuation).toBeCloseTo(fieldDb, 3);
    },
  );
});

describe(`curvature: ${propagation.curvature.source} [${propagation.curvature.mark}]`, () => {
  it.each(propagation.curvature.checks)(
    '$frequencyHz Hz, $ground ground, $distanceM m: flat earth $leastDb to $mostDb dB high',
    ({ frequencyHz, ground: kind, distanceM, leastDb, mostDb }) => {
      const ground = GROUNDS[kind as Ground];
      const [frequency, distance] = [hertz(frequencyHz), metres(distanceM)];
      const series = new ResidueSeries(frequency, ground).attenuation(distance);
      const high = flatEarthAttenuation(frequency, ground, distance) - series;

      expect(high).toBeGreaterThan(leastDb);
      expect(high).toBeLessThan(mostDb);
    },
  );
});
