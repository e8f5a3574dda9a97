/**
 * A receiver judged as it is and as a cure leaves it, over the same stations.
 *
 * Source: own rule; judged as in `judgeCandidates`.
 *
 * @module radio/cures/cure-bench
 */
import type { BandScan } from '../assessment/band-scan.ts';
import { Deficit, type Worst } from '../assessment/deficit.ts';
import type { FieldStrength } from '../propagation/field-strength.ts';
import type { Finding, FindingSink, Orders } from '../assessment/finding.ts';
import { FrontEnd } from '../circuits/front-end.ts';
import { rasterChannels } from '../channels/raster.ts';
import type { Receiver } from '../receiver.ts';
import { bandScans, WeightingTables } from '../assessment/receiver-at-site.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import type { Period, Site } from '../site.ts';
import { Spectrum } from '../channels/spectrum.ts';
import type { RasterRange, Station } from '../station.ts';
import { tuningOf } from '../tracking/tuning.ts';

/** What is judged. */
export interface CuresInput extends Orders {
  readonly receiver: Receiver;
  readonly site: Site;
  readonly stations: readonly Station[];
  /** Fields of the stations at the site, for each period that is asked. */
  readonly fields: Readonly<Partial<Record<Period, readonly FieldStrength[]>>>;
  readonly raster: readonly RasterRange[];
  readonly periods: readonly Period[];
}

/** A receiver, designed for its own `ifHz`, and the IF it is aligned to. */
export interface SetUp {
  readonly receiver: Receiver;
  readonly ifHz: number;
}

/** The worst that one station does in one period. */
export interface WorstOfStation {
  readonly period: Period;
  readonly station: number;
  readonly dialHz: number;
  readonly ratioDb: number;
}

/** A set-up, judged. */
export interface JudgedSetUp {
  /** Deficit in the worse period. */
  readonly deficitDb: number;
  readonly worst: readonly WorstOfStation[];
  /** The worst breakthrough of all, with its band; null: none is heard. */
  readonly breakthrough: (Worst & { readonly scan: BandScan }) | null;
  readonly scans: readonly BandScan[];
}

/** Where a loss of wanted signal is felt first. */
export interface WantedChannel {
  /** Place of the band in the receiver. */
  readonly band: number;
  readonly dialHz: number;
}

/** The stations of a site in each period, and the receiver's way of hearing. */
export class CureBench {
  private readonly input: CuresInput;
  private readonly tables: WeightingTables;
  private readonly spectra: ReadonlyMap<Period, Spectrum>;

  constructor(input: CuresInput) {
    const { receiver, site, stations, fields, periods, maxM } = input;
    const selectivity = ifSelectivity(receiver.selectivity, receiver.ifHz);
    this.input = input;
    this.tables = new WeightingTables(receiver, selectivity, site.ituRegion, maxM);
    this.spectra = new Map(
      periods.map((period) => [period, new Spectrum(stations, fields[period] ?? [])]),
    );
  }

  /** Half the width over which a station on the IF is heard, hertz. */
  get reachHz(): number {
    return this.tables.selectivity.b60Hz / 2;
  }

  /** Judges a set-up in every period. */
  judge({ receiver, ifHz }: SetUp): JudgedSetUp {
    const { site, raster } = this.input;
    let deficitDb = 0;
    let breakthrough: JudgedSetUp['breakthrough'] = null;
    const worst: WorstOfStation[] = [];
    const scans: BandScan[] = [];
    for (const [period, spectrum] of this.spectra) {
      const heard = new Map<number, WorstOfStation>();
      let missing = 0;
      for (const scan of bandScans(receiver, site, raster, spectrum, this.tables)) {
        const sink = new StationRatios(scan, period, heard);
        scan.scan(ifHz, this.input, sink);
        missing += sink.deficit.deficitDb();
        const here = sink.deficit.worst.breakthrough;
        if (here !== null && here.ratioDb < (breakthrough?.ratioDb ?? Infinity)) {
          breakthrough = { ...here, scan };
        }
        scans.push(scan);
      }
      deficitDb = Math.max(deficitDb, missing);
      worst.push(...heard.values());
    }
    return { deficitDb, worst, breakthrough, scans };
  }

  /**
   * The lowest wanted channel of the band on which breakthrough is worst, or of the lowest band:
   * the lowest usable station, else the lowest channel of the raster, else the end of the band.
   */
  lowestWanted({ breakthrough, scans }: JudgedSetUp): WantedChannel {
    const { receiver, raster } = this.input;
    const lows = receiver.bands.map(({ lowHz }) => lowHz);
    const worstBand = breakthrough?.scan.dial.band;
    const found = receiver.bands.findIndex((band) => band === worstBand);
    const index = found >= 0 ? found : lows.indexOf(Math.min(...lows));
    const { lowHz = NaN, highHz = NaN } = receiver.bands[index] ?? {};
    const usable = scans
      .filter((_, place) => place % lows.length === index)
      .flatMap(({ dial }) => Array.from(dial.usableRows, (row) => dial.hz[row] ?? Infinity));
    const lowest = usable.reduce((least, hz) => Math.min(least, hz), Infinity);
    const [channel = lowHz] = rasterChannels(raster, lowHz, highHz);
    return { band: index, dialHz: Number.isFinite(lowest) ? lowest : channel };
  }
}

/**
 * Loss of a wanted station between aerial and mixer: circuits that stand beside it, and what does
 * not follow the dial.
 *
 * @param setUp The receiver and its IF.
 * @param channel The station's channel.
 * @returns Decibels.
 * @throws {RangeError} If the receiver has no such band.
 * @example
 *   wantedLoss({ receiver, ifHz: 560_000 }, { band: 0, dialHz: 600_000 }); // 0: nothing but circuits
 */
export function wantedLoss({ receiver, ifHz }: SetUp, channel: WantedChannel): number {
  const band = receiver.bands[channel.band];
  if (band === undefined) throw new RangeError(`band must be one of ${receiver.bands.length}`);
  const { dialHz } = channel;
  const frontEnd = new FrontEnd(receiver, band);
  const tunedHz = tuningOf(band, receiver.ifHz, ifHz).tuning?.(dialHz) ?? dialHz;
  return frontEnd.circuitsDb(dialHz, tunedHz) + frontEnd.fixedDb(dialHz);
}

/** Keeps the deficit, and the smallest ratio that each station leaves anywhere. */
class StationRatios implements FindingSink {
  readonly takesHidden = false;
  readonly deficit: Deficit;
  private readonly dial: BandScan['dial'];
  private readonly period: Period;
  private readonly heard: Map<number, WorstOfStation>;

  constructor(scan: BandScan, period: Period, heard: Map<number, WorstOfStation>) {
    this.deficit = new Deficit(scan);
    this.dial = scan.dial;
    this.period = period;
    this.heard = heard;
  }

  take(finding: Readonly<Finding>): void {
    this.deficit.take(finding);
    if (finding.heard === 0) return;
    const { n, row, strongest, shiftDb, weightingDb, dialHz } = finding;
    const { spectrum, wantedDb } = this.dial;
    const levelDb = n * (spectrum.fieldDb[strongest] ?? NaN) + shiftDb + weightingDb;
    const ratioDb = (wantedDb[row] ?? NaN) - levelDb;
    if (ratioDb >= (this.heard.get(strongest)?.ratioDb ?? Infinity)) return;
    const station = spectrum.ids[strongest] ?? NaN;
    this.heard.set(strongest, { period: this.period, station, dialHz, ratioDb });
  }
}
