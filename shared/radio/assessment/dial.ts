/**
 * The settings of one band's dial that are judged, and what is wanted and what else is there.
 *
 * @module radio/assessment/dial
 */
import { type FrontEnd } from '../circuits/front-end.ts';
import { noiseField } from '../propagation/noise.ts';
import { rasterChannels } from '../channels/raster.ts';
import type { Band } from '../receiver.ts';
import type { IfSelectivity } from '../circuits/selectivity.ts';
import {
  assumedWantedField,
  protectionRatio,
  tuningTolerance,
} from '../hearing/service-figures.ts';
import type { Site } from '../site.ts';
import { lowerBound, type Spectrum } from '../channels/spectrum.ts';
import type { RasterRange } from '../station.ts';
import type { Tuning } from '../tracking/tuning.ts';
import type { WeightingTable } from '../hearing/weighting-table.ts';

/** A station is usable from here above the noise, decibels. */
const USABLE_OVER_NOISE_DB = 26;
/** Interference this far under noise or band is not heard, decibels. */
export const HIDDEN_UNDER_DB = 6;

/** What a dial is made of. */
export interface DialParts {
  readonly band: Band;
  readonly site: Site;
  readonly raster: readonly RasterRange[];
  readonly spectrum: Spectrum;
  readonly frontEnd: FrontEnd;
  readonly selectivity: IfSelectivity;
  /** The weighting for a tuning tolerance. */
  readonly weightingFor: (toleranceHz: number) => WeightingTable;
}

/**
 * Columns over the dial settings of a band: its ends, the channels and the listed frequencies in
 * it, ascending. One more row, `vacant`, is lent to a setting where none of these is within reach.
 *
 * Nothing here depends on the IF, so one dial serves all candidates for it.
 */
export class Dial {
  readonly band: Band;
  readonly spectrum: Spectrum;
  readonly protectionDb: number;
  /** Half of B60: how far a product may be off and still be heard. */
  readonly reachHz: number;
  readonly hz: Float64Array;
  /** Row that is lent; also the number of the others. */
  readonly vacant: number;
  /** Rows of listed frequencies and of channels, ascending. */
  readonly listed: Int32Array;
  readonly channels: Int32Array;
  /** Rows of usable stations, ascending. */
  readonly usableRows: Int32Array;
  readonly noiseDb: Float64Array;
  readonly wantedDb: Float64Array;
  /** Position of the usable station; -1: none, the wanted field is assumed. */
  readonly wanted: Int32Array;
  /** Frequency the signal circuits are tuned to. */
  readonly tunedHz: Float64Array;
  /** What the front end loses at the setting itself. */
  readonly ownLossDb: Float64Array;
  private readonly parts: DialParts;
  private tuning: Tuning | null = null;
  /** Power of the band itself; NaN: not yet asked. */
  private readonly bandPowers: Float64Array;
  /** Level up to which a station elsewhere is hidden; NaN: not yet asked. */
  private readonly hiddenDbs: Float64Array;
  private readonly tables: WeightingTable[] = [];
  private readonly tolerances: number[] = [];
  private readonly tableOf: Uint8Array;

  constructor(parts: DialParts) {
    const { band, raster, spectrum, site } = parts;
    this.parts = parts;
    this.band = band;
    this.spectrum = spectrum;
    this.reachHz = parts.selectivity.b60Hz / 2;
    this.protectionDb = protectionRatio(band.service, site.ituRegion);
    const channels = rasterChannels(raster, band.lowHz, band.highHz);
    const from = spectrum.firstFrom(band.lowHz);
    const listed = spectrum.hz.filter((hz, group) => group >= from && hz <= band.highHz);
    const settings = [...new Set([band.lowHz, band.highHz, ...channels, ...listed])];
    settings.sort((a, b) => a - b);
    this.vacant = settings.length;
    this.hz = Float64Array.from([...settings, NaN]);
    this.listed = Int32Array.from(listed, (hz) => lowerBound(settings, hz));
    this.channels = Int32Array.from(channels, (hz) => lowerBound(settings, hz));
    const column = (): Float64Array => new Float64Array(settings.length + 1);
    [this.noiseDb, this.wantedDb, this.tunedHz, this.ownLossDb] = [
      column(),
      column(),
      column(),
      column(),
    ];
    this.bandPowers = column();
    this.hiddenDbs = column();
    this.wanted = new Int32Array(settings.length + 1);
    this.tableOf = new Uint8Array(settings.length + 1);
    settings.forEach((hz, row) => this.fill(row, hz, spectrum.groupAt(hz)));
    this.usableRows = this.listed.filter((row) => (this.wanted[row] ?? -1) >= 0);
  }

  /** Lends the spare row to a setting that has none. */
  lend(hz: number): number {
    this.fill(this.vacant, hz, -1);
    return this.vacant;
  }

  /** Moves the signal circuits of all rows to where a tuning leaves them; null: to the dial. */
  retune(tuning: Tuning | null): void {
    this.tuning = tuning;
    for (let row = 0; row < this.vacant; row++) this.tune(row);
  }

  /** Whether the signal circuits stand elsewhere than the dial shows. */
  get isTracked(): boolean {
    return this.tuning !== null;
  }

  private tune(row: number): void {
    const hz = this.hz[row] ?? NaN;
    const { frontEnd } = this.parts;
    const tunedHz = this.tuning === null ? hz : this.tuning(hz);
    this.tunedHz[row] = tunedHz;
    this.ownLossDb[row] = frontEnd.circuitsDb(hz, tunedHz) + frontEnd.fixedDb(hz);
  }

  /** Rejection of the IF at a distance from its centre, decibels. */
  ifRejectionDb(offsetHz: number): number {
    return this.parts.selectivity.rejectionDb(offsetHz);
  }

  /** Number of the row's weighting table, and how many tables there are. */
  tableIndex(row: number): number {
    return this.tableOf[row] ?? 0;
  }

  get tableCount(): number {
    return this.tables.length;
  }

  /** The weighting of a beat at a row, decibels. */
  weightingDb(row: number, beatHz: number): number {
    return this.weightingByTable(this.tableIndex(row), beatHz);
  }

  weightingByTable(table: number, beatHz: number): number {
    return this.tables[table]?.at(beatHz) ?? NaN;
  }

  /** The largest weighting that any beat can have, decibels. */
  get greatestWeightingDb(): number {
    return this.tables[0]?.greatestDb ?? NaN;
  }

  /** The least noise on the band, dB(uV/m): it changes one way along the dial. */
  get leastNoiseDb(): number {
    return Math.min(this.noiseDb[0] ?? NaN, this.noiseDb[this.vacant - 1] ?? NaN);
  }

  /** Level up to which interference is hidden by the noise, dB(uV/m). */
  hiddenByNoiseDb(row: number): number {
    return (this.noiseDb[row] ?? NaN) - HIDDEN_UNDER_DB;
  }

  /**
   * Level up to which a station's interference is hidden by noise and band together.
   *
   * @param row The setting.
   * @param group Group of the interferer.
   * @param position Position of the interferer, which is no part of the band.
   * @returns dB(uV/m).
   */
  hiddenDb(row: number, group: number, position: number): number {
    if (this.isNear(row, group))
      return this.hiddenUnder(row, this.bandWithout(row, group, position));
    let hidden = this.hiddenDbs[row] ?? NaN;
    if (Number.isNaN(hidden)) {
      hidden = this.hiddenUnder(row, this.bandPower(row, group, position));
      this.hiddenDbs[row] = hidden;
    }
    return hidden;
  }

  /** Whether stations of a group lie near enough to count as the band at a row. */
  isNear(row: number, group: number): boolean {
    const hz = this.spectrum.hz[group] ?? NaN;
    return Math.abs(hz - (this.hz[row] ?? NaN)) <= this.reachHz;
  }

  /**
   * B as a power: what stations on or near the setting do to any set, other than the wanted one
   * and the interferer.
   *
   * @returns The power; -1: there is no such station.
   */
  bandPower(row: number, group: number, position: number): number {
    return this.isNear(row, group) ? this.sumBand(row, group, position) : this.wholeBand(row);
  }

  private wholeBand(row: number): number {
    let power = this.bandPowers[row] ?? NaN;
    if (Number.isNaN(power)) {
      power = this.sumBand(row, -1, -1);
      this.bandPowers[row] = power;
    }
    return power;
  }

  /** The band less a near interferer: on a dense list summing it anew each time takes too long. */
  private bandWithout(row: number, group: number, position: number): number {
    const { spectrum } = this;
    const distance = Math.abs((spectrum.hz[group] ?? NaN) - (this.hz[row] ?? NaN));
    const whole = this.wholeBand(row);
    const ownDb = (spectrum.fieldDb[position] ?? NaN) + this.weightingDb(row, distance);
    const own = 10 ** (ownDb / 10);
    // Where the interferer is most of the band, a difference would lose the rest in rounding.
    if (distance === 0 || !(own <= whole / 2)) return this.sumBand(row, group, position);
    return whole - own;
  }

  private hiddenUnder(row: number, bandPower: number): number {
    const noiseDb = this.noiseDb[row] ?? NaN;
    if (bandPower < 0) return noiseDb - HIDDEN_UNDER_DB;
    return 10 * Math.log10(10 ** (noiseDb / 10) + bandPower) - HIDDEN_UNDER_DB;
  }

  private sumBand(row: number, without: number, position: number): number {
    const { spectrum } = this;
    const hz = this.hz[row] ?? NaN;
    const wanted = this.wanted[row] ?? -1;
    let sum = 0;
    let found = false;
    for (let group = spectrum.firstFrom(hz - this.reachHz); group < spectrum.hz.length; group++) {
      const distance = Math.abs((spectrum.hz[group] ?? NaN) - hz);
      if (distance > this.reachHz) break;
      const left = group === without ? position : distance === 0 ? wanted : -1;
      if (left >= 0 && spectrum.startOf(group + 1) - spectrum.startOf(group) === 1) continue;
      found = true;
      sum += spectrum.powerOf(group, left) * 10 ** (this.weightingDb(row, distance) / 10);
    }
    return found ? sum : -1;
  }

  private fill(row: number, hz: number, group: number): void {
    const { band, site, selectivity, spectrum } = this.parts;
    const noiseDb = noiseField(site, hz, selectivity.b6Hz);
    const strongest = group < 0 ? -1 : (spectrum.wanted[group] ?? -1);
    const groundDb = spectrum.groundDb[strongest] ?? -Infinity;
    // Where the strongest is too weak to be usable nobody listens to it: the wanted field is assumed,
    // there is no wanted station, and what is listed here counts as the band.
    const usable = groundDb >= noiseDb + USABLE_OVER_NOISE_DB;
    this.hz[row] = hz;
    this.noiseDb[row] = noiseDb;
    this.wanted[row] = usable ? strongest : -1;
    this.wantedDb[row] = usable ? groundDb : assumedWantedField(band, site.ituRegion, hz);
    this.bandPowers[row] = NaN;
    this.hiddenDbs[row] = NaN;
    this.tableOf[row] = this.tableNumber(tuningTolerance(band, hz));
    this.tune(row);
  }

  private tableNumber(toleranceHz: number): number {
    const known = this.tolerances.indexOf(toleranceHz);
    if (known >= 0) return known;
    this.tables.push(this.parts.weightingFor(toleranceHz));
    return this.tolerances.push(toleranceHz) - 1;
  }
}
