/**
 * Where on a band a product that does not move with the dial is judged.
 *
 * @module radio/assessment/still-settings
 */
import type { Dial } from './dial.ts';

/** Ratios this close count as equal, decibels. */
const EQUAL_DB = 1e-9;

/** The least of S less shift over the rows of each weighting table, and the row it stands at. */
interface Least {
  readonly valueDb: Float64Array;
  readonly row: Int32Array;
}

/**
 * A product with m = 0 is heard everywhere and judged once, at the row with the smallest ratio of
 * all rows but the station's own frequency; of equals the lowest.
 *
 * The ratio at a row is `S - shift - n E - W(b)`. Only W depends on the IF, and only through the
 * tolerance on the row, so the least of `S - shift` for each tolerance is found once a station
 * frequency and serves every IF.
 */
export class StillSettings {
  private readonly dial: Dial;
  private readonly shiftDb: (group: number, n: number, row: number) => number;
  private readonly known = new Map<number, Least>();

  constructor(dial: Dial, shiftDb: (group: number, n: number, row: number) => number) {
    this.dial = dial;
    this.shiftDb = shiftDb;
  }

  /** Row at which the product of a group is judged; -1: the band has no row for it. */
  worstRow(group: number, n: number, beatHz: number): number {
    const { valueDb, row } = this.least(group, n);
    let worst = -1;
    let smallest = Infinity;
    for (let table = 0; table < row.length; table++) {
      const place = row[table] ?? -1;
      if (place < 0) continue;
      const value = (valueDb[table] ?? NaN) - this.dial.weightingByTable(table, beatHz);
      const equal = Math.abs(value - smallest) <= EQUAL_DB;
      if (equal ? place < worst : value < smallest) worst = place;
      smallest = Math.min(smallest, value);
    }
    return worst;
  }

  forget(): void {
    this.known.clear();
  }

  private least(group: number, n: number): Least {
    const key = group * 4 + n;
    const known = this.known.get(key);
    if (known !== undefined) return known;
    const found = this.search(group, n);
    this.known.set(key, found);
    return found;
  }

  private search(group: number, n: number): Least {
    const { dial } = this;
    const own = dial.spectrum.hz[group];
    const values = new Float64Array(dial.vacant).fill(Infinity);
    const valueDb = new Float64Array(dial.tableCount).fill(Infinity);
    for (let row = 0; row < dial.vacant; row++) {
      if (dial.hz[row] === own) continue;
      const table = dial.tableIndex(row);
      const value = (dial.wantedDb[row] ?? NaN) - this.shiftDb(group, n, row);
      values[row] = value;
      valueDb[table] = Math.min(valueDb[table] ?? Infinity, value);
    }
    const row = new Int32Array(dial.tableCount).fill(-1);
    for (let place = dial.vacant - 1; place >= 0; place--) {
      const table = dial.tableIndex(place);
      const value = values[place] ?? Infinity;
      if (value < Infinity && value <= (valueDb[table] ?? NaN) + EQUAL_DB) row[table] = place;
    }
    return { valueDb, row };
  }
}
