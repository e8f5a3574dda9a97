import type { WhistlesAnswer } from '../../../../shared/contracts/whistles';

type Beat = WhistlesAnswer['causes'][number];

/**
 * Pairs of stations that make the IF between them at zero beat. On a raster there are dozens, none
 * with a pitch or a known level: they would crowd out what can be heard.
 */
const isSilentPair = ({ cause, pitchHz, levelDb }: Beat): boolean =>
  cause === 'intermodulation' && pitchHz === 0 && levelDb === null;

/** Beats to be listed one by one, and silent pairs to be counted in one line; both in order. */
export function apartFromPairs<B extends Beat>(beats: readonly B[]): { heard: B[]; pairs: B[] } {
  return {
    heard: beats.filter((each) => !isSilentPair(each)),
    pairs: beats.filter(isSilentPair),
  };
}

/** The line that stands for the pairs. */
export const pairsSummary = (count: number): string =>
  count === 1
    ? $localize`and 1 pair of stations that makes the IF between them, at zero beat`
    : $localize`and ${count}:count: pairs of stations that make the IF between them, at zero beat`;
