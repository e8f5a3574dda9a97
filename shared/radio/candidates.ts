/**
 * Candidates for the intermediate frequency, judged against the lists of one or several sites.
 *
 * @module radio/candidates
 */
import type { HarmonicPoint } from './assessment.ts';
import type { FieldStrength } from './field-strength.ts';
import type { Grade } from './grades.ts';
import type { Receiver } from './receiver.ts';
import type { Period, Site } from './site.ts';
import type { RasterRange, Station } from './station.ts';
import type { FrequencySpan } from './tuning-spans.ts';

/** One site with its list and raster. */
export interface CandidateCase {
  readonly site: Site;
  readonly stations: readonly Station[];
  /** Fields of the stations at the site, for each period that is asked. */
  readonly fields: Readonly<Partial<Record<Period, readonly FieldStrength[]>>>;
  readonly raster: readonly RasterRange[];
}

/** What is judged. */
export interface CandidatesInput {
  readonly receiver: Receiver;
  readonly cases: readonly CandidateCase[];
  readonly periods: readonly Period[];
  readonly fromHz: number;
  /** Inclusive. */
  readonly toHz: number;
  readonly stepHz: number;
  readonly maxM: number;
  readonly maxN: number;
}

/** The worst response of one kind; null where none is heard. */
export interface KindOfResponse {
  readonly deficitDb: number;
  readonly worstRatioDb: number | null;
  readonly grade: Grade | null;
  readonly dialHz: number | null;
  readonly station: number | null;
}

/** A candidate in one period, in the worst of the cases. */
export interface CandidatePeriod {
  readonly breakthrough: KindOfResponse;
  readonly image: KindOfResponse;
  readonly products: KindOfResponse;
  /** Change of the worst breakthrough against the present IF; negative: less of it. */
  readonly breakthroughChangeDb: number | null;
  readonly changeSigmaDb: number | null;
}

/** A harmonic of the IF on a band, with the channel it whistles on. */
export interface HarmonicOnChannel extends HarmonicPoint {
  /** Nearest channel of the raster in the band; null: the band has none. */
  readonly channelHz: number | null;
  readonly beatHz: number | null;
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
  readonly intermodulation: { readonly count: number; readonly nearestBeatHz: number | null };
  readonly bfoShiftHz: number;
  /** Change of every IF capacitance, as a fraction. */
  readonly capacitanceChange: number;
  /** Greatest loss by mistracking after refitting, decibels; null without tracking data. */
  readonly trackingCostDb: number | null;
}

/** The term of the ranking that puts a candidate before the one after it. */
export type RankingTerm = 'reach' | 'deficit' | 'harmonic-beat' | 'shift' | 'lower';

/** A place in the ranking. */
export interface RankedCandidate {
  readonly ifHz: number;
  /** Null for the last. */
  readonly decidedBy: RankingTerm | null;
}

/** The whole answer; the candidates stand in the order of the ranking. */
export interface Candidates {
  readonly present: Candidate;
  readonly candidates: readonly Candidate[];
  readonly ranking: readonly RankedCandidate[];
}
