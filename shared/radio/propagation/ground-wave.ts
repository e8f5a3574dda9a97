/**
 * Ground wave of a station: the flat earth near by, the spherical earth farther away.
 *
 * Source: as in the two modules it joins; checked with data published with NTIA's LFMF.
 *
 * @module radio/propagation/ground-wave
 */
import { flatEarthAttenuation } from './flat-earth.ts';
import type { GroundConstants } from './ground.ts';
import { ResidueSeries } from './spherical-earth.ts';
import { type Decibels, decibels, type Hertz, metres, type Metres } from '../units.ts';

/** Field of 1 kW e.m.r.p. over a perfect conductor at 1 km: 300 mV/m, dB(uV/m). */
const FIELD_AT_1_KM = 20 * Math.log10(300_000);
/** Nearer than this the field is taken as at this distance, metres. */
export const LEAST_DISTANCE_M = 1000;

/**
 * Field of a ground wave of 1 kW e.m.r.p. at any distance, for one frequency and one ground.
 *
 *     E = 109.5424 - 20 log10 d(km) + 20 log10 |F|
 *
 * |F| by the flat earth up to 25 / cbrt(f MHz) km and by the residue series from there on. At the
 * joint the flat earth is 0.1 to 0.25 dB high, for want of curvature, whose effect begins in
 * proportion to d^1.5: that much is taken off, so that there is no step. The distance is taken as
 * 1 km at least.
 *
 * Within 0.1 dB of the validation data published with NTIA's LFMF model. Holds for smooth uniform
 * ground and vertical aerials on it; a real path may differ by 10 dB.
 *
 * @param frequency Frequency, hertz, above 0.
 * @param ground Constants of the ground.
 * @returns A function of the distance in metres that gives the field, dB(uV/m); it keeps what it
 *   has worked out, so ask one function for all distances.
 * @example
 *   groundWave(hertz(1_000_000), GROUNDS.average)(metres(50_000)); // 57.03
 */
export function groundWave(
  frequency: Hertz,
  ground: GroundConstants,
): (distance: Metres) => Decibels {
  const series = new ResidueSeries(frequency, ground);
  const joint = flatEarthReach(frequency);
  let step: number | undefined;

  const nearAttenuation = (distance: Metres): number => {
    step ??= flatEarthAttenuation(frequency, ground, joint) - series.attenuation(joint);
    return flatEarthAttenuation(frequency, ground, distance) - step * (distance / joint) ** 1.5;
  };
  return (distance) => {
    const path = metres(Math.max(distance, LEAST_DISTANCE_M));
    const attenuation = path < joint ? nearAttenuation(path) : series.attenuation(path);
    return decibels(FIELD_AT_1_KM - 20 * Math.log10(path / 1000) + attenuation);
  };
}

/**
 * Distance up to which the flat earth is used: `25 km / cbrt(f MHz)`.
 *
 * @param frequency Frequency, hertz, above 0.
 * @returns Distance, metres.
 * @example
 *   flatEarthReach(hertz(8_000_000)); // 12500
 */
export const flatEarthReach = (frequency: Hertz): Metres =>
  metres(25_000 / Math.cbrt(frequency / 1e6));
