/**
 * Dial settings at which a station is heard through a product of the mixer: closed form.
 *
 * Source: arithmetic.
 *
 * @module radio/assessment/dial-settings
 */
import type { Dial } from './dial.ts';
import { sideSign } from '../mixing/superheterodyne.ts';

/** A range of stations is taken this much wider than rounding can make it, hertz. */
const SLACK_HZ = 1;

/**
 * The dial setting at which the m-th harmonic of the oscillator stands on a frequency.
 *
 *     m osc = T, osc = (fs + s IF)/h   =>   fs = h T/m - s IF
 *
 * @param targetHz T, hertz.
 * @param m Order of the oscillator, from 1.
 * @param harmonic Harmonic h of the oscillator that mixes on the band.
 * @param signedIfHz s IF: the IF, negative for an oscillator below the signal.
 * @returns fs, hertz, a real number.
 *
 * @example
 *   dialSolution(1_900_000 - 455_000, 1, 1, 455_000); // 990000: the image of 1900 kHz
 */
export function dialSolution(
  targetHz: number,
  m: number,
  harmonic: number,
  signedIfHz: number,
): number {
  return (targetHz * harmonic) / m - signedIfHz;
}

/** A way in which a signal and the oscillator make the IF: `m osc = signal n f + offset IF`. */
export interface Meeting {
  readonly signal: 1 | -1;
  readonly offset: 1 | -1;
}

/** The three ways; the last two are never both above 0. */
export const MEETINGS: readonly Meeting[] = [
  { signal: 1, offset: 1 },
  { signal: 1, offset: -1 },
  { signal: -1, offset: 1 },
];

/**
 * Solves a product for one station frequency at a time and keeps what it found in columns.
 *
 * A station at f is heard where `m osc` is `n f + IF`, `n f - IF` or `IF - n f`, osc above 0. For
 * each solution d* inside the band the settings are: the listed frequencies that the band tunes
 * within reach of d*; if there is none, the nearest channel within reach (of two the lower); if
 * there is none, d* itself. The station's own frequency is never one: it is passed over at each
 * of these steps.
 */
export class DialSettings {
  /** Row of each setting. */
  readonly row: Int32Array;
  /** Beat at each setting: `|m osc(fs) - T|`, exact in whole hertz for h = 1. */
  readonly beatHz: Float64Array;
  /** d* of each setting; the frequency of the setting where the row is the vacant one. */
  readonly solutionHz: Float64Array;
  private readonly dial: Dial;
  private signedIfHz = NaN;
  private ifHz = NaN;
  private found = 0;

  constructor(dial: Dial) {
    this.dial = dial;
    const most = 2 * (dial.vacant + 1);
    this.row = new Int32Array(most);
    this.beatHz = new Float64Array(most);
    this.solutionHz = new Float64Array(most);
  }

  /**
   * Moves to an IF.
   *
   * @param ifHz The IF by which the oscillator stands beside the signal, hertz.
   * @param heardHz Frequency at which the mixer's output is heard, hertz; the IF as a rule.
   */
  moveTo(ifHz: number, heardHz = ifHz): void {
    this.ifHz = heardHz;
    this.signedIfHz = sideSign(this.dial.band.oscillator) * ifHz;
  }

  /** Frequencies of stations that may be heard somewhere on the band: lowest and highest. */
  stationsWithin(m: number, n: number, { signal, offset }: Meeting): [number, number] {
    const { lowHz, highHz, oscillatorHarmonic } = this.dial.band;
    const stationAt = (dialHz: number): number => {
      const target = Math.max(0, (m * (dialHz + this.signedIfHz)) / oscillatorHarmonic);
      return (signal * (target - offset * this.ifHz)) / n;
    };
    const ends = [stationAt(lowHz), stationAt(highHz)];
    return [Math.min(...ends) - SLACK_HZ, Math.max(...ends) + SLACK_HZ];
  }

  /** d* of a station; NaN: none in the band, or the wanted product itself, which is no response. */
  solution(stationHz: number, m: number, n: number, meeting: Meeting): number {
    const { band } = this.dial;
    const target = this.target(stationHz, n, meeting);
    if (target <= 0) return NaN;
    const solution = dialSolution(target, m, band.oscillatorHarmonic, this.signedIfHz);
    if (solution < band.lowHz || solution > band.highHz) return NaN;
    const wanted = m === band.oscillatorHarmonic && n === 1 && solution === stationHz;
    return wanted ? NaN : solution;
  }

  /** Whether the two solutions of a product lie so near that they may share a setting. */
  mayShare(stationHz: number, m: number, n: number): boolean {
    const apart = (2 * Math.min(n * stationHz, this.ifHz) * this.dial.band.oscillatorHarmonic) / m;
    return apart <= 2 * this.dial.reachHz;
  }

  /** Whether a way is the first of a product that has a solution in the band. */
  isFirst(stationHz: number, m: number, n: number, meeting: Meeting): boolean {
    return meeting === MEETINGS.find((each) => !Number.isNaN(this.solution(stationHz, m, n, each)));
  }

  /**
   * Finds the settings of one solution.
   *
   * @returns How many there are; they stand in the columns.
   */
  settle(stationHz: number, m: number, n: number, meeting: Meeting): number {
    this.found = 0;
    this.addSolution(stationHz, m, n, meeting);
    return this.found;
  }

  /**
   * Finds the settings of all solutions of a product together: where two lead to one setting, the
   * smaller beat stands.
   *
   * @returns How many there are; they stand in the columns.
   */
  settleAll(stationHz: number, m: number, n: number): number {
    this.found = 0;
    for (const meeting of MEETINGS) {
      const first = this.found;
      this.addSolution(stationHz, m, n, meeting);
      if (first > 0) this.keepSmallerBeats(first);
    }
    return this.found;
  }

  private target(stationHz: number, n: number, { signal, offset }: Meeting): number {
    return signal * n * stationHz + offset * this.ifHz;
  }

  private addSolution(stationHz: number, m: number, n: number, meeting: Meeting): void {
    const solution = this.solution(stationHz, m, n, meeting);
    if (Number.isNaN(solution)) return;
    const targetHz = this.target(stationHz, n, meeting);
    const before = this.found;
    this.addListed(stationHz, m, solution, targetHz);
    if (this.found > before) return;
    const channel = this.nearestChannel(stationHz, solution);
    if (channel >= 0) this.add(channel, m, solution, targetHz);
    else if (solution !== stationHz) this.push(this.dial.vacant, 0, solution);
  }

  private addListed(stationHz: number, m: number, solution: number, targetHz: number): void {
    const { listed, hz, reachHz } = this.dial;
    let index = firstRow(listed, hz, solution - reachHz);
    for (; index < listed.length; index++) {
      const row = listed[index] ?? -1;
      const setting = hz[row] ?? NaN;
      if (setting - solution > reachHz) return;
      if (setting !== stationHz) this.add(row, m, solution, targetHz);
    }
  }

  private nearestChannel(stationHz: number, solution: number): number {
    const { channels, hz, reachHz } = this.dial;
    let nearest = -1;
    let least = Infinity;
    const from = firstRow(channels, hz, solution);
    // Below the solution the first that is not the station's own, above likewise.
    for (const [start, step] of [
      [from - 1, -1],
      [from, 1],
    ] as const) {
      let index = start;
      if (hz[channels[index] ?? -1] === stationHz) index += step;
      const row = channels[index];
      if (row === undefined) continue;
      const distance = Math.abs((hz[row] ?? NaN) - solution);
      if (distance > reachHz || distance >= least) continue;
      least = distance;
      nearest = row;
    }
    return nearest;
  }

  private add(row: number, m: number, solution: number, targetHz: number): void {
    const { hz, band } = this.dial;
    const oscillator = ((hz[row] ?? NaN) + this.signedIfHz) / band.oscillatorHarmonic;
    this.push(row, Math.abs(m * oscillator - targetHz), solution);
  }

  private push(row: number, beatHz: number, solution: number): void {
    this.row[this.found] = row;
    this.beatHz[this.found] = beatHz;
    this.solutionHz[this.found] = solution;
    this.found++;
  }

  /** Where two solutions of one product lead to one setting, the smaller beat stands. */
  private keepSmallerBeats(first: number): void {
    const { row, beatHz, solutionHz } = this;
    let kept = first;
    for (let index = first; index < this.found; index++) {
      const same = row.subarray(0, first).indexOf(row[index] ?? -1);
      if (same >= 0 && row[index] !== this.dial.vacant) {
        beatHz[same] = Math.min(beatHz[same] ?? Infinity, beatHz[index] ?? Infinity);
        continue;
      }
      row[kept] = row[index] ?? 0;
      beatHz[kept] = beatHz[index] ?? 0;
      solutionHz[kept] = solutionHz[index] ?? 0;
      kept++;
    }
    this.found = kept;
  }
}

/** First of some rows whose frequency is at or above a limit. */
function firstRow(rows: Int32Array, hz: Float64Array, limit: number): number {
  let low = 0;
  let high = rows.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((hz[rows[middle] ?? 0] ?? NaN) < limit) low = middle + 1;
    else high = middle;
  }
  return low;
}
