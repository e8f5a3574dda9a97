/**
 * Field strength of every station of a list at a receiving site.
 *
 * Source: the parts name theirs; own rule for power and sky wave at a moment, by suncalc.
 *
 * @module radio/propagation/field-strength
 */
import { patternGain } from './directional-pattern.ts';
import { LEAST_DISTANCE_M } from './ground-wave.ts';
import { type PathSection, totalLength } from './mixed-path.ts';
import type { Place } from './path.ts';
import type { Ground, Period, ReceptionTime, Site } from '../site.ts';
import {
  SKY_WAVE_MAX_LATITUDE,
  SKY_WAVE_RANGE_HZ,
  type SkyWaveChoice,
  USUAL_SKY_WAVE,
} from './sky-wave.ts';
import type { Station } from '../station.ts';
import { GroundWaves, hasSkyWave, StationPath } from './station-path.ts';
import { type Decibels, decibels, powerSum } from '../units.ts';

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

/** Every note a field can carry, in the order they are told, by a name that outlives its wording. */
export const FIELD_NOTES = {
  given: 'The field is as given; no propagation was computed.',
  silent: 'The station is silent in this period.',
  offAir: 'The station is off the air: somebody who listened found it silent.',
  noStationPlace: 'The station has no place.',
  noPower: 'The station has no power for this period.',
  noSitePlace: 'The site has no place.',
  noGround: 'The site has no class of ground.',
  near: 'The station is nearer than 1 km; its field is taken as at 1 km.',
  mixedPath: 'The ground wave runs over several kinds of ground, by Millington.',
  scaledPath: 'The sections of the path do not add up to the distance; they were scaled to it.',
  pattern: 'The directional pattern of the aerial is counted in.',
  noSkyWave:
    'There is no sky-wave model here below 150 and above 1710 kHz: this is the ground wave alone.',
  criticalHours:
    'The sun is up at the middle of the path for less than two hours: what is left of the sky wave is estimated.',
  skyWaveExtrapolated: 'The sky wave below 535 kHz is extrapolated from the medium-wave formula.',
  skyWaveLatitude: 'The path runs beyond 60 degrees of geomagnetic latitude; it is taken as 60.',
  skyWaveP1147: 'The sky wave is computed by the form of ITU-R P.1147.',
  skyWaveTenth: 'The sky wave is that which is exceeded in 10 % of the nights.',
} as const;

/**
 * Field strength of stations at a site.
 *
 * By day the ground wave with the power by day; at night the powers of ground and sky wave added,
 * with the power at night. At a moment the sun decides: at the station for the power, at the middle
 * of the path for the sky wave, which fades over the two hours after sunrise and before sunset. A
 * station whose field is given passes through. A station that is silent, or lacks what is needed,
 * has no field and says why; nothing is ever NaN.
 *
 * Rough by nature: ground wave 10 dB at 50 km with the ground's conductivity, sky wave 8 dB from
 * night to night. A directional pattern counts for ground and sky wave alike. Over sections of
 * different ground the ground wave goes by Millington, and the sections are scaled to the distance.
 *
 * @param site The receiving site; place and ground are needed for stations without a given field.
 * @param stations The stations; frequencies in whole hertz, powers as e.m.r.p. in watts.
 * @param time Day or night for all, or a moment.
 * @param choice Which sky wave; left out, the median by 47 CFR 73.190.
 * @returns One result for each station, in their order.
 * @throws {RangeError} If a frequency is not whole, a place is not on the earth or the moment is no
 *   valid date.
 * @example
 *   // A station of 10 kW on 1 MHz, 50 km away over average ground, by day:
 *   fieldStrengths(site, [station], 'day')[0].fieldDb; // 67.0
 */
export const fieldStrengths = (
  site: Site,
  stations: readonly Station[],
  time: ReceptionTime,
  choice: SkyWaveChoice = USUAL_SKY_WAVE,
): FieldStrength[] => {
  const fields = new FieldsAtSite(site, stations, choice);
  return stations.map((station) => fields.of(station, time));
};

/** Fields of stations at a site for several times: what does not change is worked out once. */
export class FieldsAtSite {
  private readonly place: Place | null;
  private readonly ground: Ground | null;
  private readonly groundWaves = new GroundWaves();
  private readonly stations: readonly Station[];
  private readonly choice: SkyWaveChoice;
  private readonly choiceNotes: readonly string[];
  private followed: readonly Followed[] | undefined;

  /** Takes what `fieldStrengths` takes, and throws what it throws. */
  constructor(site: Site, stations: readonly Station[], choice: SkyWaveChoice = USUAL_SKY_WAVE) {
    this.place = placeOf(site);
    this.ground = site.ground;
    this.stations = stations;
    this.choice = choice;
    this.choiceNotes = notesOnChoice(choice);
  }

  /** The fields at a time, as `fieldStrengths` gives them; a field is the same one until it changes. */
  at(time: ReceptionTime): FieldStrength[] {
    this.followed ??= this.stations.map((station) => ({ station, path: this.pathFrom(station) }));
    return this.followed.map((followed) => this.follow(followed, time));
  }

  /** Power and what is left of the sky wave are all that changes with time. */
  private follow(followed: Followed, time: ReceptionTime): FieldStrength {
    const { station, path, field } = followed;
    const power = powerOf(station, path, time);
    const fade = path && hasSkyWave(station.frequencyHz) ? path.skyFade(time) : null;
    if (field && power === followed.power && fade === followed.fade) return field;
    followed.power = power;
    followed.fade = fade;
    return (followed.field = this.of(station, time, path));
  }

  /** The field of one station at a time. */
  of(station: Station, time: ReceptionTime, path = this.pathFrom(station)): FieldStrength {
    if (station.offAir) return withoutWaves(station, path, null, [FIELD_NOTES.offAir]);
    if (station.fieldDb !== null) {
      return withoutWaves(station, path, station.fieldDb, [FIELD_NOTES.given]);
    }
    const power = powerOf(station, path, time);
    if (power === 0) return withoutWaves(station, path, null, [FIELD_NOTES.silent]);
    const ground = this.groundWave(station, path);
    if (!path || ground === null || power === null) {
      const places = { from: placeOf(station), to: this.place };
      const notes = missing(station.path ?? this.ground, places, power);
      return withoutWaves(station, path, null, notes);
    }
    const powerDb = 10 * Math.log10(power / 1000) + gainOf(station, path);
    const groundDb = decibels(ground + powerDb);
    const sky = hasSkyWave(station.frequencyHz) ? path.sky(time) : null;
    const skyDb = sky === null ? null : decibels(sky + powerDb);
    const fieldDb = skyDb === null ? groundDb : powerSum(groundDb, skyDb);
    const notes = notesOn(station, path, time);
    if (skyDb !== null) notes.push(...this.choiceNotes);
    return { station: station.id, distanceM: path.distance, groundDb, skyDb, fieldDb, notes };
  }

  private pathFrom(station: Station): StationPath | null {
    const from = placeOf(station);
    return this.place && from ? new StationPath(from, this.place, this.choice) : null;
  }

  /** Ground wave of 1 kW; null where a place or the ground is not known. */
  private groundWave(station: Station, path: StationPath | null): Decibels | null {
    if (!path) return null;
    const { frequencyHz, path: sections } = station;
    const { ground, groundWaves } = this;
    if (sections) {
      return path.groundWave((length) => groundWaves.fieldOver(sections, frequencyHz, length));
    }
    if (ground === null) return null;
    return path.groundWave((length) => groundWaves.field(ground, frequencyHz, length));
  }
}

/** A station through several times, with the field last worked out and what it came of. */
interface Followed {
  readonly station: Station;
  readonly path: StationPath | null;
  power?: number | null;
  fade?: number | null;
  field?: FieldStrength;
}

/** A field that was given, or none. */
const withoutWaves = (
  { id }: Station,
  path: StationPath | null,
  fieldDb: number | null,
  notes: string[],
): FieldStrength => ({
  station: id,
  distanceM: path?.distance ?? null,
  groundDb: null,
  skyDb: null,
  fieldDb,
  notes,
});

const gainOf = ({ patternDb }: Station, path: StationPath): number =>
  patternDb ? patternGain(patternDb, path.bearing) : 0;

/** Power in watts at a time, null if not given; without a path, what both periods agree in. */
function powerOf(station: Station, path: StationPath | null, time: ReceptionTime): number | null {
  const { powerDayW, powerNightW } = station;
  if (powerDayW === powerNightW) return powerDayW;
  const period: Period | undefined = typeof time === 'string' ? time : path?.periodAtStation(time);
  if (period === undefined) return null;
  return period === 'day' ? powerDayW : powerNightW;
}

/** What is to be said of a sky wave that is not the usual one. */
const notesOnChoice = ({ form, nights }: SkyWaveChoice): string[] => [
  ...(form === 'itu-r-p1147' ? [FIELD_NOTES.skyWaveP1147] : []),
  ...(nights === 10 ? [FIELD_NOTES.skyWaveTenth] : []),
];

/** What is to be said of a field that was computed. */
function notesOn(station: Station, path: StationPath, time: ReceptionTime): string[] {
  const { frequencyHz } = station;
  const notes: string[] = path.distance < LEAST_DISTANCE_M ? [FIELD_NOTES.near] : [];
  if (station.path) notes.push(...notesOnSections(station.path, path));
  if (station.patternDb) notes.push(FIELD_NOTES.pattern);
  if (!hasSkyWave(frequencyHz)) return [...notes, FIELD_NOTES.noSkyWave];
  const fade = path.skyFade(time);
  if (fade === -Infinity) return notes;
  if (fade < 0) notes.push(FIELD_NOTES.criticalHours);
  if (frequencyHz < SKY_WAVE_RANGE_HZ.extrapolatedBelow) {
    notes.push(FIELD_NOTES.skyWaveExtrapolated);
  }
  if (Math.abs(path.geomagneticLatitude) > SKY_WAVE_MAX_LATITUDE) {
    notes.push(FIELD_NOTES.skyWaveLatitude);
  }
  return notes;
}

/** Sections that miss the distance by more than rounding are told of. */
function notesOnSections(sections: readonly PathSection[], { distance }: StationPath): string[] {
  const off = Math.abs(totalLength(sections) / distance - 1);
  return off < 0.01 ? [FIELD_NOTES.mixedPath] : [FIELD_NOTES.mixedPath, FIELD_NOTES.scaledPath];
}

function missing(
  ground: Ground | readonly PathSection[] | null,
  { from, to }: { readonly from: Place | null; readonly to: Place | null },
  power: number | null,
): string[] {
  const notes: string[] = [];
  if (from === null) notes.push(FIELD_NOTES.noStationPlace);
  if (power === null) notes.push(FIELD_NOTES.noPower);
  if (to === null) notes.push(FIELD_NOTES.noSitePlace);
  if (ground === null) notes.push(FIELD_NOTES.noGround);
  return notes;
}

function placeOf({ latitude, longitude }: Pick<Site, 'latitude' | 'longitude'>): Place | null {
  return latitude === null || longitude === null ? null : { latitude, longitude };
}
