/**
 * A receiver at one site in one period, ready to be judged at any IF.
 *
 * @module radio/assessment/listening
 */
import type { BandScan } from './band-scan.ts';
import type { Finding, FindingSink, Orders } from './finding.ts';
import { Deficit, isBefore, type Kind, type Worst } from './deficit.ts';
import {
  intermodulatingPairs,
  type StrongStation,
  strongestStations,
} from '../mixing/intermodulation.ts';
import type { Spectrum } from '../channels/spectrum.ts';

/** What was found at one IF. */
export interface JudgedIf {
  /** Deficit of all responses together. */
  readonly deficitDb: number;
  /** Deficit of each kind by itself. */
  readonly kindDeficitDb: Readonly<Record<Kind, number>>;
  /** The worst response of each kind, with the band it is on; null: none is heard. */
  readonly worst: Readonly<Record<Kind, WorstOnBand | null>>;
  readonly intermodulation: { readonly count: number; readonly nearestBeatHz: number | null };
}

/** A response with the band it is on. */
export interface WorstOnBand extends Worst {
  readonly scan: BandScan;
}

/** The stations, and the bands over them. */
export class Listening {
  private readonly spectrum: Spectrum;
  private readonly strongest: readonly StrongStation[];
  private readonly scans: readonly BandScan[];
  private readonly orders: Orders;
  private readonly b6Hz: number;
  private readonly breakthroughs = new Map<number, number>();

  constructor(
    spectrum: Spectrum,
    scans: readonly BandScan[],
    { orders, b6Hz }: { readonly orders: Orders; readonly b6Hz: number },
  ) {
    this.spectrum = spectrum;
    this.strongest = strongestStations(spectrum);
    this.scans = scans;
    this.orders = orders;
    this.b6Hz = b6Hz;
  }

  /** Judges an IF, hertz. */
  judge(ifHz: number): JudgedIf {
    const deficits = this.scans.map((scan) => {
      const deficit = new Deficit(scan);
      scan.scan(ifHz, this.orders, deficit);
      return { scan, deficit };
    });
    const sum = (kind: Kind | null): number =>
      deficits.reduce((total, { deficit }) => total + deficit.deficitDb(kind), 0);
    const worst = (kind: Kind): WorstOnBand | null =>
      deficits.reduce<WorstOnBand | null>((found, { scan, deficit }) => {
        const here = deficit.worst[kind];
        if (here === null) return found;
        const better = found !== null && !isBefore(here, found, this.spectrum.ids);
        return better ? found : { ...here, scan };
      }, null);
    return {
      deficitDb: sum(null),
      kindDeficitDb: {
        breakthrough: sum('breakthrough'),
        image: sum('image'),
        products: sum('products'),
      },
      worst: {
        breakthrough: worst('breakthrough'),
        image: worst('image'),
        products: worst('products'),
      },
      intermodulation: this.intermodulation(ifHz),
    };
  }

  /** Smallest ratio of a breakthrough that is heard at an IF; Infinity: none is. */
  breakthroughDb(ifHz: number): number {
    const known = this.breakthroughs.get(ifHz);
    if (known !== undefined) return known;
    let smallest = Infinity;
    for (const scan of this.scans) {
      const sink = new SmallestRatio(scan);
      scan.scanBreakthrough(ifHz, this.orders.maxN, sink);
      smallest = Math.min(smallest, sink.ratioDb);
    }
    this.breakthroughs.set(ifHz, smallest);
    return smallest;
  }

  private intermodulation(ifHz: number): JudgedIf['intermodulation'] {
    const pairs = intermodulatingPairs(this.strongest, ifHz, this.b6Hz / 2);
    const nearest = pairs.reduce((least, { beatHz }) => Math.min(least, beatHz), Infinity);
    return { count: pairs.length, nearestBeatHz: pairs.length > 0 ? Math.round(nearest) : null };
  }
}

/** Keeps the smallest ratio of all findings. */
class SmallestRatio implements FindingSink {
  readonly takesHidden = false;
  ratioDb = Infinity;
  private readonly dial: BandScan['dial'];

  constructor({ dial }: BandScan) {
    this.dial = dial;
  }

  take({ n, row, strongest, shiftDb, weightingDb }: Readonly<Finding>): void {
    const fieldDb = this.dial.spectrum.fieldDb[strongest] ?? NaN;
    const ratioDb = (this.dial.wantedDb[row] ?? NaN) - (n * fieldDb + shiftDb + weightingDb);
    this.ratioDb = Math.min(this.ratioDb, ratioDb);
  }
}
