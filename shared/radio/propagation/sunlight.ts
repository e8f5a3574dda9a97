/**
 * Since when the sun is up at a place, and for how long still.
 *
 * Source: suncalc.
 *
 * @module radio/propagation/sunlight
 */
import { type Place, sunHeight, sunTimes } from './path.ts';
import type { Period } from '../site.ts';
import { CRITICAL_HOURS } from './sky-wave.ts';

const HOUR_MS = 3_600_000;
const DAY_MS = 24 * HOUR_MS;
const DEGREE = Math.PI / 180;

/** Below this altitude, degrees, the sun is down at any place, its disc and refraction allowed for. */
const SURELY_DOWN = -2;
/** Above this one it is up; the disc, refraction and the times' 2 minutes come to far less. */
const SURELY_UP = 1.5;
/** It climbs by less than this in the critical hours at the equator, by the cosine of it elsewhere. */
const CLIMB = 15 * CRITICAL_HOURS;

interface SunEvent {
  readonly at: number;
  /** What begins. */
  readonly begins: Period;
}

/**
 * The sun at one place. Keeps what it has worked out, for other moments of the same day.
 *
 * Source of the times: suncalc, sunrise and sunset of the disc's upper edge, within 2 minutes.
 */
export class Sunlight {
  private readonly place: Place;
  /** The solar day last asked about, where the sun rises and sets on it. */
  private known: SunnyDay | undefined;

  /** @param place The place. */
  constructor(place: Place) {
    this.place = place;
  }

  /**
   * How long the sun has been up or will still be up, whichever is less.
   *
   * Once it is up for longer than the critical hours, any number above them may come: nothing
   * depends on it. Where the sun does not set, it is `Infinity`, also while it grazes the horizon.
   *
   * @param at The moment.
   * @returns Hours; 0 when the sun is down.
   * @throws {RangeError} If the moment is no valid date.
   * @example
   *   const equator = { latitude: 0, longitude: 0 };
   *   const at = new Date('2026-03-20T07:04:00Z');
   *   new Sunlight(equator).hours(at); // 1.0
   */
  hours(at: Date): number {
    if (Number.isNaN(at.getTime())) throw new RangeError('time: not a valid date');
    const time = at.getTime();
    if (this.known && isOnDay(this.known, time)) return hoursOnDay(this.known, time);
    const altitude = sunHeight(this.place, at);
    if (altitude < SURELY_DOWN) return 0;
    if (altitude > SURELY_UP + CLIMB * Math.cos(this.place.latitude * DEGREE)) return Infinity;
    return this.hoursByEvents(at);
  }

  /**
   * Whether any of the sun is above the horizon: `hours` above 0, but cheaper.
   *
   * @param at The moment.
   * @returns Whether it is day.
   * @throws {RangeError} If the moment is no valid date.
   * @example
   *   new Sunlight({ latitude: 0, longitude: 0 }).isUp(new Date('2026-03-20T12:00:00Z')); // true
   */
  isUp(at: Date): boolean {
    if (!this.known && sunHeight(this.place, at) > SURELY_UP) return true;
    return this.hours(at) > 0;
  }

  private hoursByEvents(at: Date): number {
    const time = at.getTime();
    const { sunrise, sunset, polar } = sunTimes(this.place, at);
    if (sunrise && sunset) {
      this.known = { rise: sunrise.getTime(), set: sunset.getTime() };
      return hoursOnDay(this.known, time);
    }
    // Where the polar day or night begins or ends, the days beside it count.
    const polarHours = polar === 'night' ? 0 : Infinity;
    return hoursBetween(eventsAround(this.place, at), time) ?? polarHours;
  }
}

interface SunnyDay {
  readonly rise: number;
  readonly set: number;
}

const isOnDay = ({ rise, set }: SunnyDay, time: number): boolean =>
  Math.abs(time - (rise + set) / 2) <= DAY_MS / 2;

const hoursOnDay = ({ rise, set }: SunnyDay, time: number): number =>
  Math.max(0, Math.min(time - rise, set - time)) / HOUR_MS;

/** Null when the sun neither rises nor sets on these days. */
function hoursBetween(events: readonly SunEvent[], at: number): number | null {
  const next = events.find((event) => event.at > at);
  const last = events.findLast((event) => event.at <= at);
  if (!next && !last) return null;
  if (last?.begins === 'night' || (!last && next?.begins === 'day')) return 0;
  const since = last ? at - last.at : Infinity;
  const until = next?.begins === 'night' ? next.at - at : Infinity;
  return Math.min(since, until) / HOUR_MS;
}

/** Sunrises and sunsets of a day and of those beside it, in order. */
function eventsAround(place: Place, around: Date): SunEvent[] {
  return [-1, 0, 1]
    .flatMap((day): SunEvent[] => {
      // eslint-disable-next-line no-restricted-globals -- a moment that was given, not the clock's
      const date = new Date(around.getTime() + day * DAY_MS);
      const { sunrise, sunset } = sunTimes(place, date);
      return [
        ...(sunrise ? [{ at: sunrise.getTime(), begins: 'day' } as const] : []),
        ...(sunset ? [{ at: sunset.getTime(), begins: 'night' } as const] : []),
      ];
    })
    .sort((a, b) => a.at - b.at);
}

/**
 * Whether it is day or night at a place, by the sun.
 *
 * @param place The place.
 * @param at The moment.
 * @returns Day while any of the sun is above the horizon.
 * @throws {RangeError} If the moment is no valid date.
 * @example
 *   periodAt({ latitude: 0, longitude: 0 }, new Date('2026-03-20T00:00:00Z')); // 'night'
 */
export const periodAt = (place: Place, at: Date): Period =>
  new Sunlight(place).isUp(at) ? 'day' : 'night';
