/**
 * Everything a band of a receiver hears that it should not, for any IF.
 *
 * @module radio/band-scan
 */
import type { Dial } from './dial.ts';
import { DialSettings, type Meeting, MEETINGS } from './dial-settings.ts';
import type { FrontEnd } from './front-end.ts';
import { NoiseGate } from './noise-gate.ts';
import { mixerLevel, signalOrderLevel } from './product-levels.ts';
import type { Receiver } from './receiver.ts';
import { StillSettings } from './still-settings.ts';
import { tuningOf } from './tuning.ts';

/** Field at which `signalToOscillatorDb` is stated, dB(uV/m). */
const REFERENCE_FIELD_DB = 80;

/**
 * A product of all stations on one frequency at one dial setting. The scan lends the same object
 * again and again: take what you need, keep nothing of it.
 */
export interface Finding {
  /** Group of the spectrum. */
  group: number;
  /** Position of its strongest station. */
  strongest: number;
  m: number;
  n: number;
  /** Row of the dial. */
  row: number;
  dialHz: number;
  beatHz: number;
  /** A station of field E interferes with `n E + shiftDb`, weighted `+ weightingDb`. */
  shiftDb: number;
  weightingDb: number;
  /** How many stations of the group are heard: the strongest ones. */
  heard: number;
  /** Sum of their weighted powers. */
  heardPower: number;
}

/** Who takes the findings of a scan. */
export interface FindingSink {
  /** Whether findings of which no station is heard are wanted, too. */
  readonly takesHidden: boolean;
  take(finding: Readonly<Finding>): void;
}

/** The orders up to which products are looked for. */
export interface Orders {
  readonly maxM: number;
  readonly maxN: number;
}

/** One band of a receiver over the stations of a site. */
export class BandScan {
  readonly dial: Dial;
  readonly frontEnd: FrontEnd;
  private readonly receiver: Receiver;
  private readonly still: StillSettings;
  private readonly gate: NoiseGate;
  private readonly settings: DialSettings;
  /** IF for which the rows of the dial are tuned. */
  private alignedHz = NaN;
  /** Loss of the terms that do not follow the dial, for each group. */
  private readonly fixedDb: Float64Array;
  private readonly finding: Finding = {
    group: 0,
    strongest: 0,
    m: 0,
    n: 0,
    row: 0,
    dialHz: 0,
    beatHz: 0,
    shiftDb: 0,
    weightingDb: 0,
    heard: 0,
    heardPower: 0,
  };

  constructor(receiver: Receiver, dial: Dial, frontEnd: FrontEnd) {
    this.receiver = receiver;
    this.dial = dial;
    this.frontEnd = frontEnd;
    this.fixedDb = dial.spectrum.hz.map((hz) => frontEnd.fixedDb(hz));
    this.settings = new DialSettings(dial);
    this.gate = new NoiseGate(dial, frontEnd, this.fixedDb, receiver.strayDb?.image ?? Infinity);
    this.still = new StillSettings(dial, (group, n, row) => this.shiftDb(group, 0, n, row));
  }

  /**
   * Hands every product of the asked orders to a sink.
   *
   * @param ifHz Intermediate frequency, hertz.
   * @param orders Highest orders.
   * @param sink Takes the findings.
   * @throws {RangeError} If an order is out of range.
   */
  scan(ifHz: number, { maxM, maxN }: Orders, sink: FindingSink): void {
    this.scanBreakthrough(ifHz, maxN, sink);
    this.settings.moveTo(ifHz);
    for (let n = 1; n <= maxN; n++) {
      for (let m = 1; m <= maxM; m++) {
        for (const meeting of MEETINGS) this.scanMeeting(m, n, meeting, sink);
      }
    }
  }

  private scanMeeting(m: number, n: number, meeting: Meeting, sink: FindingSink): void {
    const { settings } = this;
    const { hz } = this.dial.spectrum;
    const levelDb = this.productLevelDb(m, n);
    const gate = sink.takesHidden || this.dial.isTracked ? null : this.gate.forProduct(n, levelDb);
    const [lowest, highest] = settings.stationsWithin(m, n, meeting);
    for (let group = this.dial.spectrum.firstFrom(lowest); group < hz.length; group++) {
      const stationHz = hz[group] ?? NaN;
      if (stationHz > highest) return;
      const solution = settings.solution(stationHz, m, n, meeting);
      if (Number.isNaN(solution)) continue;
      let found = 0;
      if (settings.mayShare(stationHz, m, n)) {
        // All solutions are settled together, with the first of them that lies in the band.
        if (!settings.isFirst(stationHz, m, n, meeting)) continue;
        found = settings.settleAll(stationHz, m, n);
      } else {
        if (gate !== null && this.gate.isSilent(gate, group, n, solution)) continue;
        found = settings.settle(stationHz, m, n, meeting);
      }
      this.judgeAll(found, group, m, n, levelDb, sink);
    }
  }

  private judgeAll(
    found: number,
    group: number,
    m: number,
    n: number,
    levelDb: number,
    sink: FindingSink,
  ): void {
    const { settings } = this;
    for (let index = 0; index < found; index++) {
      const row = settings.row[index] ?? 0;
      if (row === this.dial.vacant) this.dial.lend(settings.solutionHz[index] ?? NaN);
      this.judge(group, m, n, row, settings.beatHz[index] ?? NaN, levelDb, sink);
    }
  }

  /** The part of `scan` that does not move with the dial: m = 0. */
  scanBreakthrough(ifHz: number, maxN: number, sink: FindingSink): void {
    this.moveTo(ifHz);
    const { spectrum, reachHz } = this.dial;
    for (let n = 1; n <= maxN; n++) {
      const levelDb = this.productLevelDb(0, n);
      const from = spectrum.firstFrom((ifHz - reachHz) / n);
      for (let group = from; group < spectrum.hz.length; group++) {
        const offset = n * (spectrum.hz[group] ?? NaN) - ifHz;
        if (offset > reachHz) break;
        const beatHz = Math.abs(offset);
        if (beatHz > reachHz) continue;
        const row = this.still.worstRow(group, n, beatHz);
        if (row >= 0) this.judge(group, 0, n, row, beatHz, levelDb, sink);
      }
    }
  }

  /** Aligns the set to an IF: with tracking data the signal circuits move a little. */
  private moveTo(ifHz: number): void {
    if (this.dial.band.tracking === null || this.alignedHz === ifHz) return;
    this.dial.retune(tuningOf(this.dial.band, this.receiver.ifHz, ifHz).tuning);
    this.still.forget();
    this.alignedHz = ifHz;
  }

  /** What the mixer adds to `n g`: `H_m - H_h + K_n + (n - 1)(r - 80)`. */
  productLevelDb(m: number, n: number): number {
    const { ifFeedthroughDb, signalToOscillatorDb } = this.receiver;
    return (
      mixerLevel(m, this.dial.band.oscillatorHarmonic, ifFeedthroughDb) +
      signalOrderLevel(n) +
      (n - 1) * (signalToOscillatorDb - REFERENCE_FIELD_DB)
    );
  }

  /** What a product adds to n times the field of a station, stray pick-up included. */
  shiftDb(group: number, m: number, n: number, row: number): number {
    return this.shift(group, m, n, row, this.productLevelDb(m, n));
  }

  private shift(group: number, m: number, n: number, row: number, levelDb: number): number {
    const { dial } = this;
    const rejection =
      this.frontEnd.circuitsDb(dial.spectrum.hz[group] ?? NaN, dial.tunedHz[row] ?? NaN) +
      (this.fixedDb[group] ?? 0) -
      (dial.ownLossDb[row] ?? 0);
    const shift = levelDb - n * rejection;
    const { strayDb } = this.receiver;
    if (n > 1 || strayDb === null) return shift;
    return Math.max(shift, m === 0 ? -strayDb.if : -strayDb.image);
  }

  private judge(
    group: number,
    m: number,
    n: number,
    row: number,
    beatHz: number,
    levelDb: number,
    sink: FindingSink,
  ): void {
    const { dial, finding } = this;
    const strongest = dial.spectrum.start[group] ?? 0;
    const shiftDb = this.shift(group, m, n, row, levelDb);
    const weightingDb = dial.weightingDb(row, beatHz);
    const topDb = n * (dial.spectrum.fieldDb[strongest] ?? NaN) + shiftDb + weightingDb;
    const silent = topDb <= dial.hiddenByNoiseDb(row);
    if (silent && !sink.takesHidden) return;
    const addedDb = shiftDb + weightingDb;
    const heard = silent ? 0 : this.countHeard(group, n, row, addedDb);
    if (heard === 0 && !sink.takesHidden) return;
    finding.group = group;
    finding.strongest = strongest;
    finding.m = m;
    finding.n = n;
    finding.row = row;
    finding.dialHz = dial.hz[row] ?? NaN;
    finding.beatHz = beatHz;
    finding.shiftDb = shiftDb;
    finding.weightingDb = weightingDb;
    finding.heard = heard;
    finding.heardPower =
      heard === 0
        ? 0
        : 10 ** (addedDb / 10) * (dial.spectrum.powers[n - 1]?.[strongest + heard - 1] ?? NaN);
    sink.take(finding);
  }

  /** Levels fall inside a group, so those heard are the first ones. */
  private countHeard(group: number, n: number, row: number, addedDb: number): number {
    const { dial } = this;
    const { fieldDb, start } = dial.spectrum;
    const near = dial.isNear(row, group);
    const first = start[group] ?? 0;
    const end = start[group + 1] ?? 0;
    let hiddenDb = dial.hiddenDb(row, group, first);
    let position = first;
    while (position < end && n * (fieldDb[position] ?? NaN) + addedDb > hiddenDb) {
      position++;
      if (near && position < end) hiddenDb = dial.hiddenDb(row, group, position);
    }
    return position - first;
  }
}
