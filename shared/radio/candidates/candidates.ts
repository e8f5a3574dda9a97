/**
 * Candidates for the intermediate frequency, judged against the lists of one or several sites.
 *
 * Source: own rule; responses as in `assess`.
 *
 * @module radio/candidates/candidates
 */
import { capacitanceChange } from '../mixing/beat-oscillator.ts';
import { compareCandidates, rankingSentence } from './candidate-order.ts';
import {
  type CandidatePeriod,
  candidatePeriod,
  deficitOf,
  type Judgement,
} from './candidate-period.ts';
import type { FieldStrength } from '../propagation/field-strength.ts';
import { type HarmonicOnChannel, harmonicsOnChannels } from './harmonics-on-channels.ts';
import { outOfReach } from './if-reach.ts';
import { breakthroughWindow } from './if-window.ts';
import type { Orders } from '../assessment/finding.ts';
import { Listening } from '../assessment/listening.ts';
import { rasterDistance, rasterStep } from '../channels/raster.ts';
import type { Receiver } from '../receiver.ts';
import { bandScans, WeightingTables } from '../assessment/receiver-at-site.ts';
import { type IfSelectivity, ifSelectivity } from '../circuits/selectivity.ts';
import type { Period, Site } from '../site.ts';
import { Spectrum } from '../channels/spectrum.ts';
import type { RasterRange, Station } from '../station.ts';
import { trackingCost } from '../tracking/tracking-cost.ts';
import type { FrequencySpan } from '../mixing/tuning-spans.ts';

/** Most candidates judged at once. */
export const MAX_CANDIDATES = 400;

/** Orders of products that candidates are judged by, as assessments are unless asked otherwise. */
export const CANDIDATE_ORDERS = { maxM: 3, maxN: 2 } as const;

/** One site with its list and raster. */
export interface CandidateCase {
  readonly site: Site;
  readonly stations: readonly Station[];
  /** Fields of the stations at the site, for each period that is asked. */
  readonly fields: Readonly<Partial<Record<Period, readonly FieldStrength[]>>>;
  readonly raster: readonly RasterRange[];
}

/** What is judged. */
export interface CandidatesInput extends Orders {
  readonly receiver: Receiver;
  readonly cases: readonly CandidateCase[];
  readonly periods: readonly Period[];
  readonly fromHz: number;
  /** Inclusive. */
  readonly toHz: number;
  readonly stepHz: number;
}

/** One intermediate frequency, judged. */
export interface Candidate {
  readonly ifHz: number;
  readonly reachable: { readonly ok: boolean; readonly reason: string | null };
  /** Deficit in the worse period and the worst case. */
  readonly deficitDb: number;
  /** Distance of the IF and its harmonics to the raster; null: no raster. */
  readonly rasterDistanceHz: {
    readonly if: number | null;
    readonly twice: number | null;
    readonly thrice: number | null;
  };
  readonly day?: CandidatePeriod;
  readonly night?: CandidatePeriod;
  /** Range of the IF inside which breakthrough stays within 3 dB. */
  readonly windowHz: FrequencySpan;
  readonly harmonics: readonly HarmonicOnChannel[];
  /** Pairs of strong stations that make the IF between them, where there are most. */
  readonly intermodulation: { readonly count: number; readonly nearestBeatHz: number | null };
  /** How far a beat oscillator must follow: the change of the IF. */
  readonly bfoShiftHz: number;
  /** Change of every IF capacitance, as a fraction. */
  readonly capacitanceChange: number;
  /** Greatest loss by mistracking after refitting, decibels; null without tracking data. */
  readonly trackingCostDb: number | null;
}

/** The whole answer; the candidates stand in order. */
export interface Candidates {
  readonly present: Candidate;
  readonly candidates: readonly Candidate[];
  /** What put the first candidate first. */
  readonly ranking: string;
}

/**
 * Judges candidates for the IF and puts them in order: within reach before not; then the smaller
 * deficit in the worse period; then the larger beat of the nearest harmonic whistle to a channel;
 * then the smaller shift; then the lower. No IF is best on every term, so each term is given.
 *
 * @param input Receiver, cases, periods and the range of candidates.
 * @returns The present IF and the candidates.
 * @throws {RangeError} If a value is out of range, or there would be more than 400 candidates.
 *
 * @example
 *   judgeCandidates({ receiver, cases: [judged], periods: ['night'], fromHz: 551_000,
 *     toHz: 560_000, stepHz: 500, maxM: 3, maxN: 2 })
 *     .candidates[0]?.ifHz; // 555000 between strong stations on 550 and 560 kHz
 */
export function judgeCandidates(input: CandidatesInput): Candidates {
  const { receiver } = input;
  const frequencies = candidateFrequencies(input);
  const bench = new Bench(input);
  const present = bench.judge(receiver.ifHz);
  const candidates = frequencies
    .map((ifHz) => bench.candidate(ifHz, present))
    .sort((a, b) => compareCandidates(a, b, receiver.ifHz));
  return {
    present: bench.candidate(receiver.ifHz, present),
    candidates,
    ranking: rankingSentence(candidates, receiver.ifHz),
  };
}

/** The receiver over all cases and periods. */
class Bench {
  private readonly receiver: Receiver;
  private readonly raster: readonly RasterRange[];
  private readonly selectivity: IfSelectivity;
  private readonly listenings: ReadonlyMap<Period, readonly Listening[]>;

  constructor(input: CandidatesInput) {
    this.receiver = input.receiver;
    this.raster = input.cases.flatMap(({ raster }) => raster);
    this.selectivity = ifSelectivity(input.receiver.selectivity, input.receiver.ifHz);
    this.listenings = new Map(
      input.periods.map((period) => [period, listeningsOf(input, period, this.selectivity)]),
    );
  }

  judge(ifHz: number): Judgement {
    return new Map(
      [...this.listenings].map(([period, cases]) => [period, cases.map((at) => at.judge(ifHz))]),
    );
  }

  candidate(ifHz: number, present: Judgement): Candidate {
    const { receiver, raster } = this;
    const judgement = ifHz === receiver.ifHz ? present : this.judge(ifHz);
    const reason = outOfReach(receiver, ifHz);
    return {
      ifHz,
      reachable: { ok: reason === null, reason },
      deficitDb: deficitOf(judgement),
      rasterDistanceHz: {
        if: toRaster(raster, ifHz),
        twice: toRaster(raster, 2 * ifHz),
        thrice: toRaster(raster, 3 * ifHz),
      },
      ...this.periods(judgement, present),
      windowHz: this.window(ifHz),
      harmonics: harmonicsOnChannels(ifHz, receiver.bands, raster),
      intermodulation: worstIntermodulation(judgement),
      bfoShiftHz: ifHz - receiver.ifHz,
      capacitanceChange: capacitanceChange(receiver.ifHz, ifHz),
      trackingCostDb: trackingCost(receiver, ifHz),
    };
  }

  private periods(
    judgement: Judgement,
    present: Judgement,
  ): Partial<Record<Period, CandidatePeriod>> {
    return Object.fromEntries(
      [...judgement].map(([period, cases]) => [
        period,
        candidatePeriod(cases, present.get(period) ?? []),
      ]),
    );
  }

  private window(ifHz: number): FrequencySpan {
    const all = [...this.listenings.values()].flat();
    return breakthroughWindow(
      ifHz,
      all.map((at) => (hz: number) => at.breakthroughDb(hz)),
      this.selectivity.b60Hz / 2,
    );
  }
}

/**
 * The receiver at each site in one period, ready to be judged at any IF.
 *
 * @param asked Receiver, sites with their lists, and orders.
 * @param period The period.
 * @param selectivity Selectivity of the receiver's IF.
 * @returns One for each site, in their order.
 * @throws {RangeError} If a value is out of range; the message names it.
 * @example
 *   const { selectivity } = receiver;
 *   const asked = { receiver, cases: [judged], ...orders };
 *   listeningsOf(asked, 'night', ifSelectivity(selectivity, 560e3)).length; // 1
 */
export function listeningsOf(
  { receiver, cases, maxM, maxN, checkpoint }: Pick<CandidatesInput, 'receiver' | 'cases'> & Orders,
  period: Period,
  selectivity: IfSelectivity,
): Listening[] {
  return cases.map(({ site, stations, fields, raster }) => {
    const spectrum = new Spectrum(stations, fields[period] ?? []);
    const tables = new WeightingTables(receiver, selectivity, site.ituRegion, maxM);
    const scans = bandScans(receiver, site, raster, spectrum, tables);
    return new Listening(spectrum, scans, {
      orders: { maxM, maxN, checkpoint },
      b6Hz: selectivity.b6Hz,
    });
  });
}

function candidateFrequencies({ fromHz, toHz, stepHz }: CandidatesInput): number[] {
  if (!(stepHz > 0)) throw new RangeError(`stepHz must be above 0, got ${stepHz}`);
  if (!(fromHz > 0)) throw new RangeError(`fromHz must be above 0, got ${fromHz}`);
  if (!(toHz >= fromHz)) throw new RangeError(`toHz must not be below fromHz, got ${toHz}`);
  const count = Math.floor((toHz - fromHz) / stepHz) + 1;
  if (count > MAX_CANDIDATES) {
    throw new RangeError(`stepHz gives ${count} candidates; at most ${MAX_CANDIDATES} are judged`);
  }
  return Array.from({ length: count }, (_, index) => fromHz + index * stepHz);
}

function toRaster(raster: readonly RasterRange[], hz: number): number | null {
  const stepHz = rasterStep(raster, hz);
  return stepHz === null ? null : rasterDistance(stepHz, hz);
}

function worstIntermodulation(judgement: Judgement): Candidate['intermodulation'] {
  const all = [...judgement.values()].flat().map(({ intermodulation }) => intermodulation);
  const beat = (one: Candidate['intermodulation']): number => one.nearestBeatHz ?? Infinity;
  return all.reduce(
    (worst, one) =>
      one.count > worst.count || (one.count === worst.count && beat(one) < beat(worst))
        ? one
        : worst,
    { count: 0, nearestBeatHz: null },
  );
}
