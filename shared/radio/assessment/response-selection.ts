/**
 * The worst responses of a band, in order, without an object for each that is looked at.
 *
 * @module radio/assessment/response-selection
 */
import type { Finding, FindingSink } from './finding.ts';
import type { Dial } from './dial.ts';
import { type Grade, ratioBelow } from '../hearing/grades.ts';
import type { SignalPath } from '../mixing/signal-path.ts';

/** A response that is to be answered. */
export interface Selected {
  /** Position of the station in the spectrum. */
  readonly position: number;
  readonly m: number;
  readonly n: number;
  readonly path: SignalPath;
  readonly row: number;
  readonly dialHz: number;
  readonly beatHz: number;
  readonly ratioDb: number;
}

/**
 * Counts the responses that are at least as bad as a grade and keeps the first of them in the
 * order of the answer: ratio, dial setting, station, m, n.
 *
 * Twice as many as asked are held in columns; when they are full, the better half is dropped.
 */
export class ResponseSelection implements FindingSink {
  readonly takesHidden: boolean;
  /** Number of responses before the limit. */
  total = 0;
  private readonly dial: Dial;
  private readonly limit: number;
  private readonly ratioBelowDb: number;
  /** Ratio, dial setting, position, m, n, row, beat and path of each response held. */
  private readonly columns: number[][] = [[], [], [], [], [], [], [], []];
  private held = 0;
  /** Responses with a larger ratio than this are beyond the limit already. */
  private cutDb = Infinity;

  /**
   * @param dial The dial that is scanned.
   * @param leaveOutBetterThan Mildest grade that is kept; null: all, hidden ones too.
   * @param limit Most responses kept, a whole number from 1.
   * @throws {RangeError} If the limit is no whole number from 1.
   */
  constructor(dial: Dial, leaveOutBetterThan: Grade | null, limit: number) {
    if (!Number.isInteger(limit) || limit < 1) {
      throw new RangeError(`limit must be a whole number from 1, got ${limit}`);
    }
    this.dial = dial;
    this.limit = limit;
    this.takesHidden = leaveOutBetterThan === null || leaveOutBetterThan === 'hidden';
    this.ratioBelowDb =
      leaveOutBetterThan === null
        ? Infinity
        : ratioBelow(dial.band.service, leaveOutBetterThan, dial.protectionDb);
  }

  take(finding: Readonly<Finding>): void {
    const { dial } = this;
    const { group, strongest, n, row, shiftDb, weightingDb } = finding;
    const { fieldDb } = dial.spectrum;
    const end = this.takesHidden ? dial.spectrum.startOf(group + 1) : strongest + finding.heard;
    const offsetDb = (dial.wantedDb[row] ?? NaN) - shiftDb - weightingDb;
    for (let position = strongest; position < end; position++) {
      const ratioDb = offsetDb - n * (fieldDb[position] ?? NaN);
      if (!this.takesHidden && ratioDb >= this.ratioBelowDb) return;
      this.total++;
      if (ratioDb <= this.cutDb) this.hold(finding, position, ratioDb);
    }
  }

  /** The responses, in order, at most as many as the limit. */
  selected(): Selected[] {
    return this.order()
      .slice(0, this.limit)
      .map((index) => ({
        ratioDb: this.value(0, index),
        dialHz: this.value(1, index),
        position: this.value(2, index),
        m: this.value(3, index),
        n: this.value(4, index),
        row: this.value(5, index),
        beatHz: this.value(6, index),
        path: this.value(7, index) as SignalPath,
      }));
  }

  private hold(
    { dialHz, m, n, row, beatHz, path }: Finding,
    position: number,
    ratioDb: number,
  ): void {
    if (this.held === 2 * this.limit) this.prune();
    const values = [ratioDb, dialHz, position, m, n, row, beatHz, path];
    this.columns.forEach((column, index) => column.push(values[index] ?? NaN));
    this.held++;
  }

  private prune(): void {
    const kept = this.order().slice(0, this.limit);
    for (const column of this.columns) {
      column.splice(0, column.length, ...kept.map((index) => column[index] ?? NaN));
    }
    this.held = this.limit;
    this.cutDb = this.value(0, this.limit - 1);
  }

  private order(): number[] {
    const { ids } = this.dial.spectrum;
    const compare = (a: number, b: number): number =>
      this.value(0, a) - this.value(0, b) ||
      this.value(1, a) - this.value(1, b) ||
      (ids[this.value(2, a)] ?? 0) - (ids[this.value(2, b)] ?? 0) ||
      this.value(3, a) - this.value(3, b) ||
      this.value(4, a) - this.value(4, b);
    return Array.from({ length: this.held }, (_, index) => index).sort(compare);
  }

  private value(column: number, index: number): number {
    return this.columns[column]?.[index] ?? NaN;
  }
}
