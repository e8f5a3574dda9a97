/**
 * Sky wave of medium-wave stations at night.
 *
 * Source: 47 CFR 73.190; ITU-R P.1147 from memory, not re-read; own estimate in critical hours.
 *
 * @module radio/propagation/sky-wave
 */
import type { Place } from './path.ts';
import { type Decibels, decibels, type Metres } from '../units.ts';

/** Frequencies for which the formula is used, hertz; it was made for 535 to 1705 kHz. */
export const SKY_WAVE_RANGE_HZ = { low: 150_000, high: 1_710_000, extrapolatedBelow: 535_000 };

/** Published forms of the sky-wave formula. */
export type SkyWaveForm = 'cfr-73-190' | 'itu-r-p1147';

/** Which sky wave is computed. */
export interface SkyWaveChoice {
  readonly form: SkyWaveForm;
  /** Share of the nights in which the field is exceeded, percent. */
  readonly nights: 50 | 10;
}

/** What is computed where nobody chooses: the median by 47 CFR 73.190. */
export const USUAL_SKY_WAVE: SkyWaveChoice = { form: 'cfr-73-190', nights: 50 };

/** Critical hours: so long after sunrise and before sunset the sky wave still counts. */
export const CRITICAL_HOURS = 2;

/** Geomagnetic latitude, degrees north or south, up to which the formula is evaluated. */
export const SKY_WAVE_MAX_LATITUDE = 60;

const DEGREE = Math.PI / 180;
/** 1 kW e.m.r.p. makes 300 mV/m at 1 km, the rule speaks of 100 mV/m. */
const KILOWATT_DB = 20 * Math.log10(3);

/**
 * Field of the sky wave of 1 kW e.m.r.p., about six hours after sunset.
 *
 *     Fc = C - 20 log10 D - (2 pi + 4.95 tan^2 phi) sqrt(D / 1000),  D = sqrt(40000 + d^2) km
 *
 * By 47 CFR 73.190 C is 97.5 for 100 mV/m at 1 km, and 9.54 dB more for 1 kW e.m.r.p.; by ITU-R
 * P.1147 it is 106.6 - 2 sin phi for 1 kW, phi north positive. The two differ by 2 dB or so. Beyond
 * 60 degrees the latitude is taken as 60. Exceeded in 10 % of the nights: 6 dB more below 40
 * degrees, `0.2 |phi| - 2` up to 60, 10 beyond; the same is added to either form. Single nights
 * differ by 8 dB and more.
 *
 * Source: 47 CFR 73.190, Engineering charts and related formulas, formulas 1 and 2; the constant of
 * ITU-R P.1147 from memory of it, not re-read.
 *
 * @param distance Distance, metres.
 * @param geomagneticLatitude Geomagnetic latitude of the middle of the path, degrees.
 * @param nights Share of the nights in which the field is exceeded, percent: 50 or 10.
 * @param form Published form of the formula.
 * @returns Field, dB(uV/m).
 * @example
 *   skyWave(metres(1_329_018), 46.3138); // 30.9 (21.358 for 100 mV/m at 1 km)
 */
export function skyWave(
  distance: Metres,
  geomagneticLatitude: number,
  nights: SkyWaveChoice['nights'] = USUAL_SKY_WAVE.nights,
  form: SkyWaveForm = USUAL_SKY_WAVE.form,
): Decibels {
  const latitude = Math.abs(geomagneticLatitude);
  const within = Math.min(latitude, SKY_WAVE_MAX_LATITUDE) * DEGREE;
  const tangent = Math.tan(within);
  const northward = Math.sign(geomagneticLatitude) * Math.sin(within);
  const constant = form === 'itu-r-p1147' ? 106.6 - 2 * northward : 97.5 + KILOWATT_DB;
  const slantKm = Math.hypot(200, distance / 1000);
  const loss = (2 * Math.PI + 4.95 * tangent ** 2) * Math.sqrt(slantKm / 1000);
  const median = constant - 20 * Math.log10(slantKm) - loss;
  return decibels(nights === 50 ? median : median + tenPercentGain(latitude));
}

/**
 * What is left of the night's sky wave while the sun is up at the middle of the path:
 * `80 log10 cos(pi h / 4)`, h hours after sunrise or before sunset, whichever is less.
 *
 * 0 dB at sunrise and sunset, -2.8 dB after half an hour, -12 dB after one hour, nothing from two
 * hours on, with a smooth beginning and no step at the end. A model of our own: the two hours are
 * the critical hours of 47 CFR 73.14, the shape is from memory of measured sunrises, which scatter
 * by 10 dB, and not from a published formula.
 *
 * @param hoursOfSun How long the sun has been or will still be up, hours, whichever is less; 0 when
 *   it is down.
 * @returns Level relative to the night, dB; `-Infinity` where nothing is left.
 * @example
 *   criticalHoursFade(1); // -12.04
 */
export function criticalHoursFade(hoursOfSun: number): Decibels {
  if (hoursOfSun >= CRITICAL_HOURS) return decibels(-Infinity);
  return decibels(80 * Math.log10(Math.cos((Math.PI * hoursOfSun) / (2 * CRITICAL_HOURS))));
}

/**
 * Geomagnetic latitude of a place:
 * `asin[sin a sin 78.5 deg + cos a cos 78.5 deg cos(69 deg + b)]`, b the longitude east.
 *
 * Source: 47 CFR 73.190, equation 3.
 *
 * @param place The place.
 * @returns Geomagnetic latitude, degrees, north positive.
 * @example
 *   geomagneticLatitude({ latitude: 90, longitude: 0 }); // 78.5
 */
export function geomagneticLatitude({ latitude, longitude }: Place): number {
  const along = Math.sin(latitude * DEGREE) * Math.sin(78.5 * DEGREE);
  const across = Math.cos(latitude * DEGREE) * Math.cos(78.5 * DEGREE);
  const sine = along + across * Math.cos((69 + longitude) * DEGREE);
  // Rounding may carry the sine past 1 at the pole itself.
  return Math.asin(Math.max(-1, Math.min(1, sine))) / DEGREE;
}

function tenPercentGain(latitude: number): number {
  if (latitude < 40) return 6;
  return latitude <= SKY_WAVE_MAX_LATITUDE ? 0.2 * latitude - 2 : 10;
}
