/**
 * Everything a band of a receiver hears that it should not, for any IF.
 *
 * @module radio/assessment/band-scan
 */
import type { Dial } from './dial.ts';
import { DialSettings, type Meeting, MEETINGS } from './dial-settings.ts';
import type { FrontEnd } from '../circuits/front-end.ts';
import { NoiseGate } from './noise-gate.ts';
import {
  MAX_OSCILLATOR_ORDER,
  MAX_SIGNAL_ORDER,
  mixerLevel,
  signalOrderLevel,
} from '../mixing/product-levels.ts';
import type { Receiver } from '../receiver.ts';
import { secondImage } from '../mixing/second-conversion.ts';
import { SIGNAL_PATH, type SignalPath } from '../mixing/signal-path.ts';
import { StillSettings } from './still-settings.ts';
import type { Finding, FindingSink, Orders, Product } from './finding.ts';
import { sideSign } from '../mixing/superheterodyne.ts';
import { tuningOf } from '../tracking/tuning.ts';

/** Field at which `signalToOscillatorDb` is stated, dB(uV/m). */
const REFERENCE_FIELD_DB = 80;

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
  /** `productLevelDb` of (m, n) at 4 m + n. */
  private readonly levels: Float64Array;
  private readonly finding: Finding = {
    group: 0,
    strongest: 0,
    m: 0,
    n: 0,
    path: SIGNAL_PATH.first,
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
    this.levels = this.productLevels();
    this.settings = new DialSettings(dial);
    this.gate = new NoiseGate(dial, frontEnd, this.fixedDb, receiver.strayDb?.image ?? Infinity);
    this.still = new StillSettings(dial, (group, n, row) =>
      this.shiftDb({ group, m: 0, n, path: SIGNAL_PATH.first }, row),
    );
  }

  /**
   * Hands every product of the asked orders to a sink.
   *
   * @param ifHz Intermediate frequency, hertz.
   * @param orders Highest orders.
   * @param sink Takes the findings.
   * @throws {RangeError} If an order is out of range.
   */
  scan(ifHz: number, { maxM, maxN, checkpoint }: Orders, sink: FindingSink): void {
    checkOrders(maxM, maxN);
    this.scanBreakthrough(ifHz, maxN, sink);
    this.settings.moveTo(ifHz);
    for (let n = 1; n <= maxN; n++) {
      for (let m = 1; m <= maxM; m++) {
        for (const meeting of MEETINGS) {
          checkpoint?.();
          this.scanMeeting(m, n, meeting, sink);
        }
      }
    }
    if (maxM >= this.dial.band.oscillatorHarmonic) this.scanSecondImage(ifHz, sink);
  }

  /** A station 2 IF2 from the dial, which the first IF rejects and the second mixer takes. */
  private scanSecondImage(ifHz: number, sink: FindingSink): void {
    const { settings, dial } = this;
    const { secondConversion } = this.receiver;
    if (secondConversion === null) return;
    const { band, spectrum } = dial;
    const heardHz = secondImage(ifHz, secondConversion);
    const offset = sideSign(band.oscillator) * Math.sign(heardHz) > 0 ? 1 : -1;
    const meeting = { signal: 1, offset } as const;
    const path = SIGNAL_PATH.secondImage;
    settings.moveTo(ifHz, Math.abs(heardHz));
    const m = band.oscillatorHarmonic;
    const [lowest, highest] = settings.stationsWithin(m, 1, meeting);
    for (let group = spectrum.firstFrom(lowest); group < spectrum.hz.length; group++) {
      const stationHz = spectrum.hz[group] ?? NaN;
      if (stationHz > highest) return;
      this.judgeAll(settings.settle(stationHz, m, 1, meeting), { group, m, n: 1, path }, sink);
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
      this.judgeAll(found, { group, m, n, path: SIGNAL_PATH.first }, sink);
    }
  }

  private judgeAll(found: number, product: Product, sink: FindingSink): void {
    const { settings } = this;
    for (let index = 0; index < found; index++) {
      const row = settings.row[index] ?? 0;
      if (row === this.dial.vacant) this.dial.lend(settings.solutionHz[index] ?? NaN);
      this.judge(product, row, settings.beatHz[index] ?? NaN, sink);
    }
  }

  /** The part of `scan` that does not move with the dial: m = 0. */
  scanBreakthrough(ifHz: number, maxN: number, sink: FindingSink): void {
    this.moveTo(ifHz);
    for (let n = 1; n <= maxN; n++) this.scanStill(ifHz, n, SIGNAL_PATH.first, sink);
    const { secondConversion } = this.receiver;
    if (secondConversion === null) return;
    this.scanStill(secondConversion.ifHz, 1, SIGNAL_PATH.secondIf, sink);
  }

  private scanStill(ifHz: number, n: number, path: SignalPath, sink: FindingSink): void {
    const { spectrum, reachHz } = this.dial;
    const from = spectrum.firstFrom((ifHz - reachHz) / n);
    for (let group = from; group < spectrum.hz.length; group++) {
      const offset = n * (spectrum.hz[group] ?? NaN) - ifHz;
      if (offset > reachHz) return;
      const beatHz = Math.abs(offset);
      if (beatHz > reachHz) continue;
      const row = this.still.worstRow(group, n, beatHz);
      if (row >= 0) this.judge({ group, m: 0, n, path }, row, beatHz, sink);
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

  private productLevels(): Float64Array {
    const levels = new Float64Array(4 * (MAX_OSCILLATOR_ORDER + 1)).fill(NaN);
    for (let m = 0; m <= MAX_OSCILLATOR_ORDER; m++) {
      for (let n = 1; n <= MAX_SIGNAL_ORDER; n++) levels[4 * m + n] = this.productLevelDb(m, n);
    }
    return levels;
  }

  /** What the first IF takes from a signal that only the second mixer brings to the second IF. */
  firstIfLossDb(path: SignalPath): number {
    const { secondConversion } = this.receiver;
    if (path !== SIGNAL_PATH.secondImage || secondConversion === null) return 0;
    return this.dial.ifRejectionDb(2 * secondConversion.ifHz);
  }

  /**
   * What a product adds to n times the field of a station, stray pick-up included. What comes past
   * the circuits still has to pass the first IF.
   */
  shiftDb({ group, m, n, path }: Product, row: number): number {
    const { dial } = this;
    const rejection =
      this.frontEnd.circuitsDb(dial.spectrum.hz[group] ?? NaN, dial.tunedHz[row] ?? NaN) +
      (this.fixedDb[group] ?? 0) -
      (dial.ownLossDb[row] ?? 0);
    const shift = (this.levels[m * 4 + n] ?? NaN) - n * rejection;
    const { strayDb } = this.receiver;
    const past = n > 1 || strayDb === null ? -Infinity : m === 0 ? -strayDb.if : -strayDb.image;
    const reaching = Math.max(shift, past);
    return path === SIGNAL_PATH.secondImage ? reaching - this.firstIfLossDb(path) : reaching;
  }

  private judge(product: Product, row: number, beatHz: number, sink: FindingSink): void {
    const { dial, finding } = this;
    const { group, m, n, path } = product;
    const strongest = dial.spectrum.start[group] ?? 0;
    const shiftDb = this.shiftDb(product, row);
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
    finding.path = path;
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

function checkOrders(maxM: number, maxN: number): void {
  if (!Number.isInteger(maxM) || maxM < 0 || maxM > MAX_OSCILLATOR_ORDER) {
    throw new RangeError(`maxM must be 0 to ${MAX_OSCILLATOR_ORDER}, got ${maxM}`);
  }
  if (!Number.isInteger(maxN) || maxN < 1 || maxN > MAX_SIGNAL_ORDER) {
    throw new RangeError(`maxN must be 1 to ${MAX_SIGNAL_ORDER}, got ${maxN}`);
  }
}
