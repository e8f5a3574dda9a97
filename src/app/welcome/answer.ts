import type { Assessment } from '../../../shared/contracts/assessment';
import type { CandidatesAnswer } from '../../../shared/contracts/candidates';
import { defaultRaster, rasterChannels } from '../../../shared/radio/channels/raster';
import type { CandidateMark } from '../charts/candidate-lane/candidate-lane';
import { receiverOf, type Trial } from './trial';

type JudgedBand = Assessment['bands'][number];

/** A stretch of frequencies, hertz. */
interface Stretch {
  readonly low: number;
  readonly high: number;
}

/** A band of the set with what is heard on it. */
export interface JudgedStrip {
  readonly band: JudgedBand;
  readonly range: Stretch;
}

/** The band that tells most: on which most is heard; where all are silent, most channels lie. */
export function tellingStrip(trial: Trial, bands: readonly JudgedBand[]): JudgedStrip | undefined {
  const own = receiverOf(trial).bands;
  const raster = defaultRaster(trial.ituRegion);
  return bands
    .map((band, at) => {
      const { lowHz: low = 0, highHz: high = 0 } = own[at] ?? {};
      const heard = band.responses.filter(({ dialHz, hidden }) => dialHz !== null && !hidden);
      const channels = rasterChannels(raster, low, high);
      return { band, range: { low, high }, heard: heard.length, channels: channels.length };
    })
    .sort((a, b) => b.heard - a.heard || b.channels - a.channels)[0];
}

/** The candidates as bars, lowest first, and the stretch they cover. */
export function lane({ candidates, present }: CandidatesAnswer): {
  readonly marks: CandidateMark[];
  readonly worstDb: number;
  readonly range: Stretch;
} {
  const marks = candidates
    .map(({ ifHz, deficitDb, reachable }) => ({ ifHz, deficitDb, isReachable: reachable.ok }))
    .sort((a, b) => a.ifHz - b.ifHz);
  return {
    marks,
    worstDb: Math.max(0, ...marks.map(({ deficitDb }) => deficitDb)),
    range: {
      low: Math.min(present.ifHz, marks[0]?.ifHz ?? present.ifHz) - 1000,
      high: Math.max(present.ifHz, marks.at(-1)?.ifHz ?? present.ifHz) + 1000,
    },
  };
}
