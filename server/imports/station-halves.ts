import type { Period } from './cell-period.ts';
import type { CsvRow } from './csv-rows.ts';
import type { RowTally } from './row-tally.ts';
import type { StationRow } from './station-row.ts';

/** A row whose power is for one period. */
export interface Half {
  readonly row: CsvRow;
  readonly station: StationRow;
}

interface Met {
  readonly line: number;
  readonly day?: Half;
  readonly night?: Half;
  readonly critical?: Half;
}

/** A station told whole, or the line of the row that has already told what this one tells. */
type Taken =
  { readonly whole: Half } | { readonly repeats: number; readonly isSame: boolean } | null;

/** Puts the rows of a list together that give the power of one station by day and by night. */
export class StationHalves {
  readonly #met = new Map<string, Met>();
  readonly #tally: RowTally;

  constructor(tally: RowTally) {
    this.#tally = tally;
  }

  /** Null while the other row may still come. */
  take(half: Half, period: Period): Taken {
    const key = keyOf(half.station);
    const met = this.#met.get(key) ?? { line: half.row.line };
    const before = period === 'both' ? (met.day ?? met.night) : met[period];
    if (before) {
      return { repeats: before.row.line, isSame: isSamePower(before.station, half.station) };
    }
    if (period === 'both') {
      this.#met.set(key, { ...met, day: half, night: half });
      return { whole: half };
    }
    const now: Met = { ...met, [period]: half };
    this.#met.set(key, now);
    if (period === 'critical' || !now.day || !now.night) return null;
    this.#tally.merge();
    this.#tally.remark('merged', half.row.line);
    return { whole: { row: half.row, station: this.#joined(now.day, now.night) } };
  }

  /** What has stayed alone, once the list is at its end. */
  *rest(): Generator<Half> {
    for (const { day, night, critical } of this.#met.values()) {
      if (critical) this.#tally.remark('critical', critical.row.line);
      if (critical && (day ?? night)) this.#tally.merge();
      if (day && night) continue;
      if (day) {
        this.#tally.remark('dayOnly', day.row.line);
        yield { row: day.row, station: { ...day.station, powerNightW: 0 } };
      } else if (night) {
        this.#tally.remark('nightOnly', night.row.line);
        yield { row: night.row, station: { ...night.station, powerDayW: 0 } };
      } else if (critical) {
        const powers = { powerDayW: null, powerNightW: null };
        yield { row: critical.row, station: { ...critical.station, ...powers } };
      }
    }
  }

  #joined(day: Half, night: Half): StationRow {
    const { patternDb } = day.station;
    const other = night.station.patternDb;
    if (patternDb && other && patternDb.join() !== other.join()) {
      this.#tally.remark('patterns', night.row.line);
    }
    return {
      ...day.station,
      powerNightW: night.station.powerNightW,
      patternDb: patternDb ?? other,
      hours: `${day.station.hours}, ${night.station.hours}`.slice(0, 200),
      note: day.station.note || night.station.note,
    };
  }
}

const isSamePower = (a: StationRow, b: StationRow): boolean =>
  a.powerDayW === b.powerDayW && a.hours === b.hours && a.note === b.note;

/** One station's rows agree in name, frequency and place; another place is another transmitter. */
const keyOf = ({ name, callSign, frequencyHz, latitude, longitude }: StationRow): string =>
  [
    (callSign || name).toLowerCase(),
    frequencyHz,
    latitude?.toFixed(2) ?? '',
    longitude?.toFixed(2) ?? '',
  ].join('\u001f');
