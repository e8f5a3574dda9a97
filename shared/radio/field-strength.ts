/**
 * Field strength of every station of a list at a receiving site.
 *
 * @module radio/field-strength
 */
import { GROUNDS } from './ground.ts';
import { groundWave, LEAST_DISTANCE_M } from './ground-wave.ts';
import { type Place, pathLength, pathMiddle } from './path.ts';
import type { Ground, Period, Site } from './site.ts';
import {
  geomagneticLatitude,
  SKY_WAVE_MAX_LATITUDE,
  SKY_WAVE_RANGE_HZ,
  skyWave,
} from './sky-wave.ts';
import type { Station } from './station.ts';
import { type Decibels, decibels, hertz, type Metres, powerSum } from './units.ts';

/** Field of one station at the site; null where it could not be computed, with the reason noted. */
export interface FieldStrength {
  /** The station's `id`. */
  readonly station: number;
  readonly distanceM: number | null;
  readonly groundDb: number | null;
  readonly skyDb: number | null;
  /** Powers of ground and sky wave added, or the field that was given, dB(uV/m). */
  readonly fieldDb: number | null;
  /** Sentences of `FIELD_NOTES`: what is missing or assumed. */
  readonly notes: string[];
}

/** Every note a field can carry, by a name that stays the same when the wording changes. */
export const FIELD_NOTES = {
  given: 'The field is as given; no propagation was computed.',
  silent: 'The station is silent in this period.',
  noPower: 'The station has no power for this period.',
  noStationPlace: 'The station has no place.',
  noSitePlace: 'The site has no place.',
  noGround: 'The site has no class of ground.',
  near: 'The station is nearer than 1 km; its field is taken as at 1 km.',
  noSkyWave:
    'There is no sky-wave model here below 150 and above 1710 kHz: this is the ground wave alone.',
  skyWaveExtrapolated: 'The sky wave below 535 kHz is extrapolated from the medium-wave formula.',
  skyWaveLatitude: 'The path runs beyond 60 degrees of geomagnetic latitude; it is taken as 60.',
} as const;

/** What all stations of one request share. */
interface Reception {
  readonly place: Place | null;
  readonly ground: Ground | null;
  readonly period: Period;
  readonly groundWaves: Map<number, (distance: Metres) => Decibels>;
}

/**
 * Field strength of stations at a site.
 *
 * By day the ground wave with the power by day; at night the powers of ground and sky wave added,
 * with the power at night. A station whose field is given passes through. A station that is silent,
 * or lacks what is needed, has no field and says why; nothing is ever NaN.
 *
 * Rough by nature: ground wave 10 dB at 50 km with the ground's conductivity, sky wave 8 dB from
 * night to night, directional aerials not considered.
 *
 * @param site The receiving site; place and ground are needed for stations without a given field.
 * @param stations The stations; frequencies in whole hertz, powers as e.m.r.p. in watts.
 * @param period Day or night.
 * @returns One result for each station, in their order.
 * @throws {RangeError} If a frequency is not whole or a place is not on the earth.
 * @example
 *   // A station of 10 kW on 1 MHz, 50 km away over average ground, by day:
 *   fieldStrengths(site, [station], 'day')[0].fieldDb; // 67.03
 */
export function fieldStrengths(
  site: Site,
  stations: readonly Station[],
  period: Period,
): FieldStrength[] {
  const reception: Reception = {
    place: placeOf(site),
    ground: site.ground,
    period,
    groundWaves: new Map(),
  };
  return stations.map((station) => fieldStrength(reception, station));
}

function fieldStrength(reception: Reception, station: Station): FieldStrength {
  const { place, ground, period } = reception;
  const from = placeOf(station);
  const power = period === 'day' ? station.powerDayW : station.powerNightW;
  const distance = place !== null && from !== null ? pathLength(place, from) : null;
  const without = { station: station.id, distanceM: distance, groundDb: null, skyDb: null };

  if (station.fieldDb !== null) {
    return { ...without, fieldDb: station.fieldDb, notes: [FIELD_NOTES.given] };
  }
  if (power === 0) return { ...without, fieldDb: null, notes: [FIELD_NOTES.silent] };
  if (!place || !from || !ground || distance === null || power === null) {
    return { ...without, fieldDb: null, notes: missing(place, ground, from, power) };
  }
  const notes: string[] = distance < LEAST_DISTANCE_M ? [FIELD_NOTES.near] : [];
  const powerDb = 10 * Math.log10(power / 1000);
  const groundDb = decibels(groundWaveOf(reception, ground, station)(distance) + powerDb);
  const sky = skyWaveOf(station, period, distance, pathMiddle(place, from), notes);
  const skyDb = sky === null ? null : decibels(sky + powerDb);
  const fieldDb = skyDb === null ? groundDb : powerSum(groundDb, skyDb);
  return { station: station.id, distanceM: distance, groundDb, skyDb, fieldDb, notes };
}

function groundWaveOf(
  { groundWaves }: Reception,
  ground: Ground,
  { frequencyHz }: Station,
): (distance: Metres) => Decibels {
  const known = groundWaves.get(frequencyHz);
  if (known) return known;
  const wave = groundWave(hertz(frequencyHz), GROUNDS[ground]);
  groundWaves.set(frequencyHz, wave);
  return wave;
}

/** Sky wave of 1 kW, or null by day and where there is no model; adds what is to be said of it. */
function skyWaveOf(
  { frequencyHz }: Station,
  period: Period,
  distance: Metres,
  middle: Place,
  notes: string[],
): Decibels | null {
  const { low, high, extrapolatedBelow } = SKY_WAVE_RANGE_HZ;
  if (frequencyHz < low || frequencyHz > high) {
    notes.push(FIELD_NOTES.noSkyWave);
    return null;
  }
  if (period === 'day') return null;
  if (frequencyHz < extrapolatedBelow) notes.push(FIELD_NOTES.skyWaveExtrapolated);
  const latitude = geomagneticLatitude(middle);
  if (Math.abs(latitude) > SKY_WAVE_MAX_LATITUDE) notes.push(FIELD_NOTES.skyWaveLatitude);
  return skyWave(distance, latitude);
}

function missing(
  place: Place | null,
  ground: Ground | null,
  from: Place | null,
  power: number | null,
): string[] {
  const notes: string[] = [];
  if (from === null) notes.push(FIELD_NOTES.noStationPlace);
  if (power === null) notes.push(FIELD_NOTES.noPower);
  if (place === null) notes.push(FIELD_NOTES.noSitePlace);
  if (ground === null) notes.push(FIELD_NOTES.noGround);
  return notes;
}

function placeOf({ latitude, longitude }: Pick<Site, 'latitude' | 'longitude'>): Place | null {
  return latitude === null || longitude === null ? null : { latitude, longitude };
}
