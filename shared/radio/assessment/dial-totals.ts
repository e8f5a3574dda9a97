/**
 * Power sums of all that is heard at each dial setting of a band.
 *
 * @module radio/assessment/dial-totals
 */
import type { Finding, FindingSink } from './finding.ts';
import type { Dial } from './dial.ts';
import { type Grade, grade } from '../hearing/grades.ts';

/** Power sum of all that is heard at one dial setting. */
export interface DialTotal {
  readonly dialHz: number;
  readonly ratioDb: number;
  readonly grade: Grade;
  /** The stations that are heard, ascending. */
  readonly stations: readonly number[];
}

/** What is gathered at one setting. */
interface Gathered {
  readonly wantedDb: number;
  power: number;
  /** Pairs: position of the first station heard, and how many from there. */
  readonly runs: number[];
}

/** Gathers, over one scan of a band, the power sum and the stations heard at each setting. */
export class DialTotals implements FindingSink {
  readonly takesHidden = false;
  private readonly dial: Dial;
  private readonly gathered = new Map<number, Gathered>();

  constructor(dial: Dial) {
    this.dial = dial;
  }

  take(finding: Readonly<Finding>): void {
    const { dialHz, row, heard, heardPower, strongest } = finding;
    if (heard === 0) return;
    let at = this.gathered.get(dialHz);
    if (at === undefined) {
      at = { wantedDb: this.dial.wantedDb[row] ?? NaN, power: 0, runs: [] };
      this.gathered.set(dialHz, at);
    }
    at.power += heardPower;
    at.runs.push(strongest, heard);
  }

  /** The totals, ascending by dial setting; settings where nothing is heard have none. */
  totals(): DialTotal[] {
    const { band, protectionDb } = this.dial;
    return [...this.gathered]
      .sort(([one], [other]) => one - other)
      .map(([dialHz, { wantedDb, power, runs }]) => {
        const ratioDb = wantedDb - 10 * Math.log10(power);
        return {
          dialHz: Math.round(dialHz),
          ratioDb,
          grade: grade(band.service, ratioDb, protectionDb),
          stations: this.stationsOf(runs),
        };
      });
  }

  private stationsOf(runs: readonly number[]): number[] {
    const { ids } = this.dial.spectrum;
    const found = new Set<number>();
    for (let index = 0; index < runs.length; index += 2) {
      const first = runs[index] ?? 0;
      const end = first + (runs[index + 1] ?? 0);
      for (let position = first; position < end; position++) found.add(ids[position] ?? -1);
    }
    return [...found].sort((a, b) => a - b);
  }
}
