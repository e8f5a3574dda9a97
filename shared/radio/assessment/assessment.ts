/**
 * Assessment of a receiver at a site: what it lets through, where on the dial, and how bad it is.
 *
 * Source: own model: every term an equivalent field at the aerial; the parts name theirs.
 *
 * @module radio/assessment/assessment
 */
import type { BandScan } from './band-scan.ts';
import type { Finding, FindingSink, Orders } from './finding.ts';
import { Deficit } from './deficit.ts';
import { type DialTotal, DialTotals } from './dial-totals.ts';
import type { FieldStrength } from '../propagation/field-strength.ts';
import type { Grade } from '../hearing/grades.ts';
import { ifHarmonics } from '../mixing/harmonic-whistles.ts';
import {
  intermodulatingPairs,
  intermodulationResponse,
  strongestStations,
} from '../mixing/intermodulation.ts';
import type { Receiver } from '../receiver.ts';
import { bandScans, WeightingTables } from './receiver-at-site.ts';
import { type RejectionPoint, rejectionCurve } from './rejection-curve.ts';
import type { Response } from './response.ts';
import { ResponseSelection } from './response-selection.ts';
import { buildResponse } from './responses.ts';
import { secondOscillatorHarmonics } from '../mixing/second-conversion.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import type { Period, Site } from '../site.ts';
import { Spectrum } from '../channels/spectrum.ts';
import type { RasterRange, Station } from '../station.ts';
import { type FrequencySpan, imageSpan, oscillatorSpan } from '../mixing/tuning-spans.ts';
import { type BandDeficit, type Verdict, verdictOf } from './verdict.ts';
import { type Warning, warningsOf } from './warnings.ts';

/** What is assessed; orders of the oscillator 0 to 5, of the signal 1 to 3. */
export interface AssessmentInput extends Orders {
  readonly receiver: Receiver;
  readonly site: Site;
  readonly stations: readonly Station[];
  /** Fields of the stations at the site, by `fieldStrengths`. */
  readonly fields: readonly FieldStrength[];
  readonly raster: readonly RasterRange[];
  readonly period: Period;
  /** Mildest grade that is still answered; null: all, hidden ones too. */
  readonly leaveOutBetterThan: Grade | null;
  /** Most responses answered for a band. */
  readonly limit: number;
}

/** A station that was not computed. */
export interface SkippedStation {
  readonly station: number;
  readonly reason: string;
}

/** Where a harmonic of the IF falls on a band. */
export interface HarmonicPoint {
  readonly harmonic: number;
  readonly dialHz: number;
}

/** One band of the receiver, assessed. */
export interface BandAssessment {
  readonly name: string;
  readonly oscillatorHz: FrequencySpan;
  readonly imageHz: FrequencySpan;
  readonly rejection: readonly RejectionPoint[];
  readonly harmonics: readonly HarmonicPoint[];
  /** Harmonics of the second oscillator, where there is a second conversion. */
  readonly secondOscillator: readonly HarmonicPoint[];
  readonly totals: readonly DialTotal[];
  /** Number of responses before `limit`. */
  readonly total: number;
  readonly responses: readonly Response[];
}

/** The whole answer. */
export interface Assessment {
  readonly verdict: Verdict;
  readonly warnings: readonly Warning[];
  readonly skipped: readonly SkippedStation[];
  readonly bands: readonly BandAssessment[];
}

/**
 * Assesses a receiver.
 *
 * All levels are equivalent fields at the aerial, so the gain of the receiver cancels. A response
 * of a station of field E through the product (m, n):
 *
 *     g = E - A(f);   I = g + H_m - H_h + K_n + (n - 1)(r + g - 80)
 *     ratio = S - (I + W);   margin = ratio - P0
 *
 * Stations without a field in the period are listed as skipped and count nowhere.
 *
 * @param input Receiver, site, stations with their fields, raster, orders and limits.
 * @returns The verdict, and each band with its responses, worst first.
 * @throws {RangeError} If a value is out of range; the message names it.
 *
 * @example
 *   // An IF of 560 kHz with strong stations on 550 and 560: the one to hear on 1000 is harmed.
 *   assess({ ...atSite, period: 'night', maxM: 3, maxN: 2,
 *     leaveOutBetterThan: 'slightly-annoying', limit: 2000 }).verdict.usable; // 1
 */
export function assess(input: AssessmentInput): Assessment {
  const { receiver, site, raster, period, maxM } = input;
  const spectrum = new Spectrum(input.stations, input.fields);
  const selectivity = ifSelectivity(receiver.selectivity, receiver.ifHz);
  const pairs = intermodulatingPairs(
    strongestStations(spectrum),
    receiver.ifHz,
    selectivity.b6Hz / 2,
  );
  const everywhere = pairs.map((pair) => intermodulationResponse(spectrum, pair));
  const bands: BandAssessment[] = [];
  const deficits: BandDeficit[] = [];
  const tables = new WeightingTables(receiver, selectivity, site.ituRegion, maxM);
  for (const scan of bandScans(receiver, site, raster, spectrum, tables)) {
    const deficit = new Deficit(scan);
    bands.push(assessBand(input, scan, deficit, everywhere));
    deficits.push({ band: scan.dial.band, protectionDb: scan.dial.protectionDb, deficit });
  }
  return {
    verdict: verdictOf(spectrum, deficits),
    warnings: warningsOf({ receiver, selectivity, site, period, spectrum, maxM }),
    skipped: spectrum.ids.length < input.stations.length ? skippedStations(input) : [],
    bands,
  };
}

function assessBand(
  input: AssessmentInput,
  scan: BandScan,
  deficit: Deficit,
  everywhere: readonly Response[],
): BandAssessment {
  const { receiver, period, limit } = input;
  const { dial } = scan;
  const { band } = dial;
  const totals = new DialTotals(dial);
  const selection = new ResponseSelection(dial, input.leaveOutBetterThan, limit);
  scan.scan(receiver.ifHz, input, new Sinks([deficit, totals, selection]));
  const context = { receiver, period, scan };
  const responses = selection.selected().map((selected) => buildResponse(context, selected));
  return {
    name: band.name,
    oscillatorHz: oscillatorSpan(band, receiver.ifHz),
    imageHz: imageSpan(band, receiver.ifHz),
    rejection: rejectionCurve(receiver, scan.frontEnd, band),
    harmonics: ifHarmonics(receiver.ifHz, band.lowHz, band.highHz),
    secondOscillator: secondOscillatorHarmonics(receiver, band.lowHz, band.highHz),
    totals: totals.totals(),
    total: selection.total + everywhere.length,
    responses: [...responses, ...everywhere].slice(0, limit),
  };
}

/** Hands each finding to several sinks. */
class Sinks implements FindingSink {
  readonly takesHidden: boolean;
  private readonly sinks: readonly FindingSink[];

  constructor(sinks: readonly FindingSink[]) {
    this.sinks = sinks;
    this.takesHidden = sinks.some(({ takesHidden }) => takesHidden);
  }

  take(finding: Readonly<Finding>): void {
    for (const sink of this.sinks) sink.take(finding);
  }
}

function skippedStations({ stations, fields }: AssessmentInput): SkippedStation[] {
  const byId = new Map(fields.map((field) => [field.station, field]));
  return stations.flatMap(({ id, fieldDb }) => {
    const field = byId.get(id);
    if ((fieldDb ?? field?.fieldDb ?? null) !== null) return [];
    const reason = field?.notes.join(' ') ?? '';
    return [{ station: id, reason: reason === '' ? 'No field was computed.' : reason }];
  });
}
