/**
 * Through a day and a night: when the IF breaks through at a site, and when the image does.
 *
 * Source: own rule for rise and fall; each moment as in `assess`.
 *
 * @module radio/assessment/breakthrough-hours
 */
import type { FieldStrength } from '../propagation/field-strength.ts';
import { FieldsAtSite } from '../propagation/field-strength.ts';
import { type Grade, grade } from '../hearing/grades.ts';
import { type JudgedIf, Listening, type WorstOnBand } from './listening.ts';
import type { Receiver } from '../receiver.ts';
import { bandScans, WeightingTables } from './receiver-at-site.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import type { Site } from '../site.ts';
import type { SkyWaveChoice } from '../propagation/sky-wave.ts';
import { Spectrum } from '../channels/spectrum.ts';
import type { RasterRange, Station } from '../station.ts';

/** Smaller changes over the day are no rise and no fall, dB. */
const LEAST_SWING_DB = 3;

/** What is asked. */
export interface BreakthroughHoursInput {
  readonly receiver: Receiver;
  readonly site: Site;
  readonly stations: readonly Station[];
  readonly raster: readonly RasterRange[];
  /** Moments, in order. */
  readonly times: readonly Date[];
  /** Which sky wave; left out, the usual one. */
  readonly skyWave?: SkyWaveChoice | undefined;
  /** Called between products; it throws when nobody waits for the answer any more. */
  readonly checkpoint?: (() => void) | undefined;
}

/** The worst that is heard of one kind at a moment. */
export interface HeardAtHour {
  readonly ratioDb: number;
  /** Weighted interference, as a field at the aerial, dB(uV/m). */
  readonly levelDb: number;
  readonly grade: Grade;
  readonly station: number;
  readonly dialHz: number;
}

/** A moment; null where nothing of the kind is heard over noise and band. */
export interface BreakthroughHour {
  readonly at: Date;
  readonly breakthrough: HeardAtHour | null;
  readonly image: HeardAtHour | null;
}

/** The day. */
export interface BreakthroughHours {
  readonly hours: readonly BreakthroughHour[];
  /** Moments by which the breakthrough has become strong, and weak again. */
  readonly rises: readonly Date[];
  readonly falls: readonly Date[];
}

/**
 * Worst breakthrough and worst image at each of several moments.
 *
 * Each moment is judged as `assess` judges it, on image and breakthrough alone. The breakthrough
 * rises where its level passes the middle between the lowest and the highest of all moments, or,
 * where it is not heard at some of them, where it begins to be heard; it falls the other way. The
 * moment named is the first of those asked by which it has happened. A swing under 3 dB is none.
 *
 * @param input Receiver, site, stations and moments.
 * @returns Each moment in order, and the rises and falls.
 * @throws {RangeError} If a value is out of range; the message names it.
 * @example
 *   // A station on the IF, 600 km off, through the evening of 20 March: it rises after sunset.
 *   breakthroughHours({ receiver, site, raster, stations: [distant], times: evening })
 *     .rises.map((at) => at.toISOString()); // ['2026-03-21T00:00:00.000Z']
 */
export function breakthroughHours(input: BreakthroughHoursInput): BreakthroughHours {
  const fieldsAtSite = new FieldsAtSite(input.site, input.stations, input.skyWave);
  const judge = judgeOf(input);
  let last: { fields: readonly FieldStrength[]; judged: JudgedIf } | undefined;
  const hours = input.times.map((at): BreakthroughHour => {
    const fields = fieldsAtSite.at(at);
    // Far from sunrise and sunset nothing changes for hours.
    const judged = last && sameFields(fields, last.fields) ? last.judged : judge(fields);
    last = { fields, judged };
    const { breakthrough, image } = judged.worst;
    return { at, breakthrough: heardAt(breakthrough), image: heardAt(image) };
  });
  return { hours, ...turns(hours) };
}

function judgeOf(input: BreakthroughHoursInput): (fields: readonly FieldStrength[]) => JudgedIf {
  const { receiver, site, raster, stations } = input;
  const selectivity = ifSelectivity(receiver.selectivity, receiver.ifHz);
  // The image comes through the harmonic that the oscillator works on.
  const maxM = Math.max(...receiver.bands.map(({ oscillatorHarmonic }) => oscillatorHarmonic));
  const orders = { maxM, maxN: 1, checkpoint: input.checkpoint };
  const tables = new WeightingTables(receiver, selectivity, site.ituRegion, maxM);
  return (fields) => {
    const spectrum = new Spectrum(stations, fields);
    const scans = bandScans(receiver, site, raster, spectrum, tables);
    const listening = new Listening(spectrum, scans, { orders, b6Hz: selectivity.b6Hz });
    return listening.judge(receiver.ifHz);
  };
}

const sameFields = (one: readonly FieldStrength[], other: readonly FieldStrength[]): boolean =>
  one.every((field, index) => field === other[index]);

function heardAt(worst: WorstOnBand | null): HeardAtHour | null {
  if (worst === null) return null;
  const { ratioDb, dialHz, position, row, scan } = worst;
  const { dial } = scan;
  return {
    ratioDb,
    levelDb: (dial.wantedDb[row] ?? NaN) - ratioDb,
    grade: grade(dial.band.service, ratioDb, dial.protectionDb),
    station: dial.spectrum.ids[position] ?? NaN,
    dialHz: Math.round(dialHz),
  };
}

function turns(hours: readonly BreakthroughHour[]): Omit<BreakthroughHours, 'hours'> {
  const levels = hours.map(({ breakthrough }) => breakthrough?.levelDb ?? -Infinity);
  const [lowest, highest] = [Math.min(...levels), Math.max(...levels)];
  if (!(highest - lowest >= LEAST_SWING_DB)) return { rises: [], falls: [] };
  const middle = (lowest + highest) / 2;
  const strong = levels.map((level) => level > middle);
  const turnsTo = (to: boolean): Date[] =>
    hours.flatMap(({ at }, index) =>
      index > 0 && strong[index] === to && strong[index - 1] !== to ? [at] : [],
    );
  return { rises: turnsTo(true), falls: turnsTo(false) };
}
