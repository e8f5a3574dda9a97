/**
 * Responses as they are answered, each with its working.
 *
 * Source: own model, as in `assess`.
 *
 * @module radio/assessment/responses
 */
import type { BandScan } from './band-scan.ts';
import { grade } from '../hearing/grades.ts';
import { mixerLevel, signalOrderLevel } from '../mixing/product-levels.ts';
import { causeOf, productName } from './product-names.ts';
import type { Receiver } from '../receiver.ts';
import type { Hidden, LedgerEntry, LedgerTerm, Response } from './response.ts';
import type { Selected } from './response-selection.ts';
import type { Period } from '../site.ts';
import { SIGNAL_PATH } from '../mixing/signal-path.ts';
import { sideSign } from '../mixing/superheterodyne.ts';
import { ratioUncertainty } from '../hearing/uncertainty.ts';

/** What every response of a band shares. */
export interface ResponseContext {
  readonly receiver: Receiver;
  readonly period: Period;
  readonly scan: BandScan;
}

/**
 * Builds a response with its ledger.
 *
 * @param context The receiver, the period and the scanned band.
 * @param selected The response.
 * @returns The response as it is answered: frequencies in whole hertz, half up.
 */
export function buildResponse(context: ResponseContext, selected: Selected): Response {
  const { dial } = context.scan;
  const { spectrum, band } = dial;
  const { position, m, n, path, beatHz, dialHz } = selected;
  const row = selected.row === dial.vacant ? dial.lend(dialHz) : selected.row;
  const levels = levelsOf(context, { ...selected, row });
  const wanted = dial.wanted[row] ?? -1;
  return {
    station: spectrum.ids[position] ?? -1,
    cause:
      path === SIGNAL_PATH.secondImage ? 'second-image' : causeOf(m, n, band.oscillatorHarmonic),
    name: nameOf(context, selected),
    m,
    n,
    dialHz: Math.round(dialHz),
    beatHz: Math.round(beatHz),
    fieldDb: spectrum.fieldDb[position] ?? null,
    distanceM: spectrum.distanceM[position] ?? null,
    interferenceDb: levels.interferenceDb,
    weightingDb: levels.weightingDb,
    wantedDb: levels.wantedDb,
    wantedStation: wanted < 0 ? null : (spectrum.ids[wanted] ?? null),
    noiseDb: levels.noiseDb,
    bandDb: levels.bandDb,
    ratioDb: levels.ratioDb,
    marginDb: levels.marginDb,
    grade:
      levels.hidden === null ? grade(band.service, levels.ratioDb, dial.protectionDb) : 'hidden',
    hidden: levels.hidden,
    borderline: Math.abs(levels.marginDb) < levels.uncertaintyDb,
    ledger: ledgerOf(context, { ...selected, row }, levels),
  };
}

interface Levels {
  readonly interferenceDb: number;
  readonly weightingDb: number;
  readonly wantedDb: number;
  readonly noiseDb: number;
  readonly bandDb: number | null;
  readonly ratioDb: number;
  readonly marginDb: number;
  readonly uncertaintyDb: number;
  readonly hidden: Hidden;
}

function levelsOf({ scan, period }: ResponseContext, selected: Selected): Levels {
  const { dial } = scan;
  const { spectrum } = dial;
  const { position, m, n, path, row, beatHz } = selected;
  const group = spectrum.groupOf(position);
  const interferenceDb =
    n * (spectrum.fieldDb[position] ?? NaN) + scan.shiftDb({ group, m, n, path }, row);
  const weightingDb = dial.weightingDb(row, beatHz);
  const wantedDb = dial.wantedDb[row] ?? NaN;
  const ratioDb = wantedDb - (interferenceDb + weightingDb);
  const bandPower = dial.bandPower(row, group, position);
  return {
    interferenceDb,
    weightingDb,
    wantedDb,
    noiseDb: dial.noiseDb[row] ?? NaN,
    bandDb: bandPower < 0 ? null : 10 * Math.log10(bandPower),
    ratioDb,
    marginDb: ratioDb - dial.protectionDb,
    uncertaintyDb: ratioUncertainty(
      n,
      dial.band.circuits.length,
      spectrum.given[position] === 1,
      period,
      (dial.wanted[row] ?? -1) < 0,
    ),
    hidden: hiddenUnder(interferenceDb + weightingDb, {
      noise: dial.hiddenByNoiseDb(row),
      band: dial.hiddenDb(row, group, position),
    }),
  };
}

/** Noise first, then the band. */
function hiddenUnder(levelDb: number, up: { noise: number; band: number }): Hidden {
  if (levelDb <= up.noise) return 'noise';
  return levelDb <= up.band ? 'band' : null;
}

function nameOf(
  { scan, receiver }: ResponseContext,
  { position, m, n, path, dialHz }: Selected,
): string {
  if (path === SIGNAL_PATH.secondImage) return 'second image';
  if (path === SIGNAL_PATH.secondIf) return 'breakthrough of the second IF';
  const { band, spectrum } = scan.dial;
  const signal = n * (spectrum.hz[spectrum.groupOf(position)] ?? NaN);
  const signedIf = sideSign(band.oscillator) * receiver.ifHz;
  const oscillator = (m * (dialHz + signedIf)) / band.oscillatorHarmonic;
  const off = {
    less: Math.abs(oscillator - receiver.ifHz - signal),
    plus: Math.abs(oscillator + receiver.ifHz - signal),
    below: Math.abs(receiver.ifHz - oscillator - signal),
  };
  const relation =
    off.below < Math.min(off.less, off.plus) ? 'below' : off.plus < off.less ? 'plus' : 'less';
  return productName(m, n, band.oscillatorHarmonic, relation);
}

function ledgerOf(
  { scan, receiver }: ResponseContext,
  { position, m, n, path, row, dialHz }: Selected,
  levels: Levels,
): LedgerEntry[] {
  const { dial, frontEnd } = scan;
  const { spectrum, band } = dial;
  const fieldDb = spectrum.fieldDb[position] ?? NaN;
  const stationHz = spectrum.hz[spectrum.groupOf(position)] ?? NaN;
  const lines = frontEnd.lines(stationHz, dialHz, dial.tunedHz[row] ?? NaN);
  const reachesMixer = fieldDb - lines.reduce((sum, { lossDb }) => sum + lossDb, 0);
  const stray = receiver.strayDb === null || n > 1 ? null : receiver.strayDb;
  const firstIfDb = scan.firstIfLossDb(path);
  const relativeDb = receiver.signalToOscillatorDb + reachesMixer - 80;
  const entries: (readonly [LedgerTerm, number | null])[] = [
    ['field', fieldDb],
    ...lines.map(({ term, lossDb }) => [term, -lossDb] as const),
    ['mixer', mixerLevel(m, band.oscillatorHarmonic, receiver.ifFeedthroughDb)],
    ['signal-order', n > 1 ? signalOrderLevel(n) : null],
    ['signal-level', n > 1 ? (n - 1) * relativeDb : null],
    ['second-conversion', path === SIGNAL_PATH.secondImage ? -firstIfDb : null],
    [
      'stray-limit',
      stray === null ? null : fieldDb - firstIfDb - (m === 0 ? stray.if : stray.image),
    ],
    ['interference', levels.interferenceDb],
    ['weighting', levels.weightingDb],
    ['weighted-interference', levels.interferenceDb + levels.weightingDb],
    ['wanted', levels.wantedDb],
    ['noise', levels.noiseDb],
    ['band', levels.bandDb],
    ['ratio', levels.ratioDb],
    ['protection-ratio', dial.protectionDb],
    ['margin', levels.marginDb],
    ['uncertainty', levels.uncertaintyDb],
  ];
  return entries.flatMap(([term, valueDb]) => (valueDb === null ? [] : [{ term, valueDb }]));
}
