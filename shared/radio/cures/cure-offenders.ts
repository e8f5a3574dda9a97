/**
 * The stations that come through on the IF, as a trap meets them.
 *
 * Source: own rule; fields and rejections as in `assess`.
 *
 * @module radio/cures/cure-offenders
 */
import type { JudgedSetUp, SetUp, WantedChannel } from './cure-bench.ts';
import type { Offender } from './cure-trap.ts';
import { FrontEnd } from '../circuits/front-end.ts';
import { tuningOf } from '../tracking/tuning.ts';

/** The loudest are enough: a weaker one is never the worst. */
const MOST = 30;

/**
 * Stations within reach of the IF with their breakthrough in the worst period, while the lowest
 * wanted channel is tuned and no trap is there: `E + H_0 - A + W`.
 *
 * @param setUp The receiver and its IF.
 * @param judged The set-up, judged.
 * @param channel The lowest wanted channel, of the band on which breakthrough is worst.
 * @param reachHz Half the width over which a station on the IF is heard, hertz.
 * @returns The loudest, loudest first; none where no breakthrough is heard.
 */
export function offendersOf(
  { receiver, ifHz }: SetUp,
  { breakthrough, scans }: JudgedSetUp,
  channel: WantedChannel,
  reachHz: number,
): Offender[] {
  const band = receiver.bands[channel.band];
  if (breakthrough === null || band === undefined) return [];
  const { row, scan } = breakthrough;
  const frontEnd = new FrontEnd({ ...receiver, trap: null }, band);
  const tunedHz = tuningOf(band, receiver.ifHz, ifHz).tuning?.(channel.dialHz) ?? channel.dialHz;
  return [...strongestFields(scans, ifHz, reachHz)]
    .map(([hz, fieldDb]): Offender => {
      const heardDb = fieldDb + scan.dial.weightingDb(row, Math.abs(hz - ifHz));
      const rejectionDb = frontEnd.rejectionDb(hz, channel.dialHz, tunedHz);
      return {
        hz,
        levelDb: heardDb + receiver.ifFeedthroughDb - rejectionDb,
        leastDb: heardDb - (receiver.strayDb?.if ?? Infinity),
      };
    })
    .sort((a, b) => b.levelDb - a.levelDb)
    .slice(0, MOST);
}

/** Field on each frequency near the IF, in the period in which it is stronger. */
function strongestFields(
  scans: JudgedSetUp['scans'],
  ifHz: number,
  reachHz: number,
): Map<number, number> {
  const fields = new Map<number, number>();
  for (const spectrum of new Set(scans.map(({ dial }) => dial.spectrum))) {
    for (let group = spectrum.firstFrom(ifHz - reachHz); group < spectrum.hz.length; group++) {
      const hz = spectrum.hz[group] ?? NaN;
      if (hz > ifHz + reachHz) break;
      const fieldDb = 10 * Math.log10(spectrum.powerOf(group));
      fields.set(hz, Math.max(fieldDb, fields.get(hz) ?? -Infinity));
    }
  }
  return fields;
}
