/**
 * The least that judging a receiver can cost: a loop over typed arrays that computes solution,
 * rejection, weighting and ratio of every judged setting of every station, and keeps nothing but
 * the smallest ratio. No objects, no hidden responses, no totals, no order.
 */
import type { Band, Receiver } from '../../shared/radio/receiver.ts';
import { rasterChannels } from '../../shared/radio/channels/raster.ts';
import { WeightingTables } from '../../shared/radio/assessment/receiver-at-site.ts';
import { ifSelectivity } from '../../shared/radio/circuits/selectivity.ts';
import { assumedWantedField } from '../../shared/radio/hearing/service-figures.ts';
import type { RasterRange, Station } from '../../shared/radio/station.ts';

const OSCILLATOR_DB = [3, 0, -6, -10, -14, -17];
const SIGNAL_DB = [0, 0, -15, -30];

/** Columns of one band, made beforehand. */
interface BareBand {
  readonly band: Band;
  readonly q: Float64Array;
  readonly slope: Float64Array;
  readonly listed: Float64Array;
  readonly listedWantedDb: Float64Array;
  readonly channels: Float64Array;
  readonly channelsWantedDb: Float64Array;
  readonly weighting: Float64Array;
}

export interface BareCase {
  readonly hz: Float64Array;
  readonly fieldDb: Float64Array;
  readonly bands: readonly BareBand[];
  readonly reachHz: number;
  readonly strayDb: number;
  readonly signalToOscillatorDb: number;
}

export interface BareResult {
  judged: number;
  smallestDb: number;
}

/** Sets up the columns. */
export function bareCase(
  receiver: Receiver,
  stations: readonly Station[],
  raster: readonly RasterRange[],
): BareCase {
  const sorted = [...stations].sort((a, b) => a.frequencyHz - b.frequencyHz);
  const frequencies = [...new Set(sorted.map(({ frequencyHz }) => frequencyHz))];
  const selectivity = ifSelectivity(receiver.selectivity, receiver.ifHz);
  const tables = new WeightingTables(receiver, selectivity, 1);
  return {
    hz: Float64Array.from(sorted, ({ frequencyHz }) => frequencyHz),
    fieldDb: Float64Array.from(sorted, ({ fieldDb }) => fieldDb ?? -Infinity),
    reachHz: selectivity.b60Hz / 2,
    strayDb: receiver.strayDb?.image ?? Infinity,
    signalToOscillatorDb: receiver.signalToOscillatorDb,
    bands: receiver.bands.map((band) => {
      const table = tables.table(
        'broadcast',
        band.lowHz < 2e6 ? 1000 : band.lowHz < 1e7 ? 2000 : 4000,
      );
      const listed = frequencies.filter((hz) => hz >= band.lowHz && hz <= band.highHz);
      const channels = rasterChannels(raster, band.lowHz, band.highHz);
      const wanted = (hz: number): number => assumedWantedField(band, 1, hz);
      const width = band.highHz - band.lowHz;
      return {
        band,
        q: Float64Array.from(band.circuits, ({ qLow }) => qLow),
        slope: Float64Array.from(band.circuits, ({ qLow, qHigh }) => (qHigh - qLow) / width),
        listed: Float64Array.from(listed),
        listedWantedDb: Float64Array.from(listed, wanted),
        channels: Float64Array.from(channels),
        channelsWantedDb: Float64Array.from(channels, wanted),
        weighting: Float64Array.from({ length: 600 }, (_, step) => table.at(step * 100)),
      };
    }),
  };
}

/** Judges every setting of every station. */
export function bareLoop(
  it: BareCase,
  ifHz: number,
  maxM: number,
  maxN: number,
  result: BareResult,
): void {
  const { hz, fieldDb, reachHz, bands } = it;
  for (let b = 0; b < bands.length; b++) {
    const at = bands[b]!;
    const { lowHz, highHz } = at.band;
    for (let n = 1; n <= maxN; n++) {
      for (let m = 0; m <= maxM; m++) {
        const level = OSCILLATOR_DB[m]! + SIGNAL_DB[n]! + (n - 1) * (it.signalToOscillatorDb - 80);
        for (let i = 0; i < hz.length; i++) {
          const f = hz[i]!;
          const e = fieldDb[i]!;
          if (m === 0) {
            const beat = Math.abs(n * f - ifHz);
            if (beat > reachHz) continue;
            everywhere(it, at, f, e, n, level, beat, result);
            continue;
          }
          for (let side = 0; side < 2; side++) {
            const target = side === 0 ? n * f + ifHz : Math.abs(n * f - ifHz);
            const solution = target / m - ifHz;
            if (target === 0 || solution < lowHz || solution > highHz) continue;
            if (m === 1 && n === 1 && solution === f) continue;
            around(it, at, f, e, m, n, level, solution, result);
          }
        }
      }
    }
  }
}

function around(
  it: BareCase,
  at: BareBand,
  f: number,
  e: number,
  m: number,
  n: number,
  level: number,
  solution: number,
  result: BareResult,
): void {
  const { listed, channels } = at;
  let found = false;
  for (let k = lowerBound(listed, solution - it.reachHz); k < listed.length; k++) {
    const dial = listed[k]!;
    if (dial > solution + it.reachHz) break;
    if (dial === f) continue;
    found = true;
    one(it, at, f, e, n, level, dial, at.listedWantedDb[k]!, m * Math.abs(dial - solution), result);
  }
  if (found) return;
  const k = lowerBound(channels, solution);
  const below = k > 0 ? solution - channels[k - 1]! : Infinity;
  const above = k < channels.length ? channels[k]! - solution : Infinity;
  const nearest = below <= above ? k - 1 : k;
  const distance = Math.min(below, above);
  if (distance > it.reachHz) one(it, at, f, e, n, level, solution, 40, 0, result);
  else
    one(
      it,
      at,
      f,
      e,
      n,
      level,
      channels[nearest]!,
      at.channelsWantedDb[nearest]!,
      m * distance,
      result,
    );
}

function everywhere(
  it: BareCase,
  at: BareBand,
  f: number,
  e: number,
  n: number,
  level: number,
  beat: number,
  result: BareResult,
): void {
  for (let k = 0; k < at.listed.length; k++) {
    one(it, at, f, e, n, level, at.listed[k]!, at.listedWantedDb[k]!, beat, result);
  }
  for (let k = 0; k < at.channels.length; k++) {
    one(it, at, f, e, n, level, at.channels[k]!, at.channelsWantedDb[k]!, beat, result);
  }
}

function one(
  it: BareCase,
  at: BareBand,
  f: number,
  e: number,
  n: number,
  level: number,
  dial: number,
  wantedDb: number,
  beat: number,
  result: BareResult,
): void {
  const rho = f / dial - dial / f;
  let factor = 1;
  for (let c = 0; c < at.q.length; c++) {
    const x = (at.q[c]! + at.slope[c]! * (dial - at.band.lowHz)) * rho;
    factor *= 1 + x * x;
  }
  let i = n * (e - 10 * Math.log10(factor)) + level;
  if (n === 1) i = Math.max(i, e - it.strayDb);
  const ratio = wantedDb - (i + at.weighting[Math.round(beat / 100)]!);
  result.judged++;
  if (ratio < result.smallestDb) result.smallestDb = ratio;
}

function lowerBound(sorted: Float64Array, limit: number): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if (sorted[middle]! < limit) low = middle + 1;
    else high = middle;
  }
  return low;
}
