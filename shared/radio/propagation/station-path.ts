/**
 * The path from a station to the receiving site, and what 1 kW makes of it.
 *
 * Source: the parts name theirs.
 *
 * @module radio/propagation/station-path
 */
import { GROUNDS } from './ground.ts';
import { groundWave, LEAST_DISTANCE_M } from './ground-wave.ts';
import { millington, type PathSection, scaledTo } from './mixed-path.ts';
import { type Place, pathBearing, pathLength, pathMiddle } from './path.ts';
import type { Ground, Period, ReceptionTime } from '../site.ts';
import {
  criticalHoursFade,
  geomagneticLatitude,
  SKY_WAVE_RANGE_HZ,
  skyWave,
  type SkyWaveChoice,
} from './sky-wave.ts';
import { Sunlight } from './sunlight.ts';
import { type Decibels, decibels, hertz, type Metres, metres } from '../units.ts';

/** Ground waves: stations that share a frequency and a ground share the work. */
export class GroundWaves {
  private readonly waves = new Map<Ground, Map<number, (distance: Metres) => Decibels>>();

  /** Field of the ground wave of 1 kW over uniform ground, dB(uV/m). */
  field(ground: Ground, frequencyHz: number, distance: Metres): Decibels {
    const over = this.over(ground);
    let wave = over.get(frequencyHz);
    if (!wave) {
      wave = groundWave(hertz(frequencyHz), GROUNDS[ground]);
      over.set(frequencyHz, wave);
    }
    return wave(distance);
  }

  private over(ground: Ground): Map<number, (distance: Metres) => Decibels> {
    const known = this.waves.get(ground) ?? new Map<number, (distance: Metres) => Decibels>();
    this.waves.set(ground, known);
    return known;
  }

  /** Field of the ground wave of 1 kW over sections, drawn to the distance, dB(uV/m). */
  fieldOver(sections: readonly PathSection[], frequencyHz: number, distance: Metres): Decibels {
    const length = metres(Math.max(distance, LEAST_DISTANCE_M));
    return millington(scaledTo(sections, length), (ground, reached) =>
      this.field(ground, frequencyHz, reached),
    );
  }
}

/** One path. Works out what is asked for when it is first asked for, and keeps it. */
export class StationPath {
  readonly distance: Metres;
  private readonly from: Place;
  private readonly to: Place;
  private readonly choice: SkyWaveChoice;
  private towards: number | undefined;
  private middlePlace: Place | undefined;
  private magnetic: number | undefined;
  private nightSky: Decibels | undefined;
  private ground: Decibels | undefined;
  private sunAtStation: Sunlight | undefined;
  private sunAtMiddle: Sunlight | undefined;

  /**
   * @param from Place of the station.
   * @param to Place of the site.
   * @param choice Which sky wave.
   * @throws {RangeError} If a place is not on the earth.
   */
  constructor(from: Place, to: Place, choice: SkyWaveChoice) {
    this.from = from;
    this.to = to;
    this.choice = choice;
    this.distance = pathLength(to, from);
  }

  /** Geomagnetic latitude of the middle, degrees. */
  get geomagneticLatitude(): number {
    return (this.magnetic ??= geomagneticLatitude(this.middle));
  }

  /** Bearing of the site from the station, degrees from north. */
  get bearing(): number {
    return (this.towards ??= pathBearing(this.from, this.to));
  }

  /** Ground wave of 1 kW, dB(uV/m): the same at any time, so worked out by the first who asks. */
  groundWave(workOut: (distance: Metres) => Decibels): Decibels {
    return (this.ground ??= workOut(this.distance));
  }

  /** Sky wave of 1 kW at a time, dB(uV/m); null when there is none. */
  sky(time: ReceptionTime): Decibels | null {
    const fade = this.skyFade(time);
    if (fade === -Infinity) return null;
    const { nights, form } = this.choice;
    this.nightSky ??= skyWave(this.distance, this.geomagneticLatitude, nights, form);
    return decibels(this.nightSky + fade);
  }

  /** The sky wave at a time relative to the night: 0 at night, `-Infinity` by day, dB. */
  skyFade(time: ReceptionTime): Decibels {
    if (time === 'night') return decibels(0);
    if (time === 'day') return decibels(-Infinity);
    this.sunAtMiddle ??= new Sunlight(this.middle);
    return criticalHoursFade(this.sunAtMiddle.hours(time));
  }

  /** Day or night at the station, by which its power goes. */
  periodAtStation(time: ReceptionTime): Period {
    if (typeof time === 'string') return time;
    this.sunAtStation ??= new Sunlight(this.from);
    return this.sunAtStation.isUp(time) ? 'day' : 'night';
  }

  private get middle(): Place {
    return (this.middlePlace ??= pathMiddle(this.to, this.from));
  }
}

/**
 * Whether there is a model of the sky wave on a frequency.
 *
 * @param frequencyHz Frequency, hertz.
 * @returns Whether there is.
 * @example
 *   hasSkyWave(1_720_000); // false
 */
export const hasSkyWave = (frequencyHz: number): boolean =>
  frequencyHz >= SKY_WAVE_RANGE_HZ.low && frequencyHz <= SKY_WAVE_RANGE_HZ.high;
